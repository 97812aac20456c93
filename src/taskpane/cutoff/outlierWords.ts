import { formatAddress, parseAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import { listed } from "../column/listed";

/** A sentence or two on the scores that stand out from the curve, each by its cell; the function's own words where it can't tell. */
export function outlierWords({ call, texts, numbers, answer }: PaneContext): string[] {
  const { column, question } = answer.get()!;
  const outcome = call("OUTLIER_FLAGS", [column.cells, undefined, undefined, question.shape]);
  if (!outcome) return [];
  if ("error" in outcome) return [outcome.message];
  const flags = Array.isArray(outcome.value) ? outcome.value : [];
  const area = parseAddress(column.address)!;
  const places = flags.flatMap((row, index) =>
    row[0] === true
      ? [formatAddress({ top: area.top + index, bottom: area.top + index, left: area.left, right: area.left })]
      : [],
  );
  if (places.length === 0) return [texts.outliersNone];
  return [texts.outliers(numbers.count(places.length), listed(places, texts, numbers)), texts.outliersAdvice];
}
