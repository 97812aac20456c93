import { columnIndex, parseAddress, type Area } from "../../sheet/address";
import { UnusableFile } from "./unusableFile";

/** `C7` as row and column from 0. Refused where it is no cell of a sheet. Written out by hand: a large sheet has millions of them. */
export function cellReference(text: string): { row: number; column: number } {
  let at = 0;
  while (at < text.length && text.charCodeAt(at) >= 65) at++;
  const row = Number(text.slice(at)) - 1;
  const column = at <= 3 ? columnIndex(text.slice(0, at)) : -1;
  if (!(row >= 0 && row < 1_048_576 && Number.isInteger(row) && column >= 0 && column < 16_384))
    throw new UnusableFile(`The file is damaged: it has a cell “${text.slice(0, 40)}”.`);
  return { row, column };
}

/** `A1:C7` as an area. Refused where it is none. */
export function areaReference(text: string): Area {
  const area = parseAddress(text);
  if (!area) throw new UnusableFile(`The file is damaged: it has a range “${text.slice(0, 40)}”.`);
  return area;
}
