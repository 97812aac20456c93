import { kolmogorovUpperTail } from "../distribution/kolmogorovUpperTail";
import type { Sample } from "../sample/sample";
import { smirnovUpperTail } from "./smirnovUpperTail";

/** Up to this product of the counts the p-value is exact. */
export const MOST_EXACT_PAIRS = 10_000;

export interface SmirnovTest {
  /** The largest distance of the two empirical distribution functions. */
  readonly distance: number;
  readonly exact: boolean;
  /** Two-sided. */
  readonly pValue: number;
}

/**
 * The two-sample test of Kolmogorov and Smirnov that two batches come from the same distribution, whatever it is.
 *
 * Domain     two batches of one or more scores.
 * Edges      tied scores: both functions are compared at distinct values only.
 * Method     The distance in whole numbers |i·m − j·n|, which no rounding can blur. p exact by counting paths, given the ties, up to
 *            n·m = 10,000; beyond, Kolmogorov's limiting law at d·√(nm/(n + m)), uncorrected.
 * Accuracy   exact p 1e-13 relative; test/core/method/smirnovTest.test.ts. Just beyond, the limiting law itself is too large, by up to 0.015
 *            near 5 % and 0.06 in the middle.
 * Reference  Smirnov (1939); Schröer & Trenkler (1995), Exact and randomization distributions of Kolmogorov–Smirnov tests for two or three
 *            samples, Comput. Statist. Data Anal. 20.
 */
export function smirnovTest(first: Sample, second: Sample): SmirnovTest {
  const a = first.sorted;
  const b = second.sorted;
  const n = a.length;
  const m = b.length;
  const exact = n * m <= MOST_EXACT_PAIRS;
  const distinctEnds = exact ? new Uint8Array(n + m + 1) : undefined;
  let steps = 0;
  for (let i = 0, j = 0; i < n || j < m;) {
    const value = j >= m || (i < n && a[i] <= b[j]) ? a[i] : b[j];
    while (i < n && a[i] === value) i++;
    while (j < m && b[j] === value) j++;
    steps = Math.max(steps, Math.abs(i * m - j * n));
    if (distinctEnds) distinctEnds[i + j] = 1;
  }
  const distance = steps / (n * m);
  const pValue = distinctEnds
    ? smirnovUpperTail(steps, n, m, distinctEnds)
    : kolmogorovUpperTail(steps / Math.sqrt(n) / Math.sqrt(m) / Math.sqrt(n + m));
  return { distance, exact, pValue };
}
