/**
 * The smallest whole number n from `least` to `most` at which `holds(n)` is true, looked for around a guess, for a condition that stays
 * true once it is.
 *
 * Domain     least ≤ most whole; guess any number (NaN is taken as least).
 * Edges      Infinity where the condition holds nowhere up to `most`.
 * Method     Gallops from the guess in doubling steps, down or up, and bisects the last one: about 2·log₂|n − guess| questions.
 */
export function smallestNear(
  holds: (n: number) => boolean,
  guess: number,
  least: number,
  most: number = Number.MAX_SAFE_INTEGER,
): number {
  let passes = Math.round(Math.min(Math.max(guess, least), most)) || least;
  let fails = passes;
  if (holds(passes)) {
    for (let step = 1; passes > least; step *= 2) {
      fails = Math.max(passes - step, least);
      if (!holds(fails)) break;
      passes = fails;
    }
    if (passes === least) return least;
  } else {
    for (let step = 1; ; step *= 2) {
      if (fails >= most) return Infinity;
      passes = Math.min(fails + step, most);
      if (holds(passes)) break;
      fails = passes;
    }
  }
  while (passes - fails > 1) {
    const middle = fails + Math.floor((passes - fails) / 2);
    if (holds(middle)) passes = middle;
    else fails = middle;
  }
  return passes;
}
