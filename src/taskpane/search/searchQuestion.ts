/** What the user tells of the search. Amounts are in whatever unit the user counts. */
export interface SearchQuestion {
  readonly hits: number;
  /** The chance with which the budget and the time are to be enough. */
  readonly chance: number;
  readonly stages: readonly Stage[];
  /** Entries that arrive in a period; left out: no forecast of time. */
  readonly arrivals?: number;
  /** What one look costs in points of the score; left out: no reserve. */
  readonly lookCost?: number;
  /** How many looks are left at most; left out: no schedule. */
  readonly looksLeft?: number;
}

export interface Stage {
  /** The fraction of entries that gets here; 1 for the first. */
  readonly reach: number;
  /** What one look costs here. */
  readonly cost: number;
}

export const FIRST_SEARCH: SearchQuestion = { hits: 1, chance: 0.9, stages: [{ reach: 1, cost: 1 }] };

/** The question as it was kept with the workbook; what can't be one any more falls back to the first. */
export function keptSearch(kept: unknown): SearchQuestion {
  if (typeof kept !== "object" || kept === null) return FIRST_SEARCH;
  const { hits, chance, stages, arrivals, lookCost, looksLeft } = kept as Partial<
    Record<keyof SearchQuestion, unknown>
  >;
  const amount = (value: unknown, least: number) => (typeof value === "number" && value >= least ? value : undefined);
  return {
    hits: Number.isInteger(hits) ? (amount(hits, 1) ?? 1) : 1,
    chance: typeof chance === "number" && chance > 0 && chance < 1 ? chance : FIRST_SEARCH.chance,
    stages: Array.isArray(stages) && stages.length > 0 && stages.every(isStage) ? stages : FIRST_SEARCH.stages,
    arrivals: amount(arrivals, 0),
    lookCost: amount(lookCost, 0),
    looksLeft: amount(looksLeft, 1),
  };
}

function isStage(value: unknown): value is Stage {
  if (typeof value !== "object" || value === null) return false;
  const { reach, cost } = value as Partial<Stage>;
  return typeof reach === "number" && reach > 0 && reach <= 1 && typeof cost === "number" && cost >= 0;
}
