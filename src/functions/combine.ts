import { compositeSpread } from "../core/method/compositeSpread";
import { minimumsMet } from "../core/method/minimumsMet";
import { pricePoints } from "../core/method/pricePoints";
import { weightedScores } from "../core/method/weightedScores";
import { isBlank } from "../sheet/cell";
import { readPositive } from "../sheet/readArgument";
import { gridCells, readGrid, readOneEach, readSquare, requireWholeRows } from "../sheet/readGrid";

/**
 * Makes one score of several criteria: the weighted mean of each entry's values.
 *
 * Rows are entries, columns are criteria. The weights need not sum to 1 or 100: each is divided by their sum. With minimums, an entry that
 * falls short of any of them gets no score, however good the rest.
 *
 * @customfunction WEIGHTED_SCORE
 * @param {any[][]} values The scores to combine: one row an entry, one column a criterion. A row may be empty; one with only some cells filled is refused.
 * @param {any[][]} weights One weight for each criterion, in a row or a column: 0 or above, not all 0.
 * @param {any[][]} [minimums] One minimum for each criterion, in a row or a column, met at or above; a blank asks for nothing. Default: no minimums.
 * @returns {any[][]} One column, a score for each row: Σ weight × value / Σ weights. Empty for an empty row and where a minimum is not met.
 * @caution Criteria on unlike scales (0 to 10 and 0 to 100) reweight themselves: standardise them first.
 * @caution Where entries are people, a score is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question How do I make one score of several criteria with weights?
 * @question How do I leave out entries that miss a minimum on one criterion?
 * @example =WEIR.WEIGHTED_SCORE({80,6,70;60,8,90},{5,2,3}) => [[62.2],[58.6]]
 * @example =WEIR.WEIGHTED_SCORE({80,6,70;60,8,90},{5,2,3},{"",7,""}) => [[""],[58.6]]
 */
export function WEIGHTED_SCORE(values: any[][], weights: any[][], minimums?: any[][]): any {
  const grid = readGrid("values", values);
  const weight = readOneEach("weights", weights, "refused", grid.columns);
  const none = minimums == null || (minimums.length === 1 && minimums[0].length === 1 && isBlank(minimums[0][0]));
  const least = none ? undefined : readOneEach("minimums", minimums, "kept", grid.columns);
  requireWholeRows("values", grid);
  const { scores } = weightedScores(grid.values, weight);
  const met = least && minimumsMet(grid.values, least);
  return Array.from(scores, (score, row) => [grid.filled[row] === 0 || met?.[row] === false ? "" : score]);
}

/**
 * Says for each entry whether it reaches all the minimums.
 *
 * Rows are entries, columns are criteria. A minimum is met at or above; a criterion with a blank minimum is not looked at.
 *
 * @customfunction MINIMUMS_MET
 * @param {any[][]} values The scores: one row an entry, one column a criterion. A row may be empty; one with only some cells filled is refused.
 * @param {any[][]} minimums One minimum for each criterion, in a row or a column; a blank asks for nothing.
 * @returns {any[][]} One column, TRUE or FALSE for each row; empty for an empty row.
 * @caution Where entries are people, a missed minimum is no decision: groups can be hit unequally, and local law and licensed practice come first.
 * @question Which entries reach the minimum on every criterion?
 * @example =WEIR.MINIMUMS_MET({80,6;60,8;90,8},{70,8}) => [[false],[false],[true]]
 */
export function MINIMUMS_MET(values: any[][], minimums: any[][]): any {
  const grid = readGrid("values", values);
  const least = readOneEach("minimums", minimums, "kept", grid.columns);
  requireWholeRows("values", grid);
  return minimumsMet(grid.values, least).map((met, row) => [grid.filled[row] === 0 ? "" : met]);
}

/**
 * Turns prices into points by the rule of proportion: the lowest price gets all the points, one twice as high gets half of them.
 *
 * Points × lowest / price. Common practice in tenders, no source: what the rules of the tender say comes first.
 *
 * @customfunction PRICE_POINTS
 * @param {any[][]} prices One price or a range of prices, all above 0. Blanks stay blank.
 * @param {any} points The points for the lowest price, above 0.
 * @param {any} [lowest] The price that gets all the points, above 0; a price below it is refused. Default: the smallest of the prices given.
 * @returns {any[][]} The points, in the shape of prices.
 * @caution Dropping one bid can reverse the order of others, because all points hang on the lowest price: write the lowest price down before bids are withdrawn.
 * @question How many points does each price get?
 * @example =WEIR.PRICE_POINTS({800;1000;1600},40) => [[40],[32],[20]]
 * @example =WEIR.PRICE_POINTS(905,25,655.25) => 18.10082872928177
 */
export function PRICE_POINTS(prices: any[][], points: any, lowest?: any): any {
  const grid = readGrid("prices", prices);
  const most = readPositive("points", points);
  const least = isBlank(lowest) ? undefined : readPositive("lowest", lowest);
  return gridCells(grid, pricePoints(grid.values, most, least).points);
}

/**
 * Tells how far weighted scores will spread: their standard deviation, from that of each criterion and their correlations.
 *
 * For criteria combined as by WEIGHTED_SCORE. Criteria that go together spread the combined score, criteria that pull against one another
 * narrow it: a mark set for one criterion's spread does not fit the combination.
 *
 * @customfunction COMPOSITE_SPREAD
 * @param {any[][]} weights One weight for each criterion, in a row or a column: 0 or above, not all 0.
 * @param {any[][]} sds The standard deviation of each criterion, above 0, in a row or a column, in the order of the weights.
 * @param {any[][]} correlations The table of correlations, a row and a column for each criterion: symmetric, 1 on the diagonal, and such that they can all hold at once.
 * @returns {any} The standard deviation of the weighted score.
 * @question How much do combined scores spread?
 * @example =WEIR.COMPOSITE_SPREAD({1,1},{3,4},{1,0;0,1}) => 2.5
 */
export function COMPOSITE_SPREAD(weights: any[][], sds: any[][], correlations: any[][]): any {
  const weight = readOneEach("weights", weights, "refused");
  const sd = readOneEach("sds", sds, "refused", weight.length);
  return compositeSpread(weight, sd, readSquare("correlations", correlations, weight.length)).spread;
}
