import { expect, test } from "vitest";
import { auditWorkbook } from "../../src/audit/auditWorkbook";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { column, direct } from "../support/auditBook";
import { xlsxFile } from "../support/xlsxFile";

const ROWS = 100_000;
const CALLS = 2_000;

test("100,000 rows with 2,000 calls, each on the whole column, are read and judged in seconds", async () => {
  // Invented scores from a fixed recurrence; every call asks for another fraction.
  const scores: number[] = [];
  for (let i = 0, seed = 7; i < ROWS; i++) scores.push(40 + ((seed = (seed * 16_807) % 2_147_483_647) % 4000) / 100);
  const range = column(scores);
  const rows = scores.map((score, i) => {
    const fraction = (i + 1) / 2_001;
    const call =
      i < CALLS
        ? `<c r="D${i + 2}"><f>_xldudf_WEIR_TOP_FRACTION_CUTOFF($B$2:$B$${ROWS + 1},${fraction})</f><v>${i < 3 ? String(direct("TOP_FRACTION_CUTOFF", [range, fraction])) : "1"}</v></c>`
        : "";
    return `<row r="${i + 2}"><c r="A${i + 2}"><v>${i}</v></c><c r="B${i + 2}"><v>${score}</v></c>${call}</row>`;
  });
  const file = xlsxFile({ sheets: [{ name: "Scores", rows: rows.join("") }] });
  const start = performance.now();
  const { counts } = await auditWorkbook(readXlsx(file), { tolerance: 1e-9 });
  // Measured: 1.8 s of processor time and 155 MB, the program's start included. The bound is for a busy machine.
  expect(performance.now() - start).toBeLessThan(20_000);
  expect(counts).toEqual({ agrees: 3, differs: CALLS - 3, "not checkable": 0 });
});
