import { DomainError } from "../domain";

/** Costs as whole multiples of their greatest common unit, which is numerator / denominator. */
export interface CostUnit {
  readonly multiples: readonly number[];
  readonly numerator: number;
  readonly denominator: number;
}

const FINEST = 20_000;

/**
 * The greatest common unit of costs, read as the decimals that a cell shows (15 digits): 2, 15.5 and 120 are 4, 31 and 240 halves.
 *
 * Domain     costs ≥ 0, at least one of them above 0.
 * Edges      a unit below a 20,000th of the largest cost is refused: the exact distribution would have too many points.
 * Method     Whole numbers without limit of size; greatest common divisor by Euclid. As binary fractions 15.1 and 120 would share no
 *            unit above 1e-15, and 0.1 + 0.2 would not be 0.3.
 *
 * @throws {DomainError} naming costs.
 */
export function costUnit(costs: readonly number[]): CostUnit {
  const paid = [...new Set(costs)].filter((cost) => cost > 0);
  const largest = paid.reduce((a, b) => Math.max(a, b), 0);
  const smallest = paid.reduce((a, b) => Math.min(a, b), largest);
  // More different costs than there are multiples share no unit: no need to look for one.
  if (paid.length > FINEST) refuse(largest, `${paid.length} different costs were given`);
  if (!(smallest * FINEST >= largest)) refuse(smallest, unitText(smallest, largest));
  const decimals = paid.map(decimal);
  const shift = decimals.reduce((least, one) => Math.min(least, one.exponent), Infinity);
  const whole = decimals.map(({ digits, exponent }) => digits * 10n ** BigInt(exponent - shift));
  const unit = whole.reduce(greatestCommonDivisor);
  const most = whole.reduce((a, b) => (a > b ? a : b));
  const power = 10 ** Math.abs(shift);
  const numerator = shift < 0 ? Number(unit) : Number(unit) * power;
  const denominator = shift < 0 ? power : 1;
  if (most > unit * BigInt(FINEST)) refuse(numerator / denominator, unitText(numerator / denominator, largest));
  const multipleOf = new Map(paid.map((cost, i) => [cost, Number(whole[i] / unit)]));
  const multiples = costs.map((cost) => multipleOf.get(cost) ?? 0);
  return { multiples, numerator, denominator };
}

function unitText(unit: number, largest: number): string {
  return `their unit is ${unit} and the largest ${largest}`;
}

function refuse(unit: number, came: string): never {
  const requirement = `multiples of one common unit of at least a ${FINEST.toLocaleString("en")}th of the largest (round them)`;
  throw new DomainError("costs", unit, requirement, came);
}

/** 15.5 → 155 · 10⁻¹, with as few digits as show it. */
function decimal(cost: number): { digits: bigint; exponent: number } {
  const [mantissa, exponent] = cost.toExponential(14).split("e");
  const digits = mantissa.replace(".", "").replace(/0+$/, "");
  return { digits: BigInt(digits), exponent: Number(exponent) + 1 - digits.length };
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  while (b > 0n) [a, b] = [b, a % b];
  return a;
}
