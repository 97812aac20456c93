import type { Port } from "../../hosts/port";
import { formatAddress, formatSheetName, parseAddress } from "../../sheet/address";
import {
  FIXED_MARK_HEADINGS,
  FIXED_MARK_SHEET,
  fixedMarkRow,
  isFixedMarkHeading,
  readFixedMark,
  type FixedMark,
  type FixedMarkKind,
} from "../../sheet/fixedMark";
import { gridMark } from "../../sheet/scoreGrid";
import type { Column } from "../column/readColumn";
import type { Call } from "../context";
import { answerCutoff, type CutoffAnswer } from "../cutoff/answerCutoff";

const LAST_LETTER = "N";

/** The sheet that holds fixed marks, where the workbook has one; its name may carry a number. */
async function markSheet(port: Port): Promise<{ name: string; rows: number; marks: FixedMark[] } | undefined> {
  for (const name of await port.sheetNames()) {
    if (!name.toLowerCase().startsWith(FIXED_MARK_SHEET.toLowerCase())) continue;
    const { values } = await port.read(`${formatSheetName(name)}!A:${LAST_LETTER}`);
    if (!values[0] || !isFixedMarkHeading(values[0])) continue;
    const marks = values.slice(1).flatMap((row) => readFixedMark(row) ?? []);
    return { name, rows: values.length, marks };
  }
  return undefined;
}

/** The fixed marks of one column of scores, oldest first: those whose scores stood on the same sheet, in the same column. */
export async function marksOf(port: Port, column: Column): Promise<FixedMark[]> {
  const here = parseAddress(column.address);
  const sheet = await markSheet(port);
  return (sheet?.marks ?? []).filter(({ scores }) => {
    const there = parseAddress(scores);
    return there?.left === here?.left && there?.sheet?.toLowerCase() === here?.sheet?.toLowerCase();
  });
}

/** Adds a mark below the others, on a sheet of its own that is made where it is missing. Returns where it stands. */
export async function writeMark(port: Port, mark: FixedMark): Promise<string> {
  const sheet = await markSheet(port);
  const row = fixedMarkRow(mark);
  if (sheet) {
    const place = { sheet: sheet.name, top: sheet.rows, bottom: sheet.rows, left: 0, right: 0 };
    await port.write(formatAddress(place), [row]);
    return formatAddress(place);
  }
  const name = await port.addSheet(FIXED_MARK_SHEET);
  await port.write(`${formatSheetName(name)}!A1`, [[...FIXED_MARK_HEADINGS], row]);
  return `${formatSheetName(name)}!A2`;
}

/** The cutoff of one kind out of an answer; undefined where it has none. */
export function cutoffOfKind({ report }: CutoffAnswer, kind: FixedMarkKind): number | undefined {
  return kind === "plain" ? report?.cutoff : kind === "safe" ? report?.safe : report?.next;
}

/** The mark as it would be written down today: on the grid of the scores, or the cutoff with all its digits. */
export function markToday(
  answer: CutoffAnswer,
  kind: FixedMarkKind,
  reason: string,
  date: string,
  revision: number,
  onGrid = true,
): FixedMark | undefined {
  const { column, question, report } = answer;
  const cutoff = cutoffOfKind(answer, kind);
  if (!report || cutoff === undefined) return undefined;
  const { fraction, confidence, better, shape } = question;
  return {
    mark: onGrid ? gridMark(cutoff, better, report.decimals, report.spread).mark : cutoff,
    better,
    date,
    reason,
    count: report.count,
    scores: column.address,
    kind,
    fraction,
    confidence,
    shape,
    cutoff,
    lower: report.lower,
    upper: report.upper,
    revision,
  };
}

export interface MarkDrift {
  /** Where the same question would set it with the scores of today; undefined where they give no answer. */
  readonly today: number | undefined;
  readonly count: number;
}

/** What the scores of today would make of a fixed mark: asked as it was asked then. */
export function driftOf(call: Call, column: Column, mark: FixedMark): MarkDrift {
  const { fraction, confidence, better, shape } = mark;
  const answer = answerCutoff(call, column, { fraction, confidence, better, shape });
  const onGrid = mark.mark !== mark.cutoff;
  return { today: markToday(answer, mark.kind, "", "", mark.revision, onGrid)?.mark, count: column.count };
}

/** How many entries score the mark to the bit: they pass together or not at all, whatever fraction was meant. */
export function tiesAt({ values }: Pick<Column, "values">, mark: number): number {
  return values.reduce((ties, score) => (score === mark ? ties + 1 : ties), 0);
}
