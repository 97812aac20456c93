import type { PlanLine } from "../planModel";

/** A line with a live formula. */
export function result(
  name: string,
  label: string,
  formula: string,
  format: string | undefined,
  meaning: string,
  second?: string,
): PlanLine {
  const other = second === undefined ? undefined : { formula: second, format };
  return { kind: "result", name: `weir_${name}`, label, cell: { formula, format }, second: other, meaning };
}
