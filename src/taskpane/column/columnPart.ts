import { isCellError, type Cell } from "../../sheet/cell";
import { columnLetters, parseAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import { button, choice, tickBox } from "../dom/choice";
import { element, fill } from "../dom/element";
import { part, type PanePart } from "../dom/part";
import { typedNumber } from "../typed";
import type { Follower, Selection } from "./followSelection";
import type { Column, Offender } from "./readColumn";
import { putInventedScores } from "./inventedScores";
import { listed } from "./listed";

const MOST_LISTED = 8;

/** The part that tells which column is in hand, and what in it is no score. */
export function columnPart(context: PaneContext, follower: Follower): PanePart {
  const { texts, column } = context;
  const summary = element("div", { class: "summary" });
  const aside = element("div", { class: "aside" });
  const offenders = element("div");
  const hold = tickBox(texts.holdColumn, false, (on) => follower.hold(on));
  const made = part("scores", texts.scoresHeading, summary, aside, offenders, hold);
  column.watch((current) => {
    fill(summary, ...(current ? columnWords(context, current) : []));
    fill(offenders, ...(current ? offenderList(context, current) : []));
    hold.hidden = !current;
  });
  follower.selection.watch((selection) => fill(aside, ...selectionWords(context, follower, selection)));
  return made;
}

function columnWords(
  { texts, numbers, port }: PaneContext,
  { heading, address, count, blanks }: Column,
): HTMLElement[] {
  const scores = count === 1 ? texts.oneScore : texts.scoresCounted(numbers.count(count));
  const where = listed(blanks, texts, numbers);
  const skipped =
    blanks.length === 0
      ? texts.noBlanks
      : blanks.length === 1
        ? texts.oneBlank(where)
        : texts.blanksSkipped(numbers.count(blanks.length), where);
  return [
    element("p", { class: "column-name" }, heading === "" ? address : texts.columnWithHeading(heading, address)),
    element("p", {}, `${scores}, ${skipped}.`),
    ...(blanks.length > 0 && port.kind === "excel" ? [element("p", { class: "quiet" }, texts.blanksInExcel)] : []),
  ];
}

function offenderList({ texts, numbers, port }: PaneContext, { address, offenders }: Column): HTMLElement[] {
  if (offenders.length === 0) return [];
  const sheet = address.includes("!") ? address.slice(0, address.lastIndexOf("!") + 1) : "";
  const words = (cell: Cell) => cellWords(cell, texts, numbers.decimal);
  const item = ({ address: at, cell }: Offender) =>
    element(
      "li",
      {},
      button(at, () => void port.select(sheet + at), "plain"),
      ` ${words(cell)}`,
    );
  const rest = offenders.length - MOST_LISTED;
  return [
    element(
      "div",
      { class: "notice" },
      element(
        "p",
        {},
        offenders.length === 1 ? texts.offendersOne : texts.offendersMany(numbers.count(offenders.length)),
      ),
      element(
        "ul",
        {},
        ...offenders.slice(0, MOST_LISTED).map(item),
        rest > 0 && element("li", {}, texts.moreOffenders(numbers.count(rest))),
      ),
    ),
  ];
}

function cellWords(cell: Cell, texts: PaneContext["texts"], decimal: "." | ","): string {
  if (isCellError(cell)) return texts.holdsError(cell.code);
  if (typeof cell === "boolean") return texts.holdsFlag(cell ? "TRUE" : "FALSE");
  const shown = String(cell).trim();
  const short = shown.length > 30 ? `${shown.slice(0, 30)}…` : shown;
  return typedNumber(shown, decimal) === undefined ? texts.holdsText(short) : texts.holdsNumberAsText(short);
}

function selectionWords(context: PaneContext, follower: Follower, selection: Selection): HTMLElement[] {
  const { texts, column } = context;
  const current = column.get();
  if (selection.kind === "failed") return [element("p", { class: "notice" }, texts.readFailed(selection.message))];
  if (selection.kind === "reading") return [element("p", {}, texts.reading)];
  if (selection.kind === "nothing") return current ? [] : [element("p", {}, texts.noColumn), tryOut(context)];
  if (selection.kind === "no-numbers") {
    const { address, letters } = selection;
    const words = current ? texts.stillShowing(address, current.address) : texts.noNumbers(address);
    return [
      element("p", { class: "quiet" }, words),
      ...(letters === "" ? [] : [button(texts.takeColumn(letters), () => void follower.takeColumn(letters), "plain")]),
      ...(current ? [] : [tryOut(context)]),
    ];
  }
  if (selection.kind === "columns") {
    const { block, places, place } = selection;
    const left = parseAddress(block.address)?.left ?? 0;
    const options = places.map((one) => {
      const first = block.values[0]?.[one];
      const letters = columnLetters(left + one);
      return [
        String(one),
        typeof first === "string" && first.trim() !== "" ? `${letters}, ${first}` : letters,
      ] as const;
    });
    return [
      choice(texts.whichColumn, options, String(place), (value) => void follower.takePlace(block, Number(value))).root,
    ];
  }
  return [];
}

/** A way to see the pane at work where no scores are at hand yet. */
function tryOut({ texts, port }: PaneContext): HTMLElement {
  const message = element("span", { "aria-live": "polite" });
  const act = button(
    texts.inventedTry,
    () => {
      putInventedScores(port, texts.inventedSheet, texts.inventedHeading).catch((failure: unknown) => {
        message.textContent = texts.writeFailed(failure instanceof Error ? failure.message : String(failure));
      });
    },
    "plain",
  );
  return element("p", { class: "actions" }, act, message);
}
