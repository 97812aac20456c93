import type { Sample } from "./sample";
import type { Shape } from "./shape";

/** A normal curve on a shape's scale, and the way between that scale and the scores. */
export interface Curve {
  readonly shape: Shape;
  /** The Box-Cox power in use, given or fitted; undefined for the other shapes. */
  readonly power?: number;
  /** True where the power was fitted to these scores: limits are then approximate. */
  readonly powerFitted: boolean;
  readonly count: number;
  /** Mean and sample standard deviation (n − 1) on the scale. */
  readonly mean: number;
  readonly sd: number;
  /** The scores on the scale (the sample itself for the normal shape). */
  readonly scaled: Sample;
  readonly toScale: (score: number) => number;
  /** NaN where a point of the scale belongs to no score (a Box-Cox power carries it off). */
  readonly fromScale: (point: number) => number;
}
