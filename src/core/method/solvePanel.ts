import { UnsettledError } from "../domain";
import { choleskyFactor, choleskySolve } from "../numeric/choleskyFactor";

/** One direction of a table of ratings: how many lines it has, and how far apart they lie in the array. */
export interface Side {
  readonly lines: number;
  readonly step: number;
}

/**
 * The effects of the shorter side of a linked panel, summing to 0, by the normal equations that are left when the longer side is eliminated:
 * (D − Σ p·pᵀ/n) effects = Σ (rating − mean of its line), p telling which n of the shorter side's lines a line of the longer side meets.
 *
 * Domain     ratings with NaN for blanks, all linked; `middle` is taken off each. A line without a rating gets NaN.
 * Method     Where a line lacks fewer ratings than it has, its p·pᵀ is written with what it lacks, (1 − q)(1 − q)ᵀ, so that a full table of a
 *            million cells takes one pass. The direction without an answer, all effects alike, is filled in; Cholesky.
 */
export function solvePanel(ratings: Float64Array, middle: number, fewer: Side, more: Side): Float64Array {
  const rated = ratedLines(ratings, fewer, more);
  const size = rated.length;
  const matrix = new Float64Array(size * size);
  const right = new Float64Array(size);
  const border = new Float64Array(size);
  const present = new Int32Array(size);
  const missing = new Int32Array(size);
  let everywhere = 0;
  for (let line = 0; line < more.lines; line++) {
    let count = 0;
    let lacking = 0;
    let sum = 0;
    for (let i = 0; i < size; i++) {
      const rating = ratings[line * more.step + rated[i] * fewer.step];
      if (Number.isNaN(rating)) {
        missing[lacking++] = i;
        continue;
      }
      present[count++] = i;
      sum += rating - middle;
      right[i] += rating - middle;
      matrix[i * size + i] += 1;
    }
    for (let a = 0; a < count; a++) right[present[a]] -= sum / count;
    if (lacking < count) {
      everywhere += 1 / count;
      for (let a = 0; a < lacking; a++) border[missing[a]] += 1 / count;
    }
    const chosen = lacking < count ? missing : present;
    const many = Math.min(lacking, count);
    for (let a = 0; a < many; a++) for (let b = 0; b <= a; b++) matrix[chosen[a] * size + chosen[b]] -= 1 / count;
  }
  let trace = 0;
  for (let i = 0; i < size; i++) trace += matrix[i * size + i];
  const filling = (trace > 0 ? trace : 1) / (size * size);
  for (let i = 0; i < size; i++)
    for (let j = 0; j <= i; j++) matrix[i * size + j] += filling - everywhere + border[i] + border[j];
  if (choleskyFactor(matrix, size) >= 0) throw new UnsettledError("The panel's equations");
  choleskySolve(matrix, size, right);
  const effects = new Float64Array(fewer.lines).fill(NaN);
  rated.forEach((line, i) => (effects[line] = right[i]));
  return effects;
}

/** The places of the lines that hold a rating. */
function ratedLines(ratings: Float64Array, side: Side, across: Side): Int32Array {
  const rated = new Uint8Array(side.lines);
  for (let line = 0; line < across.lines; line++)
    for (let i = 0; i < side.lines; i++) if (!Number.isNaN(ratings[line * across.step + i * side.step])) rated[i] = 1;
  return Int32Array.from(rated.keys()).filter((i) => rated[i] === 1);
}
