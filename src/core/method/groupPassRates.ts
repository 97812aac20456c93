import { productDifference } from "../numeric/productDifference";
import { fisherExact } from "./fisherExact";
import { holmAdjusted } from "./holmAdjusted";
import { belowFourFifths, ratioOfRates } from "./passRateRatio";

export interface GroupCount {
  readonly assessed: number;
  readonly passed: number;
}

export interface GroupPassRate extends GroupCount {
  readonly rate: number;
  /** Undefined where nobody passed in any group. */
  readonly ratioToHighest: number | undefined;
  readonly belowFourFifths: boolean;
  readonly pValue: number;
  readonly adjustedPValue: number;
}

/**
 * Each group's pass rate against the highest: ratio, four fifths, Fisher's exact p-value, and that adjusted by Holm over the comparisons made.
 *
 * Domain     one or more groups, assessed ≥ 1, 0 ≤ passed ≤ assessed.
 * Edges      the highest itself has p-value 1; of several highest the first counts as such. Nobody passed anywhere: no ratio.
 * Method     Rates are ranked and held against four fifths in whole numbers. Equal counts are tested once.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/passRates.test.ts).
 * Reference  29 CFR 1607.4 D; Fisher (1935); Holm (1979), Scandinavian J. Statistics 6.
 */
export function groupPassRates(groups: readonly GroupCount[]): readonly GroupPassRate[] {
  let top = 0;
  groups.forEach((group, index) => {
    const highest = groups[top];
    if (productDifference(group.passed, highest.assessed, highest.passed, group.assessed) > 0) top = index;
  });
  const highest = groups[top];
  const known = new Map<string, number>();
  const pValues = groups.map(({ passed, assessed }, index) => {
    if (index === top) return 1;
    const key = `${passed}/${assessed}`;
    const pValue = known.get(key) ?? fisherExact(passed, assessed, highest.passed, highest.assessed);
    known.set(key, pValue);
    return pValue;
  });
  const adjusted = holmAdjusted(pValues.filter((_, index) => index !== top));
  adjusted.splice(top, 0, 1);
  return groups.map(({ passed, assessed }, index) => ({
    assessed,
    passed,
    rate: passed / assessed,
    ratioToHighest: highest.passed === 0 ? undefined : ratioOfRates(passed, assessed, highest.passed, highest.assessed),
    belowFourFifths: belowFourFifths(passed, assessed, highest.passed, highest.assessed),
    pValue: pValues[index],
    adjustedPValue: adjusted[index],
  }));
}
