import { bestPickChance } from "../core/method/bestPickChance";
import { bestPickSchedule } from "../core/method/bestPickSchedule";
import { MOST_LOOKS } from "../core/method/mostLooks";
import { rankOnlyBest } from "../core/method/rankOnlyBest";
import { rankOnlySchedule } from "../core/method/rankOnlySchedule";
import { readCount, readWord } from "../sheet/readArgument";
import { headedTable, labelTable, requireItem } from "../sheet/tables";

/**
 * Gives for each look the percentile that a best-so-far score must pass to be taken, when only the very best will do.
 *
 * For a known number of entries from a curve that is known, one after another, where an entry passed over is gone. Accept a score that is
 * the best so far and beyond that fraction of the curve; turn a percentile into a mark with CURVE_CUTOFF(mean, sd, 1 - percentile). At the
 * last look any best so far is taken. Gilbert and Mosteller 1966.
 *
 * @customfunction BEST_PICK_SCHEDULE
 * @param {any} looks Looks in all, a whole number from 1 to 10000.
 * @returns {any[][]} A row a look: look, looks left after this, percentile to beat (0 to 1).
 * @caution It plays for the very best and counts a second best as a failure: for a good result on average take RESERVE_SCHEDULE.
 * @caution The curve is taken as known: with a curve estimated from scores the promise is optimistic.
 * @caution Where entries are people, the schedule is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Which score should I stop at if I want the best of all, and not just a good one?
 * @example =WEIR.BEST_PICK_SCHEDULE(3) => [["look","looks left after this","percentile to beat"],[1,2,0.6898979485566357],[2,1,0.5],[3,0,0]]
 */
export function BEST_PICK_SCHEDULE(looks: any): any[][] {
  const steps = bestPickSchedule(readCount("looks", looks, 1, MOST_LOOKS));
  return headedTable(
    ["look", "looks left after this", "percentile to beat"],
    steps.map(({ look, looksLeft, percentile }) => [look, looksLeft, percentile]),
  );
}

/**
 * Gives the chance that BEST_PICK_SCHEDULE ends with the very best of all entries.
 *
 * It falls from 1 with a single look to 0.580164 with very many. Gilbert and Mosteller 1966.
 *
 * @customfunction BEST_PICK_CHANCE
 * @param {any} looks Looks in all, a whole number from 1 to 10000.
 * @returns {any} The chance, 0 to 1.
 * @caution The curve is taken as known: with a curve estimated from scores the promise is optimistic.
 * @question How likely is it to get the best of all when I must decide on each one at once?
 * @example =WEIR.BEST_PICK_CHANCE(2) => 0.75
 * @example =WEIR.BEST_PICK_CHANCE(10) => 0.6086993668758407
 */
export function BEST_PICK_CHANCE(looks: any): any {
  return bestPickChance(readCount("looks", looks, 1, MOST_LOOKS));
}

/**
 * Plans a search without any score scale, when all that can be said is whether an entry is better than all before.
 *
 * For a known number of entries in random order, where an entry passed over is gone. With goal "best": how many to pass over before taking
 * the first that is better than all before, and the chance that it is the best of all. With goal "rank": the smallest expected rank that
 * can be reached (1 is the best); RANK_ONLY_SCHEDULE says how. Gilbert and Mosteller 1966; Chow and others 1964.
 *
 * @customfunction RANK_ONLY_PLAN
 * @param {any} looks Looks in all, a whole number from 1 to 10000.
 * @param {any} [goal] "best" (default): the best or nothing; "rank": a low rank on average.
 * @param {any} [item] One label alone, such as "pass over first". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value: pass over first, chance of taking the best; or, with goal "rank", expected rank.
 * @choices goal "best" "rank"
 * @choices item "pass over first" "chance of taking the best" "expected rank"
 * @caution The order must be random: if good entries tend to come early or late, the chances do not hold.
 * @caution Where entries are people, those who happen to come first are passed over whatever they are worth: local law and licensed practice come first.
 * @question How many offers should I let pass before taking the first that beats them all?
 * @example =WEIR.RANK_ONLY_PLAN(10) => [["pass over first",3],["chance of taking the best",0.3986904761904762]]
 * @example =WEIR.RANK_ONLY_PLAN(4,"rank","expected rank") => 1.875
 */
export function RANK_ONLY_PLAN(looks: any, goal?: any, item?: any): any {
  const count = readCount("looks", looks, 1, MOST_LOOKS);
  if (readWord("goal", goal, ["best", "rank"], "best") === "rank") {
    requireItem(["expected rank"], item);
    return labelTable([["expected rank", rankOnlySchedule(count).expectedRank]], item);
  }
  const { passOver, chance } = rankOnlyBest(count);
  return labelTable(
    [
      ["pass over first", passOver],
      ["chance of taking the best", chance],
    ],
    item,
  );
}

/**
 * Gives for each look the worst rank so far at which to accept, for the smallest expected rank, without any score scale.
 *
 * For a known number of entries in random order, where an entry passed over is gone. At look i accept an entry that is among the best so
 * many of the i seen; 0 means: accept none yet. Where taking and passing over come to the same, take. Chow and others 1964.
 *
 * @customfunction RANK_ONLY_SCHEDULE
 * @param {any} looks Looks in all, a whole number from 1 to 10000.
 * @returns {any[][]} A row a look: look, accept if among the best so far (a whole number; 0 is none). The last look is always taken.
 * @caution The order must be random: if good entries tend to come early or late, the expected rank does not hold.
 * @caution Where entries are people, the schedule treats early and late comers unequally: local law and licensed practice come first.
 * @question At which look may I take the second or third best so far?
 * @example =WEIR.RANK_ONLY_SCHEDULE(3) => [["look","accept if among the best so far"],[1,0],[2,1],[3,3]]
 */
export function RANK_ONLY_SCHEDULE(looks: any): any[][] {
  const { acceptRank } = rankOnlySchedule(readCount("looks", looks, 1, MOST_LOOKS));
  return headedTable(
    ["look", "accept if among the best so far"],
    acceptRank.map((rank, index) => [index + 1, rank]),
  );
}
