/**
 * What a cell is for, as its look says it: a small closed set, so that a written sheet looks the same in a file, in Excel and in the
 * trial sheet. Text of the role "text" is never taken for a formula.
 */
export const CELL_ROLES = [
  "plain",
  "title",
  "section",
  "heading",
  "number heading",
  "label",
  "input",
  "result",
  "formula",
  "note",
  "caution",
  "wrapped",
  "text",
] as const;
export type CellRole = (typeof CELL_ROLES)[number];

/** How numbers are shown, in the spelling of number formats (ECMA-376, numFmts). Any other format may be used in their place. */
export const NUMBER_FORMATS = {
  whole: "#,##0",
  decimals: "#,##0.00",
  fine: "#,##0.0000",
  percent: "0.0%",
  date: "yyyy-mm-dd",
} as const;

export interface RoleLook {
  /** Points. */
  readonly size?: number;
  readonly bold?: boolean;
  readonly italic?: boolean;
  /** Colours as six hexadecimal digits. */
  readonly ink?: string;
  readonly fill?: string;
  readonly rule?: { readonly side: "bottom" | "box" | "left"; readonly colour: string; readonly thick?: boolean };
  readonly wrap?: boolean;
  readonly align?: "left" | "right" | "center";
  /** Space beside the text, in the format's own unit. */
  readonly indent?: number;
}

const WATER = "0B4A6B";
const PALE = "565E66";
const LINE = "9AA5AE";

/** Ink on paper with one accent: inputs are told by their frame too, and a caution by its words, so that a black-and-white print says the same. */
export const ROLE_LOOKS: Readonly<Record<CellRole, RoleLook>> = {
  plain: {},
  title: { size: 16, bold: true },
  section: { size: 12, bold: true, ink: WATER, rule: { side: "bottom", colour: WATER, thick: true } },
  heading: { bold: true, rule: { side: "bottom", colour: LINE } },
  "number heading": { bold: true, rule: { side: "bottom", colour: LINE }, align: "right", indent: 1 },
  label: { wrap: true },
  input: { ink: WATER, fill: "EEF6F9", rule: { side: "box", colour: WATER }, align: "right", indent: 1 },
  result: { bold: true, align: "right", indent: 1 },
  formula: { size: 9, ink: PALE, wrap: true },
  note: { ink: PALE, wrap: true },
  caution: { bold: true, wrap: true, rule: { side: "left", colour: WATER, thick: true } },
  wrapped: { wrap: true },
  text: {},
};
