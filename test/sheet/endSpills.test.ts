import { describe, expect, test } from "vitest";
import { endSpills } from "../../src/sheet/endSpills";

/* By hand: what spilled at E2 of “Bids” filled E2:F4; at C1 of “Ann's & co” one cell. */
const ended = (sheet: string, row: number, column: number) => {
  if (sheet === "Bids" && row === 1 && column === 4) return { top: 1, left: 4, bottom: 3, right: 5 };
  return sheet === "Ann's & co" && row === 0 && column === 2 ? { top: 0, left: 2, bottom: 0, right: 2 } : undefined;
};

describe("a reference to a result that spills no more", () => {
  test.each([
    ["SUM(_xlfn.ANCHORARRAY(E2))", "SUM(E2:F4)"],
    ["_xlfn.ANCHORARRAY($E$2)", "$E$2:$F$4"],
    ["_xlfn.ANCHORARRAY(Bids!E$2)*2", "Bids!E$2:F$4*2"],
    ["_xlfn.ANCHORARRAY('Ann''s & co'!C1)", "'Ann''s & co'!C1"],
    ["_xlfn.ANCHORARRAY(&apos;Ann&apos;&apos;s &amp; co&apos;!C1)", "&apos;Ann&apos;&apos;s &amp; co&apos;!C1"],
  ])("%s becomes %s", (text, changed) => expect(endSpills(text, "Bids", ended)).toBe(changed));

  test.each(["_xlfn.ANCHORARRAY(E3)", "_xlfn.ANCHORARRAY(Other!E2)", "_xlfn.ANCHORARRAY(INDEX(E2,1))", "E2+F4"])(
    "%s stays",
    (text) => expect(endSpills(text, "Bids", ended)).toBe(text),
  );
});
