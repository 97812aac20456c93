import { describe, expect, test } from "vitest";
import { expectProven, nativeSheetOf } from "../support/provenWorkings";

/* What the public cases leave out: ranges of any form, long tables, ties, batches too small or too large for one of the tests. Scores invented. */
const wave = (count: number, of: number) =>
  Array.from({ length: count }, (_, i) => 60 + ((i * of) % 37) / 2 - ((i * 5) % 13));
const columns = [
  { heading: "left", cells: ["", 61.5, 84, "", 58] },
  { heading: "right", cells: [52, 66.5, null, 71, 90.5] },
  { heading: "many", cells: wave(130, 11) },
  { heading: "more", cells: wave(110, 17).map((x, i) => (i % 9 === 4 ? "" : x + i / 20)) },
  { heading: "ties", cells: [1, 2, 2, 3, 3, 3, 4, 5, 5] },
  { heading: "few ties", cells: [3, 4, 4, 5, "", 5, 6] },
];
const sheet = nativeSheetOf(columns);
const prove = (formula: string) => expectProven(formula, columns, sheet);

describe("the workings of DRIFT_FLAGS", () => {
  test.each([
    "=WEIR.DRIFT_FLAGS(A2:B6,60,8)",
    '=WEIR.DRIFT_FLAGS(A2:B6,60,8,"cusum")',
    "=WEIR.DRIFT_FLAGS(A3:D3,60,8)",
    '=WEIR.DRIFT_FLAGS({84,"",60},60,8)',
    '=WEIR.DRIFT_FLAGS({68;52;100;9},60,8,"cusum")',
    "=WEIR.DRIFT_FLAGS({84;60},60,8)",
    "=WEIR.DRIFT_FLAGS(C2:C131,60,8)",
    '=WEIR.DRIFT_FLAGS(D2:D111,60,8,"cusum")',
  ])("%s", (formula) => void prove(formula));

  test("a score is worked from the cells down to its own", () => {
    const row = prove("=WEIR.DRIFT_FLAGS(D2:D8,60,8)").find(([, meaning]) => meaning === "score 5: smoothed")!;
    expect(row[3]).toBe('=REDUCE(60,D2:D7,LAMBDA(a,x,IF(x<"",a+0.2*(x-a),a)))');
  });

  test("of a long column the first and the last twenty scores are laid out", () => {
    const rows = prove("=WEIR.DRIFT_FLAGS(C2:C131,60,8)").map(([, meaning]) => meaning);
    expect(rows).toHaveLength(2 + 200 + 1);
    expect(rows[102]).toBe("rows left out here, from the 21st to the 110th, worked alike");
  });
});

describe("the workings of DRIFT_COMPARISON", () => {
  test.each([
    "=WEIR.DRIFT_COMPARISON(A2:B6,C2:C8)",
    "=WEIR.DRIFT_COMPARISON(E2:E10,F2:F8)",
    "=WEIR.DRIFT_COMPARISON(F2:F8,E2:E10)",
    "=WEIR.DRIFT_COMPARISON(A2:B6,A2:B6)",
    "=WEIR.DRIFT_COMPARISON({1;2;3},{4;5;6;7})",
    "=WEIR.DRIFT_COMPARISON(C2:C131,D2:D111)",
  ])("%s", (formula) => void prove(formula));

  test("two scores each have no test of their spread", () => {
    const row = prove("=WEIR.DRIFT_COMPARISON(B2:B3,B5:B6)").find(
      ([, meaning]) => meaning === "Brown-Forsythe p-value",
    )!;
    expect(row.slice(2, 4)).toEqual(["", ""]);
  });
});
