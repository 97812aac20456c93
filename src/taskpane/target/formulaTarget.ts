import { parseAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import { button } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { localFormula, type Formula } from "../formula";
import { cellShown, checkTarget, type TargetCheck } from "./targetCells";

export interface FormulaTarget {
  readonly root: HTMLElement;
  /** The formula to put in, and the range that it reads. */
  show(formula: Formula | undefined, reads: string | undefined): void;
}

/** Shows a formula as this user would type it, and puts it into a cell: never over something without having asked. */
export function formulaTarget(context: PaneContext): FormulaTarget {
  const { texts, numbers, port, selected } = context;
  let formula: Formula | undefined;
  let reads: string | undefined;
  const shown = element("code", { class: "formula" });
  const answer = element("div", { "aria-live": "polite" });
  const cell = field(texts.targetCell, "", () => fill(answer));
  const say = (words: string, ...more: HTMLElement[]) => fill(answer, element("p", {}, words), ...more);
  const useSelected = button("", () => {
    cell.input.value = useSelected.value;
    fill(answer);
  });

  async function write(address: string) {
    try {
      await port.write(address, [[formula!.text]]);
      say(texts.putDone(address));
    } catch (failure) {
      say(texts.writeFailed(failure instanceof Error ? failure.message : String(failure)));
    }
  }

  async function put() {
    if (!formula) return;
    try {
      tell(await checkTarget(port, cell.input.value, formula, reads));
    } catch (failure) {
      say(texts.writeFailed(failure instanceof Error ? failure.message : String(failure)));
    }
  }

  function tell(check: TargetCheck) {
    if (check.kind === "free") return void write(check.address);
    if (check.kind === "missing") return say(texts.targetMissing);
    if (check.kind === "bad") return say(texts.targetBad(cell.input.value.trim()));
    if (check.kind === "no-sheet") return say(texts.targetNoSheet(check.sheet));
    if (check.kind === "edge") return say(texts.targetEdge);
    if (check.kind === "inside") return say(texts.targetInside);
    if (check.kind === "no-room")
      return say(texts.targetNoRoom(check.area, check.first, cellShown(check.holds, texts.quoted)));
    const replace = button(texts.replace, () => void write(check.address));
    const keep = button(texts.keep, () => {
      fill(answer);
      cell.input.focus();
    });
    say(
      texts.targetTaken(check.address, cellShown(check.holds, texts.quoted)),
      element("p", { class: "actions" }, replace, keep),
    );
  }

  selected.watch((address) => {
    const area = address === undefined ? undefined : parseAddress(address);
    const single = area && area.top === area.bottom && area.left === area.right;
    useSelected.hidden = !single;
    if (!single) return;
    useSelected.value = address!;
    useSelected.textContent = texts.useSelected(address!);
  });

  const copied = element("span", { "aria-live": "polite" });
  const copy = button(
    texts.copy,
    () => {
      getSelection()?.selectAllChildren(shown);
      // Where the pane may not write to the clipboard, the text stands selected for the user's own copy.
      navigator.clipboard?.writeText(shown.textContent ?? "").then(
        () => (copied.textContent = texts.copied),
        () => undefined,
      );
    },
    "plain",
  );
  const root = element(
    "div",
    { class: "target" },
    element("p", { class: "formula-label" }, texts.formulaShown),
    shown,
    element("p", { class: "actions" }, copy, copied),
    element("div", { class: "fields" }, cell.root),
    element(
      "p",
      { class: "actions" },
      useSelected,
      button(texts.putIn, () => void put(), "main"),
    ),
    answer,
  );
  return {
    root,
    show(next, range) {
      const same = next?.text === formula?.text;
      formula = next;
      reads = range;
      // Cells changed, perhaps by the very formula just put in: what was said of it stays.
      if (same) return;
      shown.textContent = next ? localFormula(next.text, numbers.separators) : "";
      copied.textContent = "";
      fill(answer);
    },
  };
}
