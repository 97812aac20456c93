const MOST_DECIMALS = 6;

/** How many decimals the scores were given with: 71.5 and 70 → 1; undefined where they are finer than people score. */
export function scoreDecimals(values: Float64Array): number | undefined {
  let decimals = 0;
  for (let i = 0; i < values.length; i++) {
    while (!onGrid(values[i]!, decimals)) if (++decimals > MOST_DECIMALS) return undefined;
  }
  return decimals;
}

function onGrid(value: number, decimals: number): boolean {
  const scaled = value * 10 ** decimals;
  // 0.29 · 100 is 28.999999999999996: what matters is whether the written number has so many decimals.
  return Math.abs(scaled - Math.round(scaled)) <= 1e-9 * Math.max(1, Math.abs(scaled));
}

export interface GridMark {
  readonly mark: number;
  readonly decimals: number;
}

/**
 * The first score on the grid that clears a cutoff: whoever scores in tenths passes 81.9527 from 82.0 on, so that 82.0 takes exactly the
 * same entries and can be said aloud. Without a grid the cutoff is rounded to the strict side, to a thousandth of the spread.
 */
export function gridMark(
  cutoff: number,
  better: "high" | "low",
  decimals: number | undefined,
  spread: number,
): GridMark {
  const places = decimals ?? Math.min(Math.max(Math.ceil(3 - Math.log10(spread)), 0), 10);
  const scale = 10 ** places;
  const scaled = cutoff * scale;
  // A cutoff that lies on the grid but for the last bits is that point, not the next one.
  const near = Math.round(scaled);
  const step =
    Math.abs(scaled - near) < 1e-9 * Math.max(1, Math.abs(scaled))
      ? near
      : better === "low"
        ? Math.floor(scaled)
        : Math.ceil(scaled);
  return { mark: step / scale, decimals: places };
}
