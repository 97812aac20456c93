import { UnsettledError, requireCount } from "../domain";
import { gaussLegendre } from "../numeric/gaussLegendre";
import { MOST_LOOKS } from "./mostLooks";

const POINTS = 12;

export interface BestPickStep {
  readonly look: number;
  readonly looksLeft: number;
  /** j·ln(1/d): settles at 0.804352… as j grows; 0 at the last look. */
  readonly exponent: number;
  /** The fraction d of the known curve that a best-so-far score must pass. */
  readonly percentile: number;
}

/**
 * Percentiles d(j) to beat with j looks left: Σ_{i=1..j} (d⁻ⁱ − 1)/i = 1, and 0 at the last look.
 *
 * Domain     looks 1 … 10,000.
 * Method     With d = exp(−a/j) the sum is ∫₀ᵃ (eʷ − 1)/(j(1 − e^(−w/j))) dw, a smooth integrand on 0 … 0.81: 12 Gauss-Legendre points
 *            give all digits for any j, where the sum itself costs j terms and cancels in d⁻ⁱ − 1. Newton's steps start from the a before.
 * Accuracy   relative error ≤ 1e-14 (test/core/method/bestPick.test.ts).
 * Reference  Gilbert & Mosteller (1966), J. Amer. Statist. Assoc. 61, sec. 3.
 *
 * @throws {DomainError} if looks is outside its domain.
 */
export function bestPickSchedule(looks: number): readonly BestPickStep[] {
  requireCount("looks", looks, 1, MOST_LOOKS);
  const steps = new Array<BestPickStep>(looks);
  steps[looks - 1] = { look: looks, looksLeft: 0, exponent: 0, percentile: 0 };
  let exponent = Math.LN2;
  let rise = 0;
  for (let left = 1; left < looks; left++) {
    // With one look left the percentile is one half, to the bit.
    const settled = left === 1 ? exponent : settleExponent(left, exponent + rise);
    rise = settled - exponent;
    exponent = settled;
    steps[looks - left - 1] = {
      look: looks - left,
      looksLeft: left,
      exponent,
      percentile: Math.exp(-exponent / left),
    };
  }
  return steps;
}

function settleExponent(left: number, start: number): number {
  const { nodes, weights } = gaussLegendre(POINTS);
  const integrand = (w: number) => Math.expm1(w) / (-left * Math.expm1(-w / left));
  let a = start;
  for (let round = 0; round < 50; round++) {
    let sum = 0;
    for (let i = 0; i < nodes.length; i++) sum += weights[i]! * integrand((a / 2) * (1 + nodes[i]!));
    const step = (1 - (a / 2) * sum) / integrand(a);
    a += step;
    // Newton's next step would be of the order of this one squared.
    if (Math.abs(step) <= 1e-9) return a;
  }
  throw new UnsettledError("The percentile to beat");
}
