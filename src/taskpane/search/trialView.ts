import { MARK_METHODS, type MarkMethod } from "../../core/method/markFactor";
import type { SearchPlan } from "../../core/method/searchPlan";
import type { SearchSummary } from "../../core/method/summariseSearches";
import type { PaneContext } from "../context";
import { afterPaint } from "../afterPaint";
import { button, choice } from "../dom/choice";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { fold } from "../dom/part";
import { figure, table } from "../dom/table";
import { formulaText } from "../formula";
import { problemWords } from "../problemWords";
import { formulaChooser } from "../target/formulaChooser";
import { typedCount } from "../typed";
import { simulationWorker, trialRunner } from "./trial";

const USUAL_LEARNING = 60;

/** The search tried out many times in the background, with progress and a way to stop it. */
export function trialView(context: PaneContext): HTMLElement {
  const { texts, numbers, answer, question } = context;
  const runner = trialRunner(simulationWorker);
  const asked = { learnCount: undefined as number | undefined, runs: 10_000, seed: 1, mostLooks: 10_000 };
  let method: MarkMethod = "plain";
  const learnt = () => asked.learnCount ?? answer.get()?.report?.count ?? USUAL_LEARNING;
  const plan = (): SearchPlan => ({ ...asked, fraction: question.get().fraction, learnCount: learnt(), method });

  const about = element("p", { class: "quiet" });
  const progress = element("progress", { max: 1, value: 0, "aria-label": texts.tryHeading });
  const message = element("p", { "aria-live": "polite" });
  const result = element("div", { "aria-live": "polite" });
  const chooser = formulaChooser(context, texts.formulaHeading);
  const changed = () => {
    about.textContent = texts.tryAbout(numbers.count(learnt()), numbers.exactPercent(question.get().fraction));
    const { fraction, learnCount, runs, seed, mostLooks } = plan();
    const given = [0, 1, fraction, learnCount, method === "plain" ? undefined : method, runs, seed, mostLooks];
    chooser.offer([
      { words: texts.tryHeading, formula: { text: formulaText("SIMULATED_SEARCH", given), rows: 7, columns: 2 } },
    ]);
  };
  const line = (label: string, key: keyof typeof asked, least: number, hint = "") => {
    const first = asked[key];
    const made = field(
      label,
      first === undefined ? "" : String(first),
      (text) => {
        const typed = typedCount(text, numbers.decimal, least);
        const empty = key === "learnCount" && text.trim() === "";
        made.problem(empty ? "" : problemWords(typed, text, texts, numbers));
        if (empty) asked.learnCount = undefined;
        else if ("value" in typed) asked[key] = typed.value;
        changed();
      },
      hint,
    );
    return made.root;
  };
  const methodWords = { plain: texts.plain, safe: texts.safe, next: texts.next };
  const methods = choice(
    texts.tryMethod,
    MARK_METHODS.map((one) => [one, methodWords[one]] as const),
    method,
    (value) => {
      method = value as MarkMethod;
      changed();
    },
  );
  const running = (on: boolean) => {
    progress.hidden = cancel.hidden = !on;
    start.hidden = on;
  };
  const start = button(texts.tryStart, () => {
    fill(result);
    progress.value = 0;
    message.textContent = "";
    running(true);
    cancel.focus();
    const ended = (words: string) => {
      const here = document.activeElement === cancel;
      running(false);
      if (here) start.focus();
      message.textContent = words;
    };
    runner.start(plan(), {
      progress: (played, runs) => {
        progress.value = played / runs;
        progress.textContent = texts.tryProgress(numbers.count(played), numbers.count(runs));
      },
      done: (summary) => {
        ended("");
        fill(result, ...summaryWords(context, summary));
      },
      cancelled: () => ended(texts.tryCancelled),
      failed: (words) => ended(texts.tryFailed(words)),
    });
  });
  const cancel = button(texts.tryCancel, () => runner.cancel());
  running(false);
  const later = afterPaint(changed);
  answer.watch(later);
  question.watch(later);
  return fold(
    texts.tryHeading,
    false,
    about,
    element(
      "div",
      { class: "fields" },
      line(texts.tryLearn, "learnCount", 2),
      methods.root,
      line(texts.tryRuns, "runs", 1),
      line(texts.trySeed, "seed", 0, texts.trySeedHint),
      line(texts.tryMost, "mostLooks", 1),
    ),
    element("p", { class: "actions" }, start, cancel, progress),
    message,
    result,
    chooser.root,
  );
}

function summaryWords({ texts, numbers }: PaneContext, summary: SearchSummary): HTMLElement[] {
  const { averageLooks, medianLooks, ninetiethLooks, firstHitNotTop, foundNothing, lowestPassing, highestPassing } =
    summary;
  const [median, ninetieth] = [numbers.count(medianLooks), numbers.count(ninetiethLooks)];
  return [
    element("p", {}, texts.tryResult(median, ninetieth)),
    table(
      texts.tryTable,
      [],
      [
        [texts.tryAverage, figure(numbers.telling(averageLooks))],
        [texts.tryMedian, figure(median)],
        [texts.tryNinetieth, figure(ninetieth)],
        [texts.tryNotTop, figure(firstHitNotTop === undefined ? texts.noAnswer : numbers.percent(firstHitNotTop))],
        [texts.tryNothing, figure(numbers.percent(foundNothing))],
        [texts.tryLowest, figure(numbers.percent(lowestPassing))],
        [texts.tryHighest, figure(numbers.percent(highestPassing))],
      ],
    ),
    element("p", { class: "quiet" }, texts.tryNote),
  ];
}
