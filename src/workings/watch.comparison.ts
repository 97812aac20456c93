import { driftComparison } from "../core/method/driftComparison";
import { readScores } from "../sheet/readScores";
import { literal } from "./native";
import { countNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const WELCH = "Welch 1938, degrees of freedom by Satterthwaite 1946";
const FORSYTHE = "Brown & Forsythe 1974";
const SMIRNOV = "Smirnov 1939";
const PATHS = "Hodges 1958: paths counted, ties at distinct values only (Schröer & Trenkler 1995)";
const KOLMOGOROV = "Kolmogorov 1933, limiting law";
/** Scores in all up to which the distance is compared score by score with native formulas. */
const MOST_COMPARED = 5000;

export function DRIFT_COMPARISON(call: WorkingsCall): readonly Step[] {
  const before = readScores("baseline", call.range("baseline")).sample;
  const after = readScores("recent", call.range("recent")).sample;
  const { baseline, recent, welch, varianceRatio, brownForsythe, smirnov } = driftComparison(before, after);
  const [a, b] = [call.text("baseline"), call.text("recent")];
  const [n, m] = [countNative(a), countNative(b)];
  const shift = `AVERAGE(${b})-AVERAGE(${a})`;
  const error = `SQRT(VAR.S(${a})/${n}+VAR.S(${b})/${m})`;
  const degrees = `LET(v,VAR.S(${a})/${n},w,VAR.S(${b})/${m},(v+w)^2/(v^2/(${n}-1)+w^2/(${m}-1)))`;
  const tail = `LET(t,(${shift})/${error},f,${degrees},BETA.DIST(f/(f+t^2),f/2,0.5,TRUE))`;
  const forsythe = forsytheNative(a, b);
  const compared = before.count + after.count <= MOST_COMPARED;
  const distance = compared ? distanceNative(a, b) : "";
  const furthest = compared ? distance : literal(smirnov.distance);
  const steps = new Steps()
    .add("scores of the baseline", baseline.count, n)
    .add("recent scores", recent.count, m)
    .add("mean of the baseline", baseline.mean, `AVERAGE(${a})`)
    .add("mean of the recent scores", recent.mean, `AVERAGE(${b})`)
    .add("variance of the baseline", baseline.variance, `VAR.S(${a})`)
    .add("variance of the recent scores", recent.variance, `VAR.S(${b})`)
    .add("standard error of the shift", welch.standardError, error)
    .add("degrees of freedom of the shift", welch.degrees, degrees, WELCH)
    .add("median of the baseline", brownForsythe.medians[0], `MEDIAN(${a})`)
    .add("median of the recent scores", brownForsythe.medians[1], `MEDIAN(${b})`)
    .add("mean distance from the median, baseline", brownForsythe.meanDistances[0], meanDistanceNative(a))
    .add("mean distance from the median, recent scores", brownForsythe.meanDistances[1], meanDistanceNative(b));
  const { statistic, degreesWithin, pValue } = brownForsythe;
  if (statistic !== undefined)
    steps
      .add("Brown-Forsythe F, 1 degree of freedom between", statistic, forsythe, FORSYTHE)
      .add("its degrees of freedom within", degreesWithin, `${n}+${m}-2`);
  const law = smirnov.exact
    ? "exact law: not more than 10,000 pairs of scores"
    : "limiting law: more than 10,000 pairs";
  steps
    .add("law by which the distance is judged", law, "", smirnov.exact ? PATHS : KOLMOGOROV)
    .add("mean shift", welch.shift, shift)
    .add("Welch t", welch.t, `(${shift})/${error}`, WELCH)
    .add("Welch p-value", welch.pValue, tail, WELCH)
    .add("ratio of variances", varianceRatio, `VAR.S(${b})/VAR.S(${a})`)
    .add("Brown-Forsythe p-value", pValue ?? "", pValue === undefined ? "" : forsytheTail(forsythe, n, m), FORSYTHE)
    .add("Kolmogorov-Smirnov distance", smirnov.distance, distance, SMIRNOV)
    .add(
      "Kolmogorov-Smirnov p-value",
      smirnov.pValue,
      smirnov.exact ? pathsNative(a, b, furthest) : limitingNative(furthest, n, m),
      smirnov.exact ? PATHS : KOLMOGOROV,
    );
  return pickItem(steps.rows, 7, call.cell("item"));
}

function distancesNative(range: string): string {
  return `IF(${range}<"",ABS(${range}-MEDIAN(${range})),"")`;
}

function meanDistanceNative(range: string): string {
  return `AVERAGE(${distancesNative(range)})`;
}

function forsytheNative(a: string, b: string): string {
  const [n, m] = [countNative(a), countNative(b)];
  return (
    `LET(v,${distancesNative(a)},w,${distancesNative(b)},n,${n},m,${m},g,(SUM(v)+SUM(w))/(n+m),` +
    `(n*(AVERAGE(v)-g)^2+m*(AVERAGE(w)-g)^2)/((DEVSQ(v)+DEVSQ(w))/(n+m-2)))`
  );
}

function forsytheTail(statistic: string, n: string, m: string): string {
  return `F.DIST.RT(${statistic},1,${n}+${m}-2)`;
}

/** The largest difference of the two shares at or below a score, over all scores. */
function distanceNative(a: string, b: string): string {
  const share = (range: string) => `SUM(IF(${range}<"",IF(${range}<=v,1,0),0))/${countNative(range)}`;
  const at = (range: string) => `MAX(MAP(${range},LAMBDA(v,IF(v<"",ABS(${share(a)}-${share(b)}),0))))`;
  return `MAX(${at(a)},${at(b)})`;
}

/**
 * The chance that a random path from no score to all scores of both batches has been as far from the diagonal, row by row: a point is reached
 * from the left or from below, and counts as touched where the path is that far out and the next score is another.
 */
function pathsNative(a: string, b: string, distance: string): string {
  const column = (range: string) => `TOCOL(IF(${range}<"",${range}*1,NA()),3)`;
  return (
    `LET(n,${countNative(a)},m,${countNative(b)},g,ROUND((${distance})*n*m,0),z,SORT(VSTACK(${column(a)},${column(b)})),` +
    `l,REDUCE(SEQUENCE(1,m+1)*0,SEQUENCE(n+1,1,0),LAMBDA(p,i,SCAN(0,SEQUENCE(1,m+1,0),LAMBDA(q,j,IF(i+j=0,0,` +
    `IF(IF(ABS(i*m-j*n)>=g,IF(i+j=n+m,TRUE,INDEX(z,i+j)<>INDEX(z,i+j+1)),FALSE),1,` +
    `i/(i+j)*INDEX(p,1,j+1)+j/(i+j)*q)))))),INDEX(l,1,m+1))`
  );
}

function limitingNative(distance: string, n: string, m: string): string {
  return (
    `LET(x,${distance}*SQRT(${n}*${m}/(${n}+${m})),k,SEQUENCE(10),` +
    `IF(x<0.04,1,IF(x<1,1-SQRT(2*PI())/x*SUM(EXP(-((2*k-1)*PI()/x)^2/8)),2*SUM((-1)^(k-1)*EXP(-2*(k*x)^2)))))`
  );
}
