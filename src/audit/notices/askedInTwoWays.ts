import { isBlank, type Cell } from "../../sheet/cell";
import { formatAddress, formatSheetName } from "../../sheet/address";
import type { Judgement, Notice } from "../judgement";
import { Reference } from "../value";

/** The arguments that should be the same wherever one column is judged. */
const QUESTIONS = ["fraction", "shape", "better"] as const;
const USUAL: Readonly<Record<string, string>> = { shape: "normal", better: "high" };

interface Asked {
  readonly column: string;
  readonly question: string;
  /** Each answer with the first cell that gives it. */
  readonly answers: Map<string, Judgement>;
}

/** One column of scores judged with different fractions, shapes or directions: said once for each column and question. */
export function askedInTwoWays(judgements: readonly Judgement[]): Notice[] {
  const asked = new Map<string, Asked>();
  for (const judgement of judgements) {
    for (const { entry, values, given, answered } of judgement.calls) {
      // A fraction of 1000% was refused: it judged nothing.
      if (!answered) continue;
      const at = entry.parameters.findIndex(({ name }) => name === "scores");
      const place = at < 0 ? undefined : values[at];
      if (!(place instanceof Reference) || place.places.length !== 1) continue;
      const { sheet, area } = place.places[0]!;
      const column = formatAddress({ sheet: sheet.name, ...area, top: 0, bottom: 1_048_575 });
      for (const question of QUESTIONS) {
        const index = entry.parameters.findIndex(({ name }) => name === question);
        const answer = index < 0 ? undefined : answerText(question, given[index] as Cell | undefined);
        if (answer === undefined) continue;
        const key = `${column} ${question}`;
        const known = asked.get(key) ?? { column, question, answers: new Map<string, Judgement>() };
        asked.set(key, known);
        if (!known.answers.has(answer)) known.answers.set(answer, judgement);
      }
    }
  }
  return [...asked.values()].filter(({ answers }) => answers.size > 1).map(noticeOf);
}

function answerText(question: string, given: unknown): string | undefined {
  if (typeof given === "number")
    return question === "fraction" ? `${Number((given * 100).toPrecision(10))}%` : String(given);
  if (isBlank(given as Cell)) return USUAL[question];
  return typeof given === "string" ? given.toLowerCase().replace(/\s+/g, "") : undefined;
}

function noticeOf({ column, question, answers }: Asked): Notice {
  const all = [...answers].map(
    ([answer, { sheet, address }]) => `${answer} in ${formatSheetName(sheet.name)}!${address}`,
  );
  const shown = all.length > 4 ? `${all.slice(0, 4).join(", ")} and ${all.length - 4} more` : all.join(", ");
  const [, second] = [...answers.values()];
  const why = `The scores of ${column} are judged with ${answers.size} different values of ${question}: ${shown}. If one was meant, keep it in one cell that all of them refer to.`;
  return { sheet: second!.sheet.name, address: second!.address, kind: "asked in two ways", why };
}
