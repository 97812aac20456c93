import type { NumberStyle } from "./numberStyle";
import { numberText } from "./numberText";

/**
 * A fraction as a percentage that can be read at a glance: two digits that matter (5 %, 2.5 %, 0.013 %), and near 100 % as many as tell it
 * from 100 %. What was typed exactly (12.5 %) stays as typed where `exact` is set.
 */
export function percentText(fraction: number, style: NumberStyle, exact = false): string {
  return `${numberText(fraction * 100, percentDecimals(fraction, exact), style.decimal)}${style.percentGap}%`;
}

function percentDecimals(fraction: number, exact: boolean): number {
  const percent = Math.abs(fraction) * 100;
  if (exact) return shortestDecimals(percent);
  if (percent === 0 || percent === 100) return 0;
  const telling = percent > 50 && percent < 100 ? 100 - percent : percent;
  const decimals = Math.min(Math.max(1 - Math.floor(Math.log10(telling)), 0), 6);
  // 5 % rather than 5.0 %: a zero at the end would claim a digit that nobody asked for.
  return shortestDecimals(Number(percent.toFixed(decimals)));
}

function shortestDecimals(percent: number): number {
  const shortest = Number(percent.toPrecision(12));
  const [, rest = ""] = String(shortest).split(".");
  return rest.includes("e") ? 6 : rest.length;
}
