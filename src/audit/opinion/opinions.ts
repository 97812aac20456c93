import type { JStat } from "jstat";
import { isBlank, type Cell, type Range } from "../../sheet/cell";
import type { Argument } from "../../sheet/invoke";

/** A number of the other library beside ours; `what` stands before it in the sentence. */
export interface Check {
  readonly theirs: number;
  readonly ours: number;
  readonly tolerance: number;
  readonly what: string;
}

export interface Question {
  readonly jStat: JStat;
  readonly given: readonly Argument[];
  readonly result: number;
}

/** More scores than these take jStat too long. */
const MOST_SCORES = 20_000;
const curves = new WeakMap<Range, { mean: number; sd: number; n: number }>();

/**
 * One opinion a function, each only for its plain case (normal shape, one number) and inside the range where the error of jStat 1.9.6 was
 * measured against 44-digit values; the tolerances are those of that measurement.
 */
export const opinions: Readonly<Record<string, (question: Question) => Check | undefined>> = {
  TOP_FRACTION_CUTOFF: ({ jStat, given: [scores, fraction, shape, better], result }) => {
    const curve = plain(shape) ? curveOf(jStat, scores) : undefined;
    return curve && cutoff(jStat, curve.mean, curve.sd, fraction, better, result);
  },
  CURVE_CUTOFF: ({ jStat, given: [mean, sd, fraction, better], result }) =>
    isNumber(mean) && isNumber(sd) ? cutoff(jStat, mean, sd, fraction, better, result) : undefined,
  TAIL_FRACTION: ({ jStat, given: [mark, mean, sd, better], result }) => {
    const value = oneCell(mark);
    if (!isNumber(value) || !isNumber(mean) || !isNumber(sd)) return undefined;
    const z = low(better) ? (value - mean) / sd : (mean - value) / sd;
    if (!(z >= -5)) return undefined;
    return { theirs: jStat.normal.cdf(z, 0, 1), ours: result, tolerance: 1e-10, what: "the fraction is" };
  },
  NEXT_SCORE_CUTOFF: ({ jStat, given: [scores, fraction, shape, better], result }) => {
    const curve = plain(shape) ? curveOf(jStat, scores) : undefined;
    if (!curve || !common(fraction) || curve.n > 10_000) return undefined;
    const t = jStat.studentt.inv(1 - fraction, curve.n - 1) * (low(better) ? -1 : 1);
    const theirs = curve.mean + t * curve.sd * Math.sqrt(1 + 1 / curve.n);
    return { theirs, ours: result, tolerance: 1e-6 * curve.sd * Math.max(1, Math.abs(t)), what: "the cutoff is" };
  },
  SAFE_CUTOFF: ({ jStat, given: [scores, fraction, confidence, shape, better], result }) => {
    const curve = plain(shape) ? curveOf(jStat, scores) : undefined;
    if (!curve) return undefined;
    const k = ((result - curve.mean) / curve.sd) * (low(better) ? -1 : 1);
    return factor(jStat, k, curve.n, fraction, confidence);
  },
  TOLERANCE_FACTOR: ({ jStat, given: [count, coverage, confidence, sides], result }) =>
    isNumber(count) && isNumber(coverage) && (isBlank(sides as Cell) || sides === 1)
      ? factor(jStat, result, count, 1 - coverage, confidence)
      : undefined,
  HIT_CHANCE: ({ jStat, given: [fraction, trials, hits], result }) => {
    if (!common(fraction) || !isNumber(trials) || trials > 10_000) return undefined;
    const theirs = 1 - jStat.binomial.cdf(usual(hits, 1) - 1, trials, fraction);
    return { theirs, ours: result, tolerance: 1e-9, what: "the chance is" };
  },
  POOL_HIT_CHANCE: ({ jStat, given: [pool, good, trials, hits], result }) => {
    if (!isNumber(pool) || !isNumber(good) || !isNumber(trials) || pool > 100_000 || usual(hits, 1) > good)
      return undefined;
    const missed = jStat.hypgeom.cdf(usual(hits, 1) - 1, pool, good, trials);
    return missed >= 1e-4 ? { theirs: 1 - missed, ours: result, tolerance: 1e-9, what: "the chance is" } : undefined;
  },
  SEARCH_DURATION: ({ jStat, given: [fraction, arrivals, chance, hits], result }) => {
    if (!common(fraction) || !common(chance) || !isNumber(arrivals)) return undefined;
    const theirs = jStat.gamma.inv(chance, usual(hits, 1), 1) / (arrivals * fraction);
    return { theirs, ours: result, tolerance: 1e-10 * theirs, what: "the duration is" };
  },
  SD_PRECISION: ({ jStat, given: [count, confidence], result }) => {
    if (!isNumber(count) || count > 10_000 || !(result < 1)) return undefined;
    const within = (r: number) => jStat.chisquare.cdf((count - 1) * r * r, count - 1);
    const theirs = within(1 + result) - within(1 - result);
    return { theirs, ours: usual(confidence, 0.95), tolerance: 1e-8, what: "the confidence that belongs to it is" };
  },
};

function cutoff(
  jStat: JStat,
  mean: number,
  sd: number,
  fraction: Argument,
  better: Argument,
  ours: number,
): Check | undefined {
  if (!common(fraction)) return undefined;
  const theirs = mean + sd * jStat.normal.inv(low(better) ? fraction : 1 - fraction, 0, 1);
  return { theirs, ours, tolerance: 1e-10 * Math.max(Math.abs(mean), sd), what: "the cutoff is" };
}

/** The confidence that belongs to a factor: P(noncentral t ≤ k√n). */
function factor(jStat: JStat, k: number, n: number, fraction: Argument, confidence: Argument): Check | undefined {
  if (!common(fraction)) return undefined;
  const ncp = jStat.normal.inv(1 - fraction, 0, 1) * Math.sqrt(n);
  if (!(n >= 3 && n <= 1000 && Math.abs(ncp) <= 20)) return undefined;
  const theirs = jStat.noncentralt.cdf(k * Math.sqrt(n), n - 1, ncp);
  return { theirs, ours: usual(confidence, 0.95), tolerance: 1e-7, what: "the confidence that belongs to it is" };
}

function curveOf(jStat: JStat, scores: Argument): { mean: number; sd: number; n: number } | undefined {
  if (!Array.isArray(scores)) return undefined;
  const range = scores as Range;
  let curve = curves.get(range);
  if (curve || range.length > MOST_SCORES) return curve;
  const numbers = range.flat().filter(isNumber);
  if (numbers.length < 2) return undefined;
  curve = { mean: jStat.mean(numbers), sd: jStat.stdev(numbers, true), n: numbers.length };
  curves.set(range, curve);
  return curve;
}

function isNumber(value: unknown): value is number {
  return typeof value === "number";
}

/** A probability inside the range that was measured. */
function common(value: unknown): value is number {
  return isNumber(value) && value >= 1e-6 && value <= 1 - 1e-6;
}

function plain(shape: Argument): boolean {
  return isBlank(shape as Cell) || (typeof shape === "string" && shape.trim().toLowerCase() === "normal");
}

function low(better: Argument): boolean {
  return typeof better === "string" && better.trim().toLowerCase() === "low";
}

function usual(value: Argument, fallback: number): number {
  return isNumber(value) ? value : fallback;
}

function oneCell(value: Argument): Cell {
  return Array.isArray(value)
    ? (value as Range).length === 1 && (value as Range)[0]!.length === 1
      ? (value as Range)[0]![0]!
      : undefined
    : (value as Cell);
}
