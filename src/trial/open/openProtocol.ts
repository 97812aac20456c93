import type { Extra } from "../../hosts/file/notShown";
import type { Differences } from "./cellsOfSheet";

/** What is told of a file once it was read, before anything is replaced by it. */
export interface FileSummary {
  readonly name: string;
  readonly sheets: number;
  readonly cells: number;
  readonly differences: Differences;
  readonly extras: readonly (readonly [Extra, number])[];
}

/** What the page tells the background that reads files; a file that is no longer wanted goes with the background itself. */
export type OpenRequest =
  | { readonly kind: "read"; readonly file: Blob; readonly name: string; readonly functions: readonly string[] }
  | { readonly kind: "take" };

export type OpenAnswer =
  | { readonly kind: "read"; readonly summary: FileSummary }
  | { readonly kind: "refused"; readonly message: string }
  /** The workbook is kept in the browser in the place of the one before, with the settings that came with it. */
  | { readonly kind: "taken"; readonly settings: Readonly<Record<string, unknown>> }
  | { readonly kind: "notKept" };
