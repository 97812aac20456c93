import { DomainError, requireCount, requireFraction } from "../domain";
import { costUnit } from "./costUnit";
import { missCostQuantile, MOST_WORK } from "./missCostQuantile";
import { missCosts, type MissCost } from "./missCosts";
import { representable } from "./representable";
import { largestOf, requireStages } from "./stages";

export interface SearchBudget {
  /** The common unit of the costs: numerator / denominator, 0 where nothing costs anything. */
  readonly unit: number;
  /** What a look that misses may pay, and how often. */
  readonly misses: readonly MissCost[];
  /** What a hit pays, in units, and what the misses may pay. */
  readonly hitUnits: number;
  readonly missUnits: number;
  readonly budget: number;
  /** The chance that the search comes within the budget. */
  readonly chance: number;
}

/** Each such stage makes a kind of miss of its own, and as many units are more than the recursion may take. */
const MOST_PAYING = Math.floor(Math.sqrt(MOST_WORK));

/**
 * The smallest total cost that covers the search until the last of the hits with the chance asked for.
 *
 * Domain     as requireStages; chance in (0, 1); hits ≥ 1 whole; costs with a common unit (see costUnit).
 * Edges      costs that are all 0 give 0. What would take too long is refused (see costUnit, missCostQuantile).
 * Method     What the hits pay is fixed; what the misses pay is a compound distribution on the common unit of the costs, exact by Panjer's
 *            recursion. A normal approximation misses the skewness that a budget is for.
 * Accuracy   the exact multiple of the unit; test/core/method/searchBudget.test.ts.
 * Reference  Panjer (1981), Recursive evaluation of a family of compound distributions, ASTIN Bulletin 12.
 *
 * @throws {DomainError}
 */
export function searchBudget(
  fraction: number,
  reach: readonly number[],
  costs: readonly number[],
  chance: number,
  hits: number,
): SearchBudget {
  const stages = requireStages(reach, costs, fraction);
  requireFraction("chance", chance);
  requireCount("hits", hits, 1);
  const paying = stages.filter(({ reach: here, cost }, i) => cost > 0 && here > (reach[i + 1] ?? fraction)).length;
  if (paying > MOST_PAYING)
    throw new DomainError(
      "reach",
      paying,
      `falling at ${MOST_PAYING} stages that cost anything at most`,
      `it falls at ${paying}`,
    );
  if (costs.every((cost) => cost === 0))
    return { unit: 0, misses: [], hitUnits: 0, missUnits: 0, budget: 0, chance: 1 };
  const { multiples, numerator, denominator } = costUnit(costs);
  const hitUnits = hits * multiples.reduce((sum, units) => sum + units, 0);
  const misses = missCosts(stages, multiples, fraction);
  const { units, reached } = missCostQuantile(misses, fraction, chance, hits);
  const budget = representable("costs", largestOf(costs), ((hitUnits + units) * numerator) / denominator);
  return { unit: numerator / denominator, misses, hitUnits, missUnits: units, budget, chance: reached };
}
