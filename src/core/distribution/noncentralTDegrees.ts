import { DomainError } from "../domain";

/** Fails unless df is at least 1 (∞ may pass): below, the integrand reaches over so many decades that the sum never ends. */
export function requireNoncentralDegrees(df: number): void {
  if (!(df >= 1)) throw new DomainError("df", df, "a number of at least 1");
}
