import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { panelScores } from "../../../src/core/method/panelScores";
import { relativeError } from "../../support/relativeError";

const _ = NaN;
const table = (...rows: number[][]) => Float64Array.from(rows.flat());

describe("panelScores", () => {
  test("by hand: rater 2 is 10 below rater 1 where both rated, so an entry that only rater 2 rated 90 is worth 95", () => {
    const { scores, raterEffects, ratingCount } = panelScores(table([60, 50], [80, 70], [_, 90]), 2);
    [55, 75, 95].forEach((score, i) => expect(scores[i]).toBeCloseTo(score, 11));
    [5, -5].forEach((effect, i) => expect(raterEffects[i]).toBeCloseTo(effect, 11));
    expect(ratingCount).toBe(5);
  });

  test("twelve entries and four raters with half of the ratings: the exact solution in fractions (Python), to 1e-13", () => {
    const rows = [
      [36.7, 40.1, 56.1, _],
      [_, _, 64.9, 41.2],
      [43.9, _, _, _],
      [_, 50.1, _, _],
      [_, _, 69.4, _],
      [_, _, _, _],
      [49.5, _, _, _],
      [_, 56.9, _, 40.5],
      [82.8, 33.0, _, 64.8],
      [52.3, _, 56.8, 71.1],
      [53.1, _, 66.3, _],
      [34.0, 79.7, _, 51.5],
    ];
    const exact = [
      43.502572796170725,
      50.125787794176304,
      48.47437175907459,
      51.37405265257279,
      61.15929397686478,
      NaN,
      54.074371759074594,
      50.533167132030314,
      62.94690200771174,
      59.641982449142404,
      57.866832867969684,
      57.81356867437841,
    ];
    const effects = [-4.574371759074591, -1.2740526525727962, 8.240706023135221, -2.3922816114878342];
    const { scores, raterEffects } = panelScores(table(...rows), 4);
    expect(scores[5]).toBeNaN();
    exact.forEach((score, i) => i !== 5 && expect(relativeError(scores[i], score)).toBeLessThan(1e-13));
    effects.forEach((effect, i) => expect(relativeError(raterEffects[i], effect)).toBeLessThan(1e-12));
  });

  test("where every rater rated every entry, scores are plain means", () => {
    const { scores } = panelScores(table([50, 55.5, 40.9], [69.6, 72.8, 62.6]), 3);
    expect(scores[0]).toBeCloseTo((50 + 55.5 + 40.9) / 3, 12);
    expect(scores[1]).toBeCloseTo((69.6 + 72.8 + 62.6) / 3, 12);
  });

  test("one rater's ratings are the scores; empty rows and columns are left aside", () => {
    const { scores, raterEffects } = panelScores(table([_, 61, _], [_, _, _], [_, 47.5, _]), 3);
    expect([...scores]).toEqual([61, NaN, 47.5]);
    expect([...raterEffects]).toEqual([NaN, 0, NaN]);
  });

  const ratings = fc
    .record({ entries: fc.integer({ min: 1, max: 9 }), raters: fc.integer({ min: 1, max: 9 }) })
    .chain(({ entries, raters }) =>
      fc.record({
        raters: fc.constant(raters),
        values: fc.array(
          fc.oneof({ weight: 3, arbitrary: fc.double({ min: -100, max: 100, noNaN: true }) }, fc.constant(NaN)),
          {
            minLength: entries * raters,
            maxLength: entries * raters,
          },
        ),
      }),
    );

  test("law: what is left over sums to 0 for each entry and each rater, which is what least squares means, and effects sum to 0", () => {
    let fitted = 0;
    fc.assert(
      fc.property(ratings, ({ raters, values }) => {
        if (!values.some((value) => !Number.isNaN(value))) return;
        let fit;
        try {
          fit = panelScores(Float64Array.from(values), raters);
        } catch (failure) {
          expect(failure).toMatchObject({ name: "DomainError", argument: "ratings" });
          return;
        }
        fitted++;
        const { scores, raterEffects } = fit;
        const byEntry = new Float64Array(scores.length);
        const byRater = new Float64Array(raters);
        values.forEach((rating, i) => {
          if (Number.isNaN(rating)) return;
          const rest = rating - scores[Math.floor(i / raters)] - raterEffects[i % raters];
          byEntry[Math.floor(i / raters)] += rest;
          byRater[i % raters] += rest;
        });
        [...byEntry, ...byRater].forEach((sum) => expect(Math.abs(sum)).toBeLessThan(1e-9));
        const present = raterEffects.filter((effect) => !Number.isNaN(effect));
        expect(Math.abs(present.reduce((sum, effect) => sum + effect, 0))).toBeLessThan(1e-10);
      }),
      { numRuns: 300 },
    );
    expect(fitted).toBeGreaterThan(100);
  });

  test("law: more raters than entries or the other way round, the same table turned gives the same differences", () => {
    const wide = [
      [50, 55, 41, _, 60],
      [_, 73, 63, 70, _],
    ];
    const tall = wide[0].map((_unused, j) => wide.map((row) => row[j]));
    const across = panelScores(table(...wide), 5);
    const down = panelScores(table(...tall), 2);
    expect(across.scores[1] - across.scores[0]).toBeCloseTo(down.raterEffects[1] - down.raterEffects[0], 11);
    expect(across.raterEffects[3] - across.raterEffects[2]).toBeCloseTo(down.scores[3] - down.scores[2], 11);
  });

  test("law: a constant added to one rater's ratings moves all scores alike and no order; ratings near a million keep their digits", () => {
    const rows = [
      [50, 55.5, 40.9],
      [69.6, 72.8, _],
      [80.6, _, 68.5],
      [_, 75.1, 68.8],
    ];
    const plain = panelScores(table(...rows), 3).scores;
    const shifted = panelScores(table(...rows.map(([a, b, c]) => [a, b + 3e6, c])), 3).scores;
    plain.forEach((score, i) => expect(shifted[i] - score).toBeCloseTo(1e6, 7));
  });

  test("names the rows that lack a link, of the smaller groups, and not more than six of them", () => {
    expect(() => panelScores(table([5, _], [6, _], [_, 7], [_, 8], [_, 9]), 2)).toThrow(
      "ratings must be linked, each rater to every other through entries that both rated; the 1st and 2nd rows lack a link to the rest.",
    );
    expect(() => panelScores(table([5, _], [_, 7], [_, 8]), 2)).toThrow("the 1st row lacks a link to the rest.");
    const many = Array.from({ length: 20 }, (_unused, i) => (i < 9 ? [1, _] : [_, 2]));
    expect(() => panelScores(table(...many), 2)).toThrow(
      "the 1st, 2nd, 3rd, 4th, 5th, 6th and 3 more rows lack a link to the rest.",
    );
  });

  test("100,000 entries of five raters, and 300 entries of 300 raters, are quick", () => {
    const started = performance.now();
    const tall = Float64Array.from({ length: 500_000 }, (_unused, i) => (i % 7 === 0 ? NaN : (i * 7919) % 101));
    expect(panelScores(tall, 5).scores).toHaveLength(100_000);
    panelScores(
      Float64Array.from({ length: 90_000 }, (_unused, i) => (i * 7919) % 101),
      300,
    );
    expect(performance.now() - started).toBeLessThan(3000);
  });
});
