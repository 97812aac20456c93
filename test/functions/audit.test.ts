import { describe, expect, test } from "vitest";
import { callFunction } from "../../src/functions/call";

describe("BLANK_CHECK", () => {
  test.each([
    ["null", null, "blanks arrive as blanks"],
    ["empty", null, "blanks arrive as blanks"],
    ["null", 12, "give an empty cell"],
    ["null", "x", "give an empty cell"],
    ["null", false, "give an empty cell"],
  ] as const)("says on a host that hands over %s for blanks, given %s: %s", (policy, cell, answer) => {
    expect(callFunction("BLANK_CHECK", [[[cell]]], policy)).toEqual({ value: answer });
  });

  test("says what to do on a host that hands over 0", () => {
    const outcome = callFunction("BLANK_CHECK", [[[null]]], "zero") as { value: string };
    expect(outcome.value).toMatch(/^blanks arrive as 0: .*without blanks/);
  });
});
