/**
 * The power of two that is at most |x| and more than half of it: dividing by it changes no digit, and makes sums of such numbers safe.
 *
 * Edges      0 and what is no finite number give 1.
 * Method     Halving or doubling; Math.log2 may be off by one next to a power.
 */
export function powerOfTwoBelow(x: number): number {
  const size = Math.abs(x);
  if (!(size > 0 && size < Infinity)) return 1;
  let power = 1;
  while (power > size) power /= 2;
  while (power <= size - power) power *= 2;
  return power;
}
