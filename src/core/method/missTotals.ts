import type { MissCost } from "./missCosts";

const STRIDE = 500;

/**
 * The chances g(s) that all misses before the last hit pay s units in all, one after another.
 *
 * Domain     kinds of miss with whole units, shares of all looks that with `rest`, the share of hits, add up to 1; so many of the last
 *            totals are kept, at least the units of the dearest kind.
 * Method     The misses are negative binomial in number, so their total has a compound distribution: s·g(s) = Σ qⱼ(s + (hits − 1)Cⱼ)
 *            g(s − Cⱼ), all terms positive. rest^hits would underflow: it is carried as a power of two. The recursion runs in calls of
 *            many steps: one long loop is left to the interpreter, which takes ten times as long.
 * Reference  Panjer (1981), Recursive evaluation of a family of compound distributions, ASTIN Bulletin 12.
 */
export class MissTotals {
  /** The last total that was reached. */
  at = 0;
  private readonly ring: Float64Array;
  private readonly mask: number;
  private readonly units: Int32Array;
  private readonly shares: Float64Array;
  private readonly bends: Float64Array;
  private scaledSum: number;
  private lost = 0;
  private exponent: number;

  constructor(kinds: readonly Pick<MissCost, "units" | "share">[], kept: number, rest: number, hits: number) {
    this.mask = 2 ** Math.ceil(Math.log2(kept + 1)) - 1;
    this.ring = new Float64Array(this.mask + 1);
    this.units = Int32Array.from(kinds, (kind) => kind.units);
    this.shares = Float64Array.from(kinds, (kind) => kind.share);
    this.bends = Float64Array.from(kinds, (kind) => kind.share * (hits - 1) * kind.units);
    const { value, exponent } = scaledPower(rest, hits);
    this.ring[0] = this.scaledSum = value;
    this.exponent = exponent;
  }

  /** The chance of at most `at` units. */
  get sum(): number {
    return this.scaledSum * 2 ** this.exponent;
  }

  /** The chance of just s units, one of the last totals. */
  chance(s: number): number {
    return this.ring[s & this.mask] * 2 ** this.exponent;
  }

  /** Goes on to the total `end`, or to the first at which the sum reaches `target`. */
  advance(end: number, target: number): void {
    while (this.at < end && !(this.sum >= target)) {
      const factor = 2 ** this.exponent;
      this.recur(end, this.exponent < 0 ? Math.min(2 ** STRIDE, target / factor) : target);
      // At the ceiling itself too: a sum that comes to 1 there would else be asked for ever.
      if (this.exponent < 0 && this.scaledSum >= 2 ** STRIDE) this.rescale();
    }
  }

  private recur(end: number, ceiling: number): void {
    const { ring, mask, units, shares, bends } = this;
    let [s, sum, lost] = [this.at, this.scaledSum, this.lost];
    while (s < end && !(sum >= ceiling)) {
      const each = 1 / ++s;
      let g = 0;
      for (let j = 0; j < units.length; j++) g += (shares[j] + bends[j] * each) * ring[(s - units[j]) & mask];
      ring[s & mask] = g;
      const term = g - lost;
      const next = sum + term;
      lost = next - sum - term;
      sum = next;
    }
    this.at = s;
    this.scaledSum = sum;
    this.lost = lost;
  }

  private rescale(): void {
    for (let i = 0; i <= this.mask; i++) this.ring[i] *= 2 ** -STRIDE;
    this.scaledSum *= 2 ** -STRIDE;
    this.lost *= 2 ** -STRIDE;
    this.exponent += STRIDE;
  }
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
