import { ratersNeeded } from "../core/method/ratersNeeded";
import { scoreReliability } from "../core/method/scoreReliability";
import { scoreValidity } from "../core/method/scoreValidity";
import { isBlank } from "../sheet/cell";
import { readFraction, readPositive } from "../sheet/readArgument";
import { readPairs } from "../sheet/readColumn";
import { readRatings } from "../sheet/readRatings";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import { addTable } from "./tableSteps";
import type { WorkingsCall } from "./workingsCall";

const SHROUT = "Shrout & Fleiss 1979";
const McGRAW = "McGraw & Wong 1996";
/** b, w, j, e: mean squares between entries, within them, between raters, residual. */
const SQUARES =
  "n,ROWS(r),k,COLUMNS(r),m,MMULT(r,SEQUENCE(k,1,1,0))/k,c,MMULT(SEQUENCE(1,n,1,0),r)/n,g,AVERAGE(r)," +
  "p,k*SUM((m-g)^2),q,n*SUM((c-g)^2),b,p/(n-1),w,(DEVSQ(r)-p)/(n*(k-1)),j,q/(k-1),e,(DEVSQ(r)-p-q)/((n-1)*(k-1))";
/** F quantile through the beta distribution: the host's own cuts degrees of freedom to whole numbers. */
const quantile = (d1: string, d2: string) => `LET(x,BETA.INV(t,(${d1})/2,(${d2})/2),(${d2})*x/((${d1})*(1-x)))`;
const single = (f: string) => `(${f}-1)/(${f}+k-1)`;
const panel = (f: string) => `(${f}-1)/${f}`;

export function SCORE_RELIABILITY(call: WorkingsCall): readonly Step[] {
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  const { values, raters } = readRatings("ratings", call.range("ratings"));
  const found = scoreReliability(values, raters, confidence);
  const squares = (answer: string) => `LET(r,${call.text("ratings")},${SQUARES},${answer})`;
  const limits = (answer: string) => `LET(t,(1-${call.text("confidence", "0.95")})/2,${squares(answer)})`;
  const one = [`b/w*${quantile("n*(k-1)", "n-1")}`, `b/w/${quantile("n-1", "n*(k-1)")}`];
  const fixed = [`b/e*${quantile("(n-1)*(k-1)", "n-1")}`, `b/e/${quantile("n-1", "(n-1)*(k-1)")}`];
  const two = "(b/e-1)/(b/e+k-1+k*(j/e-1)/n)";
  const degrees = `LET(s,${two},a,k*s*j/e,d,n*(1+(k-1)*s)-k*s,IF(a=0,(k-1)*(n-1),(k-1)*(n-1)*(a+d)^2/((n-1)*a^2+d^2)))`;
  const twoWay = (f: string) => `LET(v,${degrees},f,b/e*${f},n*(f-1)/(k*j/e+k*n-k-n+n*f))`;
  const [low, high] = [twoWay(quantile("v", "n-1")), twoWay(`1/${quantile("n-1", "v")}`)];
  const steppedUp = (limit: string) => `LET(h,${limit},k*h/(1+(k-1)*h))`;
  const formulas: Record<string, readonly [string, string, string, string]> = {
    "ICC(1,1)": [single("(b/w)"), ...both(single, one), SHROUT],
    "ICC(2,1)": [two, low, high, McGRAW],
    "ICC(3,1)": [single("(b/e)"), ...both(single, fixed), SHROUT],
    "ICC(1,k)": [panel("(b/w)"), ...both(panel, one), SHROUT],
    "ICC(2,k)": ["(b/e-1)/(b/e+(j/e-1)/n)", steppedUp(low), steppedUp(high), McGRAW],
    "ICC(3,k)": [panel("(b/e)"), ...both(panel, fixed), SHROUT],
  };
  const steps = new Steps()
    .add("entries", found.entries, `ROWS(${call.text("ratings")})`)
    .add("raters", found.raters, `COLUMNS(${call.text("ratings")})`)
    .add("mean square between entries", found.betweenEntries, squares("b"))
    .add("mean square within entries", found.withinEntries, squares("w"))
    .add("mean square between raters", found.betweenRaters, squares("j"))
    .add("residual mean square", found.residual, squares("e"))
    .add("degrees of freedom of the two-way limits", found.degreesTwoWay, squares(degrees), "Satterthwaite 1946");
  return addTable(steps, ["form", "reliability", "lower limit", "upper limit"], found.forms.length, (index) => {
    const { form, reliability, lower, upper } = found.forms[index]!;
    const [value, from, to, source] = formulas[form]!;
    const cell = (number: number | undefined, formula: string) =>
      number === undefined ? (["none"] as const) : ([number, formula, source] as const);
    return {
      name: form,
      cells: [[form], cell(reliability, squares(value)), cell(lower, limits(from)), cell(upper, limits(to))],
    };
  }).rows;
}

function both(form: (f: string) => string, [low, high]: readonly string[]): readonly [string, string] {
  return [`LET(f,${low},${form("f")})`, `LET(f,${high},${form("f")})`];
}

export function SCORE_VALIDITY(call: WorkingsCall): readonly Step[] {
  const before = isBlank(call.cell("unselected_sd"))
    ? undefined
    : readPositive("unselected_sd", call.cell("unselected_sd"));
  const [x, y] = readPairs("scores", call.range("scores"), "outcomes", call.range("outcomes"));
  const level = readFraction("confidence", call.cell("confidence"), 0.95);
  const { pairs, scoreSd, correlation, fisherZ, halfWidth, lower, upper, beforeSelection } = scoreValidity(
    x,
    y,
    level,
    before,
  );
  const [a, b] = [call.text("scores"), call.text("outcomes")];
  const r = `CORREL(${a},${b})`;
  // Only rows with both count.
  const count = `SUM(IF(${a}<"",IF(${b}<"",1,0),0))`;
  const sd = `STDEV.S(IF(${a}<"",IF(${b}<"",${a},""),""))`;
  const half = `NORM.S.INV((1+${call.text("confidence", "0.95")})/2)/SQRT(${count}-3)`;
  const k = `(${call.text("unselected_sd")}/${sd})`;
  const steps = new Steps()
    .add("standard deviation of the scores that have an outcome", scoreSd, sd)
    .add("Fisher's z of the correlation", fisherZ, `FISHER(${r})`, "Fisher 1921")
    .add("half the width of its interval", halfWidth, half)
    .add("pairs used", pairs, count)
    .add("correlation", correlation, r)
    .add("lower limit", lower, `FISHERINV(FISHER(${r})-${half})`)
    .add("upper limit", upper, `FISHERINV(FISHER(${r})+${half})`)
    .add(
      "correlation before selection",
      beforeSelection ?? "",
      beforeSelection === undefined ? "" : `LET(r,${r},k,${k},r*k/SQRT(1-r^2+r^2*k^2))`,
      beforeSelection === undefined ? "" : "Thorndike 1949, case 2",
    );
  return pickItem(steps.rows, 5, call.cell("item"));
}

export function RATERS_NEEDED(call: WorkingsCall): readonly Step[] {
  const { exact, raters } = ratersNeeded(
    readFraction("single_reliability", call.cell("single_reliability")),
    readFraction("target", call.cell("target")),
  );
  const [r, target] = [call.text("single_reliability"), call.text("target")];
  const formula = `${target}/(1-${target})*(1-${r})/${r}`;
  return new Steps()
    .add("raters before rounding up", exact, formula, "Spearman 1910; Brown 1910")
    .add("raters needed", raters, `MAX(1,ROUNDUP((${formula})*(1-1E-12),0))`).rows;
}
