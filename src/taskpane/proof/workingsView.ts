import { parseAddress, formatAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import { afterPaint } from "../afterPaint";
import { button, choice } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { lazyFold } from "../dom/part";
import type { BookReader } from "./bookReader";
import { loadProof } from "./loadProof";
import { stepsView } from "./stepsView";
import type { WorkedCell } from "./workingsOf";
import { writeWorkings } from "./writeWorkings";

/** The selected cell step by step: follows the selection while it is open. */
export function workingsView(context: PaneContext, reader: BookReader): HTMLElement {
  const { texts, selected } = context;
  let turn = 0;
  let worked: WorkedCell | undefined;
  const words = element("p", { "aria-live": "polite" });
  const ask = element("p", { class: "actions" });
  const steps = element("div");
  const message = element("p", { "aria-live": "polite" });
  const chosen = () => worked?.calls[Number(which.select.value)] ?? worked?.calls[0];
  const which = choice(texts.workingsWhich, [], "", () => draw());
  const choosing = element("div", { class: "fields one" }, which.root);
  const write = button(texts.workingsWrite, () => {
    const call = chosen();
    if (!worked || !call) return;
    writeWorkings(context, worked, call, where.input.value).then(
      (said) => (message.textContent = said),
      (failure) => (message.textContent = texts.writeFailed(String(failure?.message ?? failure))),
    );
  });
  const where = field(texts.workingsWhere, "", () => fill(message), texts.workingsWhereHint);
  const action = element(
    "div",
    {},
    element("div", { class: "fields one" }, where.root),
    element("p", { class: "actions" }, write),
  );
  const draw = () => {
    const call = chosen();
    fill(steps, call && stepsView(context, call));
    action.hidden = !call || call.steps.length === 0;
    fill(message);
  };
  const take = (next: WorkedCell | undefined, sentence: string) => {
    words.textContent = sentence;
    fill(ask);
    const before = worked;
    const same = next !== undefined && JSON.stringify(next) === JSON.stringify(before);
    worked = next;
    // Cells changed elsewhere, perhaps by the very workings just written: what was said of it stays.
    if (same) return;
    const typed = next?.calls.map(({ text }) => text) ?? [];
    choosing.hidden = typed.length < 2;
    const kept = next?.address === before?.address ? before?.calls[Number(which.select.value)]?.text : undefined;
    const chosen = kept === undefined ? 0 : Math.max(0, typed.indexOf(kept));
    which.offer(
      typed.map((text, index) => [String(index), text] as const),
      String(chosen),
    );
    draw();
  };
  const look = async (asked: boolean) => {
    const mine = ++turn;
    const address = firstCell(selected.get());
    if (address === undefined) return take(undefined, texts.workingsSelect);
    if (reader.slow() && !asked) {
      take(undefined, "");
      return fill(
        ask,
        button(texts.workingsShow(address), () => tell(true)),
      );
    }
    const [{ book }, { workingsOf }] = await Promise.all([reader.current(), loadProof()]);
    if (mine !== turn) return;
    const found = workingsOf(book, address);
    take(found, found ? texts.workingsOf(found.address) : texts.workingsNone(address));
  };
  const tell = (asked: boolean) => {
    look(asked).catch((failure) => take(undefined, texts.workingsFailed(String(failure?.message ?? failure))));
  };
  const made = lazyFold(texts.workingsHeading, () => tell(false), words, ask, choosing, steps, action, message);
  const later = afterPaint(made.refresh);
  selected.watch(later);
  reader.edits.watch(later);
  take(undefined, texts.workingsSelect);
  return made.root;
}

function firstCell(address: string | undefined): string | undefined {
  const area = address === undefined ? undefined : parseAddress(address);
  return area && formatAddress({ ...area, bottom: area.top, right: area.left });
}
