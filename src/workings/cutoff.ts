import { knownCurve, requireOnScale } from "../core/method/markCurve";
import { nextScoreCutoff } from "../core/method/nextScoreCutoff";
import { plainCutoff } from "../core/method/plainCutoff";
import { safeCutoff } from "../core/method/safeCutoff";
import { toleranceFactor } from "../core/method/toleranceFactor";
import { twoSidedFactor } from "../core/method/twoSidedFactor";
import { readBetter, readCount, readFraction, readNumber, readPositive } from "../sheet/readArgument";
import { aboveTrueMarkNative } from "./factorSteps";
import { addCurve, markNative, OWEN, signedNative, zNative } from "./markNative";
import { literal } from "./native";
import { countNative } from "./nativeScale";
import { readCurve } from "./readCurve";
import { Steps, type Step } from "./steps";
import { twoSidedNative } from "./twoSidedNative";
import type { WorkingsCall } from "./workingsCall";

const WHITMORE = "Whitmore 1986: prediction limit for one observation";

export function TOP_FRACTION_CUTOFF(call: WorkingsCall): readonly Step[] {
  const { range, sample, curve } = readCurve(call);
  const better = readBetter(call.cell("better"));
  const { z, cutoff } = plainCutoff(curve, readFraction("fraction", call.cell("fraction")), better);
  const zText = zNative(call.text("fraction"));
  const mark = markNative(range, curve, signedNative(zText, better));
  return addCurve(new Steps(), range, curve, sample)
    .add("z of the fraction", z, zText)
    .add("cutoff", requireOnScale("cutoff", cutoff), mark).rows;
}

export function CURVE_CUTOFF(call: WorkingsCall): readonly Step[] {
  const curve = knownCurve(2, readNumber("mean", call.cell("mean")), readPositive("sd", call.cell("sd")));
  const better = readBetter(call.cell("better"));
  const { z, cutoff } = plainCutoff(curve, readFraction("fraction", call.cell("fraction")), better);
  const zText = zNative(call.text("fraction"));
  return new Steps()
    .add("z of the fraction", z, zText)
    .add("cutoff", cutoff, `${call.text("mean")}${signedNative(zText, better)}*${call.text("sd")}`).rows;
}

export function SAFE_CUTOFF(call: WorkingsCall): readonly Step[] {
  const { range, sample, curve } = readCurve(call);
  const better = readBetter(call.cell("better"));
  const fraction = readFraction("fraction", call.cell("fraction"));
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  const { count, z, noncentrality, factor, cutoff } = safeCutoff(curve, fraction, confidence, better);
  const [n, zText] = [countNative(range), zNative(call.text("fraction"))];
  return addCurve(new Steps(), range, curve, sample)
    .add("z of the fraction", z, zText)
    .add("noncentrality: z times the square root of the count", noncentrality, `${zText}*SQRT(${n})`, OWEN)
    .add("factor, in standard deviations from the mean", factor, "", OWEN)
    .add(
      "check: chance that this factor leads beyond the true mark, must be the confidence",
      confidence,
      aboveTrueMarkNative(factor, n, zText, { count, z }),
      OWEN,
    )
    .add("safe cutoff", cutoff, markNative(range, curve, signedNative(literal(factor), better))).rows;
}

export function NEXT_SCORE_CUTOFF(call: WorkingsCall): readonly Step[] {
  const { range, sample, curve } = readCurve(call);
  const better = readBetter(call.cell("better"));
  const { t, factor, cutoff } = nextScoreCutoff(curve, readFraction("fraction", call.cell("fraction")), better);
  const n = countNative(range);
  const tText = `-T.INV(${call.text("fraction")},${n}-1)`;
  const factorText = `${tText}*SQRT(1+1/${n})`;
  return addCurve(new Steps(), range, curve, sample)
    .add("Student quantile of the fraction", t, tText)
    .add("factor, in standard deviations from the mean", factor, factorText, WHITMORE)
    .add("next-score cutoff", cutoff, markNative(range, curve, signedNative(factorText, better)), WHITMORE).rows;
}

export function TOLERANCE_FACTOR(call: WorkingsCall): readonly Step[] {
  const count = readCount("count", call.cell("count"), 2);
  const coverage = readFraction("coverage", call.cell("coverage"));
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  const [n, share, trust] = [call.text("count"), call.text("coverage"), call.text("confidence", "0.95")];
  if (readCount("sides", call.cell("sides"), 1, 2, 1) === 2) {
    const { start, factor } = twoSidedFactor(count, coverage, confidence);
    // With 1 degree of freedom not every host can invert the chi-square this far down; it is a squared normal.
    const spread = count === 2 ? `NORM.S.INV(1-${trust}/2)^2` : `CHISQ.INV(1-${trust},${n}-1)`;
    const howe = `NORM.S.INV((1+${share})/2)*SQRT((1+1/${n})*(${n}-1)/${spread})`;
    return new Steps()
      .add("approximation from which the search for the factor starts", start, howe, "Howe 1969")
      .add(
        "check: chance that the factor below holds the coverage, must be the confidence",
        confidence,
        twoSidedNative(factor, [n, share], { count, coverage }),
        "Eberhardt, Mee & Reeve 1989; ISO 16269-6",
      )
      .add("factor k, two-sided", factor, "", "Eberhardt, Mee & Reeve 1989; ISO 16269-6").rows;
  }
  const { z, noncentrality, quantile, factor } = toleranceFactor(count, coverage, confidence);
  const zText = `NORM.S.INV(${share})`;
  return new Steps()
    .add("z of the coverage", z, zText)
    .add("noncentrality: z times the square root of the count", noncentrality, `${zText}*SQRT(${n})`, OWEN)
    .add("noncentral t quantile at the confidence", quantile, "", OWEN)
    .add(
      "check: chance that the noncentral t stays below it, must be the confidence",
      confidence,
      aboveTrueMarkNative(factor, n, zText, { count, z }),
      OWEN,
    )
    .add("factor k, one-sided", factor, `${literal(quantile)}/SQRT(${n})`, OWEN).rows;
}
