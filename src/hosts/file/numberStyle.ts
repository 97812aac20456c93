import type { Separator } from "./separator";

/** How numbers are written in a delimited file. `grouped` where a sign between thousands may be believed. */
export interface NumberStyle {
  readonly decimal: "." | ",";
  readonly grouped: boolean;
}

const GROUPED_BY_COMMA = /^[+-]?[1-9]\d{0,2}(,\d{3})+$/;
const GROUPED_BY_POINT = /^[+-]?[1-9]\d{0,2}(\.\d{3})+$/;
const COMMA_DECIMAL = /^[+-]?\d*,\d+ ?%?$/;
const POINT_DECIMAL = /^[+-]?\d*\.\d+ ?%?$/;

/**
 * Finds whether numbers have a decimal point or a decimal comma. `1.234` and `1,234` prove nothing, since they may be thousands. Semicolons
 * go with the decimal comma unless the file clearly has decimal points; commas between the fields go with the decimal point.
 * Thousands are believed only where the file's decimal sign is settled: else `1.234` stays a text, which a function refuses by its place.
 */
export function findNumberStyle(records: readonly (readonly string[])[], separator: Separator): NumberStyle {
  let commas = 0;
  let points = 0;
  for (const record of records) {
    for (const field of record) {
      const text = field.trim();
      if (COMMA_DECIMAL.test(text) && !GROUPED_BY_COMMA.test(text)) commas++;
      else if (POINT_DECIMAL.test(text) && !GROUPED_BY_POINT.test(text)) points++;
    }
  }
  if (separator === ",") return { decimal: ".", grouped: commas === 0 };
  if (commas > 0 && (separator === ";" || points === 0)) return { decimal: ",", grouped: points === 0 };
  if (points > 0) return { decimal: ".", grouped: commas === 0 };
  return { decimal: separator === ";" ? "," : ".", grouped: false };
}
