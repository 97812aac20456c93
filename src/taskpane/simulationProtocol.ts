import type { SearchPlan } from "../core/method/searchPlan";
import type { SearchSummary } from "../core/method/summariseSearches";

/** What the pane tells the worker. `id` is the pane's own number for the simulation; starting another cancels the one that runs. */
export type SimulationRequest =
  | { readonly kind: "start"; readonly id: number; readonly plan: SearchPlan }
  | { readonly kind: "cancel"; readonly id: number };

/** What the worker tells the pane: any number of "progress", then one of the others. */
export type SimulationAnswer =
  | { readonly kind: "progress"; readonly id: number; readonly runsPlayed: number; readonly runs: number }
  | { readonly kind: "done"; readonly id: number; readonly summary: SearchSummary }
  | { readonly kind: "cancelled"; readonly id: number }
  | { readonly kind: "refused"; readonly id: number; readonly message: string };
