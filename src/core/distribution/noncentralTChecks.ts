import { DomainError } from "../domain";

/**
 * Fails unless df and ncp are parameters for which the noncentral t distribution is accurate: df from 1 to 1e15 or ∞, ncp
 * at most 1000·√df in size. Beyond, the sum would need too many terms; as ncp = z·√n comes up, |z| stays below 40.
 */
export function requireNoncentral(df: number, ncp: number): void {
  if (!(df >= 1 && (df <= 1e15 || df === Infinity))) throw new DomainError("df", df, "a number from 1 to 1e15");
  if (!(Math.abs(ncp) <= 1000 * Math.sqrt(Math.min(df, 1e15)))) {
    throw new DomainError("ncp", ncp, "a number of at most 1000 times the root of df");
  }
}
