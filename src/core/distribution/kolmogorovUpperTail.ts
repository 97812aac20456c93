import { requireReal } from "../domain";

/**
 * P(K > x) for Kolmogorov's limiting law, K the limit of √n times the largest distance of two distribution functions.
 *
 * Domain     x any number.
 * Edges      x ≤ 0 gives 1, ∞ gives 0.
 * Method     2·Σ (−1)^(j−1) e^(−2j²x²) from x = 1 on, below it 1 − √(2π)/x·Σ e^(−(2j−1)²π²/(8x²)), which then needs three terms.
 * Accuracy   1e-15 relative down to 1e-100; test/core/distribution/kolmogorov.test.ts.
 * Reference  Kolmogorov (1933), Sulla determinazione empirica di una legge di distribuzione, G. Ist. Ital. Attuari 4.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function kolmogorovUpperTail(x: number): number {
  requireReal("x", x);
  // Below 0.04 the other chance, e^(−π²/8x²), is under the smallest number.
  if (x < 0.04) return 1;
  let sum = 0;
  if (x < 1) {
    for (let j = 7; j > 0; j -= 2) sum += Math.exp((-j * j * Math.PI * Math.PI) / (8 * x * x));
    return 1 - (Math.sqrt(2 * Math.PI) / x) * sum;
  }
  for (let j = 4; j > 0; j--) sum = Math.exp(-2 * j * j * x * x) - sum;
  return 2 * sum;
}
