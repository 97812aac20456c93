import type { Workbook } from "../sheet/workbook";
import { callCells } from "./callCells";
import { newSharedWork, type OwnCall } from "./evaluation";
import { fileRevision } from "./fileRevision";
import { judgeCall } from "./judgeCall";
import type { Judgement, Notice, Verdict } from "./judgement";
import { askedInTwoWays } from "./notices/askedInTwoWays";
import { callRanges, type CallRange } from "./notices/callRanges";
import { allDataLeftOut, rangesOutOfLine } from "./notices/dataLeftOut";
import { fixedMarks } from "./notices/fixedMarks";
import { rowsSkipped } from "./notices/rowsSkipped";
import { hiddenRowsInside, totalTakenIn } from "./notices/totalTakenIn";
import { typedOver } from "./notices/typedOver";
import { loadSecondOpinion, type Heard, type SecondOpinion } from "./opinion/secondOpinion";

export interface Audit {
  readonly judgements: readonly Judgement[];
  readonly notices: readonly Notice[];
  readonly counts: Readonly<Record<Verdict, number>>;
  /** The revision that the file says it was computed by. */
  readonly fileRevision: number | undefined;
}

export interface AuditOptions {
  /** How far two numbers may lie apart, as a part of the larger. */
  readonly tolerance: number;
  /** Awaited between two calls, so that a window can draw meanwhile. What it throws ends the audit. */
  readonly between?: (done: number, calls: number) => Promise<void> | void;
}

/** Judges every cell that calls a function of ours on the values the file itself holds, and looks for what is wrong beside them. */
export async function auditWorkbook(workbook: Workbook, { tolerance, between }: AuditOptions): Promise<Audit> {
  const calls = callCells(workbook);
  const revision = fileRevision(calls, workbook);
  const opinion = calls.length > 0 ? await loadSecondOpinion() : undefined;
  const setting = { workbook, tolerance, fileRevision: revision, work: newSharedWork() };
  const judgements: Judgement[] = [];
  const doubts: Notice[] = [];
  for (const [done, call] of calls.entries()) {
    await between?.(done, calls.length);
    const { judgement, calls: worked } = judgeCall(call, setting);
    // Beside a value that nobody could judge it would pass for a verdict.
    const heard = opinion && judgement.verdict !== "not checkable" ? heardOf(worked, opinion) : undefined;
    judgements.push(heard ? { ...judgement, why: `${judgement.why} ${heard.sentence}` } : judgement);
    if (heard && !heard.agrees)
      doubts.push({
        sheet: judgement.sheet.name,
        address: judgement.address,
        kind: "second opinion differs",
        why: heard.sentence,
      });
  }
  const ranges = withinReach(callRanges(judgements));
  const notices = [
    ...typedOver(judgements, setting),
    ...allDataLeftOut(ranges),
    ...ranges.flatMap((range) => [...totalTakenIn(range), ...hiddenRowsInside(range)]),
    ...judgements.flatMap((one) => [...rangesOutOfLine(one), ...rowsSkipped(one, workbook)]),
    ...askedInTwoWays(judgements),
    ...fixedMarks(workbook, tolerance),
    ...doubts,
  ];
  const counts = { agrees: 0, differs: 0, "not checkable": 0 };
  for (const { verdict } of judgements) counts[verdict]++;
  return { judgements, notices, counts, fileRevision: revision };
}

/** Cells that are looked through for what is wrong beside the calls, in all ranges together. */
const MOST_CELLS_LOOKED_AT = 500_000_000;

function withinReach(ranges: readonly CallRange[]): CallRange[] {
  let cells = 0;
  return ranges.filter(({ sheet, area }) => {
    const rows = Math.min(area.bottom, sheet.lastRow) - area.top + 1 + sheet.hiddenRows.size;
    cells += Math.max(0, rows) * (Math.min(area.right, sheet.lastColumn) - area.left + 1);
    return cells <= MOST_CELLS_LOOKED_AT;
  });
}

/** What the other library says of the first call that it can speak on. */
function heardOf(calls: readonly OwnCall[], opinion: SecondOpinion): Heard | undefined {
  for (const call of calls) {
    const heard = opinion.of(call);
    if (heard) return heard;
  }
  return undefined;
}
