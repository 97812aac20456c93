import { formatAddress, parseAddress, type Area } from "./address";

/** `E2#` as files spell it, with its sheet where one is named; quotation marks may be those of XML. */
const SPILLED =
  /(?:_xlfn\.)?ANCHORARRAY\(((?:'(?:[^'<>]|'')*'!|&apos;[^<>]*?&apos;!|[^\s'"!()<>,;=+*/&^-]+!)?)(\$?)([A-Z]{1,3})(\$?)(\d+)\)/gi;

/** What the result at a cell filled, where it spills no more; undefined for every other cell. */
export type EndedSpill = (sheet: string, row: number, column: number) => Area | undefined;

/**
 * A text in the spelling of files where `E2#` stands for the cells it stood for, once the result at E2 spills no more: the host would
 * answer #REF!. An address without a sheet stands on the sheet `home`.
 */
export function endSpills(text: string, home: string, areaOf: EndedSpill): string {
  if (!/ANCHORARRAY/i.test(text)) return text;
  return text.replace(SPILLED, (found, prefix: string, across: string, letters: string, down: string, row: string) => {
    const place = parseAddress(`${letters}${row}`);
    const area = place && areaOf(prefix === "" ? home : sheetName(prefix), place.top, place.left);
    if (!area) return found;
    const [first, last] = [area, { ...area, top: area.bottom, left: area.right }].map(({ top, left }) =>
      formatAddress({ top, left, bottom: top, right: left }).replace(
        /([A-Z]+)(\d+)/,
        `${dollars(across)}$1${dollars(down)}$2`,
      ),
    );
    return `${prefix}${first === last ? first : `${first}:${last}`}`;
  });
}

/** A sign that a replacement doesn't take for its own. */
function dollars(sign: string): string {
  return sign === "$" ? "$$" : "";
}

function sheetName(prefix: string): string {
  return prefix
    .slice(0, -1)
    .replace(/&apos;/g, "'")
    .replace(/&amp;/g, "&")
    .replace(/^'(.*)'$/, "$1")
    .replace(/''/g, "'");
}
