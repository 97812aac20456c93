import { describe, expect, test } from "vitest";
import { studentTUpperTail } from "../../../src/core/distribution/studentTUpperTail";
import { curveHitChance } from "../../../src/core/method/curveHitChance";
import { relativeError } from "../../support/relativeError";

const chance = (count: number, k: number, trials: number) => curveHitChance(count, 0, 1, k, trials, "high").chance;

describe("the hit chance far beyond the scores", () => {
  test("law: one trial is a Student t tail, as far out as numbers reach", () => {
    for (const count of [2, 3, 5, 20, 100])
      for (const k of [1e3, 1e5, 1e7, 1e9, 3e9, 1e20, 1e100, 1e154, 1e300]) {
        const expected = studentTUpperTail(k / Math.sqrt(1 + 1 / count), count - 1);
        if (expected < 1e-300) continue;
        expect(relativeError(chance(count, k, 1), expected), `${count} ${k}`).toBeLessThanOrEqual(2e-12);
      }
  });

  test("law: far out the chance falls with the power count − 1 of the distance, for any number of trials", () => {
    for (const count of [2, 3, 5, 10])
      for (const trials of [1, 50, 1e9, 2 ** 53 - 1]) {
        const levels = [1e8, 1e9, 1e10, 1e15, 1e30].map((k) => chance(count, k, trials) * k ** (count - 1));
        for (const level of levels) expect(relativeError(level, levels[2]!)).toBeLessThanOrEqual(1e-12);
      }
  });

  test("a mark that everything clears is hit for certain, one that nothing clears never", () => {
    for (const count of [2, 15, 1e15]) {
      expect(chance(count, -1e300, 7)).toBe(1);
      expect(chance(count, 1e300, 7)).toBeLessThanOrEqual(1e-295);
    }
  });

  test("a distance that no number can hold is refused by the name of cutoff", () => {
    const far = () => curveHitChance(5, -1e308, 1e-10, 1e308, 3, "high");
    expect(far).toThrow(expect.objectContaining({ name: "DomainError", argument: "cutoff" }));
    expect(far).toThrow(/1e\+308 was given/);
  });
});
