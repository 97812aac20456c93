import { describe, expect, test } from "vitest";
import { markFactor } from "../../../src/core/method/markFactor";
import { noncentralTCdf } from "../../../src/core/distribution/noncentralTCdf";
import { studentTUpperTail } from "../../../src/core/distribution/studentTUpperTail";
import handbook from "../../reference/published/nist_handbook.json";
import factors from "../../reference/published/tolerance_factors.json";
import { relativeError } from "../../support/relativeError";

describe("markFactor", () => {
  test("safe: the one-sided tolerance factor of NIST/SEMATECH e-Handbook 7.2.6.3 (43 scores, 90 % content, 99 % confidence: 1.874)", () => {
    const { inputs, printed, tolerance } = handbook.items.find(({ id }) => id === "nist-7263-k1-nct") as any;
    const factor = markFactor(inputs.N, 1 - inputs.content, "safe", inputs.confidence);
    expect(Math.abs(factor - printed.k1)).toBeLessThanOrEqual(tolerance.k1);
  });

  test("safe: CMH-17-1G, Table 8.5.10 (90 % content, 95 % confidence), within the .0025 of its approximation", () => {
    for (const [count, factor] of factors.data.kB as [number, number][])
      expect(Math.abs(markFactor(count, 0.1, "safe") - factor)).toBeLessThanOrEqual(0.0025);
  });

  test("plain: z of 5 % is 1.6448536269514726 (mpmath)", () => {
    expect(relativeError(markFactor(2, 0.05, "plain"), 1.6448536269514726)).toBeLessThanOrEqual(1e-15);
  });

  test("law: safe and next put back into their laws give confidence and fraction", () => {
    for (const count of [2, 5, 30, 400])
      for (const fraction of [0.001, 0.1, 0.5, 0.8]) {
        const z = markFactor(count, fraction, "plain");
        const safe = markFactor(count, fraction, "safe", 0.9);
        expect(
          relativeError(noncentralTCdf(safe * Math.sqrt(count), count - 1, z * Math.sqrt(count)), 0.9),
        ).toBeLessThan(1e-12);
        const next = markFactor(count, fraction, "next") / Math.sqrt(1 + 1 / count);
        expect(relativeError(studentTUpperTail(next, count - 1), fraction)).toBeLessThan(1e-12);
      }
  });

  test.each<[string, Parameters<typeof markFactor>]>([
    ["learn_count", [1, 0.1, "plain"]],
    ["learn_count", [2.5, 0.1, "plain"]],
    ["learn_count", [NaN, 0.1, "plain"]],
    ["fraction", [10, 0, "plain"]],
    ["fraction", [10, 1, "safe"]],
    ["fraction", [10, NaN, "next"]],
    ["confidence", [10, 0.1, "safe", 1]],
  ])("refuses a bad %s and names it", (argument, args) => {
    expect(() => markFactor(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
