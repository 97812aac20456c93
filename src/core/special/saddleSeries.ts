/** The longest series asked for. */
export const MOST_TERMS = 28;

const g = new Float64Array(MOST_TERMS);

/**
 * The power series f(η) = η/V(η), where V solves η dη = V dV/(1 + linear·V − quadratic·V²), V ≈ η at 0.
 *
 * With V = x/a − 1, linear = 1, quadratic = 0 and η²/2 = V − ln(1 + V) it belongs to the gamma distribution, with the
 * constants of `incompleteBeta` to the beta distribution: the density over the normal one, as a function of η.
 *
 * Domain     `terms` from 2 to 28 are written into `f`, which is handed in because making an array takes longer than filling it.
 * Method     With V = η·g and h = g²: (1 + m/2)·hₘ = [m = 0] + linear·gₘ₋₁ − quadratic·hₘ₋₂, then f = 1/g.
 * Accuracy   the first 27 gamma terms to 1e-13 relative, and a term's own weight is 4⁻ᵐ; test/core/special/saddleSeries.test.ts.
 * Reference  Temme (1979), The asymptotic expansion of the incomplete gamma functions, SIAM J. Math. Anal. 10.
 */
export function saddleSeries(linear: number, quadratic: number, terms: number, f: Float64Array): Float64Array {
  g[0] = f[0] = 1;
  let h = 0;
  let next = 1;
  for (let m = 1; m < terms; m++) {
    const older = h;
    h = next;
    next = (linear * g[m - 1] - quadratic * older) / (1 + m / 2);
    // g² is symmetric: each product of two different factors stands for two.
    let half = next / 2;
    for (let i = 1, j = m - 1; i < j; i++, j--) half -= g[i] * g[j];
    if (m % 2 === 0) half -= (g[m / 2] * g[m / 2]) / 2;
    g[m] = half;
    let inverse = -half;
    for (let i = 1; i < m; i++) inverse -= f[i] * g[m - i];
    f[m] = inverse;
  }
  return f;
}
