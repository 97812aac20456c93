import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { noncentralTCdf } from "../../../src/core/distribution/noncentralTCdf";
import { noncentralTUpperTail } from "../../../src/core/distribution/noncentralTUpperTail";
import { clearanceConfidence } from "../../../src/core/method/clearanceConfidence";
import { cutoffLimits } from "../../../src/core/method/cutoffLimits";
import { cutoffVerdict } from "../../../src/core/method/cutoffVerdict";
import { knownCurve } from "../../../src/core/method/markCurve";
import { safeCutoff } from "../../../src/core/method/safeCutoff";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

describe("the confidence that a score clears the mark", () => {
  test("agrees with the noncentral t score by score, in both tails: to 1e-12 down to 1e-30, to 1e-11 down to 1e-280", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 3000 }),
        fc.double({ min: 1e-9, max: 0.9, noNaN: true }),
        fc.double({ min: -3, max: 6, noNaN: true }),
        (count, fraction, k) => {
          const { confidence, noncentrality, standing } = clearanceConfidence(count, 64, 8, fraction, "high");
          const score = 64 + 8 * k;
          const t = standing(score) * Math.sqrt(count);
          const cdf = noncentralTCdf(t, count - 1, noncentrality);
          // Below that it is 0, or next to it.
          if (cdf <= 1e-280) expect(confidence(score)).toBeLessThan(1e-279);
          else if (cdf < 0.5) expect(relativeError(confidence(score), cdf)).toBeLessThan(cdf > 1e-30 ? 1e-12 : 1e-11);
          else {
            const tail = noncentralTUpperTail(t, count - 1, noncentrality);
            expect(Math.abs(1 - confidence(score) - tail)).toBeLessThan(1e-12 * tail + 3e-16);
          }
        },
      ),
      { numRuns: 300 },
    );
  });

  test("law: a score at the safe mark has just its confidence, one at a limit the chance of missing beyond it", () => {
    for (const better of ["high", "low"] as const)
      for (const count of [3, 20, 65, 1000]) {
        const curve = knownCurve(count, 64, 8);
        const { confidence } = clearanceConfidence(count, 64, 8, 0.05, better);
        expect(confidence(safeCutoff(curve, 0.05, 0.9, better).cutoff)).toBeCloseTo(0.9, 11);
        const { lowerLimit, upperLimit } = cutoffLimits(curve, 0.05, 0.95, better);
        const [near, far] = better === "high" ? [lowerLimit, upperLimit] : [upperLimit, lowerLimit];
        expect(confidence(near)).toBeCloseTo(0.025, 11);
        expect(confidence(far)).toBeCloseTo(0.975, 11);
      }
  });

  test("laws: a better score never has less of it; low mirrors high to the bit", () => {
    const high = clearanceConfidence(20, 64, 8, 0.05, "high");
    const low = clearanceConfidence(20, -64, 8, 0.05, "low");
    let last = 0;
    for (let score = 20; score < 140; score += 0.25) {
      const now = high.confidence(score);
      expect(now).toBeGreaterThanOrEqual(last);
      expect(low.confidence(-score)).toBe(now);
      last = now;
    }
  });

  testRefusals(clearanceConfidence, [
    ["count", 1, 64, 8, 0.05, "high"],
    ["count", NaN, 64, 8, 0.05, "high"],
    ["mean", 20, -Infinity, 8, 0.05, "high"],
    ["sd", 20, 64, 0, 0.05, "high"],
    ["fraction", 20, 64, 8, 5, "high"],
  ]);
});

describe("the verdict", () => {
  test("at or beyond the far limit clears, before the near one falls short, in between is too close to call", () => {
    const high = cutoffVerdict(70, 75, "high");
    expect([69.9, 70, 74.9, 75, 80].map(high)).toEqual([
      "falls short",
      "too close to call",
      "too close to call",
      "clears",
      "clears",
    ]);
    const low = cutoffVerdict(70, 75, "low");
    expect([69, 70, 70.1, 75, 75.1].map(low)).toEqual([
      "clears",
      "clears",
      "too close to call",
      "too close to call",
      "falls short",
    ]);
  });

  test("equal limits leave nothing too close; no limit on a side leaves nothing beyond it", () => {
    expect([4, 5].map(cutoffVerdict(5, 5, "high"))).toEqual(["falls short", "clears"]);
    expect([-1e9, 1e9].map(cutoffVerdict(-Infinity, Infinity, "high"))).toEqual(Array(2).fill("too close to call"));
  });

  testRefusals(cutoffVerdict, [
    ["lower_limit", 75, 70, "high"],
    ["lower_limit", NaN, 70, "high"],
    ["lower_limit", 70, NaN, "low"],
  ]);
});
