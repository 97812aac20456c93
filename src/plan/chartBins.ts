import type { Shape } from "../core/sample/shape";
import { binScores } from "../plot/binScores";

export interface ChartBins {
  readonly edges: readonly number[];
  readonly width: number;
  /** Where the axis begins and ends. */
  readonly from: number;
  readonly to: number;
}

/** Bins of the scores and an axis around them on which the tails of the curve and the marks find room, as far as the shape reaches. */
export function chartBins(sorted: Float64Array, shape: Shape): ChartBins {
  const { start, width, counts } = binScores(sorted);
  // The digits of an edge are those of its width, not what repeated adding leaves.
  const round = (value: number) => Number(value.toPrecision(12));
  const edges = Array.from({ length: counts.length + 1 }, (_, bin) => round(start + bin * width));
  const low = sorted[0]!;
  const span = sorted[sorted.length - 1]! - low;
  const steps = Math.ceil(Math.max(0.2 * span, 2 * width) / width);
  let from = round(start - steps * width);
  let to = round(edges[edges.length - 1]! + steps * width);
  if (shape.kind === "lognormal" || shape.kind === "boxcox") from = Math.max(from, low / 2);
  if (shape.kind === "logit") {
    const margin = (shape.high - shape.low) / 1000;
    from = Math.max(from, shape.low + margin);
    to = Math.min(to, shape.high - margin);
  }
  return { edges, width, from, to };
}
