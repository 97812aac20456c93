import type { Sample } from "./sample";
import type { Shape } from "./shape";

/**
 * A normal curve on a shape's scale, and the way between that scale and the scores.
 *
 * `mean`, `sd`, `scaled`, `toScale` and `fromScale` belong together: compute marks and standings with them. For the lognormal and the
 * Box-Cox shapes they stand on the scale of score / geometric mean, because (x^λ − 1)/λ itself loses its digits where x^λ is small
 * beside 1. What a cell shows as mean and deviation is `shownMean` and `shownSd`, on ln x or (x^λ − 1)/λ as the catalogue says.
 */
export interface Curve {
  readonly shape: Shape;
  /** The Box-Cox power in use, given or fitted; undefined for the other shapes. */
  readonly power?: number;
  /** True where the power was fitted to these scores: limits are then approximate. */
  readonly powerFitted: boolean;
  readonly count: number;
  /** Mean and sample standard deviation (n − 1) on the working scale. */
  readonly mean: number;
  readonly sd: number;
  /** The same on the shape's own scale: for showing, not for computing on. */
  readonly shownMean: number;
  readonly shownSd: number;
  /** The scores on the working scale (the sample itself for the normal shape). */
  readonly scaled: Sample;
  /** NaN for a score outside the shape. */
  readonly toScale: (score: number) => number;
  /** NaN where a point of the scale belongs to no score (a Box-Cox power carries it off, or it overflows). */
  readonly fromScale: (point: number) => number;
}
