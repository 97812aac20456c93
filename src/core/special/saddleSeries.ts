/**
 * The power series f(η) = η/V(η), where V solves η dη = V dV/(1 + linear·V − quadratic·V²), V ≈ η at 0.
 *
 * With V = x/a − 1, linear = 1, quadratic = 0 and η²/2 = V − ln(1 + V) it belongs to the gamma distribution, with the
 * constants of `incompleteBeta` to the beta distribution: the density over the normal one, as a function of η.
 *
 * Method     With V = η·g and h = g²: (1 + m/2)·hₘ = [m = 0] + linear·gₘ₋₁ − quadratic·hₘ₋₂, then f = 1/g.
 * Accuracy   the first 27 gamma terms to 1e-13 relative, and a term's own weight is 4⁻ᵐ; test/core/special/saddleSeries.test.ts.
 * Reference  Temme (1979), The asymptotic expansion of the incomplete gamma functions, SIAM J. Math. Anal. 10.
 */
export function saddleSeries(linear: number, quadratic: number, terms: number): Float64Array {
  const g = new Float64Array(terms);
  const h = new Float64Array(terms);
  const f = new Float64Array(terms);
  g[0] = h[0] = f[0] = 1;
  for (let m = 1; m < terms; m++) {
    h[m] = (linear * g[m - 1] - (m > 1 ? quadratic * h[m - 2] : 0)) / (1 + m / 2);
    let square = h[m];
    let inverse = 0;
    for (let i = 1; i < m; i++) {
      square -= g[i] * g[m - i];
      inverse -= f[i] * g[m - i];
    }
    g[m] = square / 2;
    f[m] = inverse - g[m];
  }
  return f;
}
