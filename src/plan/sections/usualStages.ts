import type { PlanLine } from "../planModel";

/** Three stages to begin with: each sees fewer entries than the one before, the last at least the fraction that is to pass. */
export function usualStages(fraction: number): PlanLine[] {
  const last = Math.min(1, Math.max(0.1, 2 * fraction));
  const middle = Math.max(last, Math.round(Math.sqrt(last) * 20) / 20);
  const stage = (label: string, reach: number, cost: number, meaning: string): PlanLine => ({
    kind: "stage",
    label,
    reach,
    cost,
    meaning,
  });
  return [
    stage("First reading", 1, 0.5, "Every entry gets here: its reach is 100 %."),
    stage("Closer look", middle, 2, "Share of all entries that gets this far, never more than before."),
    stage("Full assessment", last, 8, "At least the fraction that is to pass."),
  ];
}
