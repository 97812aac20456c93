import { requireReal } from "../domain";
import { expSquare } from "../special/erfcx";

/**
 * The standard normal density e^(−x²/2)/√(2π).
 *
 * Domain     x any number.
 * Edges      ±∞ gives 0.
 * Accuracy   1e-15 relative; test/core/distribution/normal.test.ts.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function normalPdf(x: number): number {
  requireReal("x", x);
  return Math.abs(x) > 40 ? 0 : expSquare(x, -0.5) / Math.sqrt(2 * Math.PI);
}
