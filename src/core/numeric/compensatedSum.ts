/**
 * The sum of `values`, or of `term` of each, as if it had been added in twice the precision and rounded once.
 *
 * Edges      no values give 0; a NaN or both infinities give NaN.
 * Method     Neumaier's variant of Kahan's summation. Kahan's own loses a term that is larger than the running sum.
 * Accuracy   error ≤ 1 ulp of the sum + n²·2⁻¹⁰⁶·Σ|value|; test/core/numeric/compensatedSum.test.ts.
 * Reference  Neumaier (1974), Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen, ZAMM 54.
 */
export function compensatedSum(values: ArrayLike<number>, term?: (value: number) => number): number {
  let sum = 0;
  let lost = 0;
  for (let i = 0; i < values.length; i++) {
    const value = term ? term(values[i]) : values[i];
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  // Infinity − Infinity in `lost` would turn an infinite sum into NaN.
  return Number.isFinite(sum) ? sum + lost : sum;
}
