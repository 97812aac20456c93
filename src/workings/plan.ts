import { passingFractionLimits } from "../core/method/passingFractionLimits";
import { samplesForCutoffPrecision } from "../core/method/samplesForCutoffPrecision";
import { samplesForMeanPrecision } from "../core/method/samplesForMeanPrecision";
import { samplesForSdPrecision, samplesForVariancePrecision } from "../core/method/samplesForSdPrecision";
import { samplesForVarianceStandardError } from "../core/method/samplesForVarianceStandardError";
import { sdPrecision } from "../core/method/sdPrecision";
import { spreadCoverage } from "../core/method/spreadCoverage";
import { readCount, readFlag, readFraction, readPositive } from "../sheet/readArgument";
import { addPassingMarks } from "./factorSteps";
import { zNative } from "./markNative";
import { literal, noncentralTNative } from "./native";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const GREENWOOD = "Greenwood & Sandomire 1950: (n-1)s²/σ² is chi-square with n-1 degrees of freedom";
const OWEN = "Owen 1968: the mark of a normal sample has a noncentral t distribution";

export function SAMPLES_FOR_SD_PRECISION(call: WorkingsCall): readonly Step[] {
  const precision = readFraction("precision", call.cell("precision"));
  const found = samplesForSdPrecision(precision, readFraction("confidence", call.cell("confidence"), 0.95));
  return spreadSteps(call, found, (sign) => `(1${sign}${call.text("precision")})^2`);
}

export function SAMPLES_FOR_VARIANCE_PRECISION(call: WorkingsCall): readonly Step[] {
  const precision = readFraction("precision", call.cell("precision"));
  const found = samplesForVariancePrecision(precision, readFraction("confidence", call.cell("confidence"), 0.95));
  return spreadSteps(call, found, (sign) => `(1${sign}${call.text("precision")})`);
}

function spreadSteps(
  call: WorkingsCall,
  found: ReturnType<typeof samplesForSdPrecision>,
  bound: (sign: string) => string,
) {
  const { count, lowRatio, highRatio, below, above, covered } = found;
  const chance = (n: number) =>
    `CHISQ.DIST(${n - 1}*${bound("+")},${n - 1},TRUE)-CHISQ.DIST(${n - 1}*${bound("-")},${n - 1},TRUE)`;
  const confidence = call.text("confidence", "0.95");
  const steps = new Steps()
    .add("lowest variance ratio allowed", lowRatio, bound("-"))
    .add("highest variance ratio allowed", highRatio, bound("+"))
    .add("degrees of freedom at the answer", count - 1, `${count}-1`)
    .add("chance of falling below", below, `CHISQ.DIST(${count - 1}*${bound("-")},${count - 1},TRUE)`, GREENWOOD)
    .add("chance of coming out above", above, `CHISQ.DIST.RT(${count - 1}*${bound("+")},${count - 1})`, GREENWOOD)
    .add(`chance of lying within, from ${count} scores`, covered, chance(count), GREENWOOD);
  if (count > 2) {
    const less = spreadCoverage(count - 1, lowRatio, highRatio).covered;
    steps.add(`chance of lying within, from ${count - 1} scores: not enough`, less, chance(count - 1), GREENWOOD);
  }
  const fewer = count > 2 ? `,${chance(count - 1)}<${confidence}` : "";
  const check = `IF(AND(${chance(count)}>=${confidence}-1E-12${fewer}),${count},"no")`;
  return steps.add("smallest number of scores", count, check, "the first count that is enough").rows;
}

export function SAMPLES_FOR_VARIANCE_STANDARD_ERROR(call: WorkingsCall): readonly Step[] {
  const error = call.text("relative_error");
  const { count, degrees } = samplesForVarianceStandardError(
    readFraction("relative_error", call.cell("relative_error")),
  );
  return new Steps()
    .add(
      "degrees of freedom needed",
      degrees,
      `ROUNDUP(ROUND(2/${error}^2,9),0)`,
      "the standard error of s² is σ²√(2/(n-1)): Cramér 1946, 27.4",
    )
    .add("smallest number of scores", count, `ROUNDUP(ROUND(2/${error}^2,9),0)+1`).rows;
}

export function SAMPLES_FOR_MEAN_PRECISION(call: WorkingsCall): readonly Step[] {
  const sdKnown = readFlag("sd_known", call.cell("sd_known"), false);
  const assurance = call.isGiven("assurance") ? readFraction("assurance", call.cell("assurance")) : undefined;
  const found = samplesForMeanPrecision(
    readPositive("half_width", call.cell("half_width")),
    readPositive("sd", call.cell("sd")),
    readFraction("confidence", call.cell("confidence"), 0.95),
    sdKnown,
    assurance,
  );
  const { count, quantile, expectedHalfWidth, assured } = found;
  const [width, sd, confidence] = [call.text("half_width"), call.text("sd"), call.text("confidence", "0.95")];
  const quantileText = (n: number) =>
    sdKnown ? `NORM.S.INV((1+${confidence})/2)` : `T.INV((1+${confidence})/2,${n - 1})`;
  const widthText = (n: number) => `${quantileText(n)}*${sd}/SQRT(${n})`;
  const steps = new Steps()
    .add(
      sdKnown ? "normal quantile" : `Student quantile with ${count - 1} degrees of freedom`,
      quantile,
      quantileText(count),
    )
    .add(`half width expected from ${count} scores`, expectedHalfWidth, widthText(count));
  if (assured === undefined) {
    const first = sdKnown ? 1 : 2;
    const fewer = count > first ? `,${widthText(count - 1)}>${width}` : "";
    const check = `IF(AND(${widthText(count)}<=${width}*(1+1E-12)${fewer}),${count},"no")`;
    return steps.add("smallest number of scores", count, check, "the first count whose interval is narrow enough").rows;
  }
  const chance = (n: number) => `CHISQ.DIST(${n - 1}*(${width}/(${widthText(n)}))^2,${n - 1},TRUE)`;
  const wanted = call.text("assurance");
  const fewer = count > 2 ? `,${chance(count - 1)}<${wanted}` : "";
  return steps
    .add("chance that the realised interval is narrow enough", assured, chance(count), "Kupper & Hafner 1989")
    .add("smallest number of scores", count, `IF(AND(${chance(count)}>=${wanted}-1E-12${fewer}),${count},"no")`).rows;
}

export function SAMPLES_FOR_CUTOFF_PRECISION(call: WorkingsCall): readonly Step[] {
  const { count, z, highMark, lowMark, tooFew, tooMany, attained } = samplesForCutoffPrecision(
    readFraction("fraction", call.cell("fraction")),
    readFraction("low_fraction", call.cell("low_fraction")),
    readFraction("high_fraction", call.cell("high_fraction")),
    readFraction("confidence", call.cell("confidence"), 0.9),
  );
  const zText = `NORM.S.INV(1-${call.text("fraction")})`;
  const at = (mark: number, fraction: string) => {
    const shift = `NORM.S.INV(1-${fraction})*SQRT(${count})`;
    return noncentralTNative(`${zText}*SQRT(${count})`, String(count - 1), shift, count - 1, mark * Math.sqrt(count));
  };
  const [few, many] = [at(highMark, call.text("low_fraction")), at(lowMark, call.text("high_fraction"))];
  const confidence = call.text("confidence", "0.9");
  return new Steps()
    .add("z of the fraction", z, zText)
    .add(
      "where a mark stands that lets through the low fraction",
      highMark,
      `NORM.S.INV(1-${call.text("low_fraction")})`,
    )
    .add(
      "where a mark stands that lets through the high fraction",
      lowMark,
      `NORM.S.INV(1-${call.text("high_fraction")})`,
    )
    .add("chance that the mark lets through too few", tooFew, few, OWEN)
    .add("chance that the mark lets through too many", tooMany, `1-${many}`, OWEN)
    .add("chance of lying between", attained, `${many}-${few}`, OWEN)
    .add(
      "smallest number of scores",
      count,
      `IF(${many}-${few}>=${confidence}-1E-9,${count},"no")`,
      "check: this count is enough",
    ).rows;
}

export function SD_PRECISION(call: WorkingsCall): readonly Step[] {
  const { degrees, precision } = sdPrecision(
    readCount("count", call.cell("count"), 2),
    readFraction("confidence", call.cell("confidence"), 0.95),
  );
  const v = `(${call.text("count")}-1)`;
  const answer = literal(precision);
  const below = precision < 1 ? `-CHISQ.DIST(${v}*(1-${answer})^2,${v},TRUE)` : "";
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  return new Steps()
    .add("degrees of freedom", degrees, `${call.text("count")}-1`)
    .add(
      "check: chance of lying within the answer, must be the confidence",
      confidence,
      `CHISQ.DIST(${v}*(1+${answer})^2,${v},TRUE)${below}`,
      GREENWOOD,
    )
    .add("precision of the standard deviation", precision, "", GREENWOOD).rows;
}

export function CUTOFF_PRECISION(call: WorkingsCall): readonly Step[] {
  const count = readCount("count", call.cell("count"), 2);
  const limits = passingFractionLimits(
    count,
    readFraction("fraction", call.cell("fraction")),
    readFraction("confidence", call.cell("confidence"), 0.9),
  );
  const [n, fraction] = [call.text("count"), call.text("fraction")];
  const steps = new Steps()
    .add("z of the fraction", limits.z, zNative(fraction))
    .add("chance left out on either side", limits.alpha, `(1-${call.text("confidence", "0.9")})/2`);
  addPassingMarks(steps, limits, [n, fraction], count)
    .add("lowest passing fraction", limits.lowest, `NORM.S.DIST(-${literal(limits.highestMark)},TRUE)`)
    .add("highest passing fraction", limits.highest, `NORM.S.DIST(-${literal(limits.lowestMark)},TRUE)`);
  return pickItem(steps.rows, 2, call.cell("item"));
}
