import type { PaneContext } from "../context";
import type { Refusal } from "../cutoff/answerCutoff";
import { afterPaint } from "../afterPaint";
import { element, fill } from "../dom/element";
import { fold, part, type PanePart } from "../dom/part";
import { keepChanges } from "../keepChanges";
import type { Observable } from "../observable";
import { pictureFigure } from "../picture/pictureFigure";
import { formulaChooser } from "../target/formulaChooser";
import { answerSearch, isRefusal, type SearchAnswer } from "./answerSearch";
import { chancePicture } from "./chancePicture";
import { reserveForm, searchForm } from "./searchForm";
import { searchFormulas } from "./searchFormulas";
import type { SearchQuestion } from "./searchQuestion";
import { trialView } from "./trialView";
import { loadTable, scheduleTable } from "./searchTables";

/** The search for entries that clear the mark: looks, load, cost, time, and when to stop. Works without a column too. */
export function searchPart(context: PaneContext, search: Observable<SearchQuestion>): PanePart {
  const { texts, numbers, call, question, answer: cutoff, port } = context;
  const aim = element("p", { class: "quiet" });
  const words = element("div", { class: "answer" });
  const picture = pictureFigure(context);
  const load = element("div");
  const reserve = element("div", { "aria-live": "polite" });
  const chooser = formulaChooser(context, texts.formulaHeading);

  const ask = afterPaint(() => {
    const { fraction } = question.get();
    const asked = search.get();
    const answer = answerSearch(call, fraction, asked, cutoff.get());
    aim.textContent = texts.searchAim(numbers.exactPercent(fraction));
    fill(words, ...answerWords(context, asked, answer));
    picture.show(chancePicture(context, fraction, asked, cutoff.get(), answer));
    fill(load, ...loadWords(context, answer));
    fill(reserve, ...reserveWords(context, asked, answer));
    chooser.offer(searchFormulas(fraction, asked, cutoff.get(), texts));
  });
  cutoff.watch(ask);
  question.watch(ask);
  search.watch(ask);
  keepChanges(port, "search", search);
  return part(
    "search",
    texts.searchHeading,
    aim,
    ...searchForm(context, search),
    words,
    picture.root,
    load,
    fold(texts.reserveHeading, search.get().lookCost !== undefined, reserveForm(context, search), reserve),
    trialView(context),
    chooser.root,
  );
}

function refusalLine({ message, error }: Refusal): HTMLElement {
  return element("p", { class: "message", lang: "en" }, `${error} ${message}`);
}

function answerWords(
  { texts, numbers, answer: cutoff }: PaneContext,
  asked: SearchQuestion,
  answer: SearchAnswer,
): HTMLElement[] {
  const { looksHalf, looksMost, expected, estimated, budget, periods } = answer;
  const chance = numbers.exactPercent(asked.chance);
  for (const refused of [looksMost, looksHalf, expected]) if (isRefusal(refused)) return [refusalLine(refused)];
  const [most, half, average] = [looksMost, looksHalf, expected].map((value) => numbers.telling(value as number)) as [
    string,
    string,
    string,
  ];
  const lines: HTMLElement[] = [element("p", { class: "mark" }, texts.searchLooks(most, chance))];
  const say = (sentence: string) => lines.push(element("p", {}, sentence));
  if (estimated) {
    say(texts.searchEstimated(numbers.count(cutoff.get()!.report!.count), half));
    say(texts.searchAverage(average));
  } else say(texts.searchKnown(average, half));
  if (isRefusal(budget)) lines.push(refusalLine(budget));
  else say(texts.searchBudget(numbers.telling(budget), chance));
  if (isRefusal(periods)) lines.push(refusalLine(periods));
  else if (periods !== undefined) say(texts.searchPeriods(numbers.telling(periods), chance));
  return lines;
}

function loadWords(context: PaneContext, { load }: SearchAnswer): HTMLElement[] {
  const { texts, numbers, answer } = context;
  if (isRefusal(load)) return [refusalLine(load)];
  const learnt = answer.get()?.report?.count ?? 0;
  return [loadTable(context, load), element("p", { class: "quiet" }, texts.loadNote(numbers.count(learnt)))];
}

function reserveWords(
  context: PaneContext,
  { lookCost }: SearchQuestion,
  { reserve, schedule }: SearchAnswer,
): HTMLElement[] {
  const { texts, numbers, question } = context;
  if (lookCost === undefined) return [];
  if (reserve === undefined) return [element("p", {}, texts.reserveNeeds)];
  if (isRefusal(reserve)) return [refusalLine(reserve)];
  const { better } = question.get();
  const shown = numbers.telling(reserve);
  return [
    element("p", { class: "mark" }, better === "low" ? texts.reserveLow(shown) : texts.reserveHigh(shown)),
    element("p", {}, texts.reserveWhy),
    ...(schedule === undefined
      ? []
      : [isRefusal(schedule) ? refusalLine(schedule) : scheduleTable(context, schedule, better)]),
  ];
}
