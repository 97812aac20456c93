/**
 * Holm's step-down adjustment: the i-th smallest of m p-values times m − i + 1, at most 1, and never below the one before it.
 *
 * Domain     any number of p-values in [0, 1]; the order of the result is that of the input.
 * Reference  Holm (1979), Scandinavian J. Statistics 6.
 */
export function holmAdjusted(pValues: readonly number[]): number[] {
  const order = pValues.map((_, index) => index).sort((one, other) => pValues[one] - pValues[other]);
  const adjusted = new Array<number>(pValues.length);
  let before = 0;
  order.forEach((index, place) => {
    before = Math.max(before, Math.min(1, (pValues.length - place) * pValues[index]));
    adjusted[index] = before;
  });
  return adjusted;
}
