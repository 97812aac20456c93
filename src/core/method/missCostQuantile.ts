import { DomainError } from "../domain";
import { findRoot } from "../numeric/findRoot";
import type { MissCost } from "./missCosts";
import { chanceSlack } from "./reachesChance";

/** Products that the recursion may take: about a tenth of a second. */
export const MOST_WORK = 20_000_000;
const STRIDE = 500;

export interface MissCostQuantile {
  readonly units: number;
  /** The chance that the misses pay no more than these units. */
  readonly reached: number;
}

/**
 * The smallest number of units that covers what all misses before the last hit pay, with the chance asked for.
 *
 * Domain     checked by searchBudget.
 * Edges      more than 20 million products (units × kinds of miss) are refused by the name of fraction.
 * Method     The misses are negative binomial in number, so their total g is a compound distribution: s·g(s) = Σ qⱼ(s + (hits − 1)Cⱼ)
 *            g(s − Cⱼ), all terms positive. fraction^hits would underflow: it is carried as a power of two. For one hit g becomes a power
 *            of the root of Σ qⱼ e^{λCⱼ} = 1: e^{λs}g(s) is an average of the span before it, so once a whole span agrees it stays so, and
 *            the rest of the way is one logarithm. A chance within 1e-9 of 1 is met by what lies beyond, counted back from the end.
 * Accuracy   the exact unit, chances within 1e-12; test/core/method/searchBudget.test.ts.
 * Reference  Panjer (1981), Recursive evaluation of a family of compound distributions, ASTIN Bulletin 12.
 *
 * @throws {DomainError}
 */
export function missCostQuantile(
  misses: readonly MissCost[],
  fraction: number,
  chance: number,
  hits: number,
): MissCostQuantile {
  const paying = misses.filter((kind) => kind.units > 0);
  if (paying.length === 0) return { units: 0, reached: 1 };
  // Misses that all pay multiples of 80 leave 79 of 80 totals empty, and nothing would ever settle.
  const common = paying.reduce((unit, kind) => greatestCommonDivisor(unit, kind.units), 0);
  const { units, reached } = quantile(
    paying.map(({ units, share }) => ({ units: units / common, share })),
    fraction,
    chance,
    hits,
  );
  return { units: units * common, reached };
}

type Paying = Pick<MissCost, "units" | "share">;

function quantile(paying: readonly Paying[], fraction: number, chance: number, hits: number): MissCostQuantile {
  const span = paying.reduce((most, kind) => Math.max(most, kind.units), 0);
  // A miss that pays nothing only lengthens the search: left out, and the others scaled up.
  const paid = paying.reduce((sum, kind) => sum + kind.share, fraction);
  const units = Int32Array.from(paying, (kind) => kind.units);
  const shares = Float64Array.from(paying, (kind) => kind.share / paid);
  const bends = shares.map((share, j) => share * (hits - 1) * units[j]);
  const rate = hits === 1 ? tailRate(units, shares, fraction / paid) : 0;
  const target = chance - chanceSlack(chance);
  const late: number[] | undefined = target > 1 - 1e-9 ? [] : undefined;
  const mask = 2 ** Math.ceil(Math.log2(span + 1)) - 1;
  const steps = Math.floor(MOST_WORK / paying.length);
  if (span > steps || (hits > 1 && outOfReach(steps, units, shares, fraction / paid, hits, target))) refuse(fraction);

  const ring = new Float64Array(mask + 1);
  const start = scaledPower(fraction / paid, hits);
  let { exponent } = start;
  ring[0] = start.value;
  let sum = ring[0];
  let lost = 0;
  let factor = 2 ** exponent;
  let check = rate > 0 ? 2 * span : Infinity;
  for (let s = 0; ;) {
    if (late && sum * factor > 1 - 1e-8) {
      late.push(ring[s & mask] * factor);
      const end = late.length % span === 0 ? countedBack(late, span, 1 - target) : undefined;
      if (end) return { units: s - end.back, reached: end.reached };
    } else if (!late && sum * factor >= target) return { units: s, reached: Math.min(1, sum * factor) };
    if (s === check && (check += span) && settled(ring, mask, s, span, rate)) {
      const tail = ring[s & mask] / Math.expm1(rate);
      const more = Math.ceil(Math.log(tail / (1 - target)) / rate);
      // Not above 0 only where the end is counted back.
      if (more > 0) return { units: s + more, reached: 1 - tail * Math.exp(-rate * more) };
    }
    if (++s > steps) refuse(fraction);
    const each = 1 / s;
    let g = 0;
    for (let j = 0; j < units.length; j++) g += (shares[j] + bends[j] * each) * ring[(s - units[j]) & mask];
    ring[s & mask] = g;
    const term = g - lost;
    const next = sum + term;
    lost = next - sum - term;
    sum = next;
    if (exponent < 0 && sum > 2 ** STRIDE) {
      for (let i = 0; i <= mask; i++) ring[i] *= 2 ** -STRIDE;
      sum *= 2 ** -STRIDE;
      lost *= 2 ** -STRIDE;
      exponent += STRIDE;
      factor = 2 ** exponent;
    }
  }
}

/** The root λ of Σ shareⱼ e^{λ unitsⱼ} = 1, the shares summing to 1 − rest; by expm1, as λ may be 1e-9. */
function tailRate(units: Int32Array, shares: Float64Array, rest: number): number {
  const excess = (rate: number) => shares.reduce((sum, share, j) => sum + share * Math.expm1(rate * units[j]), -rest);
  const bounds = shares.map((share, j) => Math.log1p(rest / share) / units[j]);
  // Where one kind of miss is all there is, its bound is the root but for the rounding.
  return findRoot(excess, 0, bounds.reduce((a, b) => Math.min(a, b), Infinity) * (1 + 1e-11));
}

/** Whether Chernoff's bound e^{θs}(p/(1 − Σ qⱼe^{−θCⱼ}))^hits says that no s within `steps` can reach the target: known before the work. */
function outOfReach(
  steps: number,
  units: Int32Array,
  shares: Float64Array,
  rest: number,
  hits: number,
  target: number,
): boolean {
  for (let tilt = 1; tilt > 1e-20; tilt /= 2) {
    const thinned = shares.reduce((sum, share, j) => sum - share * Math.expm1(-tilt * units[j]), rest);
    if (tilt * steps + hits * Math.log(rest / thinned) < Math.log(target)) return true;
  }
  return false;
}

/**
 * How far before the last of the totals the chance of more is at most `miss`, once so little is left that it can be judged from the last
 * two spans: next to 1 the sum of the chances shows its own rounding, the sum of what is beyond keeps its digits.
 */
function countedBack(
  late: readonly number[],
  span: number,
  miss: number,
): { back: number; reached: number } | undefined {
  const sumOf = (from: number, to: number) => late.slice(from, to).reduce((sum, g) => sum + g, 0);
  const [before, last] = [sumOf(-2 * span, -span), sumOf(-span, late.length)];
  let tail = last > 0 ? (last * last) / (before - last) : 0;
  if (late.length < 2 * span || last > before || !(tail <= 1e-4 * miss)) return undefined;
  let back = 0;
  while (tail + late[late.length - 1 - back] <= miss) tail += late[late.length - 1 - back++];
  return { back, reached: 1 - tail };
}

/** Whether e^{λs}·g(s) is the same over the last span. */
function settled(ring: Float64Array, mask: number, s: number, span: number, rate: number): boolean {
  let least = Infinity;
  let most = 0;
  for (let back = 0; back < span; back++) {
    const level = ring[(s - back) & mask] * Math.exp(-rate * back);
    if (level < least) least = level;
    if (level > most) most = level;
    // As a rule the first few already differ: a whole span of exponentials at every span would double the work.
    if (!(most <= least * (1 + 1e-13))) return false;
  }
  return true;
}

/** base^n as value · 2^exponent, the value between 2⁻⁵⁰⁰ and 1. */
function scaledPower(base: number, n: number): { value: number; exponent: number } {
  const chunk = Math.max(1, Math.floor(-STRIDE / Math.log2(base)));
  let value = 1;
  let exponent = 0;
  for (let left = n; left > 0; left -= chunk) {
    value *= base ** Math.min(chunk, left);
    if (value < 2 ** -STRIDE) {
      value *= 2 ** STRIDE;
      exponent -= STRIDE;
    }
  }
  return { value, exponent };
}

function greatestCommonDivisor(a: number, b: number): number {
  while (b > 0) [a, b] = [b, a % b];
  return a;
}

function refuse(fraction: number): never {
  const requirement = `large enough for a search within ${MOST_WORK / 1e6} million units of cost (or the costs rounded to a coarser unit)`;
  throw new DomainError("fraction", fraction, requirement);
}
