import type { CutoffQuestion } from "../cutoff/question";
import { formulaText } from "../formula";

/** One formula that spills a verdict beside every score; its limits are worked out in the same cell. */
export function verdictFormula(address: string, { fraction, confidence, shape, better }: CutoffQuestion): string {
  const scores = { reference: address };
  const low = better === "low" ? "low" : undefined;
  const limit = (item: string) => ({
    reference: formulaText("CUTOFF_LIMITS", [
      scores,
      fraction,
      confidence === 0.95 ? undefined : confidence,
      shape === "normal" ? undefined : shape,
      low,
      item,
    ]).slice(1),
  });
  return formulaText("CUTOFF_VERDICT", [scores, limit("lower limit"), limit("upper limit"), low]);
}
