import type { Better } from "../core/method/better";
import { cutoffLimits, type CutoffLimits } from "../core/method/cutoffLimits";
import { knownCurve } from "../core/method/markCurve";
import { rankCutoff } from "../core/method/rankCutoff";
import { readBetter, readCount, readFraction, readNumber, readPositive } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { addLimitFactors } from "./factorSteps";
import { addCurve, markNative, signedNative, zNative } from "./markNative";
import { literal } from "./native";
import { countNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { readCurve } from "./readCurve";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

export function CUTOFF_LIMITS(call: WorkingsCall): readonly Step[] {
  const { range, sample, curve } = readCurve(call);
  const limits = cutoffLimits(curve, ...readAsked(call));
  const steps = addCurve(new Steps(), range, curve, sample);
  addLimits(steps, call, countNative(range), limits, (factor) => markNative(range, curve, factor));
  return pickItem(steps.rows, 3, call.cell("item"));
}

export function CURVE_CUTOFF_LIMITS(call: WorkingsCall): readonly Step[] {
  const count = readCount("count", call.cell("count"), 2);
  const curve = knownCurve(count, readNumber("mean", call.cell("mean")), readPositive("sd", call.cell("sd")));
  const limits = cutoffLimits(curve, ...readAsked(call));
  const mark = (factor: string) => `${call.text("mean")}${factor}*${call.text("sd")}`;
  const steps = new Steps();
  addLimits(steps, call, call.text("count"), limits, mark);
  return pickItem(steps.rows, 3, call.cell("item"));
}

function readAsked(call: WorkingsCall): [fraction: number, confidence: number, better: Better] {
  return [
    readFraction("fraction", call.cell("fraction")),
    readFraction("confidence", call.cell("confidence"), 0.95),
    readBetter(call.cell("better")),
  ];
}

function addLimits(
  steps: Steps,
  call: WorkingsCall,
  count: string,
  limits: CutoffLimits,
  mark: (factor: string) => string,
): void {
  const better = readBetter(call.cell("better"));
  addLimitFactors(steps, limits, [count, call.text("fraction"), call.text("confidence", "0.95")]);
  const ends = [limits.nearFactor, limits.farFactor].map((factor) => mark(signedNative(literal(factor), better)));
  if (better === "low") ends.reverse();
  steps
    .add("lower limit", limits.lowerLimit, ends[0])
    .add("cutoff", limits.cutoff, mark(signedNative(zNative(call.text("fraction")), better)))
    .add("upper limit", limits.upperLimit, ends[1]);
}

const BINOMIAL = "David & Nagaraja 2003, 7.1: how many scores lie beyond the true mark is binomial";

export function RANK_CUTOFF(call: WorkingsCall): readonly Step[] {
  const [fraction, confidence, better] = readAsked(call);
  const { sample } = readScores("scores", call.range("scores"));
  const found = rankCutoff(sample, fraction, confidence, better);
  const { count, nearRank, farRank, nearTail, farTail } = found;
  const [range, share] = [call.text("scores"), call.text("fraction")];
  const n = countNative(range);
  const left = `(1-${call.text("confidence", "0.95")})/2`;
  const allowed = `${left}*(1+1E-12)`;
  /** P(at least as many scores beyond the true mark), and P(at most so many). */
  const atLeast = (rank: number) => `1-BINOM.DIST(${rank - 1},${n},${share},TRUE)`;
  const atMost = (rank: number) => `BINOM.DIST(${rank},${n},${share},TRUE)`;
  const best = (rank: number) => `${better === "low" ? "SMALL" : "LARGE"}(${range},${rank})`;

  const steps = new Steps()
    .add("scores used", count, n)
    .add("place of the cutoff, counted from the best score", found.place, `1+(${n}-1)*${share}`, HYNDMAN)
    .add("chance left out on either side", found.alpha, left);
  const closer = nearRank === undefined || nearRank === 1 ? "" : `,${atLeast(nearRank - 1)}>${allowed}`;
  const nearCheck =
    nearRank === undefined
      ? `IF(${share}^${n}>${allowed},"none","no")`
      : `IF(AND(${atLeast(nearRank)}<=${allowed}${closer}),${nearRank},"no")`;
  steps
    .add("rank of the near limit, counted from the best score", nearRank ?? "none", nearCheck, BINOMIAL)
    .add("chance that the true mark lies before it", nearTail, nearRank ? atLeast(nearRank) : "", BINOMIAL);
  const further = farRank === count ? "" : `,${atMost(farRank ?? 0)}>${allowed}`;
  const farCheck =
    farRank === undefined
      ? `IF((1-${share})^${n}>${allowed},"none","no")`
      : `IF(AND(${atMost(farRank - 1)}<=${allowed}${further}),${farRank},"no")`;
  steps
    .add("rank of the far limit, counted from the best score", farRank ?? "none", farCheck, BINOMIAL)
    .add("chance that the true mark lies beyond it", farTail, farRank ? atMost(farRank - 1) : "", BINOMIAL);

  const ends = [nearRank, farRank].map((rank) => (rank === undefined ? "" : best(rank)));
  if (better === "low") ends.reverse();
  const tails = [nearRank ? `-(${atLeast(nearRank)})` : "", farRank ? `-${atMost(farRank - 1)}` : ""];
  const below = better === "low" ? share : `1-${share}`;
  steps
    .add("lower limit", found.lowerLimit ?? "none", ends[0])
    .add("cutoff", found.cutoff, `PERCENTILE.INC(${range},${below})`, HYNDMAN)
    .add("upper limit", found.upperLimit ?? "none", ends[1])
    .add("actual confidence", found.actualConfidence, `1${tails.join("")}`, BINOMIAL);
  return pickItem(steps.rows, 4, call.cell("item"));
}

const HYNDMAN = "Hyndman & Fan 1996, definition 7";
