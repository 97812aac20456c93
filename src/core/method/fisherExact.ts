import { hypergeometricCdf } from "../distribution/hypergeometricCdf";
import { hypergeometricPmf } from "../distribution/hypergeometricPmf";
import { hypergeometricUpperTail } from "../distribution/hypergeometricUpperTail";

/** Tables that are equally probable on paper may differ by rounding. */
const SLACK = 1e-7;

/**
 * Two-sided p-value of Fisher's exact test for two pass rates: the chance of all tables with these margins that are no more probable
 * than the one seen.
 *
 * Domain     whole numbers, 0 ≤ passed ≤ assessed, assessed ≥ 1 on either side.
 * Edges      all or nobody passed on both sides gives 1.
 * Method     The probabilities rise to the mode and fall after it, so each side's boundary is found by halving and its tail taken whole:
 *            some 40 probabilities for a million people, where adding up table by table takes a million.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/fisherExact.test.ts).
 * Reference  Fisher (1935), The Design of Experiments, ch. 2; the two-sided rule: Freeman & Halton (1951), Biometrika 38.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function fisherExact(passedA: number, assessedA: number, passedB: number, assessedB: number): number {
  const pool = assessedA + assessedB;
  const good = passedA + passedB;
  const least = Math.max(0, good - assessedB);
  const most = Math.min(good, assessedA);
  const chance = (k: number) => hypergeometricPmf(k, pool, good, assessedA);
  const bound = chance(passedA) * (1 + SLACK);
  const peak = Math.floor(((assessedA + 1) / (pool + 2)) * (good + 1));
  const mode = Math.min(most, Math.max(least, peak));
  if (chance(mode) <= bound) return 1;
  // Largest k below the mode and smallest above it that are no more probable; one step outside where there is none.
  const below = boundary(mode, least - 1, (k) => k < least || chance(k) <= bound);
  const above = boundary(mode, most + 1, (k) => k > most || chance(k) <= bound);
  const lower = hypergeometricCdf(below, pool, good, assessedA);
  return Math.min(1, lower + hypergeometricUpperTail(above, pool, good, assessedA));
}

/** The whole number nearest to `inside` for which `outside` is true, on the way to `end`, where it is true. */
function boundary(inside: number, end: number, outside: (k: number) => boolean): number {
  let near = inside;
  let far = end;
  while (Math.abs(far - near) > 1) {
    const middle = Math.floor((near + far) / 2);
    if (outside(middle)) far = middle;
    else near = middle;
  }
  return far;
}
