import type { Cell } from "../../sheet/cell";
import type { PaneContext } from "../context";
import { afterPaint } from "../afterPaint";
import { element, fill } from "../dom/element";
import { lazyFold } from "../dom/part";
import { figure, table, type TableCell } from "../dom/table";
import { pictureFigure } from "../picture/pictureFigure";
import { fitPicture } from "./fitPicture";
import { morePicture } from "./morePicture";
import { outlierWords } from "./outlierWords";

/** Two closer looks, each on request: whether the shape fits, and what more scores would buy. */
export function closerLook(context: PaneContext): HTMLElement {
  const { texts, answer } = context;
  const fitFigure = pictureFigure(context);
  const below = element("div");
  const fit = lazyFold(
    texts.fitHeading,
    () => {
      const current = answer.get();
      if (!current?.report) return;
      fitFigure.show(fitPicture(current, context));
      fill(below, ...outlierWords(context).map((sentence) => element("p", {}, sentence)), ...rankingWords(context));
    },
    fitFigure.root,
    below,
  );
  const moreFigure = pictureFigure(context);
  const more = lazyFold(
    texts.moreHeading,
    () => {
      const current = answer.get();
      if (current?.report) moreFigure.show(morePicture(current, context));
    },
    moreFigure.root,
  );
  const root = element("div", {}, fit.root, more.root);
  const refresh = afterPaint(() => {
    fit.refresh();
    more.refresh();
  });
  answer.watch((current) => {
    root.hidden = !current?.report;
    refresh();
  });
  return root;
}

function rankingWords({ texts, numbers, call, answer }: PaneContext): HTMLElement[] {
  const { column, question } = answer.get()!;
  const [, low, high] = /^logit\(([^,]+),([^)]+)\)$/.exec(question.shape) ?? [];
  const bounds = low === undefined ? [] : [Number(low), Number(high)];
  const outcome = call("SHAPE_RANKING", [column.cells, ...bounds]);
  if (!outcome || "error" in outcome || !Array.isArray(outcome.value)) return [];
  const shown = (cell: Cell): TableCell =>
    typeof cell === "number" ? figure(numbers.telling(cell)) : figure(cell === "" ? texts.noAnswer : String(cell));
  return [
    table(
      texts.ranking,
      [texts.rankingShape, texts.rankingDifference, texts.rankingFit],
      (outcome.value as Cell[][])
        .slice(1)
        .map(([shape, , difference, p]) => [String(shape), shown(difference), shown(p)]),
    ),
    element("p", { class: "quiet" }, texts.rankingNote),
  ];
}
