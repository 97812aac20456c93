import { formulaText, type Formula, type FormulaArgument } from "../formula";
import type { CutoffQuestion } from "./question";

export const FORMULA_KINDS = ["report", "cutoff", "limits", "safe", "next", "rank"] as const;
export type FormulaKind = (typeof FORMULA_KINDS)[number];

/** The formula for what is shown; arguments at their default are left out. */
export function cutoffFormula(kind: FormulaKind, address: string, question: CutoffQuestion): Formula {
  const { fraction } = question;
  const scores = { reference: address };
  const confidence = question.confidence === 0.95 ? undefined : question.confidence;
  const shape = question.shape === "normal" ? undefined : question.shape;
  const better = question.better === "high" ? undefined : question.better;
  const formula = (name: string, given: readonly FormulaArgument[], rows = 1, columns = 1): Formula => ({
    text: formulaText(name, given),
    rows,
    columns,
  });
  switch (kind) {
    case "report":
      return formula("CUTOFF_REPORT", [scores, fraction, confidence, shape, better], 14, 2);
    case "cutoff":
      return formula("TOP_FRACTION_CUTOFF", [scores, fraction, shape, better]);
    case "limits":
      return formula("CUTOFF_LIMITS", [scores, fraction, confidence, shape, better], 3, 2);
    case "safe":
      return formula("SAFE_CUTOFF", [scores, fraction, confidence, shape, better]);
    case "next":
      return formula("NEXT_SCORE_CUTOFF", [scores, fraction, shape, better]);
    case "rank":
      return formula("RANK_CUTOFF", [scores, fraction, confidence, better], 4, 2);
  }
}
