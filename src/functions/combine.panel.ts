import { NoAnswerError } from "../core/domain";
import { panelScores } from "../core/method/panelScores";
import { weightSway } from "../core/method/weightSway";
import { readCount, readFraction } from "../sheet/readArgument";
import { gridCells, readGrid, readOneEach, requireWholeRows } from "../sheet/readGrid";

/**
 * Evens out a panel: each entry's score with the raters' severity taken out, also where not everybody rated everything.
 *
 * Rows are entries, columns are raters. Each rating is taken as the entry's worth plus the rater's severity, fitted by least squares;
 * severities sum to 0, so scores stay on the raters' scale. Where every rater rated every entry this is the plain mean. Raters must be
 * linked through entries that both rated; a rater without any rating is left aside.
 *
 * @customfunction PANEL_SCORE
 * @param {any[][]} ratings The ratings: one row an entry, one column a rater, blank where a rater saw no entry. At least one rater must tie every part of the panel to the rest.
 * @returns {any[][]} One column, the score of each entry; empty for an empty row.
 * @caution It takes raters to differ by a constant; one who also uses a wider scale than the others is not evened out.
 * @caution Where entries are people, a score is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How do I compare entries that were scored by different raters?
 * @question How do I take out that one rater is stricter than another?
 * @example =WEIR.PANEL_SCORE({60,50;80,70;"",90}) => [[55],[75],[95]]
 */
export function PANEL_SCORE(ratings: any[][]): any {
  const grid = readGrid("ratings", ratings);
  if (grid.filled.every((count) => count === 0))
    return gridCells({ ...grid, columns: 1 }, new Float64Array(grid.rows).fill(NaN));
  return gridCells({ ...grid, columns: 1 }, panelScores(grid.values, grid.columns).scores);
}

/**
 * Shows how far the choice hangs on the weights: how often each entry is among the best when the weights sway at random.
 *
 * In each run every weight is multiplied by its own random number between 1 − spread and 1 + spread, and the entries are ranked anew. A share
 * near 1 or 0 stands whatever the exact weights; one in between is decided by them. Ties share the places that are left.
 *
 * @customfunction WEIGHT_SWAY
 * @param {any[][]} values The scores to combine: one row an entry, one column a criterion. A row may be empty; one with only some cells filled is refused.
 * @param {any[][]} weights One weight for each criterion, in a row or a column: 0 or above, not all 0.
 * @param {any} top_count How many entries are to be chosen: a whole number from 1 to the number of entries.
 * @param {any} [spread] How far each weight may sway, as a fraction between 0 and 1. Default 0.25.
 * @param {any} [runs] How many times to rank: a whole number; runs × entries × criteria at most 20 million. Default 10000.
 * @param {any} [seed] A whole number from 0: the same seed gives the same shares. Default 1.
 * @returns {any[][]} One column, for each row the share of runs in which it is among the best, 0 to 1; empty for an empty row.
 * @caution The sway says nothing of errors in the scores themselves.
 * @question Would other weights have chosen other entries?
 * @example =WEIR.WEIGHT_SWAY({90,8;70,6;70,6;45,3},{5,2},2) => [[1],[0.5],[0.5],[0]]
 */
export function WEIGHT_SWAY(
  values: any[][],
  weights: any[][],
  top_count: any,
  spread?: any,
  runs?: any,
  seed?: any,
): any {
  const grid = readGrid("values", values);
  const weight = readOneEach("weights", weights, "refused", grid.columns);
  const top = readCount("top_count", top_count);
  const sway = readFraction("spread", spread, 0.25);
  const times = readCount("runs", runs, 1, undefined, 10_000);
  const from = readCount("seed", seed, 0, undefined, 1);
  requireWholeRows("values", grid);
  const present = grid.values.filter((value) => !Number.isNaN(value));
  if (present.length === 0) throw new NoAnswerError("values", "values needs at least 1 entry, and there is none yet.");
  const shares = weightSway(present, weight, top, sway, times, from);
  let next = 0;
  return Array.from(grid.filled, (count) => [count === 0 ? "" : shares[next++]]);
}
