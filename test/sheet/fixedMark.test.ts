import { expect, test } from "vitest";
import {
  FIXED_MARK_HEADINGS,
  fixedMarkRow,
  isFixedMarkHeading,
  readFixedMark,
  type FixedMark,
} from "../../src/sheet/fixedMark";

const mark: FixedMark = {
  mark: 82,
  better: "high",
  date: "2025-03-14",
  reason: "Agreed by the panel",
  count: 57,
  scores: "Bids!F2:F61",
  kind: "plain",
  fraction: 0.05,
  confidence: 0.95,
  shape: "normal",
  cutoff: 81.95271223532491,
  lower: 79.40321059787613,
  upper: 85.39704975350084,
  revision: 1,
};

test("a fixed mark comes back from its row as it was written", () => {
  expect(fixedMarkRow(mark)).toHaveLength(FIXED_MARK_HEADINGS.length);
  expect(readFixedMark(fixedMarkRow(mark))).toEqual(mark);
});

test("a date that the host turned into a day number is read as that day", () => {
  const row = fixedMarkRow(mark);
  // 14 March 2025 is day 45730: 45658 is 1 January 2025 (known from any sheet), and 72 days follow.
  row[2] = 45730;
  expect(readFixedMark(row)!.date).toBe("2025-03-14");
});

test("a reason can't become a formula", () => {
  const row = fixedMarkRow({ ...mark, reason: '=HYPERLINK("x")', scores: "'Round 2'!A2:A9" });
  expect(row[3]).toBe(' =HYPERLINK("x")');
  // A host takes an apostrophe in front for "this is text" and drops it.
  expect(row[5]).toBe(" 'Round 2'!A2:A9");
  expect(readFixedMark(row)!.scores).toBe("'Round 2'!A2:A9");
  expect(readFixedMark(row)!.reason).toBe('=HYPERLINK("x")');
});

test("the table is known by its headings, and other rows are no marks", () => {
  expect(isFixedMarkHeading(FIXED_MARK_HEADINGS.map((heading) => ` ${heading.toUpperCase()}`))).toBe(true);
  expect(isFixedMarkHeading(["fixed mark", "date"])).toBe(false);
  expect(readFixedMark(["82", "high"])).toBeUndefined();
  const other = fixedMarkRow(mark);
  other[6] = "other";
  expect(readFixedMark(other)).toBeUndefined();
});
