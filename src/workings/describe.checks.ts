import { tailFraction } from "../core/method/tailFraction";
import { andersonDarling, LEAST_FOR_ANDERSON_DARLING } from "../core/sample/andersonDarling";
import type { Sample } from "../core/sample/sample";
import { NORMAL } from "../core/sample/shape";
import { SHAPIRO_WILK_LEAST, shapiroWilk } from "../core/sample/shapiroWilk";
import { readBetter, readNumber, readPositive, readWord } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { adjustedNative, andersonDarlingNative, andersonDarlingTailNative } from "./nativeFit";
import { lackOfThreeNative, shapiroWilkNative } from "./nativeShapiroWilk";
import { countNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const STEPHENS = "D'Agostino & Stephens 1986, table 4.9";
const ROYSTON = "Royston 1995, AS R94";
const SHAPIRO = "Shapiro & Wilk 1965: three scores have an exact law";

export function NORMALITY_CHECK(call: WorkingsCall): readonly Step[] {
  const royston = readWord("test", call.cell("test"), ["shapiro-wilk", "anderson-darling"], "shapiro-wilk");
  const range = call.text("scores");
  const least = royston === "shapiro-wilk" ? SHAPIRO_WILK_LEAST : LEAST_FOR_ANDERSON_DARLING;
  const { sample } = readScores("scores", call.range("scores"), least);
  const steps = royston === "shapiro-wilk" ? shapiroWilkSteps(range, sample) : andersonDarlingSteps(range, sample);
  return pickItem(steps.add("scores used", sample.count, countNative(range)).rows, 3, call.cell("item"));
}

function andersonDarlingSteps(range: string, sample: Sample): Steps {
  const { statistic, adjusted, pValue } = andersonDarling(sample);
  const distance = andersonDarlingNative(range, { shape: NORMAL });
  const adjustment = adjustedNative(range, distance);
  return new Steps()
    .add("mean", sample.mean, `AVERAGE(${range})`)
    .add("standard deviation", sample.sd, `STDEV.S(${range})`)
    .add("statistic adjusted for the number of scores", adjusted, adjustment, STEPHENS)
    .add("statistic", statistic, distance, STEPHENS)
    .add("p-value", pValue, andersonDarlingTailNative(adjustment, adjusted), STEPHENS);
}

function shapiroWilkSteps(range: string, sample: Sample): Steps {
  const found = shapiroWilk(sample);
  const steps = new Steps().add("sum of squared distances from the mean", sample.sumOfSquares, `DEVSQ(${range})`);
  if (sample.count === 3) {
    const lack = lackOfThreeNative(range);
    return steps
      .add("what the statistic lacks of 1", found.lack, lack)
      .add("statistic", found.statistic, `1-(${lack})`)
      .add("p-value", found.pValue, `MIN(MAX(1-6/PI()*ASIN(SQRT(MAX(0,${lack}))),0),1)`, SHAPIRO);
  }
  const native = shapiroWilkNative(range, sample.count);
  steps
    .add("sum of squares of the normal scores expected of so many", found.expectedSquares, native.expectedSquares)
    .add(
      "weight of the highest score (that of the lowest is its opposite)",
      found.lastWeight,
      native.lastWeight,
      ROYSTON,
    );
  if (found.nextWeight !== undefined)
    steps.add("weight of the second highest score", found.nextWeight, native.nextWeight, ROYSTON);
  steps.add("what the statistic lacks of 1", found.lack, native.lack, ROYSTON);
  let tail = "";
  if (found.normalised) {
    const { transformed, mean, sd, z } = found.normalised;
    const scale = sample.count > 11 ? "ln(1 - W)" : "-ln(bound - ln(1 - W))";
    const standing = `(${native.transformed}-${native.mean})/${native.sd}`;
    steps
      .add(`${scale}, which is about normal`, transformed, native.transformed, ROYSTON)
      .add("its mean where the scores are normal", mean, native.mean, ROYSTON)
      .add("its standard deviation where the scores are normal", sd, native.sd, ROYSTON)
      .add("how many standard deviations above its mean", z, standing);
    tail = `NORM.S.DIST(-(${standing}),TRUE)`;
  }
  return steps
    .add("statistic", found.statistic, `1-${native.lack}`, ROYSTON)
    .add("p-value", found.pValue, tail, ROYSTON);
}

/** Answers for each cutoff: the first that is filled is worked. */
export function TAIL_FRACTION(call: WorkingsCall): readonly Step[] {
  const { cell, text } = call.firstFilled("cutoff");
  if (typeof cell !== "number") return new Steps().add("a blank cutoff stays blank", "").rows;
  const better = readBetter(call.cell("better"));
  const mean = readNumber("mean", call.cell("mean"));
  const { z, fraction } = tailFraction(cell, mean, readPositive("sd", call.cell("sd")), better);
  const standing = `(${text}-${call.text("mean")})/${call.text("sd")}`;
  const steps = new Steps();
  if (Number.isFinite(z)) steps.add("standard deviations above the mean", z, standing);
  return better === "low"
    ? steps.add("fraction at or below the cutoff", fraction, `NORM.S.DIST(${standing},TRUE)`).rows
    : steps.add("fraction at or above the cutoff", fraction, `NORM.S.DIST(-(${standing}),TRUE)`).rows;
}
