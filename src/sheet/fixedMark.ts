import { isBlank, type Cell } from "./cell";

/** A cutoff written down as a constant, with all that is needed to work it out again and to defend it. */
export interface FixedMark {
  /** The mark itself, on the grid of the scores. */
  readonly mark: number;
  readonly better: "high" | "low";
  /** The day on which it was written, as 2025-03-14. */
  readonly date: string;
  readonly reason: string;
  /** How many scores it rests on, and where they stood. */
  readonly count: number;
  readonly scores: string;
  /** Which promise it makes. */
  readonly kind: FixedMarkKind;
  readonly fraction: number;
  readonly confidence: number;
  readonly shape: string;
  /** The cutoff before it was brought onto the grid of the scores. */
  readonly cutoff: number;
  readonly lower: number;
  readonly upper: number;
  /** Revision of the numbers (RELEASE) that computed it. */
  readonly revision: number;
}

export const FIXED_MARK_KINDS = ["plain", "safe", "next-score"] as const;
export type FixedMarkKind = (typeof FIXED_MARK_KINDS)[number];

/** The sheet on which the pane keeps fixed marks: headings in row 1, one mark a row, the newest last. */
export const FIXED_MARK_SHEET = "Fixed marks";

/** The headings, by which such a table is known on any sheet. Never renamed or reordered: files hold them. */
export const FIXED_MARK_HEADINGS = [
  "fixed mark",
  "better",
  "written on",
  "reason",
  "scores used",
  "scores",
  "kind",
  "fraction",
  "confidence",
  "shape",
  "computed cutoff",
  "lower limit",
  "upper limit",
  "revision",
] as const;

export function isFixedMarkHeading(row: readonly Cell[]): boolean {
  return FIXED_MARK_HEADINGS.every((heading, index) => {
    const cell = row[index];
    return typeof cell === "string" && cell.trim().toLowerCase() === heading;
  });
}

/** The mark as a row of constants. */
export function fixedMarkRow(mark: FixedMark): Cell[] {
  const { better, date, reason, count, scores, kind, fraction, confidence, shape, cutoff, lower, upper, revision } =
    mark;
  // A reason that begins like a formula must stay a text; an apostrophe in front of a sheet's name would be dropped by the host.
  const text = (words: string) => (/^[=+\-@']/.test(words) ? ` ${words}` : words);
  return [
    mark.mark,
    better,
    date,
    text(reason),
    count,
    text(scores),
    kind,
    fraction,
    confidence,
    shape,
    cutoff,
    lower,
    upper,
    revision,
  ];
}

/** Reads a row back; undefined where it is no fixed mark. */
export function readFixedMark(row: readonly Cell[]): FixedMark | undefined {
  const [mark, better, date, reason, count, scores, kind, fraction, confidence, shape, cutoff, lower, upper, revision] =
    row;
  const numbers = [mark, count, fraction, confidence, cutoff, lower, upper, revision];
  if (!numbers.every((cell) => typeof cell === "number") || typeof scores !== "string") return undefined;
  const known = FIXED_MARK_KINDS.find((one) => one === String(kind).trim().toLowerCase());
  if (!known || typeof shape !== "string") return undefined;
  return {
    mark: mark as number,
    better: String(better).trim().toLowerCase() === "low" ? "low" : "high",
    date: dateText(date),
    reason: isBlank(reason) ? "" : String(reason).trim(),
    count: count as number,
    scores: scores.trim(),
    kind: known,
    fraction: fraction as number,
    confidence: confidence as number,
    shape,
    cutoff: cutoff as number,
    lower: lower as number,
    upper: upper as number,
    revision: revision as number,
  };
}

/** A host may turn a written date into its own day number: days since 1899-12-30, as hosts count from March 1900 on. */
function dateText(cell: Cell): string {
  if (typeof cell !== "number") return isBlank(cell) ? "" : String(cell).trim();
  return new Date(Math.round(cell - 25_569) * 86_400_000).toISOString().slice(0, 10);
}
