import { DomainError, requireFraction } from "../domain";
import { bivariateNormalUpperTail } from "../distribution/bivariateNormalUpperTail";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";

export interface TrueTopAmongPassed {
  /** The marks in standard units of true worth and of the score. */
  readonly trueMark: number;
  readonly passMark: number;
  /** Share of all entries that pass and are truly in the top fraction. */
  readonly passedAndTop: number;
  readonly share: number;
}

/** Fails unless `validity` is a correlation. NaN fails. */
export function requireValidity(validity: number): void {
  if (!(validity >= -1 && validity <= 1)) throw new DomainError("validity", validity, "a number from -1 to 1");
}

/**
 * Share of those passed on a score who are truly in the top fraction: P(Y > z(1 − true), X > z(1 − pass)) / pass, score X and true
 * worth Y bivariate normal with this correlation.
 *
 * Domain     0 < trueFraction, passFraction < 1; −1 ≤ validity ≤ 1.
 * Edges      validity 1: min(1, true/pass); −1: max(0, (true + pass − 1)/pass); 0: true.
 * Method     the upper tail of the bivariate normal; the edges in closed form, exactly.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/trueTopAmongPassed.test.ts).
 * Reference  Taylor & Russell (1939), J. Applied Psychology 23.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function trueTopAmongPassed(trueFraction: number, passFraction: number, validity: number): TrueTopAmongPassed {
  requireFraction("true_fraction", trueFraction);
  requireFraction("pass_fraction", passFraction);
  requireValidity(validity);
  const trueMark = normalUpperTailQuantile(trueFraction);
  const passMark = normalUpperTailQuantile(passFraction);
  const passedAndTop = jointShare(trueFraction, passFraction, validity, trueMark, passMark);
  return { trueMark, passMark, passedAndTop, share: Math.min(1, passedAndTop / passFraction) };
}

function jointShare(top: number, pass: number, validity: number, trueMark: number, passMark: number): number {
  if (validity === 1) return Math.min(top, pass);
  // Added first: 0.9 + 0.1 is an exact 1, while 0.9 − (1 − 0.1) leaves a trace of rounding.
  if (validity === -1) return Math.max(0, top + pass - 1);
  if (validity === 0) return top * pass;
  return bivariateNormalUpperTail(trueMark, passMark, validity);
}
