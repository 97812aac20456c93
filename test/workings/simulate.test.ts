import { describe, expect, test } from "vitest";
import { expectProven, nativeSheetOf } from "../support/provenWorkings";

const columns = [{ heading: "setting", cells: [60, 8, 0.15, 25] }];
const sheet = nativeSheetOf(columns);
const prove = (formula: string) => expectProven(formula, columns, sheet);

describe("the workings of SIMULATED_SEARCH", () => {
  test.each([
    '=WEIR.SIMULATED_SEARCH(A2,A3,A4,A5,"safe",2000)',
    '=WEIR.SIMULATED_SEARCH(A2,A3,A4,A5,"next",2000,9,50)',
    "=WEIR.SIMULATED_SEARCH(0,1,99.99%,2,,1,1,1)",
    "=WEIR.SIMULATED_SEARCH(0,1,0.0001,400,,200,5)",
    "=WEIR.SIMULATED_SEARCH(0,1,0.07,2,,300)",
  ])("%s", (formula) => void prove(formula));

  test.each(["plain", "safe", "next"])(
    'by the exact law the 5th and 95th percentiles of 20000 runs lie where they should: method "%s" (five standard errors)',
    (method) => {
      const rows = prove(`=WEIR.SIMULATED_SEARCH(A2,A3,A4,A5,"${method}",20000)`);
      const [low, high] = rows
        .filter(([, meaning]) => meaning.startsWith("exact chance"))
        .map((row) => row[2] as number);
      const slack = 5 * Math.sqrt((0.05 * 0.95) / 20_000);
      expect(Math.abs(low! - 0.05)).toBeLessThan(slack);
      expect(Math.abs(high! - 0.95)).toBeLessThan(slack);
    },
  );
});
