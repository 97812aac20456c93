import { requireFraction } from "../domain";
import { normalPdf } from "../distribution/normalPdf";
import { normalUpperTailQuantile } from "../distribution/normalUpperTailQuantile";
import { requireValidity } from "./trueTopAmongPassed";

export interface WorthAmongPassed {
  readonly passMark: number;
  /** Mean score of those passed, in standard units. */
  readonly meanScore: number;
  readonly meanWorth: number;
}

/**
 * Mean true worth, in standard units, of those passed on a score: validity·φ(z)/passFraction, z = z(1 − passFraction).
 *
 * Domain     0 < passFraction < 1; −1 ≤ validity ≤ 1.
 * Accuracy   relative error ≤ 1e-14 (test/core/method/trueTopAmongPassed.test.ts).
 * Reference  Naylor & Shine (1965), J. Industrial Psychology 3.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function worthAmongPassed(passFraction: number, validity: number): WorthAmongPassed {
  requireFraction("pass_fraction", passFraction);
  requireValidity(validity);
  const passMark = normalUpperTailQuantile(passFraction);
  const meanScore = normalPdf(passMark) / passFraction;
  return { passMark, meanScore, meanWorth: validity * meanScore };
}
