/** |got − expected| / |expected|; the absolute error where the expected value is 0; Infinity where `got` is not a number. */
export function relativeError(got: number, expected: number): number {
  if (got === expected) return 0;
  if (!Number.isFinite(got)) return Infinity;
  return Math.abs(got - expected) / (expected === 0 ? 1 : Math.abs(expected));
}
