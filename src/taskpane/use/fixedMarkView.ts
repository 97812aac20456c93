import type { FixedMark, FixedMarkKind } from "../../sheet/fixedMark";
import type { PaneContext } from "../context";
import { afterPaint } from "../afterPaint";
import { button, choice, tickBox } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { fold } from "../dom/part";
import { figure, table } from "../dom/table";
import { today } from "../today";
import { driftOf, marksOf, markToday, tiesAt, writeMark } from "./fixedMarks";

/** Writing the mark down, its history, and whether newer scores would move it. */
export function fixedMarkView(context: PaneContext): HTMLElement {
  const { texts, call, port, answer } = context;
  let kind: FixedMarkKind = "plain";
  let onGrid = true;
  const drift = element("div");
  const history = element("div");
  const proposal = element("div", { "aria-live": "polite" });
  const message = element("p", { "aria-live": "polite" });
  const reason = field(texts.markReason, "", () => reason.problem(""), texts.markReasonHint, true);

  const draft = () => {
    const current = answer.get();
    const revision = call("RELEASE", ["revision"]);
    const number = revision && "value" in revision && typeof revision.value === "number" ? revision.value : 0;
    return current && markToday(current, kind, reason.input.value.trim(), today(), number, onGrid);
  };
  const propose = () => {
    const mark = draft();
    fill(proposal, ...(mark ? proposalWords(context, mark, onGrid) : []));
  };
  const grid = tickBox(texts.markOnGrid, onGrid, (ticked) => {
    onGrid = ticked;
    propose();
  });
  const kinds = choice(
    texts.markKind,
    [
      ["plain", texts.plain],
      ["safe", texts.safe],
      ["next-score", texts.next],
    ],
    kind,
    (value) => {
      kind = value as FixedMarkKind;
      propose();
    },
  );
  const write = async () => {
    const mark = draft();
    if (!mark) return;
    if (mark.reason === "") {
      reason.problem(texts.markReasonMissing);
      reason.input.focus();
      return;
    }
    message.textContent = texts.markDone(await writeMark(port, mark));
    await look();
  };
  let turn = 0;
  const look = async () => {
    const mine = ++turn;
    const current = answer.get();
    const marks = current ? await marksOf(port, current.column) : [];
    if (mine !== turn) return;
    const newest = marks[marks.length - 1];
    fill(drift, newest && current && driftWords(context, newest));
    fill(history, marks.length > 0 && historyTable(context, marks));
  };
  const failing = (work: () => Promise<unknown>) =>
    work().catch((failure) => (message.textContent = texts.writeFailed(String(failure?.message ?? failure))));
  const root = fold(
    texts.markHeading,
    false,
    element("p", { class: "quiet" }, texts.markWhy),
    drift,
    element("div", { class: "fields" }, kinds.root, reason.root),
    grid,
    proposal,
    element(
      "p",
      { class: "actions" },
      button(texts.markWrite, () => void failing(write)),
    ),
    message,
    history,
  );
  const later = afterPaint(() => {
    propose();
    void failing(look);
  });
  answer.watch((current) => {
    root.hidden = !current?.report;
    later();
  });
  return root;
}

/** What would be written down, and a warning where entries score just that: with two or more the mark can't part them. */
function proposalWords(context: PaneContext, mark: FixedMark, onGrid: boolean): HTMLElement[] {
  const { texts, numbers, answer } = context;
  const shown = shownMark(context, mark);
  const count = numbers.count(mark.count);
  const ties = tiesAt(answer.get()!.column, mark.mark);
  return [
    element("p", {}, onGrid ? texts.markProposal(shown, count) : texts.markProposalExact(shown, count)),
    ...(ties > 1
      ? [element("p", { class: "notice" }, texts.markTies(numbers.count(ties), numbers.full(mark.mark)))]
      : []),
  ];
}

function shownMark({ texts, numbers }: PaneContext, { mark, better }: Pick<FixedMark, "mark" | "better">): string {
  return better === "low" ? texts.markLow(numbers.full(mark)) : texts.markHigh(numbers.full(mark));
}

function driftWords(context: PaneContext, mark: FixedMark): HTMLElement {
  const { texts, numbers, call, answer } = context;
  const { today: now, count } = driftOf(call, answer.get()!.column, mark);
  const fixed = texts.markFixed(shownMark(context, mark), mark.date, numbers.count(mark.count));
  if (now === undefined) return element("p", {}, `${fixed} ${texts.markUnknown}`);
  const difference = Number((now - mark.mark).toPrecision(10));
  const words =
    difference === 0
      ? texts.markStays(numbers.count(count))
      : texts.markMoves(numbers.count(count), numbers.full(now), numbers.full(Math.abs(difference)), difference > 0);
  return element("p", { class: "notice" }, `${fixed} ${words}`);
}

function historyTable({ texts, numbers }: PaneContext, marks: readonly FixedMark[]): HTMLElement {
  return table(
    texts.markHistory,
    [texts.markDate, texts.markMark, texts.markScores, texts.markReason],
    [...marks]
      .reverse()
      .map(({ date, mark, count, reason }) => [date, figure(numbers.full(mark)), figure(numbers.count(count)), reason]),
  );
}
