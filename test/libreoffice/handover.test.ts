import { describe, expect, test } from "vitest";
import { auditWorkbook } from "../../src/audit/auditWorkbook";
import { compareStored } from "../../src/audit/compareStored";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { parseAddress } from "../../src/sheet/address";
import { sheetNamed } from "../../src/sheet/workbook";
import { FOREIGN_BOOKS, foreignBook } from "../support/foreignBooks";
import { handedOver } from "../support/handedOver";
import { recalculated, withoutOffice } from "../support/recalculated";

/** What LibreOffice 7.4 doesn't have: a formula with one of these can't be recalculated there. */
const LACKING = /\b(LET|FILTER|SEQUENCE)\(|@|[A-Z]\d+#/;

/* Copies made by handover, opened in LibreOffice, which knows nothing of our functions and calculates every formula anew. */
describe.skipIf(withoutOffice)("a copy without the add-in, recalculated in LibreOffice", async () => {
  const copies = Object.fromEntries(
    await Promise.all(FOREIGN_BOOKS.map(async (name) => [name, await handedOver(foreignBook(name))] as const)),
  );
  const books = withoutOffice
    ? {}
    : recalculated(Object.fromEntries(FOREIGN_BOOKS.map((name) => [name, copies[name]!.copy])));

  test.each(FOREIGN_BOOKS)("%s.xlsx gives what the functions gave, to 1e-9", async (name) => {
    const { judgements } = await auditWorkbook(readXlsx(foreignBook(name)), { tolerance: 1e-9 });
    let compared = 0;
    for (const { sheet, cell, becomes, now } of copies[name]!.calls) {
      if (becomes === "formula" && LACKING.test(String(now))) continue;
      const { recomputed, stored } = judgements.find((one) => one.sheet.name === sheet && one.address === cell)!;
      // A value stays as it was stored; a formula gives what the stored inputs give.
      const expected = becomes === "formula" || stored === null ? recomputed! : stored;
      const rows = Array.isArray(expected) ? expected : [[expected]];
      const { top, left } = parseAddress(cell)!;
      const area = { top, left, bottom: top + rows.length - 1, right: left + rows[0]!.length - 1 };
      const fresh = sheetNamed(books[name]!, sheet)!.range(area);
      expect(compareStored(rows, fresh, 1e-9), `${sheet}!${cell} ${String(now)}`).toMatchObject({ same: true });
      compared++;
    }
    expect(compared).toBeGreaterThanOrEqual(Math.min(10, copies[name]!.calls.length - 2));
  });

  test.each(FOREIGN_BOOKS)("%s.xlsx shows the list of what was replaced", (name) => {
    const list = books[name]!.sheets.at(-1)!;
    expect(list.name).toBe("Hand-over");
    expect(list.cell(1, 1)).toBe(copies[name]!.calls[0]!.cell);
  });
});
