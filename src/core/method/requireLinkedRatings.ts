import { DomainError } from "../domain";
import { ordinal } from "../ordinal";

const MOST_NAMED = 6;

/**
 * Fails unless all that have a rating hang together: from any rater one can get to any other by way of entries that both rated.
 * Else severe raters of weak entries could not be told from mild raters of strong ones. The rows of the smaller groups are named.
 *
 * Method     Union by way of each rating, with path halving.
 * Reference  Tarjan & van Leeuwen (1984), Worst-case analysis of set union algorithms, J. ACM 31(2).
 * @throws {DomainError} naming ratings.
 */
export function requireLinkedRatings(ratings: Float64Array, raters: number): void {
  const entries = ratings.length / raters;
  const parents = Int32Array.from({ length: raters + entries }, (_, i) => i);
  const groupOf = (node: number): number => {
    while (parents[node] !== node) node = parents[node] = parents[parents[node]];
    return node;
  };
  const sizes = new Map<number, number>();
  const rated = new Uint8Array(entries);
  for (let i = 0; i < ratings.length; i++) {
    if (Number.isNaN(ratings[i])) continue;
    const entry = Math.floor(i / raters);
    rated[entry] = 1;
    parents[groupOf(raters + entry)] = groupOf(i % raters);
  }
  for (let entry = 0; entry < entries; entry++) {
    if (rated[entry]) sizes.set(groupOf(raters + entry), (sizes.get(groupOf(raters + entry)) ?? 0) + 1);
  }
  if (sizes.size < 2) return;
  const [largest] = [...sizes].reduce((most, group) => (group[1] > most[1] ? group : most));
  const apart: number[] = [];
  for (let entry = 0; entry < entries; entry++)
    if (rated[entry] && groupOf(raters + entry) !== largest) apart.push(entry + 1);
  const shown = apart.slice(0, MOST_NAMED).map(ordinal);
  const others = apart.length - shown.length;
  const last = others > 0 ? `${others} more` : shown.pop()!;
  const rows = shown.length > 0 ? `the ${shown.join(", ")} and ${last} rows lack` : `the ${last} row lacks`;
  throw new DomainError(
    "ratings",
    null,
    "linked, each rater to every other through entries that both rated",
    `${rows} a link to the rest`,
  );
}
