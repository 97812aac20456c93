import { studentTUpperTail } from "./studentTUpperTail";

/**
 * P(T ≤ x) for Student's t with `df` degrees of freedom.
 *
 * Domain     x any number; df from 0.001 to 1e15, not only whole; df = ∞ is the standard normal.
 * Edges      −∞ gives 0, ∞ gives 1.
 * Method     The upper tail of −x.
 * Accuracy   1e-13 relative down to 1e-100; test/core/distribution/studentT.test.ts.
 * Reference  as studentTUpperTail.
 *
 * @throws {DomainError} if an argument is outside its domain.
 */
export function studentTCdf(x: number, df: number): number {
  return studentTUpperTail(-x, df);
}
