import { DomainError, requirePositive } from "../domain";
import { choleskyFactor } from "../numeric/choleskyFactor";
import { powerOfTwoBelow } from "../numeric/powerOfTwoBelow";
import { ordinal } from "../ordinal";
import { requireWeights } from "./weightedScores";

export interface CompositeSpread {
  readonly weightTotal: number;
  /** The variance of the weighted mean: wᵀΣw/(Σw)². */
  readonly variance: number;
  readonly spread: number;
}

/** What rounding may leave between two entries of the table that should be alike, and below an eigenvalue that should be 0. */
const SLACK = 1e-10;

/**
 * The standard deviation of a weighted mean of correlated criteria: √(Σᵢⱼ wᵢsᵢ rᵢⱼ sⱼwⱼ) / Σ w.
 *
 * Domain     weights ≥ 0, not all 0; sds > 0; correlations row by row, symmetric with a diagonal of 1, no eigenvalue below −1e-10.
 * Method     No eigenvalue is below −1e-10 exactly where the table plus 1e-10 on its diagonal has a Cholesky factor: a sixth of the work of
 *            finding the eigenvalues, and it tells the criterion at which the correlations begin to contradict one another.
 * Accuracy   a few roundings; test/core/method/compositeSpread.test.ts.
 * @throws {DomainError} if an argument is outside its domain.
 */
export function compositeSpread(weights: Float64Array, sds: Float64Array, correlations: Float64Array): CompositeSpread {
  requireWeights("weights", weights);
  for (const sd of sds) requirePositive("sds", sd);
  const size = weights.length;
  requireCorrelations(correlations, size);
  const scale = powerOfTwoBelow(Math.max(...weights));
  const total = weights.reduce((sum, weight) => sum + weight / scale, 0);
  const parts = weights.map((weight, i) => (weight / scale / total) * sds[i]);
  // In units of the largest part no square overflows, and none vanishes beside it.
  const unit = powerOfTwoBelow(Math.max(...parts));
  for (let i = 0; i < size; i++) parts[i] /= unit;
  let square = 0;
  for (let i = 0; i < size; i++) {
    square += parts[i] * parts[i];
    for (let j = 0; j < i; j++)
      square += (correlations[i * size + j] + correlations[j * size + i]) * parts[i] * parts[j];
  }
  // Criteria that cancel one another out may leave a variance just below 0.
  const spread = unit * Math.sqrt(Math.max(0, square));
  return { weightTotal: total * scale, variance: spread * spread, spread };
}

function requireCorrelations(correlations: Float64Array, size: number): void {
  const fail = (requirement: string, came: string): never => {
    throw new DomainError("correlations", null, requirement, came);
  };
  const shifted = correlations.slice();
  for (let i = 0; i < size; i++) {
    const diagonal = correlations[i * size + i];
    if (!(Math.abs(diagonal - 1) <= SLACK))
      fail("1 between each criterion and itself", `the ${ordinal(i + 1)} on the diagonal is ${diagonal}`);
    shifted[i * size + i] = diagonal + SLACK;
    for (let j = 0; j < i; j++) {
      const below = correlations[i * size + j];
      const above = correlations[j * size + i];
      const pair = `the ${ordinal(i + 1)} criterion with the ${ordinal(j + 1)}`;
      if (!(Math.abs(below) <= 1 + SLACK)) fail("from -1 to 1", `${pair} has ${below}`);
      if (!(Math.abs(below - above) <= SLACK))
        fail("the same on both sides of the diagonal", `${pair} has ${below} and ${above}`);
    }
  }
  const clash = choleskyFactor(shifted, size);
  if (clash >= 0)
    fail(
      "such that they can all hold at once (no eigenvalue below 0)",
      `those of the ${ordinal(clash + 1)} criterion contradict those before it`,
    );
}
