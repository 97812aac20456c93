import type { PictureToWrite } from "../../hosts/file/write/book";
import type { SavedBook } from "../../hosts/trial/savedBook";

/** What the page tells the background that writes files, and what it hears. */
export interface SaveRequest {
  readonly book: SavedBook;
  readonly settings: Readonly<Record<string, unknown>>;
  readonly pictures: readonly DrawnPicture[];
}

/** A picture on a sheet, drawn as PNG: only a page can do that. */
export interface DrawnPicture extends PictureToWrite {
  readonly sheetId: string;
}

export type SaveAnswer =
  | { readonly kind: "written"; readonly bytes: Uint8Array<ArrayBuffer> }
  | { readonly kind: "failed"; readonly message: string };
