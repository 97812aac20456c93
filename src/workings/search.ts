import { curveHitChance } from "../core/method/curveHitChance";
import { expectedTrials } from "../core/method/expectedTrials";
import { hitChance } from "../core/method/hitChance";
import { searchDuration } from "../core/method/searchDuration";
import { trialsForHitChance } from "../core/method/trialsForHitChance";
import { readBetter, readCount, readFraction, readNumber, readPositive } from "../sheet/readArgument";
import { estimatedMarkNative } from "./estimatedMarkNative";
import { hitChanceNative, hitChanceSource } from "./hitNative";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

export function EXPECTED_TRIALS_TO_HIT(call: WorkingsCall): readonly Step[] {
  const trials = expectedTrials(readFraction("fraction", call.cell("fraction")), readHits(call));
  const formula = `${call.text("hits", "1")}/${call.text("fraction")}`;
  return new Steps().add("expected number of looks", trials, formula, "mean of the negative binomial distribution")
    .rows;
}

export function TRIALS_FOR_HIT_CHANCE(call: WorkingsCall): readonly Step[] {
  const fraction = readFraction("fraction", call.cell("fraction"));
  const asked = readFraction("chance", call.cell("chance"));
  const hits = readHits(call);
  const { trials, chance, chanceBefore } = trialsForHitChance(fraction, asked, hits);
  const within = (looks: number, at: number) =>
    hitChanceNative([call.text("fraction"), String(looks), call.text("hits", "1")], {
      trials: looks,
      hits,
      chance: at,
    });
  const [enough, less] = [within(trials, chance), within(trials - 1, chanceBefore)];
  const steps = new Steps().add(`chance of the hits within ${trials} looks`, chance, enough, hitChanceSource(chance));
  if (trials > hits) {
    const meaning = `chance of the hits within ${trials - 1} looks: not enough`;
    steps.add(meaning, chanceBefore, less, hitChanceSource(chanceBefore));
  }
  const wanted = call.text("chance");
  const fewer = less === "" ? "" : `,${less}<${wanted}`;
  const check = enough === "" ? "" : `IF(AND(${enough}>=${wanted}*(1-1E-12)${fewer}),${trials},"no")`;
  return steps.add("smallest number of looks", trials, check, "Wilks 1941: the first number that is enough").rows;
}

export function HIT_CHANCE(call: WorkingsCall): readonly Step[] {
  const fraction = readFraction("fraction", call.cell("fraction"));
  const trials = readCount("trials", call.cell("trials"), 0);
  const hits = readHits(call);
  const chance = hitChance(fraction, trials, hits);
  const formula = hitChanceNative([call.text("fraction"), call.text("trials"), call.text("hits", "1")], {
    trials,
    hits,
    chance,
  });
  const few = trials < hits ? ": 0, there are fewer looks than hits" : "";
  return new Steps().add(`chance of the hits within these looks${few}`, chance, formula, hitChanceSource(chance)).rows;
}

export function CURVE_HIT_CHANCE(call: WorkingsCall): readonly Step[] {
  const count = readCount("count", call.cell("count"), 2);
  const trials = readCount("trials", call.cell("trials"), 0);
  const better = readBetter(call.cell("better"));
  const { k, chance } = curveHitChance(
    count,
    readNumber("mean", call.cell("mean")),
    readPositive("sd", call.cell("sd")),
    readNumber("cutoff", call.cell("cutoff")),
    trials,
    better,
  );
  const [n, mean, cutoff] = [call.text("count"), call.text("mean"), call.text("cutoff")];
  const beyond = better === "low" ? `(${mean}-${cutoff})/${call.text("sd")}` : `(${cutoff}-${mean})/${call.text("sd")}`;
  const steps = new Steps().add("standard deviations by which the cutoff lies beyond the mean", k, beyond);
  if (trials === 0) return steps.add("chance of a hit: 0, there is no look", chance).rows;
  if (trials === 1) {
    const formula = `T.DIST.RT(${beyond}/SQRT(1+1/${n}),${n}-1)`;
    return steps.add("chance of a hit in one look", chance, formula, "Whitmore 1986: Student t with n-1 degrees").rows;
  }
  const formula = estimatedMarkNative([beyond, n], { k, count, trials }, `1-SUM(w*b^${call.text("trials")})/SUM(w)`);
  const source =
    "Geisser 1993: 1-E[Φ(kU+V/√n)^looks], U² chi-square over its n-1 degrees of freedom, V standard normal";
  return steps.add("chance of a hit within these looks", chance, formula, source).rows;
}

export function SEARCH_DURATION(call: WorkingsCall): readonly Step[] {
  const { hitRate, quantile, periods } = searchDuration(
    readFraction("fraction", call.cell("fraction")),
    readPositive("arrivals_per_period", call.cell("arrivals_per_period")),
    readFraction("chance", call.cell("chance")),
    readHits(call),
  );
  const rate = `${call.text("arrivals_per_period")}*${call.text("fraction")}`;
  const wait = `GAMMA.INV(${call.text("chance")},${call.text("hits", "1")},1)`;
  return new Steps()
    .add("hits that arrive in one period on average", hitRate, rate, "Ross 2014, ch. 5: thinning of a Poisson process")
    .add("wait for the last of the hits, in mean times between hits", quantile, wait, "gamma distribution")
    .add("number of periods", periods, `${wait}/(${rate})`).rows;
}

function readHits(call: WorkingsCall): number {
  return readCount("hits", call.cell("hits"), 1, undefined, 1);
}
