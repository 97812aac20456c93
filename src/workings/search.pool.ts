import { expectedPoolTrials } from "../core/method/expectedTrials";
import { LARGEST_POOL } from "../core/method/pool";
import { poolHitChance } from "../core/method/poolHitChance";
import { poolTrialsForHitChance } from "../core/method/poolTrialsForHitChance";
import { readCount, readFraction } from "../sheet/readArgument";
import { Steps, type Step } from "./steps";
import type { WorkingsCall } from "./workingsCall";

const HYPERGEOMETRIC = "hypergeometric distribution";
/** In a larger pool the factorials behind the host's function have lost the digits that a comparison needs. */
const LARGEST_NATIVE_POOL = 50_000;
/** Below this, 1 − P(fewer) would keep no digits. */
const SMALL = 1e-6;
const MOST_TERMS = 400;

export function POOL_EXPECTED_TRIALS(call: WorkingsCall): readonly Step[] {
  const { pool, good, hits } = readPool(call);
  const formula = `${call.text("hits", "1")}*(${call.text("pool")}+1)/(${call.text("good")}+1)`;
  const source = "Mosteller 1965, problem 40: the good ones part the others into runs of equal length";
  return new Steps().add("expected number of looks", expectedPoolTrials(pool, good, hits), formula, source).rows;
}

export function POOL_HIT_CHANCE(call: WorkingsCall): readonly Step[] {
  const { pool, good, hits } = readPool(call);
  const trials = readCount("trials", call.cell("trials"), 0, pool);
  const chance = poolHitChance(pool, good, trials, hits);
  const few =
    hits > Math.min(good, trials) ? `: 0, there are fewer ${good < trials ? "good ones" : "looks"} than hits` : "";
  const formula = chanceNative(call, call.text("trials"), trials, chance);
  return new Steps().add(`chance of the hits within these looks${few}`, chance, formula, HYPERGEOMETRIC).rows;
}

export function POOL_TRIALS_FOR_HIT_CHANCE(call: WorkingsCall): readonly Step[] {
  const { pool, good, hits } = readPool(call);
  const asked = readFraction("chance", call.cell("chance"));
  const { trials, chance, chanceBefore } = poolTrialsForHitChance(pool, good, asked, hits);
  const enough = chanceNative(call, String(trials), trials, chance);
  const steps = new Steps().add(`chance of the hits within ${trials} looks`, chance, enough, HYPERGEOMETRIC);
  const wanted = call.text("chance");
  let fewer = "";
  if (trials > hits) {
    const less = chanceNative(call, String(trials - 1), trials - 1, chanceBefore);
    steps.add(`chance of the hits within ${trials - 1} looks: not enough`, chanceBefore, less, HYPERGEOMETRIC);
    fewer = `,${less}<${wanted}`;
  }
  const check = enough === "" ? "" : `IF(AND(${enough}>=${wanted}*(1-1E-12)${fewer}),${trials},"no")`;
  return steps.add("smallest number of looks", trials, check, "the first number that is enough").rows;
}

/** P(at least the hits) as native text. The host refuses counts that can't occur, so the sure cases are told apart by the numbers. */
function chanceNative(call: WorkingsCall, trials: string, looks: number, chance: number): string {
  const { pool, good, hits } = readPool(call);
  const most = Math.min(good, looks);
  if (pool > LARGEST_NATIVE_POOL || hits > most) return "";
  const [wanted, rest] = [call.text("hits", "1"), `${trials},${call.text("good")},${call.text("pool")}`];
  if (looks - (pool - good) >= hits)
    return `IF(${trials}-(${call.text("pool")}-${call.text("good")})>=${wanted},1,"no")`;
  if (chance < SMALL && most - hits < MOST_TERMS)
    return `SUM(MAP(SEQUENCE(${most - hits + 1},1,${wanted}),LAMBDA(i,HYPGEOM.DIST(i,${rest},FALSE))))`;
  return `1-HYPGEOM.DIST(${wanted}-1,${rest},TRUE)`;
}

function readPool(call: WorkingsCall): { pool: number; good: number; hits: number } {
  const pool = readCount("pool", call.cell("pool"), 1, LARGEST_POOL);
  return {
    pool,
    good: readCount("good", call.cell("good"), 0, pool),
    hits: readCount("hits", call.cell("hits"), 1, undefined, 1),
  };
}
