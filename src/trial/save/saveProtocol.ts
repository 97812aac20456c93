import type { SavedBook } from "../../hosts/trial/savedBook";

/** What the page tells the background that writes files, and what it hears. */
export interface SaveRequest {
  readonly book: SavedBook;
  readonly settings: Readonly<Record<string, unknown>>;
}

export type SaveAnswer =
  | { readonly kind: "written"; readonly bytes: Uint8Array<ArrayBuffer> }
  | { readonly kind: "failed"; readonly message: string };
