/**
 * How many looks miss before the first hit, out of at most `most`, drawn in one go: the largest n ≤ most with uniform < (1 − chance)ⁿ.
 *
 * Domain     0 ≤ chance ≤ 1; most a whole number ≥ 0; uniform a draw from [0, 1). The answer `most` says that none of them hit.
 * Method     The geometric law by inversion, without a logarithm: the powers (1 − chance)^(2^j) by squaring, then n bit by bit from the top.
 *            ln u/ln(1 − chance) would leave the last bit, and now and then the count, to the engine.
 * Accuracy   the law of independent looks, to the rounding of the powers; test/core/method/missesBeforeHit.test.ts.
 */
export function missesBeforeHit(chance: number, most: number, uniform: number): number {
  const powers: number[] = [];
  let step = 1;
  for (let power = 1 - chance; step <= most; power *= power, step *= 2) powers.push(power);
  let misses = 0;
  let survived = 1;
  for (let j = powers.length - 1; j >= 0; j--) {
    step /= 2;
    const further = survived * powers[j];
    if (misses + step <= most && uniform < further) {
      misses += step;
      survived = further;
    }
  }
  return misses;
}
