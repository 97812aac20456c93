/*
 * Long score columns: every function that takes one, against sorting the same scores as a Float64Array in the same run; the confidence of a
 * whole column against working each score out by itself, with the largest error; 10,000 small calls; and one column handed to several
 * functions. Milliseconds of processor time, the least of three: node bench/run.mjs columns
 */
import { noncentralTCdf } from "../src/core/distribution/noncentralTCdf";
import { noncentralTUpperTail } from "../src/core/distribution/noncentralTUpperTail";
import { clearanceConfidence } from "../src/core/method/clearanceConfidence";
import { normalDeviate } from "../src/core/numeric/normalDeviate";
import { SeededRandom } from "../src/core/numeric/seededRandom";
import { callFunction } from "../src/functions/call";
import type { Argument } from "../src/sheet/invoke";

const clock = () => process.cpuUsage().user / 1000;
const timed = (work: () => unknown) => {
  const started = clock();
  work();
  return clock() - started;
};
const least = (measure: () => number) => Math.min(measure(), measure(), measure());
const ms = (time: number) => (time < 10 ? time.toFixed(1) : time.toFixed(0));

let seed = 0;
/** A new column each time: one that was seen before is remembered. */
function column(rows: number): number[][] {
  const random = new SeededRandom(++seed);
  return Array.from({ length: rows }, () => [60 + 8 * normalDeviate(random)]);
}

const CALLS: readonly [name: string, given: (scores: number[][]) => Argument[]][] = [
  ["SCORE_SUMMARY", (scores) => [scores]],
  ["SCORE_CURVE", (scores) => [scores]],
  ["NORMALITY_CHECK", (scores) => [scores, "anderson-darling"]],
  ["OUTLIER_FLAGS", (scores) => [scores, 10]],
  ["SHAPE_RANKING", (scores) => [scores]],
  ["GATED_CURVE", (scores) => [scores, 0, 5000]],
  ["TAIL_FRACTION", (scores) => [scores, 60, 8]],
  ["TOP_FRACTION_CUTOFF", (scores) => [scores, 0.05]],
  ["CUTOFF_LIMITS", (scores) => [scores, 0.05]],
  ["SAFE_CUTOFF", (scores) => [scores, 0.05]],
  ["NEXT_SCORE_CUTOFF", (scores) => [scores, 0.05]],
  ["RANK_CUTOFF", (scores) => [scores, 0.05]],
  ["GATED_CUTOFF_LIMITS", (scores) => [scores, 0, 5000, 0.05]],
  ["CLEARANCE_CONFIDENCE", (scores) => [scores, scores, 0.05]],
  ["CUTOFF_VERDICT", (scores) => [scores, 70, 75]],
  ["CUTOFF_REPORT", (scores) => [scores, 0.05]],
  ["CUTOFF_REPORT, lognormal", (scores) => [scores, 0.05, 0.95, "lognormal"]],
  ["CUTOFF_REPORT, boxcox", (scores) => [scores, 0.05, 0.95, "boxcox"]],
];

const sorting = (rows: number) =>
  least(() => {
    const scores = Float64Array.from(column(rows), ([score]) => score!);
    return timed(() => scores.sort());
  });

const SIZES = [100_000, 1_048_576] as const;
const sorts = SIZES.map(sorting);
console.log(`sorting ${SIZES[0]} scores takes ${ms(sorts[0]!)} ms, a full column ${ms(sorts[1]!)} ms`);
console.log("\n| function | 100,000 scores, ms | times sorting | a full column, ms | times sorting |");
console.log("|---|---|---|---|---|");
for (const [label, given] of CALLS) {
  const name = label.split(",")[0]!;
  const cells = SIZES.flatMap((rows, i) => {
    const time = least(() => {
      const call = given(column(rows));
      return timed(() => {
        const outcome = callFunction(name, call);
        if (!outcome || "error" in outcome) throw new Error(`${label}: ${outcome?.message ?? "no such function"}`);
      });
    });
    return [ms(time), (time / sorts[i]!).toFixed(1)];
  });
  console.log(`| ${label} | ${cells.join(" | ")} |`);
}

/** The whole column by one curve, against the distribution itself for each of some scores of it. */
const scores = column(100_000).map(([score]) => score!);
const SOME = 2000;
const whole = timed(() => {
  const { confidence } = clearanceConfidence(60, 60, 8, 0.05, "high");
  for (const score of scores) confidence(score);
});
const { confidence, standing, noncentrality } = clearanceConfidence(60, 60, 8, 0.05, "high");
const root = Math.sqrt(60);
const single = timed(() => {
  for (let i = 0; i < SOME; i++) noncentralTCdf(standing(scores[i]!) * root, 59, noncentrality);
});
let worst = 0;
for (let i = 0; i < SOME; i++) {
  const t = standing(scores[i]!) * root;
  const [got, cdf] = [confidence(scores[i]!), noncentralTCdf(t, 59, noncentrality)];
  worst = Math.max(
    worst,
    Math.abs(got / cdf - 1),
    Math.abs((1 - got) / noncentralTUpperTail(t, 59, noncentrality) - 1) * (cdf < 0.99 ? 1 : 0),
  );
}
const each = (single / SOME) * scores.length;
console.log(
  `\nCLEARANCE_CONFIDENCE of 100,000 scores: ${ms(whole)} ms as one curve, ${ms(each)} ms score by score, ${(each / whole).toFixed(0)} times as long;`,
);
console.log(`largest relative difference between the two ${worst.toExponential(1)}`);

const calls = least(() =>
  timed(() => {
    for (let i = 0; i < 10_000; i++) callFunction("TAIL_FRACTION", [60 + i / 1000, 60, 8]);
  }),
);
console.log(`10,000 cells of TAIL_FRACTION: ${ms(calls)} ms in all`);

const shared = column(100_000);
const first = timed(() => callFunction("CUTOFF_REPORT", [shared, 0.05]));
const copy = shared.map(([score]) => [score!]);
const again = timed(() => {
  callFunction("SAFE_CUTOFF", [copy, 0.01]);
  callFunction("SCORE_SUMMARY", [copy]);
  callFunction("RANK_CUTOFF", [copy, 0.05]);
});
console.log(
  `one column of 100,000: CUTOFF_REPORT first ${ms(first)} ms; SAFE_CUTOFF, SCORE_SUMMARY and RANK_CUTOFF on a copy after it ${ms(again)} ms together`,
);
