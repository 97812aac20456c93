import { andersonDarling, type AndersonDarling } from "../core/sample/andersonDarling";
import type { Curve } from "../core/sample/curve";
import { curveLikelihood, type CurveLikelihood } from "../core/sample/curveLikelihood";
import { fitCurve } from "../core/sample/fitCurve";
import type { Sample } from "../core/sample/sample";
import { scoreSummary } from "../core/sample/scoreSummary";
import { shapeText } from "../core/sample/shape";
import { LEAST_FOR_RANKING, shapeRanking } from "../core/sample/shapeRanking";
import { isBlank } from "../sheet/cell";
import { readNumber } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import * as native from "./nativeFit";
import { countNative, scaleNative, shiftedNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import { addTable, type TableCell } from "./tableSteps";
import type { WorkingsCall } from "./workingsCall";

const HYNDMAN = "Hyndman & Fan 1996, definition 7";
const JOANES = "Joanes & Gill 1998: adjusted for small samples";
const LIKELIHOOD = "Box & Cox 1964: the likelihood of the scores themselves";
const AICC = "Hurvich & Tsai 1989: 2k - 2 log-likelihood + 2k(k+1)/(n-k-1)";
const STEPHENS = "D'Agostino & Stephens 1986, table 4.9";

export function SCORE_SUMMARY(call: WorkingsCall): readonly Step[] {
  const { sample, blanks } = readScores("scores", call.range("scores"));
  const summary = scoreSummary("scores", sample);
  const range = call.text("scores");
  const { skewness = "", excessKurtosis = "" } = summary;
  const steps = new Steps()
    .add("sum of squared distances from the mean", summary.sumOfSquares, `DEVSQ(${range})`)
    .add("scores used", summary.count, countNative(range))
    .add("blanks skipped", blanks, `SUM(IF(${range}<"",0,1))`)
    .add("mean", summary.mean, `AVERAGE(${range})`)
    .add("standard deviation", summary.sd, `STDEV.S(${range})`)
    .add("standard error of the mean", summary.meanError, `STDEV.S(${range})/SQRT(${countNative(range)})`)
    .add("minimum", summary.minimum, `MIN(${range})`)
    .add("lower quartile", summary.lowerQuartile, `PERCENTILE.INC(${range},0.25)`, HYNDMAN)
    .add("median", summary.median, `MEDIAN(${range})`)
    .add("upper quartile", summary.upperQuartile, `PERCENTILE.INC(${range},0.75)`, HYNDMAN)
    .add("maximum", summary.maximum, `MAX(${range})`)
    .add("skewness", skewness, skewness === "" ? "" : `SKEW(${range})`, JOANES)
    .add("excess kurtosis", excessKurtosis, excessKurtosis === "" ? "" : `KURT(${range})`, JOANES);
  return pickItem(steps.rows, 12, call.cell("item"));
}

export function SCORE_CURVE(call: WorkingsCall): readonly Step[] {
  const shape = readShape(call.cell("shape"));
  const { sample } = readScores("scores", call.range("scores"));
  const curve = fitCurve("scores", sample, shape);
  const likelihood = curveLikelihood(sample, curve);
  const range = call.text("scores");
  const { statistic, adjusted, pValue } = andersonDarling(curve.scaled);
  const distance = native.andersonDarlingNative(range, curve);
  const steps = new Steps();
  addFit(steps, [range, sample], curve, likelihood, "");
  if (pValue !== undefined && !curve.powerFitted)
    steps.add("adjusted Anderson-Darling statistic", adjusted, native.adjustedNative(range, distance), STEPHENS);
  steps
    .add("shape", shapeText(shape))
    .add("scores used", curve.count, countNative(range))
    .add("curve mean", curve.shownMean, `AVERAGE(${scaleNative(range, shape, curve.power)})`)
    .add("curve standard deviation", curve.shownSd, `STDEV.S(${shiftedNative(range, shape, curve.power)})`)
    .add("power", curve.power ?? "")
    .add("log-likelihood", likelihood.logLikelihood, logLikelihoodNative(range, curve), LIKELIHOOD)
    .add("AICc", likelihood.aicc ?? "", aiccNative(range, curve, likelihood), AICC)
    .add("Anderson-Darling statistic", statistic, distance, STEPHENS)
    .add("Anderson-Darling p-value", ...pValueCell(range, curve, andersonDarling(curve.scaled)));
  return pickItem(steps.rows, 9, call.cell("item"));
}

/** Headed: shape, AICc, AICc difference, Anderson-Darling p-value. */
export function SHAPE_RANKING(call: WorkingsCall): readonly Step[] {
  const [low, high] = [call.cell("low"), call.cell("high")];
  const bounds =
    isBlank(low) || isBlank(high) ? undefined : { low: readNumber("low", low), high: readNumber("high", high) };
  const { sample } = readScores("scores", call.range("scores"), LEAST_FOR_RANKING);
  const ranked = shapeRanking("scores", sample, bounds);
  const range = call.text("scores");
  const steps = new Steps();
  for (const { shape, curve, likelihood } of ranked) {
    addFit(steps, [range, sample], curve, likelihood, `${shapeText(shape)}: `);
    const meaning = `${shapeText(shape)}: log-likelihood`;
    steps.add(meaning, likelihood.logLikelihood, logLikelihoodNative(range, curve), LIKELIHOOD);
  }
  const aicc = ranked.map(({ curve, likelihood }) => aiccNative(range, curve, likelihood));
  const headings = ["shape", "AICc", "AICc difference", "Anderson-Darling p-value"];
  return addTable(steps, headings, ranked.length, (i) => {
    const one = ranked[i]!;
    const cells: TableCell[] = [
      [shapeText(one.shape)],
      [one.aicc, aicc[i], AICC],
      [one.difference, `${aicc[i]}-(${aicc[0]})`],
      pValueCell(range, one.curve, andersonDarling(one.curve.scaled)),
    ];
    return { name: `rank ${i + 1}`, cells };
  }).rows;
}

/** What the log-likelihood of one shape is made of. */
function addFit(
  steps: Steps,
  [range, sample]: [string, Sample],
  curve: Curve,
  likelihood: CurveLikelihood,
  prefix: string,
) {
  if (curve.powerFitted) {
    const check = native.fittedPowerCheck(range, curve, sample);
    steps.rows.push({ ...check, meaning: prefix + check.meaning });
  }
  const { logVariance, logJacobian, parameters } = likelihood;
  steps
    .add(
      `${prefix}logarithm of the variance on the scale of the shape, divisor n`,
      logVariance,
      native.logVarianceNative(range, curve),
    )
    .add(
      `${prefix}sum of the logarithms of the slope of that scale at each score`,
      logJacobian,
      native.logJacobianNative(range, curve),
    )
    .add(`${prefix}parameters estimated`, parameters);
}

function logLikelihoodNative(range: string, curve: Curve): string {
  const variance = native.logVarianceNative(range, curve);
  const jacobian = curve.shape.kind === "normal" ? "" : `+${native.logJacobianNative(range, curve)}`;
  return `-${countNative(range)}/2*(LN(2*PI())+1+${variance})${jacobian}`;
}

function aiccNative(range: string, curve: Curve, { aicc, parameters: k }: CurveLikelihood): string {
  if (aicc === undefined) return "";
  return `${2 * k}-2*(${logLikelihoodNative(range, curve)})+${2 * k * (k + 1)}/(${countNative(range)}-${k + 1})`;
}

/** "" where the test has no p-value: below 8 scores, and with a fitted power, since it knows two estimates and not three. */
function pValueCell(range: string, curve: Curve, { pValue, adjusted }: AndersonDarling): TableCell {
  if (pValue === undefined || curve.powerFitted) return [""];
  const statistic = native.adjustedNative(range, native.andersonDarlingNative(range, curve));
  return [pValue, native.andersonDarlingTailNative(statistic, adjusted), STEPHENS];
}
