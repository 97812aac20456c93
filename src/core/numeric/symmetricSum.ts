/**
 * The sum of `values`, or of `term` of each, as if it had been added in twice the precision and rounded once, such that turning the
 * order round, or all signs, changes no bit but the sign.
 *
 * Edges      no values give 0; a NaN or both infinities give NaN.
 * Method     From both ends at once: the two of a pair are added with the exact error of that addition (Knuth's), which does not know
 *            which came first, and the pairs by Neumaier's summation. In rising order, scores and their mirror image are the same pairs.
 * Accuracy   as compensatedSum; test/core/numeric/symmetricSum.test.ts.
 * Reference  Knuth (1998), The Art of Computer Programming 2, 4.2.2, theorem B; Neumaier (1974), ZAMM 54.
 */
export function symmetricSum(values: ArrayLike<number>, term: (value: number) => number = same): number {
  let sum = 0;
  let lost = 0;
  for (let i = 0, j = values.length - 1; i <= j; i++, j--) {
    const a = term(values[i]);
    const b = i < j ? term(values[j]) : 0;
    const pair = a + b;
    const part = pair - a;
    const next = sum + pair;
    lost += a - (pair - part) + (b - part) + (Math.abs(sum) >= Math.abs(pair) ? sum - next + pair : pair - next + sum);
    sum = next;
  }
  // Infinity − Infinity in `lost` would turn an infinite sum into NaN.
  return Number.isFinite(sum) ? sum + lost : sum;
}

const same = (value: number) => value;
