import { UnsettledError } from "../domain";

const CAP = 400;

/**
 * The x between `low` and `high` at which `f` changes its sign.
 *
 * Domain     f(low) and f(high) of opposite sign, or one of them 0; infinite values of f are allowed.
 * Edges      a bracket without a change of sign, or a NaN of f, throws: there is nothing to find.
 * Method     Chandrupatla's: inverse quadratic interpolation where the last three points allow it, else halving,
 *            and every fourth time where the bracket has not halved by itself. Plain Newton leaves the bracket;
 *            plain halving takes 53 rounds.
 * Accuracy   the bracket shrinks to `relativeTolerance` of the root, by default two neighbouring numbers.
 * Reference  Chandrupatla (1997), A new hybrid quadratic/bisection algorithm, Adv. Eng. Software 28.
 *
 * @throws {UnsettledError} without a change of sign, or after 400 rounds.
 */
export function findRoot(f: (x: number) => number, low: number, high: number, relativeTolerance = 2 ** -52): number {
  let a = high; // the newest point
  let b = low; // the other side of the root
  let fa = f(a);
  let fb = f(b);
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (!(fa < 0 !== fb < 0) || Number.isNaN(fa) || Number.isNaN(fb)) throw new UnsettledError("The search for a root");
  let c = a;
  let fc = fa;
  let share = 0.5;
  let goal = Math.abs(b - a) / 2;
  let patience = 3;
  for (let round = 0; round < CAP; round++) {
    const x = share === 0.5 ? middle(a, b, round) : a + share * (b - a);
    const fx = f(x);
    if (fx === 0) return x;
    if (Number.isNaN(fx)) break;
    c = a;
    fc = fa;
    if (fx < 0 !== fa < 0) {
      c = b;
      fc = fb;
      b = a;
      fb = fa;
    }
    a = x;
    fa = fx;
    const best = Math.abs(fa) < Math.abs(fb) ? a : b;
    const tolerance = Math.max(Math.abs(best) * Math.max(relativeTolerance, 2 ** -52), Number.MIN_VALUE);
    const width = Math.abs(b - a);
    if (width <= tolerance) return best;
    if (width <= goal) {
      goal = width / 2;
      patience = 3;
    } else patience--;
    // Interpolation alone may creep towards a root at one end of the bracket for hundreds of rounds.
    share = patience > 0 ? interpolate(a, b, c, fa, fb, fc) : 0.5;
    if (patience <= 0) patience = 3;
    // Nearer to an end than half the tolerance the next point would be that end again.
    const least = (0.5 * tolerance) / width;
    share = Math.min(Math.max(share, least), 1 - least);
  }
  throw new UnsettledError("The search for a root");
}

/** The share of the way from a to b at which inverse quadratic interpolation puts the root; one half where it can't be trusted. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const xi = (a - b) / (c - b);
  const phi = (fa - fb) / (fc - fb);
  if (!(phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi)) return 0.5;
  const share = ((fa / (fb - fa)) * fc) / (fb - fc) + (((((c - a) / (b - a)) * fa) / (fc - fa)) * fb) / (fc - fb);
  return share > 0 && share < 1 ? share : 0.5;
}

/**
 * The middle of the bracket: at first as usual, then, where it still reaches over decades, on the scale of logarithms,
 * with 0 on the way from one sign to the other. Halving towards a root at 1e-200 as usual takes 660 rounds.
 */
function middle(a: number, b: number, round: number): number {
  const far = Math.max(Math.abs(a), Math.abs(b));
  const near = Math.min(Math.abs(a), Math.abs(b));
  if (round < 6 || near > far / 1000) return a + 0.5 * (b - a);
  if (near > 0 && a < 0 !== b < 0) return 0;
  return Math.sign(a + b) * Math.sqrt(Math.max(near, Number.MIN_VALUE)) * Math.sqrt(far);
}
