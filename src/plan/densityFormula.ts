import type { Shape } from "../core/sample/shape";

const CURVE = (item: string) => `WEIR.SCORE_CURVE(weir_scores,weir_shape,"${item}")`;
const MEAN = "weir_chart_mean";
const SD = "weir_chart_sd";
const POWER = "weir_chart_power";

/** Cells that the curve is drawn from, each with its defined name: on the scale of the shape, not in score points. */
export function curveCells(shape: Shape): readonly (readonly [name: string, label: string, formula: string])[] {
  const cells: (readonly [string, string, string])[] = [
    [MEAN, "curve mean", CURVE("curve mean")],
    [SD, "curve standard deviation", CURVE("curve standard deviation")],
  ];
  if (shape.kind === "boxcox")
    cells.push([POWER, "power", shape.power === undefined ? CURVE("power") : String(shape.power)]);
  return cells;
}

/**
 * How many entries a bin of this width would hold at the score in cell `x`, by the fitted curve, in functions of the host. Made for the
 * shape of the day: with another one in the plan it is #N/A, since a curve on the wrong scale would be a plausible lie.
 */
export function densityFormula(shape: Shape, shapeText: string, x: string, width: number): string {
  const normal = (point: string, slope: string) =>
    `weir_count*${width}*NORM.DIST(${point},${MEAN},${SD},FALSE)${slope}`;
  const text = `"${shapeText.replace(/"/g, '""')}"`;
  return `IF(weir_shape=${text},${density()},NA())`;

  function density(): string {
    switch (shape.kind) {
      case "normal":
        return normal(x, "");
      case "lognormal":
        return normal(`LN(${x})`, `/${x}`);
      case "logit": {
        const [above, below] = [`(${x}-${signed(shape.low)})`, `(${signed(shape.high)}-${x})`];
        return normal(`LN(${above}/${below})`, `*${shape.high - shape.low}/(${above}*${below})`);
      }
      case "boxcox":
        return normal(`IF(${POWER}=0,LN(${x}),(${x}^${POWER}-1)/${POWER})`, `*${x}^(${POWER}-1)`);
    }
  }
}

function signed(value: number): string {
  return value < 0 ? `(${value})` : String(value);
}
