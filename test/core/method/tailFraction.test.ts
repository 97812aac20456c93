import { describe, expect, test } from "vitest";
import { tailFraction } from "../../../src/core/method/tailFraction";
import { relativeError } from "../../support/relativeError";

describe("tailFraction", () => {
  // Φ(−1.625), Φ(−3) and Φ(1), rounded from 20 digits of mpmath 1.3.0.
  test.each<[number, number, number, "high" | "low", number]>([
    [83, 70, 8, "high", 0.052081279415219548],
    [12, 30, 6, "low", 0.0013498980316300945],
    [78, 70, 8, "low", 0.84134474606854295],
  ])("at %d of a curve %d ± %d, better %s: %d", (mark, mean, sd, better, expected) => {
    expect(relativeError(tailFraction(mark, mean, sd, better).fraction, expected)).toBeLessThanOrEqual(1e-13);
  });

  test("a mark farther out than numbers reach leaves nothing beyond it and all on this side", () => {
    expect(tailFraction(1e300, 0, 1e-300, "high")).toEqual({ z: Infinity, fraction: 0 });
    expect(tailFraction(1e300, 0, 1e-300, "low")).toEqual({ z: Infinity, fraction: 1 });
  });

  test.each<[string, [number, number, number]]>([
    ["cutoff", [NaN, 0, 1]],
    ["mean", [0, Infinity, 1]],
    ["sd", [0, 0, 0]],
    ["sd", [0, 0, NaN]],
  ])("refuses a bad %s and names it: %o", (argument, args) => {
    expect(() => tailFraction(...args, "high")).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
