import type { Decimal } from "../plot/numberStyle";

/** What was typed, read: a value, or why it can't be one. */
export type Typed =
  | { readonly value: number }
  | { readonly problem: "empty" | "no-number" | "not-between" | "percent-sign-missing" | "not-whole" | "not-positive" }
  | { readonly problem: "too-small"; readonly least: number };

/**
 * Reads a number as people type it. The user's own decimal mark counts; the other one is taken for a decimal mark too, except where it can
 * only part thousands in that user's habit (1,250 with a decimal point). Undefined where it is no number.
 */
export function typedNumber(typed: string, decimal: Decimal): number | undefined {
  const bare = typed.replace(/[\s\u00a0\u202f']/g, "").replace(/^−/, "-");
  const other = decimal === "." ? "," : ".";
  const grouped = new RegExp(`^[-+]?[1-9]\\d{0,2}(\\${other}\\d{3})+(\\${decimal}\\d*)?$`);
  const plain = grouped.test(bare) ? bare.split(other).join("") : bare;
  const marks = plain.replace(/[^.,]/g, "");
  if (marks.length > 1) return undefined;
  const pointed = plain.replace(/,/g, ".");
  if (!/^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(pointed)) return undefined;
  // Written out, 1e999 is a number; here it would be taken for an endless one.
  return Number.isFinite(Number(pointed)) ? Number(pointed) : undefined;
}

/** Reads a fraction: `5%`, `5 %`, `0.05`, `0,05`. A bare 5 is asked back, never taken for 5 %. With `whole` 100 % may be typed too. */
export function typedFraction(typed: string, decimal: Decimal, whole = false): Typed {
  if (typed.trim() === "") return { problem: "empty" };
  const percent = /[%٪﹪％]\s*$/.test(typed);
  const number = typedNumber(typed.replace(/[%٪﹪％]\s*$/, ""), decimal);
  if (number === undefined) return { problem: "no-number" };
  // Through decimal text: 5.7 / 100 is not the 0.057 that a cell would hold.
  const value = percent ? Number(`${number}e-2`) : number;
  if (value > 0 && (value < 1 || (whole && value === 1))) return { value };
  return { problem: !percent && number >= 1 && number < 100 ? "percent-sign-missing" : "not-between" };
}

/** Reads a whole number of at least `least`. */
export function typedCount(typed: string, decimal: Decimal, least = 1): Typed {
  if (typed.trim() === "") return { problem: "empty" };
  const value = typedNumber(typed, decimal);
  if (value === undefined) return { problem: "no-number" };
  if (!Number.isInteger(value)) return { problem: "not-whole" };
  return value >= least ? { value } : { problem: "too-small", least };
}

/** Reads an amount of at least 0. */
export function typedAmount(typed: string, decimal: Decimal): Typed {
  if (typed.trim() === "") return { problem: "empty" };
  const value = typedNumber(typed, decimal);
  if (value === undefined) return { problem: "no-number" };
  return value >= 0 ? { value } : { problem: "too-small", least: 0 };
}
