import { bestPickChance } from "../core/method/bestPickChance";
import { bestPickSchedule, type BestPickStep } from "../core/method/bestPickSchedule";
import { MOST_LOOKS } from "../core/method/mostLooks";
import { rankOnlyBest } from "../core/method/rankOnlyBest";
import { rankOnlySchedule } from "../core/method/rankOnlySchedule";
import { readCount, readWord } from "../sheet/readArgument";
import { literal } from "./native";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import { addTable } from "./tableSteps";
import type { WorkingsCall } from "./workingsCall";

const KNOWN_CURVE = "Gilbert & Mosteller 1966, sec. 3";
const RANKS = "Gilbert & Mosteller 1966, sec. 2";
const EXPECTED_RANK = "Chow, Moriguti, Robbins & Samuels 1964";
/** So many percentiles are checked one by one; the others follow the same equation. */
const CHECKED = 20;
/** Above, the percentiles no longer fit into one formula. */
const LONGEST_FORMULA = 250;

function readLooks(call: WorkingsCall): number {
  return readCount("looks", call.cell("looks"), 1, MOST_LOOKS);
}

function addChecks(steps: Steps, schedule: readonly BestPickStep[]): Steps {
  for (const { look, looksLeft, percentile } of schedule.slice(0, CHECKED)) {
    if (looksLeft === 0) continue;
    const sum = `LET(i,SEQUENCE(${looksLeft}),SUM((EXP(i*-LN(${literal(percentile)}))-1)/i))`;
    steps.add(`check: the sum that the percentile at look ${look} solves, must be 1`, 1, sum, KNOWN_CURVE);
  }
  return steps;
}

export function BEST_PICK_SCHEDULE(call: WorkingsCall): readonly Step[] {
  const schedule = bestPickSchedule(readLooks(call));
  const headings = ["look", "looks left after this", "percentile to beat"];
  return addTable(addChecks(new Steps(), schedule), headings, schedule.length, (index) => {
    const { look, looksLeft, percentile } = schedule[index]!;
    return {
      name: `look ${look}`,
      cells: [
        [look],
        [looksLeft, `${call.text("looks")}-${look}`],
        [percentile, looksLeft === 0 ? "0" : looksLeft === 1 ? "1/2" : "", KNOWN_CURVE],
      ],
    };
  }).rows;
}

export function BEST_PICK_CHANCE(call: WorkingsCall): readonly Step[] {
  const looks = readLooks(call);
  const schedule = bestPickSchedule(looks);
  const steps = addChecks(new Steps(), schedule);
  const percentiles = `{${schedule
    .slice(0, -1)
    .map((step) => step.percentile)
    .join(";")}}`;
  const sums = `MAP(SEQUENCE(${looks - 1}),${percentiles},LAMBDA(k,d,LET(r,SEQUENCE(${looks}-k,1,k),SUM(EXP(r*LN(d))/r))))`;
  const formula = looks === 1 ? "1" : looks > LONGEST_FORMULA ? "" : `(1+SUM(${sums}))/${call.text("looks")}`;
  return steps.add("chance of taking the very best", bestPickChance(looks), formula, KNOWN_CURVE).rows;
}

export function RANK_ONLY_PLAN(call: WorkingsCall): readonly Step[] {
  const looks = readLooks(call);
  const n = call.text("looks");
  if (readWord("goal", call.cell("goal"), ["best", "rank"], "best") === "rank") {
    const { expectedRank } = rankOnlySchedule(looks);
    return new Steps().add("expected rank", expectedRank, goingOnNative(n, looks, 0), EXPECTED_RANK).rows;
  }
  const { passOver, chance } = rankOnlyBest(looks);
  const harmonic = (from: number) => (from > looks - 1 ? "0" : `SUM(1/SEQUENCE(${n}-${from},1,${from}))`);
  const before = passOver === 0 ? "" : `,${harmonic(passOver)}>1`;
  const steps = new Steps().add(
    "pass over first",
    passOver,
    `IF(AND(${harmonic(passOver + 1)}<=1+1E-12${before}),${passOver},"no")`,
    RANKS,
  );
  const reached = passOver === 0 ? `1/${n}` : `${passOver}/${n}*${harmonic(passOver)}`;
  return pickItem(steps.add("chance of taking the best", chance, reached, RANKS).rows, 2, call.cell("item"));
}

export function RANK_ONLY_SCHEDULE(call: WorkingsCall): readonly Step[] {
  const looks = readLooks(call);
  const n = call.text("looks");
  const { acceptRank } = rankOnlySchedule(looks);
  return addTable(new Steps(), ["look", "accept if among the best so far"], looks, (index) => {
    const look = index + 1;
    const goingOn = goingOnNative(n, looks, look);
    const accept = look === looks ? n : `MIN(${look},INT(${goingOn}*${look + 1}/(${n}+1)*(1+1E-12)))`;
    return { name: `look ${look}`, cells: [[look], [acceptRank[index]!, accept, EXPECTED_RANK]] };
  }).rows;
}

/** The expected rank from going on after look `after`, backwards from the last look, which is taken whatever it is. */
function goingOnNative(n: string, looks: number, after: number): string {
  const rounds = looks - 1 - after;
  if (rounds === 0) return `(${n}+1)/2`;
  const step = `LAMBDA(c,i,LET(k,(${n}+1)/(i+1),s,MIN(i,INT(c/k*(1+1E-12))),(k*s*(s+1)/2+(i-s)*c)/i))`;
  return `REDUCE((${n}+1)/2,SEQUENCE(${rounds},1,${n}-1,-1),${step})`;
}
