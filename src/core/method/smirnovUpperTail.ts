/**
 * P(the largest distance of two empirical distribution functions ≥ steps/(n·m)), when all orders of the n + m scores are equally likely.
 *
 * Domain     n, m ≥ 1; steps a whole number; distinctEnds[k] is set where the k-th smallest score differs from the next: only there are
 *            the functions compared, so that ties are taken as they are.
 * Edges      steps ≤ 0 gives 1.
 * Method     The chance that a random path from (0, 0) to (n, m) has touched the border, filled in point by point: a path through (i, j) came
 *            from (i − 1, j) with chance i/(i + j). All terms are positive; 1 − P(not touched) would lose the small p-values.
 * Accuracy   1e-13 relative; test/core/method/smirnovTest.test.ts.
 * Reference  Schröer & Trenkler (1995), Comput. Statist. Data Anal. 20; Hodges (1958), The significance probability of the Smirnov
 *            two-sample test, Ark. Mat. 3.
 */
export function smirnovUpperTail(steps: number, n: number, m: number, distinctEnds: Uint8Array): number {
  if (steps <= 0) return 1;
  const touched = new Float64Array(m + 1);
  for (let i = 0; i <= n; i++) {
    for (let j = 0; j <= m; j++) {
      const fromLess = i > 0 ? (i / (i + j)) * touched[j] : 0;
      const fromLeft = j > 0 ? (j / (i + j)) * touched[j - 1] : 0;
      touched[j] = distinctEnds[i + j] && Math.abs(i * m - j * n) >= steps ? 1 : fromLess + fromLeft;
    }
  }
  return touched[m];
}
