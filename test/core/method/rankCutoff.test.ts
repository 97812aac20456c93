import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { rankCutoff } from "../../../src/core/method/rankCutoff";
import { Sample } from "../../../src/core/sample/sample";
import reference from "../../reference/cutoff/cutoff.json";
import tables from "../../reference/published/tolerance_factors.json";
import { relativeError } from "../../support/relativeError";
import { testRefusals } from "../../support/refusals";

/** The scores 1 to count: a score is its rank from the worst. */
const ranks = (count: number) => new Sample(Float64Array.from({ length: count }, (_, i) => i + 1));

describe("the mark by rank", () => {
  test.each(reference.ranks.cases as [number, number, number, number, number, number][])(
    "%d scores, fraction %d, confidence %d: ranks %d and %d, confidence %d by whole-number fractions",
    (count, fraction, confidence, near, far, actual) => {
      const found = rankCutoff(ranks(count), fraction, confidence, "high");
      expect([found.nearRank ?? 0, found.farRank ?? 0]).toEqual([near, far]);
      expect(relativeError(found.actualConfidence, actual)).toBeLessThanOrEqual(1e-14);
    },
  );

  test("CMH-17-1G, table 8.5.12: the scores it takes until the r-th one limits 90 % of all with confidence 95 %", () => {
    // One side at 95 % is either side at 90 %.
    for (const [count, rank] of tables.data.npB as [number, number][]) {
      expect(rankCutoff(ranks(count), 0.1, 0.9, "high").farRank, `${count}`).toBe(rank);
      expect(rankCutoff(ranks(count - 1), 0.1, 0.9, "high").farRank ?? 0, `${count - 1}`).toBe(rank - 1);
    }
  });

  test("CMH-17-1G, tables 8.5.12 and 13: the extreme score limits 90 % from 29 scores on, 99 % from 299 on", () => {
    const { inputs, printed } = tables.items.find(({ id }) => id === "wilks1") as unknown as {
      inputs: { content: number[] };
      printed: number[];
    };
    inputs.content.forEach((content, i) => {
      const fraction = Math.round((1 - content) * 100) / 100;
      expect(rankCutoff(ranks(printed[i]!), fraction, 0.9, "high").farRank).toBe(1);
      expect(rankCutoff(ranks(printed[i]! - 1), fraction, 0.9, "high").farRank).toBeUndefined();
    });
  });

  test("by hand: definition 7 puts the mark for a quarter of 1 to 9 at 7, for a third between 6 and 7", () => {
    expect(rankCutoff(ranks(9), 0.25, 0.5, "high").cutoff).toBe(7);
    expect(rankCutoff(ranks(9), 1 / 3, 0.5, "high").cutoff).toBeCloseTo(9 - 8 / 3, 13);
    expect(rankCutoff(ranks(9), 0.25, 0.5, "low").cutoff).toBe(3);
  });

  test("too few scores give no limit on that side, and none of its chance of missing", () => {
    const { upperLimit, farRank, farTail, lowerLimit, nearTail, actualConfidence } = rankCutoff(
      ranks(20),
      0.05,
      0.95,
      "high",
    );
    expect([upperLimit, farRank, farTail]).toEqual([undefined, undefined, 0]);
    expect(lowerLimit).toBeDefined();
    expect(actualConfidence).toBe(1 - nearTail);
  });

  test("laws: the limits keep the confidence, nest in it, and mirror to the bit", () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -1e6, max: 1e6, noNaN: true }), { minLength: 2, maxLength: 200 }),
        fc.double({ min: 0.001, max: 0.999, noNaN: true }),
        fc.double({ min: 0.05, max: 0.99, noNaN: true }),
        (scores, fraction, confidence) => {
          const sample = new Sample(Float64Array.from(scores));
          const one = rankCutoff(sample, fraction, confidence, "high");
          const wider = rankCutoff(sample, fraction, (1 + confidence) / 2, "high");
          expect(wider.lowerLimit ?? -Infinity).toBeLessThanOrEqual(one.lowerLimit ?? -Infinity);
          expect(wider.upperLimit ?? Infinity).toBeGreaterThanOrEqual(one.upperLimit ?? Infinity);
          expect(one.actualConfidence).toBeGreaterThanOrEqual(confidence - 1e-12);
          const mirror = rankCutoff(new Sample(Float64Array.from(scores, (x) => -x)), fraction, confidence, "low");
          const minus = (x: number | undefined) => (x === undefined ? undefined : -x + 0);
          expect([minus(mirror.upperLimit), minus(mirror.cutoff), minus(mirror.lowerLimit)]).toEqual(
            [one.lowerLimit, one.cutoff, one.upperLimit].map((x) => (x === undefined ? x : x + 0)),
          );
        },
      ),
    );
  });

  testRefusals(rankCutoff, [
    ["count", ranks(1), 0.05, 0.95, "high"],
    ["fraction", ranks(9), 5, 0.95, "high"],
    ["fraction", ranks(9), NaN, 0.95, "high"],
    ["confidence", ranks(9), 0.05, 1, "high"],
    ["confidence", ranks(9), 0.05, Infinity, "high"],
  ]);
});
