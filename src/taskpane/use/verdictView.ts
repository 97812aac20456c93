import type { Cell } from "../../sheet/cell";
import type { PaneContext } from "../context";
import type { CutoffAnswer } from "../cutoff/answerCutoff";
import { afterPaint } from "../afterPaint";
import { button } from "../dom/choice";
import { element, fill } from "../dom/element";
import { fold } from "../dom/part";
import { localFormula } from "../formula";
import { freeColumn } from "../target/freeColumn";
import { verdictFormula } from "./verdictFormula";

export interface VerdictCounts {
  readonly clears: number;
  readonly close: number;
  readonly short: number;
}

/** How many entries clear the mark beyond doubt, how many are too close to call, how many fall short; undefined where refused. */
export function verdictCounts(
  { call }: Pick<PaneContext, "call">,
  { column, question, report }: CutoffAnswer,
): VerdictCounts | undefined {
  if (!report) return undefined;
  const outcome = call("CUTOFF_VERDICT", [column.cells, report.lower, report.upper, question.better]);
  if (!outcome || "error" in outcome) return undefined;
  const cells = (Array.isArray(outcome.value) ? outcome.value : [[outcome.value]]).flat() as Cell[];
  const count = (word: string) => cells.reduce<number>((sum, cell) => (cell === word ? sum + 1 : sum), 0);
  return { clears: count("clears"), close: count("too close to call"), short: count("falls short") };
}

/** A verdict beside every score, in one action: into the nearest free column, with a heading. */
export function verdictView(context: PaneContext): HTMLElement {
  const { texts, numbers, port, answer } = context;
  const counts = element("p");
  const formula = element("code", { class: "formula" });
  const message = element("p", { "aria-live": "polite" });

  const write = async () => {
    const current = answer.get();
    if (!current?.report) return;
    const { address } = current.column;
    const free = await freeColumn(port, address);
    if (!free) return void (message.textContent = texts.verdictNoColumn);
    const cell = verdictFormula(address, current.question);
    await port.write(
      free.heading ?? free.first,
      free.heading === undefined ? [[cell]] : [[texts.verdictColumn], [cell]],
    );
    message.textContent = texts.verdictDone(free.shown);
  };
  const act = button(texts.verdictWrite, () => {
    write().catch((failure) => (message.textContent = texts.writeFailed(String(failure?.message ?? failure))));
  });
  const root = fold(
    texts.verdictHeading,
    true,
    element("p", { class: "caution" }, texts.verdictCaution),
    counts,
    element("p", { class: "quiet" }, texts.verdictWhere),
    formula,
    element("p", { class: "actions" }, act),
    message,
  );
  const count = afterPaint(() => {
    const current = answer.get();
    const counted = current && verdictCounts(context, current);
    root.hidden = !counted;
    if (!counted) return;
    const [clears, close, short] = [counted.clears, counted.close, counted.short].map(numbers.count) as [
      string,
      string,
      string,
    ];
    counts.textContent = texts.verdictCounts(clears, close, short);
    const text = localFormula(verdictFormula(current.column.address, current.question), numbers.separators);
    if (formula.textContent === text) return;
    formula.textContent = text;
    fill(message);
  });
  answer.watch(count);
  return root;
}
