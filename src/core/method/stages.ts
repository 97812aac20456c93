import { DomainError, requireFraction, requireNotNegative } from "../domain";

/** One step of assessment: the fraction of entries that gets there, and what assessing one of them costs. */
export interface Stage {
  readonly reach: number;
  readonly cost: number;
}

/**
 * The stages of an assessment, checked: reach begins with 1, never rises and ends no lower than the fraction that passes them all.
 *
 * Edges      a last reach short of the fraction by rounding alone (1e-12 of it) is allowed: 0.7 × 0.1 is below 0.07.
 * @throws {DomainError} naming reach, costs or fraction.
 */
export function requireStages(reach: readonly number[], costs: readonly number[], fraction: number): Stage[] {
  requireFraction("fraction", fraction);
  if (!(reach.length > 0)) throw new DomainError("reach", null, "one fraction a stage, the first 100%");
  if (reach[0] !== 1) throw new DomainError("reach", reach[0], "100% at the first stage, which every entry reaches");
  reach.forEach((here, index) => {
    const before = index === 0 ? 1 : reach[index - 1];
    if (!(here > 0 && here <= before)) {
      const requirement = `fractions above 0 that never rise from one stage to the next (${before} before stage ${index + 1})`;
      throw new DomainError("reach", here, requirement);
    }
  });
  if (costs.length !== reach.length) {
    const came = `${costs.length} ${costs.length === 1 ? "number was" : "numbers were"} given`;
    throw new DomainError("costs", costs.length, `one number a stage, ${reach.length} like reach`, came);
  }
  costs.forEach((cost) => requireNotNegative("costs", cost));
  const last = reach[reach.length - 1];
  if (!(fraction <= last * (1 + 1e-12)))
    throw new DomainError("fraction", fraction, `at most the reach of the last stage, ${last}`);
  return reach.map((here, index) => ({ reach: here, cost: costs[index] }));
}

/** The largest of many numbers: a full column as arguments of Math.max would overflow the stack. */
export function largestOf(numbers: readonly number[]): number {
  return numbers.reduce((most, number) => Math.max(most, number), -Infinity);
}
