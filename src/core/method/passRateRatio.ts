import { requireCount, requireFraction } from "../domain";
import { productDifference } from "../numeric/productDifference";
import { fisherExact } from "./fisherExact";
import { ratioLimits, type RatioLimits } from "./ratioLimits";

export interface PassRateRatio {
  readonly rateA: number;
  readonly rateB: number;
  /** Lower rate over higher; undefined, like the limits, where nobody passed on either side. */
  readonly ratio: number | undefined;
  readonly belowFourFifths: boolean;
  readonly pValue: number;
  readonly limits: RatioLimits | undefined;
}

/** More people than there are: beyond it the exact test takes too long. */
export const MOST_PEOPLE = 1e12;

/**
 * Two pass rates compared: the lower over the higher with score limits, whether it is below four fifths, and Fisher's exact p-value.
 *
 * Domain     assessed whole, 1 … 1e12; passed whole, 0 … assessed; 0 < confidence < 1.
 * Edges      equal rates: a over b. Nobody passed on either side: no ratio, not below.
 * Method     Which rate is lower and whether 5·lower < 4·higher are decided in whole numbers: 48/60 against 4/5 must not hang on a rounding.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/passRates.test.ts).
 * Reference  29 CFR 1607.4 D (four fifths); Koopman (1984), Biometrics 40; Fisher (1935).
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function passRateRatio(
  passedA: number,
  assessedA: number,
  passedB: number,
  assessedB: number,
  confidence = 0.95,
): PassRateRatio {
  requireCount("assessed_a", assessedA, 1, MOST_PEOPLE);
  requireCount("passed_a", passedA, 0, assessedA);
  requireCount("assessed_b", assessedB, 1, MOST_PEOPLE);
  requireCount("passed_b", passedB, 0, assessedB);
  requireFraction("confidence", confidence);
  const none = passedA === 0 && passedB === 0;
  const [low, lowOf, high, highOf] =
    productDifference(passedA, assessedB, passedB, assessedA) <= 0
      ? [passedA, assessedA, passedB, assessedB]
      : [passedB, assessedB, passedA, assessedA];
  return {
    rateA: passedA / assessedA,
    rateB: passedB / assessedB,
    ratio: none ? undefined : ratioOfRates(low, lowOf, high, highOf),
    belowFourFifths: belowFourFifths(low, lowOf, high, highOf),
    pValue: fisherExact(passedA, assessedA, passedB, assessedB),
    limits: none ? undefined : ratioLimits(low, lowOf, high, highOf, confidence),
  };
}

/** (low/lowOf)/(high/highOf); 1 exactly for equal rates. */
export function ratioOfRates(low: number, lowOf: number, high: number, highOf: number): number {
  return (low * highOf) / (high * lowOf);
}

/** Whether low/lowOf is below four fifths of high/highOf, in whole numbers. */
export function belowFourFifths(low: number, lowOf: number, high: number, highOf: number): boolean {
  return productDifference(5 * low, highOf, 4 * high, lowOf) < 0;
}
