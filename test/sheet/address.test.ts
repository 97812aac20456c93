import { describe, expect, test } from "vitest";
import {
  absoluteAddress,
  columnIndex,
  columnLetters,
  formatAddress,
  formatSheetName,
  parseAddress,
} from "../../src/sheet/address";

describe("addresses", () => {
  test.each([
    ["B2", { top: 1, left: 1, bottom: 1, right: 1 }],
    ["$B$2:C61", { top: 1, left: 1, bottom: 60, right: 2 }],
    ["c61:b2", { top: 1, left: 1, bottom: 60, right: 2 }],
    ["F:F", { top: 0, left: 5, bottom: 1_048_575, right: 5 }],
    ["2:3", { top: 1, left: 0, bottom: 2, right: 16_383 }],
    ["Bids!F2", { sheet: "Bids", top: 1, left: 5, bottom: 1, right: 5 }],
    ["'Round 2, ''final'''!A1:A3", { sheet: "Round 2, 'final'", top: 0, left: 0, bottom: 2, right: 0 }],
    ["XFD1048576", { top: 1_048_575, left: 16_383, bottom: 1_048_575, right: 16_383 }],
  ])("reads %s", (text, area) => {
    expect(parseAddress(text)).toEqual(area);
  });

  test.each(["", "score", "B", "2", "B0", "B2:C", "B:3", "XFE1", "A1048577", "B2:", "Bids!", "'open!A1", "A1,B2"])(
    "refuses %o",
    (text) => {
      expect(parseAddress(text)).toBeUndefined();
    },
  );

  test.each(["Bids!F2:F61", "'Round 2'!A1", "F:G", "'Bob''s'!B2", "'A1'!C3"])("writes back %s as it was", (text) => {
    expect(formatAddress(parseAddress(text)!)).toBe(text);
  });

  test("column letters count like a sheet's headings", () => {
    expect([0, 25, 26, 51, 701, 702, 16_383].map(columnLetters)).toEqual(["A", "Z", "AA", "AZ", "ZZ", "AAA", "XFD"]);
    for (let column = 0; column < 16_384; column += 7) expect(columnIndex(columnLetters(column))).toBe(column);
  });

  test("a sheet's name is quoted when it could be read as something else", () => {
    expect(["Bids", "Gebote_2", "2026", "R1C1", "A1", "My bids", "rc"].map(formatSheetName)).toEqual([
      "Bids",
      "Gebote_2",
      "'2026'",
      "'R1C1'",
      "'A1'",
      "'My bids'",
      "'rc'",
    ]);
  });
});

test("an address held fast, as a name wants it, keeps its sheet's quotes; what is none is refused", () => {
  expect(absoluteAddress("Bids!F2:F61")).toBe("Bids!$F$2:$F$61");
  expect(absoluteAddress("'Round 2'!A1")).toBe("'Round 2'!$A$1");
  expect(absoluteAddress({ top: 0, left: 26, bottom: 1, right: 26 })).toBe("$AA$1:$AA$2");
  expect(() => absoluteAddress("nowhere")).toThrow("is no address");
});
