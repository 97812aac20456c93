import { describe, expect, test } from "vitest";
import { shareStandardError } from "../../../src/core/method/shareStandardError";

describe("shareStandardError", () => {
  test("by hand: a fifth of 400 runs is known to ±0.02, half of 10000 to ±0.005", () => {
    expect(shareStandardError(0.2, 400)).toBeCloseTo(0.02, 15);
    expect(shareStandardError(0.5, 10_000)).toBeCloseTo(0.005, 15);
  });

  test("law: a share and its complement are known equally well, and none of the runs or all of them to 0", () => {
    expect(shareStandardError(0.125, 77)).toBe(shareStandardError(0.875, 77));
    expect([shareStandardError(0, 5), shareStandardError(1, 5)]).toEqual([0, 0]);
  });

  test.each<[string, [number, number]]>([
    ["share", [-0.1, 5]],
    ["share", [NaN, 5]],
    ["share", [Infinity, 5]],
    ["runs", [0.5, 0]],
    ["runs", [0.5, 2.5]],
    ["runs", [0.5, NaN]],
  ])("refuses a bad %s and names it: %o", (argument, args) => {
    expect(() => shareStandardError(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
