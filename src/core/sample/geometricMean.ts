/**
 * The geometric mean of positive numbers, to a few roundings a hundred numbers: a centre, not a result.
 *
 * Method     Products of neighbours as long as they stay in range, so that a column of 100,000 costs some thousand logarithms.
 */
export function geometricMean(values: Float64Array): number {
  let logs = 0;
  let product = 1;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    if (value > 1e-100 && value < 1e100) product *= value;
    else logs += Math.log(value);
    if (!(product > 1e-150 && product < 1e150)) {
      logs += Math.log(product);
      product = 1;
    }
  }
  return Math.exp((logs + Math.log(product)) / values.length);
}
