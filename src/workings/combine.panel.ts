import { panelScores } from "../core/method/panelScores";
import { shareStandardError } from "../core/method/shareStandardError";
import { weightedScores } from "../core/method/weightedScores";
import { weightSway } from "../core/method/weightSway";
import { readCount, readFraction } from "../sheet/readArgument";
import { readGrid, readOneEach } from "../sheet/readGrid";
import { literal } from "./native";
import { firstEntry, weightedMeanNative } from "./nativeGrid";
import { countNative } from "./nativeScale";
import { Steps, type Step } from "./steps";
import { literalText, type WorkingsCall } from "./workingsCall";

const SEARLE = "Searle 1971, ch. 7: least squares for rating = entry + rater";
const GENERATOR = "xoshiro128++ seeded by SplitMix64 (Blackman & Vigna 2021)";
/** Up to so many raters the host solves the normal equations; up to so many a check holds the answer against them. */
const MOST_SOLVED = 20;
const MOST_CHECKED = 200;

/** Answers for each row: the raters' severities, and the first entry that somebody rated. */
export function PANEL_SCORE(call: WorkingsCall): readonly Step[] {
  const grid = readGrid("ratings", call.range("ratings"));
  const entry = firstEntry(call, grid, "ratings");
  if (!entry) return new Steps().add("a blank row stays blank", "").rows;
  const { ratingCount, raterEffects, scores } = panelScores(grid.values, grid.columns);
  const ratings = call.text("ratings");
  const raters = grid.columns;
  const solved = raters <= MOST_SOLVED ? severitiesNative(ratings, grid.rows, raters) : "";
  const known = literalText([Array.from(raterEffects, (effect) => (Number.isNaN(effect) ? 0 : effect))]);
  const steps = new Steps().add("ratings", ratingCount, countNative(ratings));
  raterEffects.slice(0, MOST_CHECKED).forEach((effect, j) => {
    if (Number.isNaN(effect)) steps.add(`rater ${j + 1}: no rating, left aside`, "");
    else steps.add(`rater ${j + 1}: severity`, effect, solved && `INDEX(${solved},${j + 1})`, SEARLE);
  });
  if (!solved && raters <= MOST_CHECKED) {
    const meaning = "check: largest sum of what the fit leaves of one rater's ratings, must be 0";
    steps.add(meaning, 0, remainderNative(ratings, grid.rows, raters, known), SEARLE);
  }
  const severities = solved ? `TRANSPOSE(${solved})` : raters <= MOST_CHECKED ? known : "";
  const mean = severities && `AVERAGE(IF(${entry.text}<"",${entry.text}-${severities},""))`;
  return steps.add("score of the first entry: mean of its ratings less severity", scores[entry.row], mean).rows;
}

/**
 * The raters' severities as a column: the normal equations that are left when the entries are eliminated, with the direction without an
 * answer (the same added to all) filled in, and a 1 on the diagonal for a rater without ratings.
 */
function severitiesNative(ratings: string, rows: number, raters: number): string {
  const [ones, entries] = [`SEQUENCE(${raters},1,1,0)`, `SEQUENCE(${rows},1,1,0)`];
  return (
    `LET(x,${ratings},u,IF(x<"",1,0),n,MMULT(u,${ones}),v,IF(n>0,1/n,0),m,MMULT(IF(x<"",x,0),${ones})*v,` +
    `d,MMULT(TRANSPOSE(IF(x<"",x-m,0)),${entries}),k,MMULT(TRANSPOSE(u),${entries}),p,IF(k>0,1,0),` +
    `a,IF(SEQUENCE(${raters})=SEQUENCE(1,${raters}),k+1-p,0)-MMULT(TRANSPOSE(u*v),u)+p*TRANSPOSE(p),MMULT(MINVERSE(a),d))`
  );
}

function remainderNative(ratings: string, rows: number, raters: number, severities: string): string {
  return (
    `LET(x,${ratings},u,IF(x<"",1,0),y,IF(x<"",x-${severities},0),n,MMULT(u,SEQUENCE(${raters},1,1,0)),` +
    `m,MMULT(y,SEQUENCE(${raters},1,1,0))*IF(n>0,1/n,0),MAX(ABS(MMULT(TRANSPOSE(IF(x<"",y-m,0)),SEQUENCE(${rows},1,1,0)))))`
  );
}

/** A simulation: what was played, how well it is known, and the share of the first entry that is filled in. */
export function WEIGHT_SWAY(call: WorkingsCall): readonly Step[] {
  const grid = readGrid("values", call.range("values"));
  const weights = readOneEach("weights", call.range("weights"), "refused", grid.columns);
  const present = grid.values.filter((value) => !Number.isNaN(value));
  const entry = firstEntry(call, grid)!;
  const spread = readFraction("spread", call.cell("spread"), 0.25);
  const runs = readCount("runs", call.cell("runs"), 1, undefined, 10_000);
  const seed = readCount("seed", call.cell("seed"), 0, undefined, 1);
  const [share] = weightSway(present, weights, readCount("top_count", call.cell("top_count")), spread, runs, seed);
  const entries = present.length / grid.columns;
  const [runsText, spreadText] = [call.text("runs", "10000"), call.text("spread", "0.25")];
  const { weightTotal, scores } = weightedScores(entry.values, weights);
  return new Steps()
    .add("entries ranked", entries, `${countNative(call.text("values"))}/${grid.columns}`)
    .add("sum of the weights as given", weightTotal, `SUM(${call.text("weights")})`)
    .add("score of the first entry at the weights as given", scores[0], weightedMeanNative(call, entry.text))
    .add("smallest factor of a weight", 1 - spread, `1-${spreadText}`)
    .add("largest factor of a weight", 1 + spread, `1+${spreadText}`)
    .add("runs", runs, runsText)
    .add("products added up", runs * present.length, `${runsText}*${countNative(call.text("values"))}`)
    .add("seed", seed, call.text("seed", "1"), GENERATOR)
    .add(
      "standard error of the share that follows, from so many runs",
      shareStandardError(share, runs),
      `SQRT(${literal(share)}*(1-${literal(share)})/${runsText})`,
      "variance of a binomial share",
    )
    .add("share of the runs in which the first entry is among the best", share, "", GENERATOR).rows;
}
