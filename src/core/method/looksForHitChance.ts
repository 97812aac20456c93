import { requireFraction } from "../domain";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { findRoot } from "../numeric/findRoot";
import { remembered } from "../numeric/remembered";
import { smallestNear } from "../numeric/smallestNear";
import { chanceBeyond, estimatedMark } from "./estimatedMark";
import { chanceSlack } from "./reachesChance";
import { requireScored } from "./requireScored";

/**
 * The smallest number of looks with a chance of at least `chance` that one of them clears the plain mark x̄ + z·s estimated from `count`
 * scores: 1 − E[Φ(T)^m] ≥ chance, T the mark in units of the true curve.
 *
 * Domain     count ≥ 2 whole; fraction and chance in (0, 1).
 * Edges      Infinity where it takes more than 2⁵³ − 1 looks.
 * Method     One quadrature for T (estimatedMark.ts), on which the real root in ln m is found and rounded up. 1/fraction, or the
 *            geometric law with the fraction asked for, forgets that the mark is itself a guess: from 5 scores at 20 % it promises
 *            90 % in 11 looks where it takes 16.
 * Accuracy   the exact number, chances within 1e-12; test/core/method/curveHitChance.test.ts.
 * Reference  Geisser (1993), Predictive Inference, ch. 2.
 *
 * @throws {DomainError}
 */
export function looksForHitChance(count: number, fraction: number, chance: number): number {
  requireScored(count);
  requireFraction("fraction", fraction);
  requireFraction("chance", chance);
  return looks(count, fraction, chance);
}

const looks = remembered((count: number, fraction: number, chance: number): number => {
  const mark = plainMark(count, fraction);
  const asked = chance - chanceSlack(chance);
  const over = (logLooks: number) => chanceBeyond(mark, Math.exp(logLooks)) - asked;
  const holds = (trials: number) => chanceBeyond(mark, trials) >= asked;
  let high = -Math.log(fraction);
  while (over(high) < 0) {
    if (high > 37) return Infinity;
    high *= 1.5;
  }
  const guess = over(0) < 0 ? Math.ceil(Math.exp(findRoot(over, 0, high, 1e-12))) : 1;
  return smallestNear(holds, guess, 1);
});

/** The quadrature serves all chances asked at one count and fraction. */
const plainMark = remembered(
  (count: number, fraction: number) => estimatedMark(count, normalUpperTailQuantile(fraction)),
  4,
);
