import { DomainError } from "../domain";
import { ordinal } from "../ordinal";

const MOST_NAMED = 6;

/**
 * Fails unless all that have a rating hang together: from any rater one can get to any other by way of entries that both rated.
 * Else severe raters of weak entries could not be told from mild raters of strong ones. The rows of the smaller groups are named.
 *
 * Method     The raters of each entry are united, with path halving; an entry belongs to the group of its first rater.
 * Reference  Tarjan & van Leeuwen (1984), Worst-case analysis of set union algorithms, J. ACM 31(2).
 * @throws {DomainError} naming ratings.
 */
export function requireLinkedRatings(ratings: Float64Array, raters: number): void {
  const entries = ratings.length / raters;
  const parents = Int32Array.from({ length: raters }, (_, i) => i);
  const groupOf = (rater: number): number => {
    while (parents[rater] !== rater) rater = parents[rater] = parents[parents[rater]];
    return rater;
  };
  const firstRaters = new Int32Array(entries).fill(-1);
  for (let entry = 0, i = 0; entry < entries; entry++) {
    for (let rater = 0; rater < raters; rater++, i++) {
      if (Number.isNaN(ratings[i])) continue;
      if (firstRaters[entry] < 0) firstRaters[entry] = rater;
      else parents[groupOf(rater)] = groupOf(firstRaters[entry]);
    }
  }
  const sizes = new Int32Array(raters);
  for (const rater of firstRaters) if (rater >= 0) sizes[groupOf(rater)]++;
  if (sizes.filter((size) => size > 0).length < 2) return;
  const largest = sizes.indexOf(Math.max(...sizes));
  const apart: number[] = [];
  firstRaters.forEach((rater, entry) => {
    if (rater >= 0 && groupOf(rater) !== largest) apart.push(entry + 1);
  });
  throw new DomainError(
    "ratings",
    null,
    "linked, each rater to every other through entries that both rated",
    rowsLackLink(apart),
  );
}

function rowsLackLink(rows: readonly number[]): string {
  const named = rows.slice(0, MOST_NAMED).map(ordinal);
  const more = rows.length - named.length;
  const last = more > 0 ? `${more} more` : named.pop()!;
  return named.length > 0
    ? `the ${named.join(", ")} and ${last} rows lack a link to the rest`
    : `the ${last} row lacks a link to the rest`;
}
