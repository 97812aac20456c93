import { NUMBERS_REVISION } from "../../core/release";
import type { PaneContext } from "../context";
import { button } from "../dom/choice";
import { element, fill } from "../dom/element";
import { timeOfDay, today } from "../today";
import type { BookReader } from "./bookReader";
import { checkSummary } from "./checkSummary";
import { findings } from "./findings";
import { findingsView } from "./findingsView";
import { loadProof } from "./loadProof";
import { reportView, type Checked } from "./reportView";

/** What is over sooner needs no bar. */
const QUICK_MS = 300;

/** All calls of the workbook worked out again in one action, with progress and a way to stop it. */
export function checkView(context: PaneContext, reader: BookReader): HTMLElement {
  const { texts, numbers } = context;
  let running: { cancelled: boolean } | undefined;
  const progress = element("progress", { max: 1, "aria-label": texts.checkAll });
  const counted = element("p", { class: "quiet" });
  const message = element("p", { "aria-live": "polite" });
  const summary = element("p", { "aria-live": "polite" });
  const result = element("div");
  const stale = element("p", { class: "notice", "aria-live": "polite", hidden: true });
  const list = findingsView(context);

  const busy = (on: boolean) => {
    const here = document.activeElement;
    progress.hidden = cancel.hidden = counted.hidden = !on;
    start.hidden = on;
    // The button that was pressed is gone: the keyboard goes on at the one in its place.
    if (on && here === start) cancel.focus();
    if (!on && here === cancel) start.focus();
  };
  const check = async (mine: { cancelled: boolean }): Promise<Checked & { upTo: number }> => {
    const [{ book, upTo }, { checkBook }] = await Promise.all([reader.read(), loadProof()]);
    const audit = await checkBook(book, {
      progress(done, calls) {
        progress.value = done / calls;
        counted.textContent = texts.checkProgress(numbers.count(done), numbers.count(calls));
      },
      cancelled: () => mine.cancelled,
    });
    return { audit, title: book.title, at: new Date(), upTo };
  };
  const run = async () => {
    if (running) return;
    const mine = (running = { cancelled: false });
    fill(message);
    progress.removeAttribute("value");
    counted.textContent = texts.checkReading;
    const late = setTimeout(() => busy(true), QUICK_MS);
    try {
      const checked = await check(mine);
      if (mine !== running) return;
      show(checked);
      checkedUpTo = checked.upTo;
      stale.hidden = reader.edits.get() === checkedUpTo;
    } catch (failure) {
      if (mine !== running) return;
      const reason = failure instanceof Error ? failure.message : String(failure);
      message.textContent = texts.checkFailed(reason);
    } finally {
      clearTimeout(late);
      if (mine === running) {
        running = undefined;
        busy(false);
      }
    }
  };
  const show = (checked: Checked) => {
    summary.textContent = checkSummary(context, checked.audit);
    const when = texts.checkedAt(today(checked.at), timeOfDay(checked.at), numbers.count(NUMBERS_REVISION));
    list.show(findings(checked.audit));
    fill(result, element("p", { class: "quiet" }, when), stale, list.root, reportView(context, checked));
    start.textContent = texts.checkAgain;
  };
  let checkedUpTo: number | undefined;
  const start = button(texts.checkAll, () => void run(), "main");
  const cancel = button(texts.checkCancel, () => {
    if (!running) return;
    running.cancelled = true;
    running = undefined;
    busy(false);
    message.textContent = texts.checkCancelled;
  });
  stale.textContent = texts.checkStale;
  reader.edits.watch((edits) => {
    if (checkedUpTo !== undefined && edits !== checkedUpTo) stale.hidden = false;
  });
  busy(false);
  return element(
    "div",
    {},
    element("p", { class: "quiet" }, texts.proofAbout),
    element("p", { class: "actions" }, start, cancel, progress),
    counted,
    message,
    summary,
    result,
  );
}
