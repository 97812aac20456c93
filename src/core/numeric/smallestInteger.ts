/**
 * The smallest whole number n ≥ start at which `holds(n)` is true, for a condition that stays true once it is.
 *
 * Domain     start and most whole numbers; `most` defaults to 2⁵³ − 1.
 * Edges      Infinity where the condition holds nowhere up to `most`, or an argument is NaN.
 * Method     Gallops in doubling steps and bisects the last one: about 2·log₂(n − start) questions. A condition
 *            that is not monotone must be asked step by step instead.
 */
export function smallestInteger(
  holds: (n: number) => boolean,
  start: number,
  most: number = Number.MAX_SAFE_INTEGER,
): number {
  if (!(start <= most)) return Infinity;
  if (holds(start)) return start;
  let fails = start;
  let passes = start;
  for (let step = 1; ; step *= 2) {
    if (fails >= most) return Infinity;
    passes = Math.min(fails + step, most);
    if (holds(passes)) break;
    fails = passes;
  }
  while (passes - fails > 1) {
    const middle = fails + Math.floor((passes - fails) / 2);
    if (holds(middle)) passes = middle;
    else fails = middle;
  }
  return passes;
}
