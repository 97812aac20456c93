import { requireCount } from "../domain";
import { representable } from "./representable";
import { largestOf, requireStages } from "./stages";

export interface StageWork {
  readonly learning: number;
  readonly searching: number;
  readonly total: number;
  readonly cost: number;
}

export interface StageLoad {
  /** Expected number of searching looks, hits / fraction. */
  readonly looks: number;
  readonly stages: readonly StageWork[];
  readonly all: StageWork;
}

/**
 * How much work each stage of assessment must expect: learnCount · reach while learning, hits · reach / fraction while searching.
 *
 * Domain     reach from 1, never rising, ending no lower than fraction; costs ≥ 0; learnCount ≥ 0 and hits ≥ 1 whole.
 * Method     Expected values: the searching looks until the last of the hits are negative binomial with mean hits / fraction, and each
 *            reaches a stage with chance reach whether it is a hit or not, by Wald's identity.
 * Reference  Wald (1944), On cumulative sums of random variables, Ann. Math. Statist. 15.
 *
 * @throws {DomainError}
 */
export function stageLoad(
  reach: readonly number[],
  costs: readonly number[],
  fraction: number,
  learnCount: number,
  hits: number,
): StageLoad {
  const given = requireStages(reach, costs, fraction);
  requireCount("learn_count", learnCount);
  requireCount("hits", hits, 1);
  const stages = given.map((stage) => {
    const learning = learnCount * stage.reach;
    const searching = (hits * stage.reach) / fraction;
    const total = learning + searching;
    return { learning, searching, total, cost: total * stage.cost };
  });
  const sum = (part: keyof StageWork) => stages.reduce((so, stage) => so + stage[part], 0);
  const all = { learning: sum("learning"), searching: sum("searching"), total: sum("total"), cost: sum("cost") };
  representable("fraction", fraction, all.total);
  representable("costs", largestOf(costs), all.cost);
  return { looks: hits / fraction, stages, all };
}
