import { clearanceConfidence } from "../core/method/clearanceConfidence";
import { cutoffReport } from "../core/method/cutoffReport";
import { cutoffVerdict } from "../core/method/cutoffVerdict";
import { readBetter, readFraction } from "../sheet/readArgument";
import { readLimit } from "../sheet/readLimit";
import { estimatedMarkNative } from "./estimatedMarkNative";
import { aboveTrueMarkNative, addLimitFactors, addPassingMarks } from "./factorSteps";
import { addCurve, addFittedPower, markNative, OWEN, signedNative, zNative } from "./markNative";
import { literal, noncentralTNative } from "./native";
import { adjustedNative, andersonDarlingNative, andersonDarlingTailNative } from "./nativeFit";
import { countNative, scaleNative, shiftedNative } from "./nativeScale";
import { pickItem } from "./pickItem";
import { readCurve, readNormalCurve } from "./readCurve";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const STEPHENS = "D'Agostino & Stephens 1986, table 4.9";
const GEISSER = "Geisser 1993: 1-E[Φ(T)^looks], T the estimated mark on the true curve";

export function CLEARANCE_CONFIDENCE(call: WorkingsCall): readonly Step[] {
  const { cell: score, text } = call.firstFilled("score");
  const { range, sample, curve } = readNormalCurve(call);
  const better = readBetter(call.cell("better"));
  const fraction = readFraction("fraction", call.cell("fraction"));
  const { z, noncentrality, standing, confidence } = clearanceConfidence(
    curve.count,
    curve.mean,
    curve.sd,
    fraction,
    better,
  );
  if (typeof score !== "number") return new Steps().add("no score to judge", "").rows;
  const [n, zText] = [countNative(range), zNative(call.text("fraction"))];
  const distance = better === "low" ? `(AVERAGE(${range})-${text})` : `(${text}-AVERAGE(${range}))`;
  const k = `${distance}/STDEV.S(${range})`;
  const chance = noncentralTNative(`${k}*SQRT(${n})`, `${n}-1`, `${zText}*SQRT(${n})`, curve.count - 1, noncentrality);
  return addCurve(new Steps(), range, curve, sample)
    .add("z of the fraction", z, zText)
    .add("noncentrality: z times the square root of the count", noncentrality, `${zText}*SQRT(${n})`, OWEN)
    .add("standard deviations by which the first score lies beyond the mean", standing(score), k)
    .add("confidence that the first score lies beyond the true mark", confidence(score), chance, OWEN).rows;
}

export function CUTOFF_VERDICT(call: WorkingsCall): readonly Step[] {
  const { cell: score, text } = call.firstFilled("score");
  const lower = readLimit("lower_limit", call.cell("lower_limit"), -Infinity);
  const upper = readLimit("upper_limit", call.cell("upper_limit"), Infinity);
  const better = readBetter(call.cell("better"));
  const verdict = cutoffVerdict(lower, upper, better);
  if (typeof score !== "number") return new Steps().add("no score to judge", "").rows;
  const [near, far] = better === "low" ? ["upper_limit", "lower_limit"] : ["lower_limit", "upper_limit"];
  const [beyond, before] = better === "low" ? ["<=", ">"] : [">=", "<"];
  // "none" would be compared as a text, which is above every number.
  const isNone = (limit: string) => !Number.isFinite(limit === "lower_limit" ? lower : upper);
  const close = '"too close to call"';
  const short = isNone(near) ? close : `IF(${text}${before}${call.text(near)},"falls short",${close})`;
  const formula = isNone(far) ? short : `IF(${text}${beyond}${call.text(far)},"clears",${short})`;
  return new Steps()
    .add("first score", score, text)
    .add("far limit: a score at or beyond it clears", isNone(far) ? "none" : call.cell(far), call.text(far))
    .add("near limit: a score before it falls short", isNone(near) ? "none" : call.cell(near), call.text(near))
    .add("verdict on the first score", verdict(score), formula).rows;
}

export function CUTOFF_REPORT(call: WorkingsCall): readonly Step[] {
  const { range, sample, blanks, curve } = readCurve(call);
  const better = readBetter(call.cell("better"));
  const fraction = readFraction("fraction", call.cell("fraction"));
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  const report = cutoffReport(sample, curve, fraction, confidence, better);
  const { limits, safe, normality, normalityP, passingFractions } = report;
  const { shape, power, count } = curve;
  const [n, share, zText] = [countNative(range), call.text("fraction"), zNative(call.text("fraction"))];
  const mark = (factor: string) => markNative(range, curve, signedNative(factor, better));
  const adjusted = adjustedNative(range, andersonDarlingNative(range, curve));

  const steps = addFittedPower(new Steps(), range, curve, sample);
  addLimitFactors(steps, limits, [n, share, call.text("confidence", "0.95")])
    .add("factor of the safe cutoff, in standard deviations from the mean", safe.factor, "", OWEN)
    .add(
      "check: chance that it leads beyond the true mark, must be the confidence",
      confidence,
      aboveTrueMarkNative(safe.factor, n, zText, { count, z: limits.z }),
      OWEN,
    );
  if (normalityP !== undefined)
    steps.add("adjusted Anderson-Darling statistic", normality.adjusted, adjusted, STEPHENS);
  addPassingMarks(steps, passingFractions, [n, share], count);
  const ends = [limits.nearFactor, limits.farFactor].map((factor) => mark(literal(factor)));
  if (better === "low") ends.reverse();
  const reached = `IF(x${better === "low" ? "<=" : ">="}${literal(limits.cutoff)},1,0)`;
  const looks = (chance: number, found: number) => {
    const value = found === Infinity ? "more than 9E+15" : found;
    return [value, found === Infinity ? "" : looksNative([zText, n], limits, chance, found), GEISSER] as const;
  };
  steps
    .add("scores used", sample.count, n)
    .add("blanks skipped", blanks, `SUM(IF(${range}<"",0,1))`)
    .add("curve mean", curve.shownMean, `AVERAGE(${scaleNative(range, shape, power)})`)
    .add("curve standard deviation", curve.shownSd, `STDEV.S(${shiftedNative(range, shape, power)})`)
    .add(
      "Anderson-Darling p-value",
      normalityP ?? "",
      normalityP === undefined ? "" : andersonDarlingTailNative(adjusted, normality.adjusted),
      STEPHENS,
    )
    .add("cutoff", limits.cutoff, mark(zText))
    .add("lower limit", limits.lowerLimit, ends[0])
    .add("upper limit", limits.upperLimit, ends[1])
    .add("safe cutoff", safe.cutoff, mark(literal(safe.factor)))
    .add("passing now", report.passing, `SUM(MAP(${range},LAMBDA(x,IF(ISNUMBER(x),${reached},0))))`)
    .add(
      "lowest passing fraction",
      passingFractions.lowest,
      `NORM.S.DIST(-${literal(passingFractions.highestMark)},TRUE)`,
    )
    .add(
      "highest passing fraction",
      passingFractions.highest,
      `NORM.S.DIST(-${literal(passingFractions.lowestMark)},TRUE)`,
    )
    .add("looks for a 50% chance", ...looks(0.5, report.looksForHalf))
    .add("looks for a 90% chance", ...looks(0.9, report.looksForMost));
  return pickItem(steps.rows, 14, call.cell("item"));
}

/** The check that these looks are enough for the chance and one fewer is not, where the host can tell them apart. */
function looksNative(
  texts: readonly [string, string],
  { z, count }: { z: number; count: number },
  chance: number,
  looks: number,
): string {
  const within = (m: number) => `1-SUM(w*b^${m})/SUM(w)`;
  const fewer = looks > 1 && looks < 1e7 ? `,${within(looks - 1)}<${chance}` : "";
  const body = `IF(AND(${within(looks)}>=${chance}-1E-9${fewer}),${looks},"no")`;
  return estimatedMarkNative(texts, { k: z, count, trials: looks }, body);
}
