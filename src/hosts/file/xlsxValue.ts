import type { Cell } from "../../sheet/cell";
import { UnusableFile } from "./unusableFile";
import { unescapeText } from "./xlsxStrings";

const PLAIN_NUMBER = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

export interface ValueContext {
  /** The texts that the cells of all sheets share. */
  readonly strings: readonly string[];
  readonly date1904: boolean;
}

/** The value of a `<c>`, from its `<v>` and the letter of its kind (ECMA-376, ST_CellType). Null where there is none. */
export function storedValue(text: string, kind: string | undefined, { strings, date1904 }: ValueContext): Cell {
  switch (kind) {
    case "s": {
      const shared = strings[Number(text)];
      if (shared === undefined)
        throw new UnusableFile(`The file is damaged: it has no text number ${text.slice(0, 20)}.`);
      return shared;
    }
    case "str":
    case "inlineStr":
      return unescapeText(text);
    case "b":
      return booleanValue(text.trim());
    case "e":
      return { code: text.trim() };
    case "d":
      return dateSerial(text.trim(), date1904);
    case undefined:
    case "n": {
      if (text.trim() === "") return null;
      const number = Number(text);
      // `0x10` is a number to the language of this program, not to that of the file.
      if (!Number.isFinite(number) || (text.charCodeAt(1) > 57 && !PLAIN_NUMBER.test(text.trim())))
        throw new UnusableFile(`The file is damaged: a number cell holds “${text.slice(0, 40)}”.`);
      return number;
    }
    default:
      throw new UnusableFile(`The file is damaged: it has a cell of the unknown kind “${kind.slice(0, 20)}”.`);
  }
}

function booleanValue(text: string): boolean {
  if (text === "1" || text === "true") return true;
  if (text === "0" || text === "false") return false;
  throw new UnusableFile(`The file is damaged: a cell of TRUE or FALSE holds “${text.slice(0, 40)}”.`);
}

/** The same day counts so many fewer in the 1904 system. */
const DAYS_TO_1904 = 1462;

/** An ISO date as the number of days that the cells of the file count in. */
function dateSerial(text: string, date1904: boolean): Cell {
  const time = Date.parse(/[Tt]/.test(text) ? text.replace(/Z?$/, "Z") : `${text}T00:00:00Z`);
  return Number.isNaN(time) ? text : time / 86_400_000 + 25_569 - (date1904 ? DAYS_TO_1904 : 0);
}
