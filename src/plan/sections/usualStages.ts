import type { PlanLine, PlanSearch } from "../planModel";

type Stages = NonNullable<PlanSearch["stages"]>;

/** Three stages to begin with: each sees fewer entries than the one before, the last at least the fraction that is to pass. */
export function usualStages(fraction: number): Stages {
  const last = Math.min(1, Math.max(0.1, 2 * fraction));
  const middle = Math.max(last, Math.round(Math.sqrt(last) * 20) / 20);
  return [
    { label: "First reading", reach: 1, cost: 0.5 },
    { label: "Closer look", reach: middle, cost: 2 },
    { label: "Full assessment", reach: last, cost: 8 },
  ];
}

/** An input line for each stage. */
export function stageLines(stages: Stages): PlanLine[] {
  return stages.map(({ label, reach, cost }, index) => ({
    kind: "stage",
    label: label ?? `Stage ${index + 1}`,
    reach,
    cost,
    meaning: meaningOf(index, stages.length),
  }));
}

function meaningOf(index: number, count: number): string {
  if (index === 0) return "Every entry gets here: its reach is 100 %.";
  if (index === count - 1) return "At least the fraction that is to pass.";
  return index === 1 ? "Share of all entries that gets this far, never more than before." : "";
}
