import type { Cell } from "../../sheet/cell";
import type { Argument } from "../../sheet/invoke";
import type { Call } from "../context";
import { refusalOf, type CutoffAnswer, type CutoffFigures, type Refusal } from "../cutoff/answerCutoff";
import { estimatedLooks } from "./chancePoints";
import type { SearchQuestion } from "./searchQuestion";

export interface SearchAnswer {
  readonly expected: number | Refusal;
  /** Looks for an even chance and for the chance asked for; of an estimated mark where there are scores. */
  readonly looksHalf: number | Refusal;
  readonly looksMost: number | Refusal;
  /** True where the two rest on the scores: the mark is then only an estimate. */
  readonly estimated: boolean;
  readonly load: readonly (readonly Cell[])[] | Refusal;
  readonly budget: number | Refusal;
  readonly periods: number | Refusal | undefined;
  readonly reserve: number | Refusal | undefined;
  readonly schedule: readonly (readonly Cell[])[] | Refusal | undefined;
}

export function isRefusal(value: unknown): value is Refusal {
  return typeof value === "object" && value !== null && "error" in value;
}

/** The arguments of the two functions over stages: reach and costs as columns. */
export function stageColumns({ stages }: SearchQuestion): { reach: number[][]; costs: number[][] } {
  return { reach: stages.map(({ reach }) => [reach]), costs: stages.map(({ cost }) => [cost]) };
}

/** Asks the cell functions for the search. `cutoff` is the answer above, where there is one: its scores are the learning looks. */
export function answerSearch(
  call: Call,
  fraction: number,
  question: SearchQuestion,
  cutoff: CutoffAnswer | undefined,
): SearchAnswer {
  const { hits, chance, arrivals, lookCost, looksLeft } = question;
  const ask = <T>(name: string, given: readonly Argument[]): T | Refusal => {
    const outcome = call(name, given);
    return refusalOf(name, outcome) ?? ((outcome as { value: unknown }).value as T);
  };
  const { reach, costs } = stageColumns(question);
  const report = cutoff?.report;
  const learnt = report?.count ?? 0;
  const estimate = report && hits === 1 ? lookEstimates(call, report, fraction, chance) : undefined;
  const curve = cutoff?.question.shape === "normal" ? new Map(cutoff.rows) : undefined;
  const better = cutoff?.question.better;
  const mean = curve?.get("curve mean");
  const sd = curve?.get("curve standard deviation");
  const wanted = lookCost !== undefined && typeof mean === "number" && typeof sd === "number";
  return {
    expected: ask("EXPECTED_TRIALS_TO_HIT", [fraction, hits]),
    looksHalf: estimate?.half ?? ask("TRIALS_FOR_HIT_CHANCE", [fraction, 0.5, hits]),
    looksMost: estimate?.most ?? ask("TRIALS_FOR_HIT_CHANCE", [fraction, chance, hits]),
    estimated: estimate !== undefined,
    load: ask("STAGE_LOAD", [reach, costs, fraction, learnt, hits]),
    budget: ask("SEARCH_BUDGET", [fraction, reach, costs, chance, hits]),
    periods: arrivals === undefined ? undefined : ask("SEARCH_DURATION", [fraction, arrivals, chance, hits]),
    reserve: wanted ? ask("RESERVE_SCORE", [mean, sd, lookCost, undefined, better]) : undefined,
    schedule:
      wanted && looksLeft !== undefined
        ? ask("RESERVE_SCHEDULE", [mean, sd, looksLeft, lookCost, undefined, better])
        : undefined,
  };
}

/** Looks that take into account that the mark is an estimate: those of the report where it has them, else worked out from the chance. */
function lookEstimates(
  call: Call,
  { count, looksHalf, looksMost }: CutoffFigures,
  fraction: number,
  chance: number,
): { half: number; most: number } | undefined {
  const half = looksHalf ?? estimatedLooks(call, count, fraction, 0.5);
  const most = chance === 0.9 && looksMost !== undefined ? looksMost : estimatedLooks(call, count, fraction, chance);
  return half === undefined || most === undefined ? undefined : { half, most };
}
