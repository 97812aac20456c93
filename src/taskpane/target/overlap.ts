import type { Area } from "../../sheet/address";

/** True where two areas share a cell; one without a sheet stands on whatever sheet the other does. */
export function overlap(a: Area, b: Area): boolean {
  const sameSheet = a.sheet === undefined || b.sheet === undefined || a.sheet.toLowerCase() === b.sheet.toLowerCase();
  return sameSheet && a.left <= b.right && b.left <= a.right && a.top <= b.bottom && b.top <= a.bottom;
}
