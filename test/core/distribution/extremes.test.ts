import { describe, expect, test } from "vitest";
import { bivariateNormalCdf } from "../../../src/core/distribution/bivariateNormalCdf";
import { betaCdf } from "../../../src/core/distribution/betaCdf";
import { betaQuantile } from "../../../src/core/distribution/betaQuantile";
import { betaUpperTail } from "../../../src/core/distribution/betaUpperTail";
import { binomialCdf } from "../../../src/core/distribution/binomialCdf";
import { binomialPmf } from "../../../src/core/distribution/binomialPmf";
import { binomialUpperTail } from "../../../src/core/distribution/binomialUpperTail";
import { chiSquareCdf } from "../../../src/core/distribution/chiSquareCdf";
import { chiSquareQuantile } from "../../../src/core/distribution/chiSquareQuantile";
import { fCdf } from "../../../src/core/distribution/fCdf";
import { fQuantile } from "../../../src/core/distribution/fQuantile";
import { fUpperTail } from "../../../src/core/distribution/fUpperTail";
import { gammaCdf } from "../../../src/core/distribution/gammaCdf";
import { gammaQuantile } from "../../../src/core/distribution/gammaQuantile";
import { gammaUpperTail } from "../../../src/core/distribution/gammaUpperTail";
import { hypergeometricCdf } from "../../../src/core/distribution/hypergeometricCdf";
import { hypergeometricPmf } from "../../../src/core/distribution/hypergeometricPmf";
import { hypergeometricUpperTail } from "../../../src/core/distribution/hypergeometricUpperTail";
import { negativeBinomialCdf } from "../../../src/core/distribution/negativeBinomialCdf";
import { negativeBinomialUpperTail } from "../../../src/core/distribution/negativeBinomialUpperTail";
import { noncentralTCdf } from "../../../src/core/distribution/noncentralTCdf";
import { noncentralTQuantile } from "../../../src/core/distribution/noncentralTQuantile";
import { studentTCdf } from "../../../src/core/distribution/studentTCdf";
import { studentTPdf } from "../../../src/core/distribution/studentTPdf";
import { studentTQuantile } from "../../../src/core/distribution/studentTQuantile";

const POSITIVE = [5e-324, 1e-300, 1e-10, 0.001, 0.5, 1, 1.5, 30, 1e5, 1e10, 1e15, 1e100, 1.7e308, Infinity];
const REAL = [0, ...POSITIVE, ...POSITIVE.map((x) => -x)];
const CHANCE = [0, 1e-320, 1e-300, 1e-15, 0.001, 0.5, 0.999, 1 - 2 ** -53, 1];
const COUNT = [-5, 0, 1, 2, 100, 1e5, 1e9, 2 ** 53 - 1];
const RHO = [-1, -1 + 2 ** -53, -0.5, -1e-300, 0, 0.999, 1 - 2 ** -53, 1];

const CHANCES: [(...args: number[]) => number, ...number[][]][] = [
  [gammaCdf, REAL, POSITIVE],
  [gammaUpperTail, REAL, POSITIVE],
  [chiSquareCdf, REAL, POSITIVE],
  [betaCdf, [...CHANCE, -1, 2], POSITIVE, POSITIVE],
  [betaUpperTail, [...CHANCE, -1, 2], POSITIVE, POSITIVE],
  [studentTCdf, REAL, POSITIVE],
  [fCdf, REAL, POSITIVE, POSITIVE],
  [fUpperTail, REAL, POSITIVE, POSITIVE],
  [noncentralTCdf, REAL, POSITIVE, REAL],
  [binomialPmf, COUNT, COUNT, CHANCE],
  [binomialCdf, COUNT, COUNT, CHANCE],
  [binomialUpperTail, COUNT, COUNT, CHANCE],
  [negativeBinomialCdf, COUNT, POSITIVE, CHANCE],
  [negativeBinomialUpperTail, COUNT, POSITIVE, CHANCE],
  [hypergeometricPmf, COUNT, COUNT, COUNT, COUNT],
  [hypergeometricCdf, COUNT, COUNT, COUNT, COUNT],
  [hypergeometricUpperTail, COUNT, COUNT, COUNT, COUNT],
  [bivariateNormalCdf, REAL, REAL, RHO],
];
const OTHERS: [(...args: number[]) => number, ...number[][]][] = [
  [studentTPdf, REAL, POSITIVE],
  [gammaQuantile, CHANCE, POSITIVE],
  [chiSquareQuantile, CHANCE, POSITIVE],
  [betaQuantile, CHANCE, POSITIVE, POSITIVE],
  [studentTQuantile, CHANCE, POSITIVE],
  [fQuantile, CHANCE, POSITIVE, POSITIVE],
  [noncentralTQuantile, CHANCE, POSITIVE, REAL],
];

/** Every combination of the arguments: a result, or a refusal by name; anything else is listed. */
function oddities(f: (...args: number[]) => number, sets: number[][], isOdd: (value: number) => boolean): string[] {
  let combinations: number[][] = [[]];
  for (const set of sets) combinations = combinations.flatMap((args) => set.map((x) => [...args, x]));
  const found: string[] = [];
  for (const args of combinations) {
    try {
      const value = f(...args);
      if (isOdd(value)) found.push(`${args.join(", ")} → ${value}`);
    } catch (error) {
      if ((error as Error).name !== "DomainError") found.push(`${args.join(", ")} → ${(error as Error).message}`);
    }
  }
  return found;
}

describe("arguments at the ends of the range of numbers", () => {
  test.each(CHANCES)("%o gives a chance from 0 to 1 or a refusal, never NaN, never an open end", (f, ...sets) => {
    expect(oddities(f, sets, (value) => !(value >= 0 && value <= 1))).toEqual([]);
  });

  test.each(OTHERS)("%o gives a number, infinite at most, or a refusal", (f, ...sets) => {
    expect(oddities(f, sets, Number.isNaN)).toEqual([]);
  });
});
