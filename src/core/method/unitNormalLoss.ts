import { normalPdf } from "../distribution/normalPdf";
import { normalUpperTail } from "../distribution/normalUpperTail";

/** From here on the difference φ(u) − u·Q(u) would lose digits, and the continued fraction settles in some 70 terms. */
const FAR = 3;

/**
 * E[(Z − u)⁺] = φ(u) − u·Q(u): what a standard normal score exceeds u by, on average, counting 0 where it does not.
 *
 * Domain     any number u.
 * Edges      u → −∞ grows as −u; underflows to 0 above 38.
 * Method     For u < 0 by ψ(u) = ψ(−u) − u, a sum of positive terms. From 3 on by the continued fraction of Mills' ratio:
 *            with Q/φ = 1/(u + K), K = 1/(u + 2/(u + 3/(u + …))), ψ = φ·K/(u + K), where the difference would lose u² times the rounding.
 * Accuracy   relative error ≤ 1e-14 (test/core/method/unitNormalLoss.test.ts).
 * Reference  Raiffa & Schlaifer (1961), Applied Statistical Decision Theory.
 *
 * @throws {DomainError} if u is NaN.
 */
export function unitNormalLoss(u: number): number {
  if (u < 0) return unitNormalLoss(-u) - u;
  const density = normalPdf(u);
  if (!(u >= FAR)) return density - u * normalUpperTail(u);
  let tail = u;
  for (let i = 10 + Math.ceil(540 / (u * u)); i >= 2; i--) tail = u + i / tail;
  return density / (tail * (u + 1 / tail));
}
