import { parseA1Ref, tokenize } from "@borgar/fx/xlsx";
import { formatAddress, type Area } from "../../sheet/address";
import { sheetNamed, type Sheet, type Workbook } from "../../sheet/workbook";
import { storedFormula } from "../formulaText";
import type { Judgement, Notice } from "../judgement";
import { LAST_ROW } from "../reference";
import { counted } from "../showCell";
import { holdsScore } from "./dataLeftOut";

/** A range of fewer rows is no batch of scores. */
const FEWEST_ROWS = 3;

interface Batch {
  readonly sheet: Sheet;
  readonly area: Area;
}

/** A formula that takes a column in several pieces and passes over rows of scores between two of them. */
export function rowsSkipped(judgement: Judgement, workbook: Workbook): Notice[] {
  const batches = batchesOf(judgement, workbook);
  for (const [index, upper] of batches.entries()) {
    const lower = batches
      .slice(index + 1)
      .find(
        ({ sheet, area }) => sheet === upper.sheet && area.left === upper.area.left && area.right === upper.area.right,
      );
    if (!lower) continue;
    const gap = { ...upper.area, top: upper.area.bottom + 1, bottom: lower.area.top - 1 };
    let skipped = 0;
    for (let row = gap.top; row <= gap.bottom; row++) if (holdsScore(upper.sheet, row, gap.left, gap.right)) skipped++;
    if (skipped === 0) continue;
    const [first, second] = [upper, lower].map(({ sheet, area }) => formatAddress({ sheet: sheet.name, ...area }));
    const why = `Between ${first} and ${second} ${counted(skipped, "row")} of numbers ${skipped === 1 ? "is" : "are"} passed over: left out, on purpose or by mistake. Take them into the range if they are scores too.`;
    return [{ sheet: judgement.sheet.name, address: judgement.address, kind: "skips rows", why }];
  }
  return [];
}

/** The ranges that the formula names itself, column by column from the top. */
function batchesOf({ sheet: home, cell }: Judgement, workbook: Workbook): Batch[] {
  if ((cell.formula.match(/:/g) ?? []).length < 2) return [];
  const batches: Batch[] = [];
  for (const { type, value } of tokenize(storedFormula(cell), { mergeRefs: true })) {
    const reference = type === "range" ? parseA1Ref(value) : undefined;
    if (!reference || !("range" in reference)) continue;
    const sheet = reference.sheetName ? sheetNamed(workbook, reference.sheetName) : home;
    const { top, bottom, left, right } = reference.range;
    if (!sheet || top == null || bottom == null || left == null || right == null) continue;
    if (bottom - top + 1 >= FEWEST_ROWS && bottom < LAST_ROW)
      batches.push({ sheet, area: { top, bottom, left, right } });
  }
  return batches.sort((a, b) => a.area.left - b.area.left || a.area.top - b.area.top);
}
