import { chanceTrueScoreClears } from "../core/method/chanceTrueScoreClears";
import { cutoffErrorRates } from "../core/method/cutoffErrorRates";
import { guardedCutoff } from "../core/method/guardedCutoff";
import { MARK_METHODS } from "../core/method/markFactor";
import { scoreErrorSd } from "../core/method/scoreErrorSd";
import { trueTopAmongPassed } from "../core/method/trueTopAmongPassed";
import { worthAmongPassed } from "../core/method/worthAmongPassed";
import { isBlank } from "../sheet/cell";
import {
  readBetter,
  readBetween,
  readCount,
  readFraction,
  readNumber,
  readPositive,
  readWord,
} from "../sheet/readArgument";
import { aboveTrueMarkNative } from "./factorSteps";
import { halfLineNative } from "./halfLineNative";
import { literal } from "./native";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const TAYLOR = "Taylor & Russell 1939: bivariate normal";
const JCGM = "JCGM 106:2012: normal prior, normal error";
const zText = (fraction: string) => `NORM.S.INV(1-${fraction})`;

export function CUTOFF_ERROR_RATES(call: WorkingsCall): readonly Step[] {
  const count = readCount("count", call.cell("count"), 2);
  const method = readWord("method", call.cell("method"), MARK_METHODS, "plain");
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  const found = cutoffErrorRates(count, readFraction("fraction", call.cell("fraction")), method, confidence);
  const { trueMark, factor, passingFraction, wronglyPassed, wronglyMissed, passedNotTop, topMissed } = found;
  const [n, p] = [call.text("count"), call.text("fraction")];
  const factorText =
    method === "plain" ? zText(p) : method === "next" ? `T.INV(1-${p},${n}-1)*SQRT(1+1/${n})` : literal(factor);
  const steps = new Steps()
    .add("the true mark, in deviations of the true curve", trueMark, zText(p))
    .add("factor of the mark set from the scores", factor, method === "safe" ? "" : factorText);
  if (method === "safe") {
    const above = aboveTrueMarkNative(factor, n, zText(p), { count, z: trueMark });
    steps.add("check: chance that this mark is safe, must be the confidence", confidence, above, "Owen 1968");
  }
  const passing = `T.DIST.RT((${factorText})/SQRT(1+1/${n}),${n}-1)`;
  steps
    .add(
      "share of all entries that pass without being truly top",
      wronglyPassed,
      "",
      "Owen 1968: noncentral t, integrated over the true curve",
    )
    .add(
      "share of all entries that are truly top without passing",
      wronglyMissed,
      "",
      "Owen 1968: noncentral t, integrated over the true curve",
    )
    .add(
      "check: the one less the other less (average passing fraction − fraction), must be 0",
      0,
      `(${literal(wronglyPassed)}-${literal(wronglyMissed)})-(${passing}-${p})`,
      "what passes is what is top, less the missed, plus the wrongly passed",
    )
    .add("average passing fraction", passingFraction, passing, "the next score against the mark is Student's t")
    .add("passed but not truly top", passedNotTop, `${literal(wronglyPassed)}/${passing}`)
    .add("truly top but missed", topMissed, `${literal(wronglyMissed)}/${p}`);
  return pickItem(steps.rows, 3, call.cell("item"));
}

export function TRUE_TOP_AMONG_PASSED(call: WorkingsCall): readonly Step[] {
  const validity = readBetween("validity", call.cell("validity"), -1, 1);
  const { trueMark, passMark, passedAndTop, share } = trueTopAmongPassed(
    readFraction("true_fraction", call.cell("true_fraction")),
    readFraction("pass_fraction", call.cell("pass_fraction")),
    validity,
  );
  const [top, pass, r] = [call.text("true_fraction"), call.text("pass_fraction"), call.text("validity")];
  const joint =
    validity === 1
      ? `MIN(${top},${pass})`
      : validity === -1
        ? `MAX(0,${top}+${pass}-1)`
        : halfLineNative(
            zText(pass),
            `NORM.S.DIST(a,FALSE)*NORM.S.DIST((${r}*a-${zText(top)})/SQRT(1-${r}*${r}),TRUE)`,
          );
  return new Steps()
    .add("mark of the truly top, in standard units", trueMark, zText(top))
    .add("mark of the passed, in standard units", passMark, zText(pass))
    .add("share of all entries that pass and are truly top", passedAndTop, joint, TAYLOR)
    .add("share of the passed who are truly top", share, `${joint}/${pass}`, TAYLOR).rows;
}

export function WORTH_AMONG_PASSED(call: WorkingsCall): readonly Step[] {
  const { passMark, meanScore, meanWorth } = worthAmongPassed(
    readFraction("pass_fraction", call.cell("pass_fraction")),
    readBetween("validity", call.cell("validity"), -1, 1),
  );
  const pass = call.text("pass_fraction");
  const score = `NORM.S.DIST(${zText(pass)},FALSE)/${pass}`;
  return new Steps()
    .add("mark of the passed, in standard units", passMark, zText(pass))
    .add("mean score of the passed, in standard units", meanScore, score)
    .add(
      "their mean true worth, in standard units",
      meanWorth,
      `${call.text("validity")}*${score}`,
      "Naylor & Shine 1965",
    ).rows;
}

export function CHANCE_TRUE_SCORE_CLEARS(call: WorkingsCall): readonly Step[] {
  const better = readBetter(call.cell("better"));
  const score = call.firstFilled("score");
  if (isBlank(score.cell)) return new Steps().add("chance that the true score clears: a blank stays blank", "").rows;
  const { reliability, expectedTrue, remainingSd, standardGap, chance } = chanceTrueScoreClears(
    readNumber("score", score.cell),
    readNumber("limit", call.cell("limit")),
    readPositive("error_sd", call.cell("error_sd")),
    readNumber("mean", call.cell("mean")),
    readPositive("true_sd", call.cell("true_sd")),
    better,
  );
  const [e, m, t, limit] = [call.text("error_sd"), call.text("mean"), call.text("true_sd"), call.text("limit")];
  const kept = `${t}^2/(${t}^2+${e}^2)`;
  const expected = `${m}+${kept}*(${score.text}-${m})`;
  const remaining = `${t}*${e}/SQRT(${t}^2+${e}^2)`;
  const gap = better === "low" ? `(${expected}-${limit})/(${remaining})` : `(${limit}-(${expected}))/(${remaining})`;
  return new Steps()
    .add("share of a score's distance from the mean that is kept", reliability, kept, JCGM)
    .add("true score to be expected", expectedTrue, expected, JCGM)
    .add("standard deviation that remains", remainingSd, remaining, JCGM)
    .add("distance of the limit, in that deviation", standardGap, gap)
    .add("chance that the true score clears the limit", chance, `NORM.S.DIST(-(${gap}),TRUE)`, JCGM).rows;
}

export function GUARDED_CUTOFF(call: WorkingsCall): readonly Step[] {
  const better = readBetter(call.cell("better"));
  const maxWrong = readFraction("max_wrong", call.cell("max_wrong"), 0.05);
  const { scoreSd, riskWithoutMark, standardMark, cutoff } = guardedCutoff(
    readNumber("limit", call.cell("limit")),
    readPositive("error_sd", call.cell("error_sd")),
    readNumber("mean", call.cell("mean")),
    readPositive("true_sd", call.cell("true_sd")),
    maxWrong,
    better,
  );
  const [e, m, t, limit] = [call.text("error_sd"), call.text("mean"), call.text("true_sd"), call.text("limit")];
  const beyond = better === "low" ? `(${m}-${limit})` : `(${limit}-${m})`;
  const spread = `SQRT(${t}^2+${e}^2)`;
  const mark = literal(standardMark);
  // Given a score a deviations above the mean, the true score is normal about t²/s·a with deviation t·e/s.
  const wrong = halfLineNative(
    mark,
    `NORM.S.DIST(a,FALSE)*NORM.S.DIST((${beyond}*${spread}-${t}^2*a)/(${t}*${e}),TRUE)`,
  );
  return new Steps()
    .add("standard deviation of the scores", scoreSd, spread)
    .add("risk without any mark", riskWithoutMark, `NORM.S.DIST(${beyond}/${t},TRUE)`)
    .add("the mark in standard deviations of the scores", standardMark, "", JCGM)
    .add(
      "check: risk among those who pass it, must be max_wrong",
      maxWrong,
      `${wrong}/NORM.S.DIST(-${mark},TRUE)`,
      JCGM,
    )
    .add("guarded cutoff", cutoff, `${m}${better === "low" ? "-" : "+"}${spread}*${mark}`).rows;
}

export function SCORE_ERROR_SD(call: WorkingsCall): readonly Step[] {
  const error = scoreErrorSd(
    readPositive("sd", call.cell("sd")),
    readBetween("reliability", call.cell("reliability"), 0, 1),
  );
  const formula = `${call.text("sd")}*SQRT(1-${call.text("reliability")})`;
  return new Steps().add("standard error of a score", error, formula, "Gulliksen 1950: classical test theory").rows;
}
