import { formatAddress, parseAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import type { Column } from "../column/readColumn";
import { afterPaint } from "../afterPaint";
import { element, fill } from "../dom/element";
import { field } from "../dom/field";
import { part, type PanePart } from "../dom/part";
import { formulaText } from "../formula";
import { pictureFigure } from "../picture/pictureFigure";
import { problemWords } from "../problemWords";
import { formulaChooser } from "../target/formulaChooser";
import { typedCount } from "../typed";
import { answerDrift, usualBaseline, type Drift } from "./answerDrift";
import { driftPicture, driftSentence } from "./driftPicture";

const FEWEST = 4;

/** Scores over time: whether the later ones still come from the curve of the first ones. */
export function watchPart(context: PaneContext): PanePart {
  const { texts, numbers, call, column } = context;
  let typed: number | undefined;
  const words = element("div");
  const picture = pictureFigure(context);
  const chooser = formulaChooser(context, texts.formulaHeading);
  const first = field(texts.driftFirst, "", (text) => {
    const read = typedCount(text, numbers.decimal, 2);
    const empty = text.trim() === "";
    first.problem(empty ? "" : problemWords(read, text, texts, numbers));
    if (!empty && !("value" in read)) return;
    typed = "value" in read ? read.value : undefined;
    look();
  });
  const hint = element("p", { class: "hint wide" });
  const nothing = (sentence: string) => {
    fill(words, element("p", { class: "quiet" }, sentence));
    picture.show(undefined);
    chooser.offer([]);
  };
  const look = () => {
    const current = column.get();
    if (!current) return nothing(texts.noColumn);
    const usual = usualBaseline(current.count);
    hint.textContent = texts.driftFirstHint(numbers.count(usual));
    const baseline = Math.min(typed ?? usual, current.count - 1);
    if (current.count < FEWEST || current.offenders.length > 0) return nothing(texts.driftFew);
    const drift = answerDrift(call, current, baseline);
    if ("error" in drift) return nothing(`${drift.error} ${drift.message}`);
    fill(words, ...driftWords(context, drift, baseline));
    picture.show(driftPicture(drift, current, context));
    const formula = driftFormula(current, baseline);
    const reads = current.address;
    chooser.offer([
      { words: texts.driftTitle(""), formula: { text: formula, rows: drift.scores.length + 1, columns: 5 }, reads },
    ]);
  };
  column.watch(afterPaint(look));
  const form = element("div", { class: "fields one" }, first.root, hint);
  return part(
    "watch",
    texts.watchHeading,
    element("p", { class: "quiet" }, texts.driftAbout),
    form,
    words,
    picture.root,
    chooser.root,
  );
}

function driftWords({ texts, numbers }: PaneContext, drift: Drift, baseline: number): HTMLElement[] {
  const shift = drift.comparison.get("mean shift");
  const p = drift.comparison.get("Welch p-value");
  const compared =
    typeof shift === "number" && typeof p === "number"
      ? texts.driftShift(
          numbers.telling(Math.abs(shift)),
          shift > 0,
          numbers.count(drift.scores.length),
          numbers.count(baseline),
          numbers.telling(p),
        )
      : "";
  return [
    element("p", { class: drift.first ? "notice" : undefined }, driftSentence(drift, { texts, numbers })),
    ...(compared === "" ? [] : [element("p", {}, compared)]),
    element("p", { class: "quiet" }, texts.driftNote),
  ];
}

/** The later scores held against the first ones, both by their cells: the row in which the first ones end is where they do on the sheet. */
export function driftFormula({ address, cells }: Column, baseline: number): string {
  const area = parseAddress(address)!;
  let seen = 0;
  const split = cells.findIndex(([cell]) => typeof cell === "number" && ++seen === baseline);
  const before = formatAddress({ ...area, bottom: area.top + split });
  const after = formatAddress({ ...area, top: area.top + split + 1 });
  return formulaText("DRIFT_FLAGS", [
    { reference: after },
    { reference: `AVERAGE(${before})` },
    { reference: `STDEV(${before})` },
  ]);
}
