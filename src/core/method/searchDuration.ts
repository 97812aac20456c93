import { requireCount, requireFraction, requirePositive } from "../domain";
import { gammaQuantile } from "../distribution/gammaQuantile";
import { representable } from "./representable";

export interface SearchDuration {
  /** Hits that arrive in one period on average. */
  readonly hitRate: number;
  /** The gamma quantile with shape `hits`: periods in units of the mean time between hits. */
  readonly quantile: number;
  readonly periods: number;
}

/**
 * The number of periods within which the hits have arrived with the chance asked for: gamma quantile / (rate × fraction).
 *
 * Domain     fraction and chance in (0, 1); arrivalsPerPeriod > 0; hits ≥ 1 whole.
 * Method     Arrivals are Poisson, and so are the hits among them (each arrival a hit or not by itself), so the time to the last of them
 *            is gamma distributed.
 * Accuracy   as gammaQuantile.
 * Reference  Ross (2014), Introduction to Probability Models, ch. 5 (thinning of a Poisson process).
 *
 * @throws {DomainError}
 */
export function searchDuration(
  fraction: number,
  arrivalsPerPeriod: number,
  chance: number,
  hits: number,
): SearchDuration {
  requireFraction("fraction", fraction);
  requirePositive("arrivals_per_period", arrivalsPerPeriod);
  requireFraction("chance", chance);
  requireCount("hits", hits, 1, 1e15);
  const hitRate = arrivalsPerPeriod * fraction;
  const quantile = gammaQuantile(chance, hits);
  return { hitRate, quantile, periods: representable("arrivals_per_period", arrivalsPerPeriod, quantile / hitRate) };
}
