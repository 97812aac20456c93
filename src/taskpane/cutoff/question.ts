/** What the user asks of the cutoff. */
export interface CutoffQuestion {
  readonly fraction: number;
  readonly confidence: number;
  readonly better: "high" | "low";
  /** As a cell function takes it: `normal`, `logit(0,100)` … */
  readonly shape: string;
}

export const FIRST_QUESTION: CutoffQuestion = { fraction: 0.05, confidence: 0.95, better: "high", shape: "normal" };

/** The question as it was kept with the workbook; what can't be one any more falls back to the first question. */
export function keptQuestion(kept: unknown): CutoffQuestion {
  if (typeof kept !== "object" || kept === null) return FIRST_QUESTION;
  const { fraction, confidence, better, shape } = kept as Partial<Record<keyof CutoffQuestion, unknown>>;
  return {
    fraction: isFraction(fraction) ? fraction : FIRST_QUESTION.fraction,
    confidence: isFraction(confidence) ? confidence : FIRST_QUESTION.confidence,
    better: better === "low" ? "low" : "high",
    shape: typeof shape === "string" ? shape : FIRST_QUESTION.shape,
  };
}

function isFraction(value: unknown): value is number {
  return typeof value === "number" && value > 0 && value < 1;
}
