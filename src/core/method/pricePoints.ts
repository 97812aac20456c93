import { DomainError, requirePositive } from "../domain";
import { ordinal } from "../ordinal";

export interface PricePoints {
  /** The price that gets all the points; NaN where there is no price. */
  readonly lowest: number;
  /** One a price; NaN where there is none. */
  readonly points: Float64Array;
}

/**
 * The points of prices by the rule of proportion: points × lowest / price, so that the lowest price gets all of them.
 *
 * Domain     prices > 0, NaN for a blank; points > 0; lowest > 0 and at most each price, by default the smallest of them.
 * Reference  common practice in tenders, no source.
 * @throws {DomainError} if an argument is outside its domain; the place of the first such price is named.
 */
export function pricePoints(prices: Float64Array, points: number, lowest?: number): PricePoints {
  requirePositive("points", points);
  requireEach(prices, "above 0", (price) => price > 0);
  // Started at NaN: a price is taken where none was there before, a blank (NaN) never.
  const least = lowest ?? prices.reduce((low, price) => (low <= price || Number.isNaN(price) ? low : price), NaN);
  if (lowest !== undefined) requirePositive("lowest", lowest);
  requireEach(prices, `at or above lowest (${least})`, (price) => price >= least);
  // points × lowest first, as on paper, unless that leaves the range of numbers.
  const product = points * least;
  const safe = product < Infinity && product > 1e-290;
  return { lowest: least, points: prices.map((price) => (safe ? product / price : points * (least / price))) };
}

function requireEach(prices: Float64Array, requirement: string, holds: (price: number) => boolean): void {
  const bad = prices.findIndex((price) => !Number.isNaN(price) && !holds(price));
  if (bad >= 0)
    throw new DomainError("prices", prices[bad], requirement, `the ${ordinal(bad + 1)} cell holds ${prices[bad]}`);
}
