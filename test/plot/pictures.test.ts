import { describe, expect, test } from "vitest";
import { fitCurve } from "../../src/core/sample/fitCurve";
import { Sample } from "../../src/core/sample/sample";
import { driftChart } from "../../src/plot/driftChart";
import type { Point } from "../../src/plot/drawnLine";
import { hitChance } from "../../src/plot/hitChance";
import { passRates } from "../../src/plot/passRates";
import type { PictureModel, Size } from "../../src/plot/picture";
import { precisionCurve } from "../../src/plot/precisionCurve";
import { quantilePlot } from "../../src/plot/quantilePlot";
import { quantilePoints } from "../../src/plot/quantilePoints";
import { elementsOf, expectTextsInside } from "./support";

const words = { title: "A title & more", description: "A sentence." };
const style = { decimal: ",", percentGap: " " } as const;
const values = Float64Array.from({ length: 60 }, (_, i) => 70 + 8 * Math.sin(i * 7.3) + (i % 5)).sort();
const curve = fitCurve("scores", new Sample(values), { kind: "normal" });
const chance: Point[] = Array.from({ length: 50 }, (_, m) => [m, 1 - 0.95 ** m]);
const limit = (at: number): Point[] => Array.from({ length: 20 }, (_, i) => [i + 1, at]);

const pictures: readonly [string, (size: Size) => PictureModel, readonly string[]][] = [
  [
    "the chance of a hit",
    (size) =>
      hitChance(
        {
          chance,
          known: chance,
          points: [
            { looks: 14, chance: 0.5, words: "50 % at 14" },
            { looks: 45, chance: 0.9, words: "90 % at 45" },
          ],
          words: { ...words, looks: "looks", chance: "chance", estimated: "estimated", known: "known" },
          style,
        },
        size,
      ),
    ["curve", "second-curve", "guide", "mark", "mark-label"],
  ],
  [
    "the quantile plot",
    (size) =>
      quantilePlot(
        {
          quantiles: quantilePoints(values, curve),
          words: { ...words, score: "score", expected: "expected" },
          decimal: ".",
        },
        size,
      ),
    ["dot", "curve", "edge", "hatch"],
  ],
  [
    "the precision that more scores buy",
    (size) =>
      precisionCurve(
        {
          lowest: limit(0.02),
          highest: limit(0.09),
          fraction: 0.05,
          counts: [
            { count: 5, words: "now 5" },
            { count: 20, words: "with 20" },
          ],
          words: { ...words, count: "scores", share: "share" },
          style,
        },
        size,
      ),
    ["hatch", "curve", "second-curve", "mark", "edge"],
  ],
  [
    "the drift chart",
    (size) =>
      driftChart(
        {
          scores: limit(60),
          smoothed: limit(61),
          lower: limit(55),
          upper: limit(65),
          flagged: [[3, 66]],
          mean: 60,
          words: { ...words, score: "score", order: "order" },
          decimal: ".",
        },
        size,
      ),
    ["dot", "curve", "flagged", "edge", "guide", "hatch"],
  ],
  [
    "the pass rates",
    (size) =>
      passRates(
        {
          groups: [
            { name: "a very long name of a group that can't fit on one line", rate: 0.4, passed: 8, assessed: 20 },
            { name: "b", rate: 0, passed: 0, assessed: 20 },
          ],
          line: 0.32,
          words: { ...words, line: "four fifths" },
          style,
        },
        size,
      ),
    ["bar", "mark", "mark-label", "strong-label"],
  ],
];

describe.each(pictures)("%s", (_name, draw, roles) => {
  test.each([240, 288, 640])("at %d pixels it is well formed, has its roles, and no text leaves it", (width) => {
    const picture = draw({ width, height: 214 });
    const classes = new Set(elementsOf(picture).map(({ attributes }) => attributes.class));
    for (const role of roles) expect(classes).toContain(role);
    expectTextsInside(picture);
    expect(picture.width).toBe(width);
  });

  test("the same numbers make the same picture", () => {
    expect(draw({ width: 300, height: 214 })).toEqual(draw({ width: 300, height: 214 }));
  });
});

describe("the band of a quantile plot", () => {
  test("of 4 scores the middle of the first place is 1 − 2^(−1/4), by hand", () => {
    const { points } = quantilePoints(
      Float64Array.of(1, 2, 3, 4),
      fitCurve("scores", new Sample(Float64Array.of(1, 2, 3, 4)), { kind: "normal" }),
    );
    // The smallest of 4 uniform numbers exceeds u with chance (1 − u)^4. Φ⁻¹(1 − 2^(−1/4)) = −0.99815 (Python's statistics.NormalDist).
    expect(points[0]![0]).toBeCloseTo(-0.9981488825, 8);
  });

  test("each limit holds its place: the share of the curve below the lower limit of the first of n is 1 − 0.975^(1/n)", () => {
    const { lower } = quantilePoints(values, curve);
    // The smallest of n lies below u with chance 1 − (1 − u)^n = 0.025. Φ⁻¹(1 − 0.975^(1/60)) = −3.33803 (Python's statistics.NormalDist).
    expect((lower[0]![1] - curve.mean) / curve.sd).toBeCloseTo(-3.3380291722, 8);
  });

  test("an outlier is called outside, and of many scores the ends are all kept", () => {
    const many = Float64Array.from({ length: 5000 }, (_, i) => i);
    many[4999] = 1e6;
    const { points, outside } = quantilePoints(many, fitCurve("scores", new Sample(many), { kind: "normal" }));
    expect(points.length).toBeLessThanOrEqual(240);
    expect(points.slice(0, 50).map(([, score]) => score)).toEqual(Array.from({ length: 50 }, (_, i) => i));
    expect(outside.map(([, score]) => score)).toContain(1e6);
  });
});
