import type { Separators } from "../hosts/port";
import type { NumberStyle } from "../plot/numberStyle";
import { decimalsOfStep, numberText } from "../plot/numberText";
import { percentText } from "../plot/percentText";

/** Numbers as this user reads and types them. */
export interface Numbers extends NumberStyle {
  readonly separators: Separators;
  number(value: number, decimals: number): string;
  count(value: number): string;
  /** Two digits that matter. */
  percent(fraction: number): string;
  /** As it was typed. */
  exactPercent(fraction: number): string;
  /** About four digits that matter, whatever the size. */
  telling(value: number): string;
  /** Every digit that the cell holds. */
  full(value: number): string;
}

export function numbersFor(separators: Separators, percentGap: string): Numbers {
  const { decimal } = separators;
  const style: NumberStyle = { decimal, percentGap };
  return {
    ...style,
    separators,
    number: (value, decimals) => numberText(value, decimals, decimal),
    count: (value) => numberText(value, 0, decimal),
    percent: (fraction) => percentText(fraction, style),
    exactPercent: (fraction) => percentText(fraction, style, true),
    telling: (value) => numberText(value, tellingDecimals(value), decimal),
    full: (value) => String(value).replace(".", decimal).replace("-", "−"),
  };
}

function tellingDecimals(value: number): number {
  if (value === 0 || !Number.isFinite(value)) return 0;
  const wanted = Math.min(Math.max(3 - Math.floor(Math.log10(Math.abs(value))), 0), 10);
  // 12 rather than 12.00 where it is a whole number anyway.
  return Number.isInteger(value) ? 0 : Math.min(wanted, Math.max(decimalsOfStep(Math.abs(value)), 1));
}
