import { criticalDeviate, extremeDeviates, LEAST_FOR_OUTLIERS } from "../core/sample/extremeDeviates";
import { fitCurve } from "../core/sample/fitCurve";
import { readCount, readFraction } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { readShape } from "../sheet/readShape";
import { fittedPowerCheck } from "./nativeFit";
import { countNative, orderedNative } from "./nativeScale";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const ROSNER = "Rosner 1983, generalised ESD test";
/** Removals laid out one by one; of more, the first ones and the last that counts. */
const MOST_REMOVALS = 20;
const LONGEST_FORMULA = 8000;

/** Answers for each score: the removals, what they come to, and the flag of the first score that is filled in. */
export function OUTLIER_FLAGS(call: WorkingsCall): readonly Step[] {
  const alpha = readFraction("alpha", call.cell("alpha"), 0.05);
  const shape = readShape(call.cell("shape"));
  const { sample } = readScores("scores", call.range("scores"), LEAST_FOR_OUTLIERS);
  const { count, sorted } = sample;
  const most = readCount("most", call.cell("most"), 1, undefined, Math.max(1, Math.floor(count / 10)));
  const curve = fitCurve("scores", sample, shape);
  const { outliers, deviates, upper, lowest, highest } = extremeDeviates(curve.scaled, most, alpha);
  const [range, alphaText] = [call.text("scores"), call.text("alpha", "0.05")];
  const ordered = orderedNative(range, shape, curve.power);
  const steps = new Steps();
  if (curve.powerFitted) steps.rows.push(fittedPowerCheck(range, curve, sample));
  const tenth = `MAX(1,INT(${countNative(range)}/10))`;
  steps.add("largest number of outliers to look for", most, call.text("most", tenth));

  const verdicts: string[] = [];
  const gone = { below: 0, above: 0 };
  for (let i = 0; i < most; i++) {
    const left = count - i;
    const remaining = trimmed(ordered, gone.below, i === 0 ? undefined : left);
    const isUpper = upper[i] === 1;
    if (isUpper) gone.above++;
    else gone.below++;
    if (i === MOST_REMOVALS)
      steps.add("removals worked alike and left out here, but for the last that counts", most - i);
    if (i >= MOST_REMOVALS && i !== outliers - 1) continue;
    const deviate = deviates[i]! > 0 ? deviateNative(remaining) : "";
    const critical = criticalNative(left, alphaText);
    const removal = `removal ${i + 1}`;
    steps
      .add(
        `${removal}: the score furthest out`,
        isUpper ? sorted[count - gone.above]! : sorted[gone.below - 1]!,
        furthestNative(remaining, range, isUpper, isUpper ? gone.above : gone.below),
      )
      .add(`${removal}: its distance from the mean in standard deviations`, deviates[i]!, deviate, ROSNER)
      .add(`${removal}: what that distance must exceed`, criticalDeviate(left, alpha), critical, ROSNER);
    verdicts.push(deviate === "" ? "0" : `IF(${deviate}>${critical},${i + 1},0)`);
  }
  const all = `MAX(${verdicts.join(",")})`;
  const laidOut = most <= MOST_REMOVALS && all.length < LONGEST_FORMULA;
  steps.add("outliers: the last removal whose distance exceeds it", outliers, laidOut ? all : "", ROSNER);

  // What the flag says where no removal counts: that there is no outlier at all.
  const none = laidOut ? `${all}>0` : "";
  const above = upper.subarray(0, outliers).reduce((sum, one) => sum + one, 0);
  const below = outliers - above;
  const { cell, text } = call.firstFilled("scores");
  const first = curve.toScale(Number(cell));
  const tests: string[] = [];
  if (below > 0) {
    steps.add("scores at or below this are outliers", sorted[below - 1]!, `SMALL(${range},${below})`);
    tests.push(`${text}<=SMALL(${range},${below})`);
  }
  if (above > 0) {
    steps.add("scores at or above this are outliers", sorted[count - above]!, `LARGE(${range},${above})`);
    tests.push(`${text}>=LARGE(${range},${above})`);
  }
  const formula = tests.length > 0 ? `OR(${tests.join(",")})` : none;
  return steps.add("flag of the first score", first <= lowest || first >= highest, formula).rows;
}

/** The scores left, in rising order, after so many have gone from the lower end; all of them where `left` is undefined. */
function trimmed(ordered: string, below: number, left: number | undefined): string {
  const rest = below > 0 ? `DROP(${ordered},${below})` : ordered;
  return left === undefined ? rest : `TAKE(${rest},${left})`;
}

function deviateNative(scores: string): string {
  return `LET(s,${scores},MAX(MAX(s)-AVERAGE(s),AVERAGE(s)-MIN(s))/STDEV.S(s))`;
}

function criticalNative(left: number, alpha: string): string {
  return `LET(t,T.INV.2T(${alpha}/${left},${left - 2}),${left - 1}*t/SQRT((${left - 2}+t^2)*${left}))`;
}

/** Between two ends equally far out the slack lets the choice stand, which rounding alone would make. */
function furthestNative(scores: string, range: string, isUpper: boolean, place: number): string {
  const [up, down] = ["MAX(s)-AVERAGE(s)", "AVERAGE(s)-MIN(s)"];
  return isUpper
    ? `LET(s,${scores},IF(${up}>=(${down})*(1-1E-9),LARGE(${range},${place}),"no"))`
    : `LET(s,${scores},IF(${down}>=(${up})*(1-1E-9),SMALL(${range},${place}),"no"))`;
}
