import { noncentralTCdf } from "../core/distribution/noncentralTCdf";
import { normalUpperTailQuantile } from "../core/distribution/normalUpperTailQuantile";
import { MARK_METHODS, type MarkMethod } from "../core/method/markFactor";
import { looksPlayedOut, type SearchPlan } from "../core/method/searchPlan";
import { shareStandardError } from "../core/method/shareStandardError";
import { playSearches } from "../core/method/simulateSearch";
import { readCount, readFraction, readWord } from "../sheet/readArgument";
import { literal, noncentralTNative } from "./native";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const GENERATOR = "xoshiro128++ seeded by SplitMix64 (Blackman & Vigna 2021)";
const DEVIATES = "normal scores by the ziggurat (Marsaglia & Tsang 2000; Doornik 2005)";
const OWEN = "Owen 1968: the mark of a normal sample has a noncentral t distribution";

/** A simulation: what is played, the exact law of the marks beside the simulated one, and the values of the runs. */
export function SIMULATED_SEARCH(call: WorkingsCall): readonly Step[] {
  const plan: SearchPlan = {
    fraction: readFraction("fraction", call.cell("fraction")),
    learnCount: readCount("learn_count", call.cell("learn_count"), 2),
    method: readWord("method", call.cell("method"), MARK_METHODS, "plain"),
    runs: readCount("runs", call.cell("runs"), 1, undefined, 10_000),
    seed: readCount("seed", call.cell("seed"), 0, undefined, 1),
    mostLooks: readCount("most_looks", call.cell("most_looks"), 1, undefined, 10_000),
  };
  const played = playSearches(plan);
  const [fraction, learn, runs] = [call.text("fraction"), call.text("learn_count"), call.text("runs", "10000")];
  const steps = new Steps();
  addFactor(steps, plan.method, fraction, learn, plan, played.factor);
  steps
    .add("runs", plan.runs, runs)
    .add("seed", plan.seed, call.text("seed", "1"), GENERATOR)
    .add("learning scores drawn", plan.runs * plan.learnCount, `${runs}*${learn}`, DEVIATES)
    .add(
      "searching looks played one by one in a run, at most",
      looksPlayedOut(plan),
      `MIN(${call.text("most_looks", "10000")},-INT(-3/${fraction}))`,
      "beyond them the rest of a run is drawn from its exact law, the geometric",
    )
    .add("searching looks played one by one in all", played.looksPlayed)
    .add(
      "standard error of the share that found nothing",
      shareStandardError(played.foundNothing, plan.runs),
      `SQRT(${literal(played.foundNothing)}*(1-${literal(played.foundNothing)})/${runs})`,
      "variance of a binomial share",
    );
  addExactLaw(steps, "lowest", played.lowestPassing, played.factor, plan.learnCount);
  addExactLaw(steps, "highest", played.highestPassing, played.factor, plan.learnCount);
  steps
    .add("average looks", played.averageLooks)
    .add("median looks", played.medianLooks)
    .add("90th percentile looks", played.ninetiethLooks)
    .add("first hit not truly top", played.firstHitNotTop ?? "")
    .add("found nothing", played.foundNothing)
    .add("lowest passing fraction", played.lowestPassing)
    .add("highest passing fraction", played.highestPassing);
  return pickItem(steps.rows, 7, call.cell("item"));
}

/** The k of the mark mean + k times deviation. The safe one has no formula in the host, but a check. */
function addFactor(
  steps: Steps,
  method: MarkMethod,
  fraction: string,
  learn: string,
  plan: SearchPlan,
  factor: number,
) {
  const meaning = `k of the mark, mean + k standard deviations, by the method "${method}"`;
  if (method === "plain") return void steps.add(meaning, factor, `NORM.S.INV(1-${fraction})`);
  if (method === "next")
    return void steps.add(meaning, factor, `T.INV(1-${fraction},${learn}-1)*SQRT(1+1/${learn})`, "Geisser 1993");
  const root = Math.sqrt(plan.learnCount);
  const ncp = `NORM.S.INV(1-${fraction})*SQRT(${learn})`;
  const v = plan.learnCount - 1;
  const delta = normalUpperTailQuantile(plan.fraction) * root;
  const chance = noncentralTNative(`${literal(factor)}*SQRT(${learn})`, `${learn}-1`, ncp, v, delta);
  steps
    .add(meaning, factor, "", OWEN)
    .add("check: chance that no more than the fraction passes, must be 0.95", 0.95, chance, OWEN);
}

/** How likely a passing fraction below the one shown is by the exact law: near 5 % and 95 %, but for chance. */
function addExactLaw(steps: Steps, which: string, passing: number, factor: number, count: number): void {
  if (!(passing > 0 && passing < 1)) return;
  const root = Math.sqrt(count);
  const mark = normalUpperTailQuantile(passing);
  // A passing fraction is lower where the mark stands higher: x̄ + k·s > mark means that a noncentral t about mark·√n lies below k√n.
  const chance = noncentralTCdf(factor * root, count - 1, mark * root);
  const text = noncentralTNative(
    `${literal(factor)}*SQRT(${count})`,
    String(count - 1),
    `${literal(mark)}*SQRT(${count})`,
    count - 1,
    mark * root,
  );
  steps.add(`exact chance of a passing fraction below the ${which} one that follows`, chance, text, OWEN);
}
