/** The mark between whole and decimals, as this user types and reads it. */
export type Decimal = "." | ",";

/** Numbers and percentages as this user reads them. */
export interface NumberStyle {
  readonly decimal: Decimal;
  /** What stands between a number and its percent sign: nothing in English, a no-break space in German. */
  readonly percentGap: string;
}

export const PLAIN_STYLE: NumberStyle = { decimal: ".", percentGap: "" };
