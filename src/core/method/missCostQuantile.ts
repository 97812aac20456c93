import { DomainError } from "../domain";
import { findRoot } from "../numeric/findRoot";
import type { MissCost } from "./missCosts";
import { MissTotals } from "./missTotals";
import { chanceSlack } from "./reachesChance";

/** Products that the recursion may take: about a tenth of a second. */
export const MOST_WORK = 20_000_000;
const SHORTEST_BLOCK = 1000;
/** Shares next to the smallest numbers have no digits to search in, and no budget would be a number. */
const LEAST_REST = 1e-290;

type Paying = Pick<MissCost, "units" | "share">;

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
 * Method     Their total has a compound distribution g (missTotals.ts), added up unit by unit. For one hit g becomes a power of the root
 *            of Σ qⱼ e^{λCⱼ} = 1: e^{λs}g(s) is an average of the span before it, so once a whole span agrees it stays so, and the rest
 *            of the way is one logarithm. A chance within 1e-9 of 1 is met by what lies beyond, counted back from the end.
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

function quantile(paying: readonly Paying[], fraction: number, chance: number, hits: number): MissCostQuantile {
  // A miss that pays nothing only lengthens the search: left out, and the others scaled up.
  const paid = paying.reduce((sum, kind) => sum + kind.share, fraction);
  const rest = fraction / paid;
  const kinds = paying.map(({ units, share }) => ({ units, share: share / paid }));
  const span = kinds.reduce((most, kind) => Math.max(most, kind.units), 0);
  const target = chance - chanceSlack(chance);
  // Next to 1 the sum of the chances shows its own rounding: there the end is counted back, which is work too.
  const late: number[] | undefined = target > 1 - 1e-9 ? [] : undefined;
  const steps = Math.floor(MOST_WORK / (kinds.length + (late ? 1 : 0)));
  if (!(rest > LEAST_REST) || span > steps || (hits > 1 && outOfReach(steps, kinds, rest, hits, target)))
    refuse(fraction);

  const block = Math.max(span, SHORTEST_BLOCK);
  const totals = new MissTotals(kinds, block, rest, hits);
  const rate = hits === 1 ? tailRate(kinds, rest) : 0;
  while (totals.at < steps) {
    const from = totals.at;
    const begun = totals.sum >= 1 - 1e-8;
    totals.advance(Math.min(from + block, steps), late ? (begun ? Infinity : 1 - 1e-8) : target);
    if (!late && totals.sum >= target) return { units: totals.at, reached: Math.min(1, totals.sum) };
    if (late && begun) {
      for (let s = from + 1; s <= totals.at; s++) late.push(totals.chance(s));
      const end = countedBack(late, span, 1 - target);
      if (end) return { units: totals.at - end.back, reached: end.reached };
    }
    if (rate > 0 && totals.at >= 2 * span && settled(totals, span, rate)) {
      const tail = totals.chance(totals.at) / Math.expm1(rate);
      const more = Math.ceil(Math.log(tail / (1 - target)) / rate);
      // Not above 0 only where the end is counted back.
      if (more > 0) return { units: totals.at + more, reached: 1 - tail * Math.exp(-rate * more) };
    }
  }
  return refuse(fraction);
}

/** The root λ of Σ shareⱼ e^{λ unitsⱼ} = 1, the shares summing to 1 − rest; by expm1, as λ may be 1e-9. */
function tailRate(kinds: readonly Paying[], rest: number): number {
  const excess = (rate: number) =>
    kinds.reduce((sum, { units, share }) => sum + share * Math.expm1(rate * units), -rest);
  const bounds = kinds.map(({ units, share }) => Math.log1p(rest / share) / units);
  // Where one kind of miss is all there is, its bound is the root but for the rounding.
  return findRoot(excess, 0, bounds.reduce((a, b) => Math.min(a, b), Infinity) * (1 + 1e-11));
}

/** Whether Chernoff's bound e^{θs}(p/(1 − Σ qⱼe^{−θCⱼ}))^hits says that no s within `steps` can reach the target: known before the work. */
function outOfReach(steps: number, kinds: readonly Paying[], rest: number, hits: number, target: number): boolean {
  for (let tilt = 1; tilt > 1e-20; tilt /= 2) {
    const thinned = kinds.reduce((sum, { units, share }) => sum - share * Math.expm1(-tilt * units), rest);
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
function settled(totals: MissTotals, span: number, rate: number): boolean {
  let least = Infinity;
  let most = 0;
  for (let back = 0; back < span; back++) {
    const level = totals.chance(totals.at - back) * Math.exp(-rate * back);
    if (level < least) least = level;
    if (level > most) most = level;
    // As a rule the first few already differ: a whole span of exponentials at every span would double the work.
    if (!(most <= least * (1 + 1e-13))) return false;
  }
  return true;
}

function greatestCommonDivisor(a: number, b: number): number {
  while (b > 0) [a, b] = [b, a % b];
  return a;
}

function refuse(fraction: number): never {
  const requirement = `large enough, and hits few enough, for a search within ${MOST_WORK / 1e6} million units of cost (or the costs rounded to a coarser unit)`;
  throw new DomainError("fraction", fraction, requirement);
}
