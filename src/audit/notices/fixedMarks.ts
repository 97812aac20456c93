import { NUMBERS_REVISION } from "../../core/release";
import { callFunction } from "../../functions/call";
import { formatAddress, parseAddress } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { FixedMark } from "../../sheet/fixedMark";
import { sheetNamed, type Workbook } from "../../sheet/workbook";
import { compareStored } from "../compareStored";
import type { Notice } from "../judgement";
import { usedPart } from "../reference";
import { counted, showCell } from "../showCell";
import { marksOn } from "./marksOn";

const MOST_CELLS = 2_000_000;
/** The functions that make the three promises. */
const FUNCTION_OF = { plain: "TOP_FRACTION_CUTOFF", safe: "SAFE_CUTOFF", "next-score": "NEXT_SCORE_CUTOFF" } as const;

/** The fixed marks of a workbook that no longer follow from the scores they were worked out from. */
export function fixedMarks(workbook: Workbook, tolerance: number): Notice[] {
  return workbook.sheets.flatMap((sheet) => {
    const notices: Notice[] = [];
    for (const { row, mark } of marksOn(sheet)) {
      const fault = faultOf(mark, workbook, tolerance);
      if (!fault) continue;
      const older =
        mark.revision < NUMBERS_REVISION
          ? ` It was written by revision ${mark.revision} of the numbers; this is revision ${NUMBERS_REVISION}.`
          : "";
      notices.push({
        sheet: sheet.name,
        address: formatAddress({ top: row, left: 0, bottom: row, right: 0 }),
        kind: "fixed mark moved",
        why: `The fixed mark ${showCell(mark.mark)}${mark.date ? ` of ${mark.date}` : ""} no longer follows from its scores: ${fault.why}.${older} Find out which of the two was changed before anyone is judged by it.`,
        stored: mark.mark,
        recomputed: fault.recomputed,
      });
    }
    return notices;
  });
}

interface Fault {
  readonly why: string;
  readonly recomputed?: Cell;
}

function faultOf(mark: FixedMark, workbook: Workbook, tolerance: number): Fault | undefined {
  const area = parseAddress(mark.scores);
  const sheet = area?.sheet === undefined ? undefined : sheetNamed(workbook, area.sheet);
  if (!area || !sheet) return { why: `its scores (${mark.scores}) are not in this file` };
  const used = usedPart({ sheet, area });
  if ((used.bottom - used.top + 1) * (used.right - used.left + 1) > MOST_CELLS)
    return { why: `its scores (${mark.scores}) are more cells than are read` };
  const scores = sheet
    .range(used)
    .flat()
    .filter((cell) => typeof cell === "number");
  if (scores.length < mark.count)
    return { why: `it rests on ${counted(mark.count, "score")}, and ${mark.scores} holds ${scores.length}` };
  // Scores that came later stand behind: the mark was written so as not to follow them.
  const first = scores.slice(0, mark.count).map((score) => [score]);
  const { fraction, confidence, shape, better, kind } = mark;
  const args = kind === "safe" ? [first, fraction, confidence, shape, better] : [first, fraction, shape, better];
  const outcome = callFunction(FUNCTION_OF[kind], args);
  const value = outcome && "value" in outcome ? outcome.value : undefined;
  if (typeof value !== "number")
    return { why: `the first ${counted(mark.count, "score")} of ${mark.scores} give no ${kind} cutoff` };
  if (!compareStored([[mark.cutoff]], [[value]], tolerance).same)
    return {
      why: `the first ${counted(mark.count, "score")} of ${mark.scores} give a ${kind} cutoff of ${showCell(value)}, and ${showCell(mark.cutoff)} was written down`,
      recomputed: value,
    };
  if (!standsOn(mark))
    return {
      why: `the cutoff worked out was ${showCell(mark.cutoff)}, and the mark is not the next score on its strict side`,
      recomputed: value,
    };
  return undefined;
}

/** The mark is its cutoff brought to the strict side, by less than one step of its own last digit. */
function standsOn({ mark, cutoff, better }: FixedMark): boolean {
  const decimals = (String(mark).split(".")[1] ?? "").length;
  const beyond = better === "low" ? cutoff - mark : mark - cutoff;
  const slack = 1e-9 * Math.max(1, Math.abs(cutoff));
  return beyond >= -slack && beyond <= 10 ** -decimals + slack;
}
