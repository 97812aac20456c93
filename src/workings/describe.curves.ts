import { combinedCurve } from "../core/sample/combinedCurve";
import { gatedCurve } from "../core/sample/gatedCurve";
import { readCount, readNotNegative, readNumber } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { literal } from "./native";
import { countNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const COHEN = "Cohen 1959: normal curve censored at one point";
const INFORMATION = "second derivatives of Cohen's log-likelihood";
const CHAN = "Chan, Golub & LeVeque 1983";
/** Below this many deviations the host's Φ is 0, and φ/Φ no number. */
const LOWEST_GATE = -35;

export function GATED_CURVE(call: WorkingsCall): readonly Step[] {
  const { sample } = readScores("scores", call.range("scores"));
  const below = readCount("below_count", call.cell("below_count"), 0);
  const found = gatedCurve(sample, readNumber("gate", call.cell("gate")), below);
  const { entries, gateScore, pull, mean, sd, information, meanError, sdError } = found;
  const [range, gate] = [call.text("scores"), call.text("gate")];
  const computes = gateScore > LOWEST_GATE;
  // No name in LET may be r or c, which Excel keeps for rows and columns.
  const start =
    `LET(n,${countNative(range)},b,${call.text("below_count")},z,${literal(gateScore)},m,NORM.S.DIST(z,FALSE)/NORM.S.DIST(z,TRUE),` +
    `y,b/n*m,d,AVERAGE(${range})-${gate},s,d/(y-z),`;
  const inner = `${start}k,m*(z+m),h,d/s+z,q,STDEV.P(${range})^2/s^2+h^2,e,n+b*k,f,2*n*h-b*(m-z*k),g,n*(3*q-1)-b*(2*m*z-z^2*k),`;
  const from = (text: string, result: string) => (computes ? `${text}${result})` : "");
  const equation = `(STDEV.P(${range})^2*(y-z)^2-d^2*(1-y*(y-z)))/(STDEV.P(${range})^2+d^2)`;
  const steps = new Steps()
    .add("mean of the scores", entries.average, `AVERAGE(${range})`)
    .add("its distance from the gate", entries.distance, `AVERAGE(${range})-${gate}`)
    .add("standard deviation of the scores, divisor n", entries.spread, `STDEV.P(${range})`);
  if (below === 0) {
    const direct = `-(AVERAGE(${range})-${gate})/STDEV.P(${range})`;
    steps.add("the gate in standard deviations from the mean", gateScore, direct);
  } else {
    steps
      .add("the gate in standard deviations from the mean", gateScore, "", COHEN)
      .add("check: the likelihood equation at that gate, must be 0", 0, from(start, equation), COHEN);
  }
  steps
    .add("how far the mean lies below that of the scores, in standard deviations", pull, from(start, "y"), COHEN)
    .add("information on the mean, times the variance", information.inMean, from(inner, "e"), INFORMATION)
    .add("information on mean and deviation together, times the variance", information.mixed, "", INFORMATION)
    .add("information on the deviation, times the variance", information.inSd, from(inner, "g"), INFORMATION)
    .add("scored", entries.scored, countNative(range))
    .add("below the gate", below, call.text("below_count"))
    .add("mean", mean, from(start, `AVERAGE(${range})-y*s`), COHEN)
    .add("standard deviation", sd, from(start, "s"), COHEN)
    .add("standard error of the mean", meanError, from(inner, "s*SQRT(g/(e*g-f^2))"), INFORMATION)
    .add("standard error of the standard deviation", sdError, from(inner, "s*SQRT(e/(e*g-f^2))"), INFORMATION);
  return pickItem(steps.rows, 6, call.cell("item"));
}

export function COMBINED_CURVE(call: WorkingsCall): readonly Step[] {
  const batch = (i: 1 | 2) => ({
    count: readCount(`count_${i}`, call.cell(`count_${i}`), 2),
    mean: readNumber(`mean_${i}`, call.cell(`mean_${i}`)),
    sd: readNotNegative(`sd_${i}`, call.cell(`sd_${i}`)),
  });
  const { count, apart, mean, sd } = combinedCurve(batch(1), batch(2));
  const [n, m] = [call.text("count_1"), call.text("count_2")];
  const distance = `${call.text("mean_2")}-${call.text("mean_1")}`;
  const within = `(${n}-1)*${call.text("sd_1")}^2+(${m}-1)*${call.text("sd_2")}^2`;
  const between = `(${distance})^2*${n}*${m}/(${n}+${m})`;
  const steps = new Steps()
    .add("distance of the two means", apart, distance)
    .add("count", count, `${n}+${m}`)
    .add("mean", mean, `${call.text("mean_1")}+(${distance})*${m}/(${n}+${m})`, CHAN)
    .add("standard deviation", sd, `SQRT((${within}+${between})/(${n}+${m}-1))`, CHAN);
  return pickItem(steps.rows, 3, call.cell("item"));
}
