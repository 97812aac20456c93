import { compositeSpread } from "../core/method/compositeSpread";
import { minimumsMet } from "../core/method/minimumsMet";
import { pricePoints } from "../core/method/pricePoints";
import { weightedScores } from "../core/method/weightedScores";
import { isBlank } from "../sheet/cell";
import { readPositive } from "../sheet/readArgument";
import { readGrid, readOneEach, readSquare } from "../sheet/readGrid";
import { acrossNative, downNative, firstEntry, weightedMeanNative } from "./nativeGrid";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

/** Criteria whose minimum is shown one by one. */
const MOST_CRITERIA = 50;

/** Answers for each row: the first that is filled is worked. */
export function WEIGHTED_SCORE(call: WorkingsCall): readonly Step[] {
  const grid = readGrid("values", call.range("values"));
  const entry = firstEntry(call, grid);
  if (!entry) return blankEntry();
  const weights = readOneEach("weights", call.range("weights"), "refused", grid.columns);
  const { weightTotal, scores } = weightedScores(entry.values, weights);
  const mean = weightedMeanNative(call, entry.text);
  const steps = new Steps().add("sum of the weights", weightTotal, `SUM(${call.text("weights")})`);
  if (!call.isGiven("minimums")) return steps.add("score of the first entry", scores[0], mean).rows;
  const minimums = readOneEach("minimums", call.range("minimums"), "kept", grid.columns);
  const [met] = minimumsMet(entry.values, minimums);
  addMinimums(steps, call, entry, minimums);
  return steps
    .add("weighted mean of the first entry", scores[0], mean)
    .add("the first entry reaches all the minimums", met, allMetNative(call, entry.text))
    .add("score of the first entry", met ? scores[0] : "", `IF(${allMetNative(call, entry.text)},${mean},"")`).rows;
}

/** Answers for each row: the first that is filled is worked. */
export function MINIMUMS_MET(call: WorkingsCall): readonly Step[] {
  const grid = readGrid("values", call.range("values"));
  const entry = firstEntry(call, grid);
  if (!entry) return blankEntry();
  const minimums = readOneEach("minimums", call.range("minimums"), "kept", grid.columns);
  const steps = new Steps();
  addMinimums(steps, call, entry, minimums);
  const [met] = minimumsMet(entry.values, minimums);
  return steps.add("the first entry reaches all the minimums", met, allMetNative(call, entry.text)).rows;
}

function blankEntry(): readonly Step[] {
  return new Steps().add("a blank row stays blank", "").rows;
}

function addMinimums(
  steps: Steps,
  call: WorkingsCall,
  { row, values }: { row: number; values: Float64Array },
  minimums: Float64Array,
): void {
  const upright = call.range("minimums").length > 1;
  for (let j = 0; j < Math.min(minimums.length, MOST_CRITERIA); j++) {
    if (Number.isNaN(minimums[j])) continue;
    const [reached] = minimumsMet(values.subarray(j, j + 1), minimums.subarray(j, j + 1));
    const minimum = upright ? call.partText("minimums", j, 0) : call.partText("minimums", 0, j);
    steps.add(`criterion ${j + 1} reaches its minimum`, reached, `${call.partText("values", row, j)}>=${minimum}`);
  }
}

function allMetNative(call: WorkingsCall, entry: string): string {
  const minimums = acrossNative(call, "minimums");
  return `SUM(IF(${minimums}<"",IF(${entry}<${minimums},1,0),0))=0`;
}

/** Answers for each price: the first that is filled is worked. */
export function PRICE_POINTS(call: WorkingsCall): readonly Step[] {
  const { row, column, cell, text } = call.firstFilled("prices");
  if (typeof cell !== "number") return new Steps().add("a blank price stays blank", "").rows;
  const grid = readGrid("prices", call.range("prices"));
  const given = call.cell("lowest");
  const least = isBlank(given) ? undefined : readPositive("lowest", given);
  const { lowest, points } = pricePoints(grid.values, readPositive("points", call.cell("points")), least);
  const lowestText = call.text("lowest", `MIN(${call.text("prices")})`);
  return new Steps()
    .add("price that gets all the points", lowest, lowestText)
    .add(
      "points of the first price",
      points[row * grid.columns + column],
      `${call.text("points")}*${lowestText}/${text}`,
      "rule of proportion: common practice in tenders, no source",
    ).rows;
}

export function COMPOSITE_SPREAD(call: WorkingsCall): readonly Step[] {
  const weights = readOneEach("weights", call.range("weights"), "refused");
  const sds = readOneEach("sds", call.range("sds"), "refused", weights.length);
  const correlations = readSquare("correlations", call.range("correlations"), weights.length);
  const { weightTotal, variance, spread } = compositeSpread(weights, sds, correlations);
  const total = `SUM(${call.text("weights")})`;
  const parts = `${downNative(call, "weights")}*${downNative(call, "sds")}/${total}`;
  const varianceText = `LET(p,${parts},SUM(p*MMULT(${call.text("correlations")},p)))`;
  return new Steps()
    .add("sum of the weights", weightTotal, total)
    .add("variance of the weighted score", variance, `MAX(0,${varianceText})`, "variance of a sum of correlated parts")
    .add("standard deviation of the weighted score", spread, `SQRT(MAX(0,${varianceText}))`).rows;
}
