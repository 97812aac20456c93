import { NUMBERS_REVISION } from "../core/release";
import { formatAddress } from "../sheet/address";
import { isCellError, type Cell } from "../sheet/cell";
import type { Comparison } from "./compareStored";
import type { OwnCall } from "./evaluation";
import { usedPart } from "./reference";
import { counted, showCell } from "./showCell";
import { Reference } from "./value";

export function explainAgreement({ gap }: Comparison): string {
  if (gap === 0) return "Worked out again from the stored inputs: the same.";
  return `Worked out again from the stored inputs: the same but for ${gap.toExponential(1)} of it, which is rounding.`;
}

export interface Causes {
  /** The stored value is what comes out when blanks count as 0. */
  readonly blanksAsZero: boolean;
  /** The revision that the file was computed by, where it is older than this one. */
  readonly olderRevision: number | undefined;
  readonly calls: readonly OwnCall[];
}

/** What the file holds, what comes out, and what explains the difference, where something does. */
export function explainDifference(compared: Comparison, stored: readonly (readonly Cell[])[], causes: Causes): string {
  const { row, column } = compared;
  const label = column > 0 ? stored[row]?.[0] : undefined;
  const many = stored.length > 1 || (stored[0]?.length ?? 0) > 1;
  const named = typeof label === "string" ? ` (${showCell(label)})` : "";
  const place = many ? `In row ${row + 1}, column ${column + 1} of the table${named} the` : "The";
  const fresh = compared.recomputed;
  const outcome =
    isCellError(fresh) && fresh.message ? `${fresh.code} (${withoutStop(fresh.message)})` : showCell(fresh);
  const sentences = [
    `${place} file holds ${showCell(compared.stored)}; the stored inputs give ${outcome}${size(compared)}.`,
  ];
  if (causes.blanksAsZero) sentences.push(blanksSentence(causes.calls));
  else if (causes.olderRevision !== undefined)
    sentences.push(
      `The file was computed by revision ${causes.olderRevision} of the numbers; this is revision ${NUMBERS_REVISION}, which may be the reason. The change log says what changed; calculate the file anew to bring it up to date.`,
    );
  else sentences.push(usualSentence(compared));
  return sentences.join(" ");
}

function size({ stored, recomputed }: Comparison): string {
  if (typeof stored !== "number" || typeof recomputed !== "number" || recomputed === 0) return "";
  const part = Math.abs((stored - recomputed) / recomputed);
  const shown = part >= 1e-4 ? `${Number((100 * part).toPrecision(2))}%` : `${part.toExponential(1)} of it`;
  return `: it is ${shown} too ${stored > recomputed ? "high" : "low"}`;
}

function blanksSentence(calls: readonly OwnCall[]): string {
  let blanks = 0;
  const where = new Set<string>();
  for (const { values } of calls) {
    for (const value of values) {
      if (!(value instanceof Reference)) continue;
      for (const place of value.places) {
        const empty = place.sheet
          .range(usedPart(place))
          .flat()
          .filter((cell) => cell === null).length;
        if (empty > 0) where.add(formatAddress({ sheet: place.sheet.name, ...place.area }));
        blanks += empty;
      }
    }
  }
  const places = blanks > 0 ? ` (${counted(blanks, "blank cell")} in ${[...where].slice(0, 3).join(", ")})` : "";
  return `That is what comes out when blank cells are taken as 0${places}, as some builds of the host do: the blanks were counted as scores. BLANK_CHECK tells which builds; take the blanks out of the range, or calculate the file in another.`;
}

function usualSentence({ stored, recomputed }: Comparison): string {
  if (typeof stored === "number" && typeof recomputed === "number")
    for (let decimals = 0; decimals <= 8; decimals++)
      // A single digit left would fit by chance.
      if (Number(recomputed.toFixed(decimals)) === stored && Math.abs(stored) * 10 ** decimals >= 10)
        return `It is that value rounded to ${counted(decimals, "decimal")}: the file may be set to calculate with the precision shown.`;
  return "Either the value was changed by hand, or an input was changed after it was last calculated: calculate the file anew, and ask for the reason if it still differs.";
}

function withoutStop(message: string): string {
  return message.replace(/\.$/, "");
}
