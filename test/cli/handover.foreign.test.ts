import { strFromU8, unzipSync } from "fflate";
import { describe, expect, test } from "vitest";
import { readXlsx } from "../../src/hosts/file/readXlsx";
import { FOREIGN_BOOKS, foreignBook } from "../support/foreignBooks";
import { handedOver } from "../support/handedOver";
import { parseXml } from "../support/xml";

/* Copies of workbooks that other programs made (test/reference/workbooks/README.md); test/libreoffice recalculates them. */
describe.each(FOREIGN_BOOKS)("the copy of %s.xlsx", async (name) => {
  const original = foreignBook(name);
  const { copy, calls } = await handedOver(original);
  const [before, after] = [unzipSync(original), unzipSync(copy)];

  test("calls nothing of the add-in any more", () => {
    const formulas = readXlsx(copy).sheets.flatMap((sheet) =>
      [...sheet.formulas.values()].map(({ formula }) => formula),
    );
    expect(formulas.length).toBeGreaterThan(0);
    expect(formulas.filter((formula) => /weir[._]/i.test(formula))).toEqual([]);
    expect(calls.filter(({ becomes }) => becomes === "as it was")).toEqual([]);
  });

  test("keeps every part that holds no call byte for byte, but for the lists that name the added sheet", () => {
    const touched = new Set(
      Object.keys(before).filter((part) => !after[part] || strFromU8(after[part]!) !== strFromU8(before[part]!)),
    );
    const calling = Object.keys(before).filter(
      (part) => part.startsWith("xl/worksheets/sheet") && /weir_/i.test(strFromU8(before[part]!)),
    );
    const lists = ["[Content_Types].xml", "xl/workbook.xml", "xl/_rels/workbook.xml.rels", "xl/calcChain.xml"];
    const ownRelations = calling.map((part) => part.replace("sheets/", "sheets/_rels/") + ".rels");
    for (const part of touched) expect([...calling, ...lists, ...ownRelations]).toContain(part);
    expect(Object.keys(after)).toEqual(
      expect.arrayContaining(Object.keys(before).filter((part) => !/calcChain/.test(part))),
    );
  });

  test("is proper XML in every part, of one form throughout", () => {
    const strict = strFromU8(after["xl/workbook.xml"]!).includes("purl.oclc.org");
    for (const [part, bytes] of Object.entries(after)) {
      if (!/\.(xml|rels|vml)$/.test(part)) continue;
      const xml = strFromU8(bytes);
      expect(() => parseXml(xml), part).not.toThrow();
      if (strict) expect(xml, part).not.toContain("schemas.openxmlformats.org/spreadsheetml/2006/main");
    }
  });
});

describe("what the calls became", () => {
  const became = async (name: (typeof FOREIGN_BOOKS)[number]) =>
    Object.fromEntries((await handedOver(foreignBook(name))).calls.map(({ cell, now }) => [cell, now]));

  test("inputs by name, table and calculation stay inputs", async () => {
    expect(await became("openpyxl")).toMatchObject({
      B8: "=1/share",
      B9: "=AVERAGE(Bids[price])+NORM.S.INV(10%)*STDEV.S(Bids[price])",
      B10: "=1-(1-share)^(YEAR(Offers!C2)-1967)",
    });
    expect(await became("byHandStrict")).toMatchObject({ D4: "=NORM.S.DIST(-(((DAY(C4)+60)-65)/8),TRUE)" });
  });

  test("a result that spills no more is referred to by its cells", async () => {
    expect(await became("xlsxWriter")).toMatchObject({
      E2: expect.stringMatching(/^lower limit \| 75\.6/),
      J3: "=NORM.S.DIST(-((INDEX(E2:F4,2,2)-65)/8),TRUE)",
    });
  });

  test("a formula that asks for a newer edition of the host says for which", async () => {
    const { calls } = await handedOver(foreignBook("xlsxWriter"));
    const note = (cell: string) => calls.find((one) => one.cell === cell)!.note;
    expect(note("J4")).toMatch(/^The host's own functions, of 2021 or later, give the same value/);
    expect(note("J3")).toMatch(/^The host's own functions give the same value/);
  });

  test("a link to the add-in's file goes with the call; a refused call keeps its error, and the note says so", async () => {
    const { calls } = await handedOver(foreignBook("byHand"));
    const at = (cell: string) => calls.find((one) => one.cell === cell)!;
    expect(at("J3").now).toBe(
      '=IF(B3>=(AVERAGE($B$2:$B$41)-NORM.S.INV(0.1)*STDEV.S($B$2:$B$41)),"clears","falls short")',
    );
    expect(at("J6")).toMatchObject({ now: "#VALUE!", note: expect.stringContaining("its error stays") });
  });
});
