/** A block of cells, counted from 0, ends included. Without a sheet it stands on the sheet of whoever reads it. */
export interface Area {
  readonly sheet?: string;
  readonly top: number;
  readonly left: number;
  readonly bottom: number;
  readonly right: number;
}

const LAST_ROW = 1_048_575;
const LAST_COLUMN = 16_383;

/** 0 → "A", 25 → "Z", 26 → "AA". */
export function columnLetters(column: number): string {
  let letters = "";
  for (let rest = column + 1; rest > 0; rest = Math.floor((rest - 1) / 26))
    letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  return letters;
}

/** "A" → 0, "AA" → 26. */
export function columnIndex(letters: string): number {
  let column = 0;
  for (const letter of letters.toUpperCase()) column = column * 26 + letter.charCodeAt(0) - 64;
  return column - 1;
}

/** Reads `B2`, `$B$2:B61`, `B:B`, `2:61`, each with or without `Sheet!` or `'My sheet'!` in front; undefined for anything else. */
export function parseAddress(text: string): Area | undefined {
  const match =
    /^(?:(?:'((?:[^']|'')+)'|([^'!:]+))!)?\$?([A-Za-z]{1,3})?\$?(\d{1,7})?(?::\$?([A-Za-z]{1,3})?\$?(\d{1,7})?)?$/.exec(
      text.trim(),
    );
  if (!match) return undefined;
  const [, quoted, plain, left, top, right, bottom] = match;
  const ranged = text.includes(":", text.lastIndexOf("!") + 1);
  if (!left !== !right && ranged) return undefined;
  if (!top !== !bottom && ranged) return undefined;
  if (ranged ? !left && !top : !left || !top) return undefined;
  const columns = left ? [columnIndex(left), columnIndex(right ?? left)] : [0, LAST_COLUMN];
  const rows = top ? [Number(top) - 1, Number(bottom ?? top) - 1] : [0, LAST_ROW];
  const area = {
    top: Math.min(...rows),
    left: Math.min(...columns),
    bottom: Math.max(...rows),
    right: Math.max(...columns),
  };
  if (area.top < 0 || area.bottom > LAST_ROW || area.right > LAST_COLUMN) return undefined;
  const sheet = quoted?.replace(/''/g, "'") ?? plain;
  return sheet === undefined ? area : { sheet, ...area };
}

/** The address as it is written in a formula: `Bids!F2:F61`, `'Round 2'!A1`, `F:F` for a whole column. */
export function formatAddress({ sheet, top, left, bottom, right }: Area): string {
  const inFront = sheet === undefined ? "" : `${formatSheetName(sheet)}!`;
  if (top === 0 && bottom === LAST_ROW) return `${inFront}${columnLetters(left)}:${columnLetters(right)}`;
  const first = `${columnLetters(left)}${top + 1}`;
  const last = `${columnLetters(right)}${bottom + 1}`;
  return inFront + (first === last ? first : `${first}:${last}`);
}

/** The same with every row and column held fast, as a name wants it: `Bids!$F$2:$F$61`. */
export function absoluteAddress(address: string | Area): string {
  const area = typeof address === "string" ? parseAddress(address) : address;
  if (!area) throw new Error(`"${String(address)}" is no address`);
  const cell = (row: number, column: number) => `$${columnLetters(column)}$${row + 1}`;
  const first = cell(area.top, area.left);
  const last = cell(area.bottom, area.right);
  const inFront = area.sheet === undefined ? "" : `${formatSheetName(area.sheet)}!`;
  return inFront + (first === last ? first : `${first}:${last}`);
}

/** A sheet's name as a formula wants it: in quotes unless it is a plain word that can't be taken for an address. */
export function formatSheetName(name: string): string {
  const plain =
    /^[\p{L}_][\p{L}\p{N}_.]*$/u.test(name) && !/^[A-Za-z]{1,3}\d+$/.test(name) && !/^(R\d*)?(C\d*)?$/i.test(name);
  return plain ? name : `'${name.replace(/'/g, "''")}'`;
}
