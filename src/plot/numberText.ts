import type { Decimal } from "./numberStyle";

const NARROW_SPACE = "\u202f";

/** A number for reading: so many decimals, the user's decimal mark, a true minus, thousands set apart from 10,000 on. */
export function numberText(value: number, decimals: number, decimal: Decimal = "."): string {
  const [whole, rest] = Math.abs(value)
    .toFixed(Math.min(Math.max(decimals, 0), 20))
    .split(".") as [string, string?];
  // toFixed itself turns to exponents there; grouping would cut one in two.
  if (whole.includes("e")) return String(value).replace(".", decimal);
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, NARROW_SPACE) : whole;
  const digits = rest === undefined ? grouped : `${grouped}${decimal}${rest}`;
  return value < 0 && /[1-9]/.test(digits) ? `−${digits}` : digits;
}

/** How many decimals tell numbers apart that lie `step` from one another: 5 → 0, 0.5 → 1, 0.02 → 2. */
export function decimalsOfStep(step: number): number {
  if (!(step > 0 && step < Infinity)) return 0;
  for (let decimals = 0; decimals < 12; decimals++) {
    const scaled = step * 10 ** decimals;
    if (Math.abs(scaled - Math.round(scaled)) < 1e-6 * scaled && Math.round(scaled) > 0) return decimals;
  }
  return 12;
}
