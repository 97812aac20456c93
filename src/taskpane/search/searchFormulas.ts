import type { CutoffAnswer } from "../cutoff/answerCutoff";
import { formulaText, type FormulaArgument } from "../formula";
import type { OfferedFormula } from "../target/formulaChooser";
import type { Texts } from "../texts/en";
import type { SearchQuestion } from "./searchQuestion";

/** The formulas behind what the search part shows. Stages go in as constants: a column each, with `;` between rows in every locale. */
export function searchFormulas(
  fraction: number,
  question: SearchQuestion,
  cutoff: CutoffAnswer | undefined,
  texts: Texts,
): OfferedFormula[] {
  const { stages, chance, arrivals, lookCost, looksLeft } = question;
  const hits = question.hits === 1 ? undefined : question.hits;
  const column = (values: readonly number[]): FormulaArgument => ({ reference: `{${values.join(";")}}` });
  const reach = column(stages.map((stage) => stage.reach));
  const costs = column(stages.map((stage) => stage.cost));
  const offer = (
    words: string,
    name: string,
    given: readonly FormulaArgument[],
    rows = 1,
    columns = 1,
  ): OfferedFormula => ({
    words,
    formula: { text: formulaText(name, given), rows, columns },
  });
  const offered = [
    ...estimatedFormulas(question, cutoff, texts),
    offer(texts.putLooksExact, "TRIALS_FOR_HIT_CHANCE", [fraction, chance, hits]),
    offer(texts.putLoad, "STAGE_LOAD", [reach, costs, fraction, cutoff?.report?.count, hits], stages.length + 2, 5),
    offer(texts.putBudget, "SEARCH_BUDGET", [fraction, reach, costs, chance, hits]),
  ];
  if (arrivals !== undefined)
    offered.push(offer(texts.putPeriods, "SEARCH_DURATION", [fraction, arrivals, chance, hits]));
  if (lookCost === undefined || cutoff?.report === undefined || cutoff.question.shape !== "normal") return offered;
  const { address } = cutoff.column;
  const mean = { reference: `AVERAGE(${address})` };
  const sd = { reference: `STDEV(${address})` };
  const better = cutoff.question.better === "low" ? "low" : undefined;
  const reserve = offer(texts.putReserve, "RESERVE_SCORE", [mean, sd, lookCost, undefined, better]);
  offered.push({ ...reserve, reads: address });
  if (looksLeft === undefined) return offered;
  const given = [mean, sd, looksLeft, lookCost, undefined, better];
  return [...offered, { ...offer(texts.putSchedule, "RESERVE_SCHEDULE", given, looksLeft + 1, 4), reads: address }];
}

/** The looks to plan for as the report has them: of the mark that is only an estimate, at the one chance that it knows. */
function estimatedFormulas(
  { hits, chance }: SearchQuestion,
  cutoff: CutoffAnswer | undefined,
  texts: Texts,
): OfferedFormula[] {
  if (!cutoff?.report || hits !== 1 || chance !== 0.9) return [];
  const { fraction, confidence, shape, better } = cutoff.question;
  const { address } = cutoff.column;
  const given = [
    { reference: address },
    fraction,
    confidence === 0.95 ? undefined : confidence,
    shape === "normal" ? undefined : shape,
    better === "low" ? better : undefined,
    "looks for a 90% chance",
  ];
  const formula = { text: formulaText("CUTOFF_REPORT", given), rows: 1, columns: 1 };
  return [{ words: texts.putLooks, formula, reads: address }];
}
