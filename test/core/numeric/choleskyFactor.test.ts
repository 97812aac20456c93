import { describe, expect, test } from "vitest";
import { choleskyFactor, choleskySolve } from "../../../src/core/numeric/choleskyFactor";
import { SeededRandom } from "../../../src/core/numeric/seededRandom";

describe("choleskyFactor and choleskySolve", () => {
  test("by hand: the factor of 4 2; 2 5 is 2 0; 1 2, and 4x + 2y = 8, 2x + 5y = 12 has x = 1, y = 2", () => {
    const matrix = Float64Array.of(4, 2, 2, 5);
    expect(choleskyFactor(matrix, 2)).toBe(-1);
    expect([matrix[0], matrix[2], matrix[3]]).toEqual([2, 1, 2]);
    const right = Float64Array.of(8, 12);
    choleskySolve(matrix, 2, right);
    expect([...right]).toEqual([1, 2]);
  });

  test("tells the pivot at which a matrix stops being positive definite", () => {
    expect(choleskyFactor(Float64Array.of(1, 0, 0, 0, 1, 2, 0, 2, 1), 3)).toBe(2);
    expect(choleskyFactor(Float64Array.of(1, 1, 1, 1), 2)).toBe(1);
    expect(choleskyFactor(Float64Array.of(NaN), 1)).toBe(0);
  });

  test("law: A·solve(A, b) = b", () => {
    const random = new SeededRandom(1);
    for (const size of [1, 3, 8, 20]) {
      const half = Float64Array.from({ length: size * size }, () => random.fraction() - 0.5);
      const matrix = new Float64Array(size * size);
      for (let i = 0; i < size; i++)
        for (let j = 0; j < size; j++) {
          for (let k = 0; k < size; k++) matrix[i * size + j] += half[i * size + k] * half[j * size + k];
          if (i === j) matrix[i * size + j] += 1;
        }
      const right = Float64Array.from({ length: size }, () => random.fraction());
      const solved = right.slice();
      const factor = matrix.slice();
      expect(choleskyFactor(factor, size)).toBe(-1);
      choleskySolve(factor, size, solved);
      for (let i = 0; i < size; i++) {
        let sum = 0;
        for (let j = 0; j < size; j++) sum += matrix[i * size + j] * solved[j];
        expect(sum).toBeCloseTo(right[i], 12);
      }
    }
  });
});
