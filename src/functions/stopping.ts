import { reserveSchedule } from "../core/method/reserveSchedule";
import { reserveScore } from "../core/method/reserveScore";
import { MOST_LOOKS } from "../core/method/mostLooks";
import { isBlank } from "../sheet/cell";
import { readBetter, readCount, readNotNegative, readNumber, readPositive } from "../sheet/readArgument";
import { headedTable } from "../sheet/tables";

/**
 * Gives the score at which going on looking costs more than it brings: accept the first entry that reaches it.
 *
 * For entries that come one after another without end, from a normal curve that is known, where an entry passed over is gone. The mark z
 * solves z = discount × (z + expected gain beyond z - look_cost). It stays the same however long the search has taken.
 *
 * @customfunction RESERVE_SCORE
 * @param {any} mean Mean of the curve, in score points.
 * @param {any} sd Standard deviation of the curve, above 0.
 * @param {any} look_cost What one look costs, in score points: 0 or above, and above 0 where discount is 1.
 * @param {any} [discount] What a result is worth one look later, above 0 and at most 1; left out: 1. Below 1 it shrinks the score itself, so scores need a true zero.
 * @param {any} [better] "high" (default), or "low" where low scores are better (prices, delivery days): accept at or below the mark.
 * @returns {any} The mark, in score points.
 * @choices better "high" "low"
 * @caution The curve is taken as known: with a mean and sd estimated from scores the promise is optimistic.
 * @caution look_cost is in score points and paid at each look: say first how many points a look is worth.
 * @caution Where entries are people, the mark is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question When is a score good enough to stop looking?
 * @question What is the lowest score (or the highest price) I should accept when every look costs something?
 * @example =WEIR.RESERVE_SCORE(50,10,1) => 59.02346347510034
 * @example =WEIR.RESERVE_SCORE(200,25,3,1,"low") => 179.9755289880721
 */
export function RESERVE_SCORE(mean: any, sd: any, look_cost: any, discount?: any, better?: any): any {
  return reserveScore(
    readNumber("mean", mean),
    readPositive("sd", sd),
    readNotNegative("look_cost", look_cost),
    readPositive("discount", discount, 1),
    readBetter(better),
  ).score;
}

/**
 * Gives the mark for each look when only so many looks are left: it falls as the end comes nearer.
 *
 * For a known number of entries from a normal curve that is known, one after another, where an entry passed over is gone. With j looks
 * left, this one included, accept at the mark in its row. Without a fallback the last look must be taken, whatever its score; with one,
 * walking away is always open. Moser 1956, Guttman 1960.
 *
 * @customfunction RESERVE_SCHEDULE
 * @param {any} mean Mean of the curve, in score points.
 * @param {any} sd Standard deviation of the curve, above 0.
 * @param {any} looks Looks left in all, a whole number from 1 to 10000.
 * @param {any} [look_cost] What one look costs, in score points, 0 or above; left out: 0.
 * @param {any} [fallback] The score that is there without looking on (the supplier you have); left out: none, the last look must be taken.
 * @param {any} [better] "high" (default), or "low" where low scores are better: accept at or below the mark.
 * @returns {any[][]} A row a look, most looks left first: looks left, lowest score to accept (highest with "low"; empty where any is), expected result after costs, chance that this look, once taken, is accepted.
 * @choices better "high" "low"
 * @caution A schedule held at the fallback means: don't look.
 * @caution The curve is taken as known: with a mean and sd estimated from scores the promise is optimistic.
 * @caution look_cost is in score points and paid at each look.
 * @caution Where entries are people, a mark that falls over time treats equal scores unequally: local law and licensed practice come first.
 * @question How far should I lower my mark as the last offers come in?
 * @question What result can I expect from ten more looks?
 * @example =WEIR.RESERVE_SCHEDULE(0,1,2) => [["looks left","lowest score to accept","expected result","chance this look is accepted"],[2,0,0.3989422804014327,0.5],[1,"",0,1]]
 */
export function RESERVE_SCHEDULE(
  mean: any,
  sd: any,
  looks: any,
  look_cost?: any,
  fallback?: any,
  better?: any,
): any[][] {
  const direction = readBetter(better);
  const steps = reserveSchedule(
    readNumber("mean", mean),
    readPositive("sd", sd),
    readCount("looks", looks, 1, MOST_LOOKS),
    readNotNegative("look_cost", look_cost, 0),
    isBlank(fallback) ? undefined : readNumber("fallback", fallback),
    direction,
  );
  const mark = direction === "low" ? "highest score to accept" : "lowest score to accept";
  return headedTable(
    ["looks left", mark, "expected result", "chance this look is accepted"],
    steps.map((step) => [step.looksLeft, step.mark ?? "", step.expectedResult, step.acceptChance]),
  );
}
