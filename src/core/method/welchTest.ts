import { studentTUpperTail } from "../distribution/studentTUpperTail";

/** What the test needs of a batch of scores. */
export interface Moments {
  readonly count: number;
  readonly mean: number;
  /** Divisor n − 1. */
  readonly variance: number;
}

export interface WelchTest {
  /** Second mean less first. */
  readonly shift: number;
  readonly standardError: number;
  readonly t: number;
  readonly degrees: number;
  /** Two-sided. */
  readonly pValue: number;
}

/**
 * Welch's test that two batches have the same mean, without taking their spreads as equal: t = (x̄₂ − x̄₁)/√(s₁²/n₁ + s₂²/n₂) with
 * Satterthwaite's degrees of freedom.
 *
 * Domain     counts from 2; variances above 0.
 * Accuracy   that of the t tail; test/core/method/welchTest.test.ts (NIST AUTO83B as worked in the Boost.Math manual).
 * Reference  Welch (1938), The significance of the difference between two means when the population variances are unequal, Biometrika 29;
 *            Satterthwaite (1946), Biometrics Bulletin 2.
 */
export function welchTest(first: Moments, second: Moments): WelchTest {
  const shift = second.mean - first.mean;
  const a = first.variance / first.count;
  const b = second.variance / second.count;
  const standardError = Math.sqrt(a + b);
  const t = shift / standardError;
  // As shares of the sum, so that squaring neither overflows nor vanishes.
  const share = a / (a + b);
  const degrees = 1 / ((share * share) / (first.count - 1) + ((1 - share) * (1 - share)) / (second.count - 1));
  return { shift, standardError, t, degrees, pValue: 2 * studentTUpperTail(Math.abs(t), degrees) };
}
