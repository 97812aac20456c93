import { numberAsText } from "../coerce";
import { NotKnown } from "../value";

const PATTERN = /^(#,##)?0(\.0+)?(%?)$/;

/** A number by a number format: the plain ones (`0`, `0.00`, `#,##0.0`, `0%`, General). Others depend on the host's language. */
export function formatNumber(value: number, pattern: string): string {
  if (/^(general|@)$/i.test(pattern)) return numberAsText(value);
  const match = PATTERN.exec(pattern);
  if (!match) throw new NotKnown(`the number format “${pattern}” is not known here`);
  const [, grouped, decimals = "", percent] = match;
  const scaled = Number((percent ? value * 100 : value).toPrecision(15));
  const places = Math.max(0, decimals.length - 1);
  const digits = fixed(Math.abs(scaled), places);
  const [whole, rest] = digits.split(".") as [string, string?];
  const parted = grouped ? whole.replace(/\B(?=(\d{3})+$)/g, ",") : whole;
  const sign = scaled < 0 && /[1-9]/.test(digits) ? "-" : "";
  return `${sign}${parted}${rest === undefined ? "" : `.${rest}`}${percent}`;
}

/** Half away from zero on the 15 digits that a sheet has: toFixed rounds the binary number, and so 1.005 down. */
function fixed(value: number, places: number): string {
  if (value >= 1e21 || places > 30) throw new NotKnown("the number is too large for a number format");
  const shifted = Number(`${value}e${places}`);
  if (!Number.isFinite(shifted) || shifted > 1e15) return value.toFixed(places);
  return Number(`${Math.round(shifted)}e-${places}`).toFixed(places);
}
