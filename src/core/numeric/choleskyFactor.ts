/**
 * The Cholesky factor of a symmetric matrix, written over its lower triangle: A = L·Lᵀ.
 *
 * Domain     `matrix` row by row, size × size; only the lower triangle is read.
 * Edges      answers −1 where all went well; else the place of the first pivot that is not above 0: A is not positive definite, and the
 *            rows up to that place show it.
 * Method     row by row, so that both inner loops run along rows.
 * Reference  Golub & Van Loan (2013), Matrix Computations, 4th ed., sec. 4.2.
 */
export function choleskyFactor(matrix: Float64Array, size: number): number {
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * size + j];
      for (let k = 0; k < j; k++) sum -= matrix[i * size + k] * matrix[j * size + k];
      if (j < i) matrix[i * size + j] = sum / matrix[j * size + j];
      else if (sum > 0) matrix[i * size + i] = Math.sqrt(sum);
      else return i;
    }
  }
  return -1;
}

/** Solves L·Lᵀ x = right for x, written over `right`; `factor` as choleskyFactor leaves it. */
export function choleskySolve(factor: Float64Array, size: number, right: Float64Array): void {
  for (let i = 0; i < size; i++) {
    let sum = right[i];
    for (let k = 0; k < i; k++) sum -= factor[i * size + k] * right[k];
    right[i] = sum / factor[i * size + i];
  }
  for (let i = size - 1; i >= 0; i--) {
    const solved = right[i] / factor[i * size + i];
    right[i] = solved;
    for (let k = 0; k < i; k++) right[k] -= factor[i * size + k] * solved;
  }
}
