import { gatedCutoffLimits } from "../core/method/gatedCutoffLimits";
import { readCount, readFraction, readNumber } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { zNative } from "./markNative";
import { literal } from "./native";
import { countNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const COHEN = "Cohen 1959: normal curve censored at one point";
const MEEKER = "Meeker & Escobar 1998, ch. 8: limits by profile likelihood";
/** Below this many deviations the host's Φ is 0, and its logarithm no number. */
const LOWEST_GATE = -35;

export function GATED_CUTOFF_LIMITS(call: WorkingsCall): readonly Step[] {
  const { sample } = readScores("scores", call.range("scores"));
  const below = readCount("below_count", call.cell("below_count"), 0);
  const found = gatedCutoffLimits(
    sample,
    readNumber("gate", call.cell("gate")),
    below,
    readFraction("fraction", call.cell("fraction")),
    readFraction("confidence", call.cell("confidence"), 0.95),
  );
  const { entries, gateScore, mean, sd, z, logLikelihood, allowed } = found;
  const zText = zNative(call.text("fraction"));
  const curve = curveNative(call, literal(mean), literal(sd));
  const computes = (score: number, formula: string) => (below === 0 || score > LOWEST_GATE ? formula : "");
  const steps = new Steps()
    .add("scored", entries.scored, countNative(call.text("scores")))
    .add("below the gate", below, call.text("below_count"))
    .add("mean of the curve of all entries", mean, "", COHEN)
    .add("standard deviation of that curve", sd, "", COHEN)
    .add(
      "check: slope of the log-likelihood in the mean, per score, must be 0",
      0,
      computes(gateScore, curve("(AVERAGE(x)-m)/s-b/n*h")),
      COHEN,
    )
    .add(
      "check: slope of the log-likelihood in the deviation, per score, must be 0",
      0,
      computes(gateScore, curve("q-1-b/n*h*g")),
      COHEN,
    )
    .add("log-likelihood of that curve", logLikelihood, computes(gateScore, curve(LOG_LIKELIHOOD)), COHEN)
    .add("z of the fraction", z, zText)
    .add(
      "by how much twice the log-likelihood may fall: chi-square quantile, 1 degree of freedom",
      allowed,
      `CHISQ.INV(${call.text("confidence", "0.95")},1)`,
      MEEKER,
    );
  const { lowerLimit, upperLimit, lowerSd, upperSd } = found;
  for (const [name, limit, spread] of [
    ["lower", lowerLimit, lowerSd],
    ["upper", upperLimit, upperSd],
  ] as const) {
    const score = (entries.gate - limit) / spread + z;
    const at = curveNative(call, `${literal(limit)}-z*${literal(spread)}`, literal(spread));
    steps
      .add(`deviation of the likeliest curve whose mark stands at the ${name} limit`, spread, "", MEEKER)
      .add(
        `check: slope of the log-likelihood along the curves whose mark stands there, per score, must be 0`,
        0,
        computes(score, at("q-1-b/n*h*g-z*((AVERAGE(x)-m)/s-b/n*h)")),
        MEEKER,
      )
      .add(
        `check: fall of twice the log-likelihood at the ${name} limit, must be what is allowed`,
        allowed,
        computes(score, at(`2*(${literal(logLikelihood)}-(${LOG_LIKELIHOOD}))`)),
        MEEKER,
      );
  }
  steps
    .add("lower limit", lowerLimit, "", MEEKER)
    .add("cutoff", found.cutoff, `${literal(mean)}${zText}*${literal(sd)}`)
    .add("upper limit", upperLimit, "", MEEKER);
  return pickItem(steps.rows, 3, call.cell("item"));

  /** A formula about one normal curve: x the scores, n of them, b below the gate, g the gate in deviations, h φ/Φ there, q mean square in deviations. */
  function curveNative(at: WorkingsCall, m: string, s: string): (body: string) => string {
    const gate = below === 0 ? "h,0,g,0" : `g,(${at.text("gate")}-m)/s,h,NORM.S.DIST(g,FALSE)/NORM.S.DIST(g,TRUE)`;
    const range = at.text("scores");
    const start =
      `LET(x,${range},n,${countNative(range)},b,${at.text("below_count")},z,${zNative(at.text("fraction"))},m,${m},s,${s},` +
      `q,(DEVSQ(x)/n+(AVERAGE(x)-m)^2)/s^2,${gate}`;
    return (body) => `${start},${below === 0 ? body.replace("b*LN(NORM.S.DIST(g,TRUE))", "0") : body})`;
  }
}

const LOG_LIKELIHOOD = "b*LN(NORM.S.DIST(g,TRUE))-n*(LN(s)+q/2)";
