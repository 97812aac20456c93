import { representable } from "./representable";
import { requireLinkedRatings } from "./requireLinkedRatings";
import { solvePanel, type Side } from "./solvePanel";

export interface PanelScores {
  readonly ratingCount: number;
  /** What each rater adds on average, summing to 0; NaN for a rater without a rating. */
  readonly raterEffects: Float64Array;
  /** Each entry's score with the raters' effects taken out; NaN for an entry without a rating. */
  readonly scores: Float64Array;
}

/**
 * Entries' scores with the raters' severity taken out: the least-squares fit of rating = entry + rater, rater effects summing to 0.
 *
 * Domain     ratings row by row, one row an entry, one column a rater, NaN where a rater saw no entry; every rater tied to every other through
 *            entries that both rated. Raters and entries without any rating are left aside.
 * Method     The longer side of the table is eliminated by hand (given the others, its effects are means), which leaves as many normal
 *            equations as the shorter side has lines: five for 100,000 entries and five raters. Their one direction without an answer, the
 *            same added to all, is filled in, and Cholesky solves them.
 * Accuracy   1e-13 relative on well linked panels, 1e-11 where 300 raters hang together by single entries; test/core/method/panelScores.test.ts.
 * Reference  Searle (1971), Linear Models, ch. 7: the two-way crossed classification without interaction.
 * @throws {DomainError} if ratings fall into groups without a link, or are too large to be added up.
 */
export function panelScores(ratings: Float64Array, raters: number): PanelScores {
  const entries = ratings.length / raters;
  requireLinkedRatings(ratings, raters);
  let ratingCount = 0;
  let total = 0;
  let largest = 0;
  for (const rating of ratings) {
    if (Number.isNaN(rating)) continue;
    ratingCount++;
    total += rating;
    if (Math.abs(rating) > Math.abs(largest)) largest = rating;
  }
  const middle = total / ratingCount;
  const byRater: Side = { lines: raters, step: 1 };
  const byEntry: Side = { lines: entries, step: raters };
  const ratersAreFewer = raters <= entries;
  const fewer = ratersAreFewer ? byRater : byEntry;
  const more = ratersAreFewer ? byEntry : byRater;
  const fewerEffects = solvePanel(ratings, middle, fewer, more);
  const moreEffects = meansWithout(ratings, middle, fewerEffects, fewer, more);
  const [raterEffects, scores] = ratersAreFewer ? [fewerEffects, moreEffects] : [moreEffects, fewerEffects];
  const surplus = meanOf(raterEffects);
  for (let i = 0; i < scores.length; i++) scores[i] += surplus + middle;
  // A sum past the largest number would leave NaN, which is shown as a blank.
  ratings.forEach((rating, i) => {
    if (!Number.isNaN(rating)) representable("ratings", largest, scores[Math.floor(i / raters)]);
  });
  return { ratingCount, raterEffects: raterEffects.map((effect) => effect - surplus), scores };
}

/** The effects of the longer side, given the shorter one's: means of what is left of the ratings. */
function meansWithout(
  ratings: Float64Array,
  middle: number,
  known: Float64Array,
  fewer: Side,
  more: Side,
): Float64Array {
  return new Float64Array(more.lines).map((_, line) => {
    let count = 0;
    let sum = 0;
    for (let i = 0; i < fewer.lines; i++) {
      const rating = ratings[line * more.step + i * fewer.step];
      if (Number.isNaN(rating)) continue;
      count++;
      sum += rating - middle - known[i];
    }
    return sum / count;
  });
}

function meanOf(effects: Float64Array): number {
  const present = effects.filter((effect) => !Number.isNaN(effect));
  return present.reduce((sum, effect) => sum + effect, 0) / present.length;
}
