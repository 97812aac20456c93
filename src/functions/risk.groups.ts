import { groupPassRates } from "../core/method/groupPassRates";
import { MOST_PEOPLE, passRateRatio } from "../core/method/passRateRatio";
import { DomainError } from "../core/domain";
import { MOST_ROWS } from "../sheet/invoke";
import { readCount, readFraction } from "../sheet/readArgument";
import { readGroups } from "../sheet/readGroups";
import { headedTable, labelTable, requireItem } from "../sheet/tables";

const RATIO = [
  "rate a",
  "rate b",
  "ratio of lower to higher",
  "below four fifths",
  "Fisher exact p-value",
  "ratio lower limit",
  "ratio upper limit",
];

/**
 * Compares the pass rates of two groups: their ratio with limits, whether it is below four fifths, and how far chance explains it.
 *
 * Four fifths is the rule of thumb of 29 CFR 1607.4 D for when a difference is looked into; it is compared in whole numbers, so exactly
 * four fifths is not below. Limits are the score limits of Koopman 1984, which also hold for rates of 0 or 1. The p-value is Fisher's
 * exact one, two-sided.
 *
 * @customfunction PASS_RATE_RATIO
 * @param {any} passed_a Passed in group a, a whole number from 0 to assessed_a.
 * @param {any} assessed_a Assessed in group a, a whole number from 1 to 1000000000000.
 * @param {any} passed_b Passed in group b, a whole number from 0 to assessed_b.
 * @param {any} assessed_b Assessed in group b, a whole number from 1 to 1000000000000.
 * @param {any} [confidence] Confidence of the limits, between 0 and 1; left out: 95%.
 * @param {any} [item] One label alone, such as "Fisher exact p-value". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: rate a, rate b, ratio of lower to higher, below four fifths (TRUE or FALSE), Fisher exact p-value, ratio lower limit, ratio upper limit. With nobody passed on either side ratio and limits are "none".
 * @choices item "rate a" "rate b" "ratio of lower to higher" "below four fifths" "Fisher exact p-value" "ratio lower limit" "ratio upper limit"
 * @caution The four-fifths ratio is a screening rule, no finding of discrimination and no clearance: local law and licensed practice come first.
 * @caution Small counts mislead both ways: with few people the ratio jumps and the p-value sees little. Read the limits.
 * @question Does my cutoff hit one group harder than another?
 * @question Is the pass rate of one group below four fifths of the other's?
 * @example =WEIR.PASS_RATE_RATIO(48,80,12,40,,"ratio of lower to higher") => 0.5
 * @example =WEIR.PASS_RATE_RATIO(48,80,12,40) => [["rate a",0.6],["rate b",0.3],["ratio of lower to higher",0.5],["below four fifths",true],["Fisher exact p-value",0.003409221767849182],["ratio lower limit",0.29334524524844],["ratio upper limit",0.7938646817375398]]
 */
export function PASS_RATE_RATIO(
  passed_a: any,
  assessed_a: any,
  passed_b: any,
  assessed_b: any,
  confidence?: any,
  item?: any,
): any {
  const ofA = readCount("assessed_a", assessed_a, 1, MOST_PEOPLE);
  const ofB = readCount("assessed_b", assessed_b, 1, MOST_PEOPLE);
  const a = readCount("passed_a", passed_a, 0, ofA);
  const b = readCount("passed_b", passed_b, 0, ofB);
  const level = readFraction("confidence", confidence, 0.95);
  requireItem(RATIO, item);
  const { rateA, rateB, ratio, belowFourFifths, pValue, limits } = passRateRatio(a, ofA, b, ofB, level);
  const values = [
    rateA,
    rateB,
    ratio ?? "none",
    belowFourFifths,
    pValue,
    limits?.lower ?? "none",
    limits?.upper ?? "none",
  ];
  return labelTable(
    RATIO.map((label, index) => [label, values[index]]),
    item,
  );
}

/**
 * Compares the pass rates of all groups with the highest of them, from one column of group labels and one of passed or not.
 *
 * In order of first appearance. Labels are compared in any case and without white space around them; rows blank in both columns are
 * skipped, half-blank rows refused. The p-value is Fisher's exact one, two-sided, against the highest (of several highest the first);
 * adjusted by Holm over the comparisons made. Four fifths (29 CFR 1607.4 D) is compared in whole numbers.
 *
 * @customfunction GROUP_PASS_RATES
 * @param {any[][]} groups One column of group labels, texts or numbers.
 * @param {any[][]} passed One column as long as groups: TRUE or FALSE, or 1 or 0.
 * @returns {any[][]} A row a group: group, assessed, passed, pass rate, ratio to highest ("none" where nobody passed at all), below four fifths (TRUE or FALSE), Fisher exact p-value, Holm-adjusted p-value.
 * @caution The four-fifths ratio is a screening rule, no finding of discrimination and no clearance: local law and licensed practice come first.
 * @caution Small counts mislead: with two truly equal groups of 20 the ratio falls below four fifths nearly half the time.
 * @caution In some places keeping or using such labels is itself restricted: ask before collecting them.
 * @question Do all groups pass at similar rates?
 * @question Which groups fall below four fifths of the highest pass rate?
 * @example =WEIR.GROUP_PASS_RATES({"quay";"mole";"quay";"mole"},{1;1;1;0}) => [["group","assessed","passed","pass rate","ratio to highest","below four fifths","Fisher exact p-value","Holm-adjusted p-value"],["quay",2,2,1,1,false,1,1],["mole",2,1,0.5,0.5,true,1,1]]
 */
export function GROUP_PASS_RATES(groups: any[][], passed: any[][]): any[][] {
  const found = readGroups(groups, passed);
  if (found.length >= MOST_ROWS) {
    const requirement = `at most ${MOST_ROWS - 1} different labels, one row each below the heading`;
    throw new DomainError("groups", groups, requirement, `there are ${found.length}`);
  }
  const rates = groupPassRates(found);
  return headedTable(
    [
      "group",
      "assessed",
      "passed",
      "pass rate",
      "ratio to highest",
      "below four fifths",
      "Fisher exact p-value",
      "Holm-adjusted p-value",
    ],
    rates.map((group, index) => [
      found[index].label,
      group.assessed,
      group.passed,
      group.rate,
      group.ratioToHighest ?? "none",
      group.belowFourFifths,
      group.pValue,
      group.adjustedPValue,
    ]),
  );
}
