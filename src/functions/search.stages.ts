import { DomainError } from "../core/domain";
import { searchBudget } from "../core/method/searchBudget";
import { stageLoad, type StageWork } from "../core/method/stageLoad";
import type { Cell } from "../sheet/cell";
import { MOST_ROWS } from "../sheet/invoke";
import { readCount, readFraction } from "../sheet/readArgument";
import { readStages } from "../sheet/readStages";
import { headedTable } from "../sheet/tables";

/**
 * Gives how much work and cost each stage of assessment must expect, while the cutoff is learnt and while it is used.
 *
 * Learning looks reach a stage with its reach; the search takes hits/fraction looks on average, and as large a share of them gets to each
 * stage. Costs are per entry that reaches the stage.
 *
 * @customfunction STAGE_LOAD
 * @param {any[][]} reach The fraction of entries that gets to each stage, one a stage: the first 100%, never rising, the last at least fraction.
 * @param {any[][]} costs What one entry costs at each stage, one number a stage beside reach, 0 or above.
 * @param {any} fraction The share of entries that is a hit, between 0 and 1.
 * @param {any} [learn_count] How many entries set the cutoff, a whole number; left out: 0.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any[][]} A headed table: stage, while learning, while searching, total, cost; the last row is all stages.
 * @caution These are averages: a single search often takes more. SEARCH_BUDGET gives the cost that is enough with a chance of your choice.
 * @question How many interviews and trials will the search need, and what will it cost?
 * @example =WEIR.STAGE_LOAD({1;0.5},{2;10},25%,8) => [["stage","while learning","while searching","total","cost"],[1,8,4,12,24],[2,4,2,6,60],["all stages",12,6,18,84]]
 */
export function STAGE_LOAD(reach: any[][], costs: any[][], fraction: any, learn_count?: any, hits?: any): any {
  const share = readFraction("fraction", fraction);
  const learning = readCount("learn_count", learn_count, 0, undefined, 0);
  const wanted = readCount("hits", hits, 1, undefined, 1);
  const given = readStages(reach, costs);
  if (given.reach.length > MOST_ROWS - 2) {
    const requirement = `at most ${MOST_ROWS - 2} stages, one row each beside the heading and the sums`;
    throw new DomainError("reach", reach, requirement, `${given.reach.length} were given`);
  }
  const { stages, all } = stageLoad(given.reach, given.costs, share, learning, wanted);
  const row = (name: Cell, work: StageWork) => [name, work.learning, work.searching, work.total, work.cost];
  return headedTable(
    ["stage", "while learning", "while searching", "total", "cost"],
    [...stages.map((work, index) => row(index + 1, work)), row("all stages", all)],
  );
}

/**
 * Gives the budget that covers a search to the last of its hits with the chance asked for.
 *
 * An entry that fails at a stage has paid for the stages up to there, a hit pays for all. The distribution of the total is exact, on the
 * greatest common unit of the costs (Panjer 1981). Learning is not counted: STAGE_LOAD has it.
 *
 * @customfunction SEARCH_BUDGET
 * @param {any} fraction The share of entries that is a hit, between 0 and 1.
 * @param {any[][]} reach The fraction of entries that gets to each stage, one a stage: the first 100%, never rising, the last at least fraction.
 * @param {any[][]} costs What one entry costs at each stage, one number a stage beside reach, 0 or above. Their common unit must be at least a 20,000th of the largest.
 * @param {any} chance The chance with which the budget is to be enough, between 0 and 1.
 * @param {any} [hits] How many hits are wanted, a whole number of at least 1. Left out: 1.
 * @returns {any} The smallest total cost, a multiple of the common unit of the costs. A search of more than 20 million units times stages is refused.
 * @caution It takes fraction and reach as known: with estimated ones keep a reserve.
 * @question What must I set aside so that the money lasts with 90 percent chance?
 * @example =WEIR.SEARCH_BUDGET(50%,{1},{7},87.5%) => 21
 */
export function SEARCH_BUDGET(fraction: any, reach: any[][], costs: any[][], chance: any, hits?: any): any {
  const share = readFraction("fraction", fraction);
  const asked = readFraction("chance", chance);
  const wanted = readCount("hits", hits, 1, undefined, 1);
  const given = readStages(reach, costs);
  return searchBudget(share, given.reach, given.costs, asked, wanted).budget;
}
