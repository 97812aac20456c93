import { describe, expect, test } from "vitest";
import { fitCurve } from "../../src/core/sample/fitCurve";
import { Sample } from "../../src/core/sample/sample";
import { binScores } from "../../src/plot/binScores";
import { hatch } from "../../src/plot/hatch";
import { histogram, type HistogramInput } from "../../src/plot/histogram";
import { elementsOf, expectTextsInside } from "./support";

const words = { title: "Scores", description: "Five scores.", score: "score", count: "how many" };
const size = { width: 288, height: 214 };
const input = (values: number[], rest: Partial<HistogramInput> = {}): HistogramInput => ({
  sorted: Float64Array.from(values).sort(),
  words,
  decimal: ".",
  ...rest,
});

describe("the bins of a histogram", () => {
  test("every score is counted once, the smallest and the largest too", () => {
    const bins = binScores(Float64Array.of(1, 2, 2, 3, 4, 5, 5, 9, 10));
    expect(bins.counts.reduce((a, b) => a + b)).toBe(9);
    expect(bins.start).toBeLessThanOrEqual(1);
    expect(bins.start + bins.width * bins.counts.length).toBeGreaterThanOrEqual(10);
  });

  test("a score on an edge counts in the upper bin, also where the edge is no binary fraction", () => {
    const sorted = Float64Array.from({ length: 11 }, (_, i) => i / 10);
    const { start, width, counts } = binScores(sorted);
    const by = Math.round(width * 10);
    expect(start).toBe(0);
    expect([...counts].slice(0, Math.floor(10 / by))).toEqual(Array(Math.floor(10 / by)).fill(by));
  });

  test("scores all alike make one bin", () => {
    expect(binScores(Float64Array.of(7, 7, 7))).toMatchObject({ counts: Int32Array.of(3) });
  });
});

describe("the picture of the scores", () => {
  const values = [54, 52.3, 60.4, 43.4, 50.5, 71, 66.2];
  const curve = fitCurve("scores", new Sample(Float64Array.from(values)), { kind: "normal" });
  const mark = { cutoff: 69, lower: 61, upper: 84, cutoffWords: "cutoff 69.0", limitsWords: "limits 61.0 to 84.0" };

  test("it is well-formed SVG with title and description, and each role is there", () => {
    const elements = elementsOf(histogram(input(values, { curve, mark }), size));
    expect(elements[0]).toMatchObject({
      name: "svg",
      attributes: { role: "img", "aria-label": "Scores. Five scores." },
    });
    const roles = new Set(elements.map(({ attributes }) => attributes.class));
    for (const role of ["bar", "curve", "rug", "mark", "hatch", "edge", "axis", "mark-label"])
      expect(roles).toContain(role);
  });

  test("words from the sheet can't become markup", () => {
    const nasty = { ...words, title: `<script>&"'\u0007`, score: "</text><image href=x>" };
    const elements = elementsOf(histogram(input(values, { words: nasty }), size));
    expect(elements.map(({ name }) => name)).not.toContain("script");
    expect(elements.map(({ name }) => name)).not.toContain("image");
  });

  test("limits far off don't squeeze the scores to a stroke, and no text leaves the picture", () => {
    const far = { ...mark, cutoff: 1e4, upper: 1e6 };
    const picture = histogram(input(values, { mark: far }), size);
    expectTextsInside(picture);
    const bars = picture.parts.find(({ role }) => role === "bar") as { d: string };
    const first = /h([\d.]+)/.exec(bars.d)!;
    expect(Number(first[1])).toBeGreaterThan(10);
  });

  test("one score, or none that differ, still make a picture", () => {
    for (const few of [[5], [3, 3, 3]]) elementsOf(histogram(input(few), size));
  });

  test("100,000 scores are binned and drawn in less than 100 ms, in a file of less than 60 kB", () => {
    const many = Float64Array.from({ length: 100_000 }, (_, i) => 50 + 10 * Math.sin(i * 12.9898)).sort();
    const start = performance.now();
    const picture = histogram({ ...input([1]), sorted: many, curve, mark }, size);
    expect(performance.now() - start).toBeLessThan(100);
    expect(JSON.stringify(picture).length).toBeLessThan(60_000);
  });
});

test("a hatch stays inside its box and follows one grid", () => {
  const strokes = [...hatch(10.5, 20, 33, 50).matchAll(/M([\d.]+),([\d.]+)L([\d.]+),([\d.]+)/g)];
  expect(strokes.length).toBeGreaterThan(8);
  for (const [, x1, y1, x2, y2] of strokes.map((stroke) => stroke.map(Number))) {
    for (const x of [x1!, x2!]) expect(x).toBeGreaterThanOrEqual(10.5);
    for (const x of [x1!, x2!]) expect(x).toBeLessThanOrEqual(43.5);
    for (const y of [y1!, y2!]) expect(y).toBeGreaterThanOrEqual(20);
    for (const y of [y1!, y2!]) expect(y).toBeLessThanOrEqual(70);
    expect((x1! + y1!) % 6).toBeCloseTo(0, 6);
  }
  expect(hatch(0, 0, 0, 10)).toBe("");
});
