import { parseStructRef, stringifyTokens, tokenize } from "@borgar/fx/xlsx";
import { readFunctionName } from "../../audit/functionName";
import { storedFormula, typedFormula } from "../../audit/formulaText";
import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import { isCellError } from "../../sheet/cell";
import { tableArea } from "../../sheet/tableArea";
import { sheetNamed, type FormulaCell, type Sheet, type Workbook } from "../../sheet/workbook";

/** The formula of a file as the trial sheet takes it. */
export interface ShownFormula {
  readonly formula: string;
  /** True where a reference that this sheet can't follow was written as the plain range that it stood for. */
  readonly pinned: boolean;
}

type Token = ReturnType<typeof tokenize>[number];

/**
 * Writes a formula as the trial sheet takes it: ours by their names, spilled ranges (`A1#`) and parts of tables as plain ranges. Undefined where it
 * needs what the sheet has not: a function it doesn't know, another workbook, a run of sheets, a spill or a table that the file doesn't have.
 */
export function shownFormula(
  cell: FormulaCell,
  sheet: Sheet,
  book: Workbook,
  knows: (name: string) => boolean,
): ShownFormula | undefined {
  const formula = typedFormula(storedFormula(cell));
  let tokens: readonly Token[];
  try {
    tokens = tokenize(formula);
  } catch {
    return undefined;
  }
  const shown: string[] = [];
  let pinned = false;
  for (let at = 0; at < tokens.length; at++) {
    const token = tokens[at]!;
    const next = tokens[at + 1];
    if (token.type === "unknown" || token.type === "context") return undefined;
    if (token.type === "range" && /^'?\[|:.*!/.test(token.value)) return undefined;
    if (token.type === "operator" && token.value === "@") {
      // One cell is what `@` would make of it anyway.
      if (next?.type !== "range" || /:/.test(next.value)) return undefined;
    } else if (token.type === "range" && next?.value === "#") {
      const range = spilledRange(token.value, sheet, book);
      if (range === undefined) return undefined;
      shown.push(range);
      pinned = true;
      at++;
    } else if (token.type === "func" && /^ANCHORARRAY$/i.test(token.value)) {
      const range = tokens[at + 3]?.value === ")" && spilledRange(tokens[at + 2]!.value, sheet, book);
      if (!range) return undefined;
      shown.push(range);
      pinned = true;
      at += 3;
    } else if (token.type === "func") {
      if (!isKnown(token.value, knows)) return undefined;
      shown.push(token.value);
    } else if (token.type === "structured") {
      const range = tableRange(token.value, cell, sheet, book);
      if (range === undefined) return undefined;
      shown.push(range);
      pinned = true;
    } else shown.push(stringifyTokens([token]));
  }
  return { formula: shown.join(""), pinned };
}

function isKnown(name: string, knows: (name: string) => boolean): boolean {
  const callee = readFunctionName(name);
  return callee.kind === "ours" || (callee.kind === "native" && knows(callee.name));
}

/** What the formula in a cell filled when the file was saved. */
function spilledRange(address: string, home: Sheet, book: Workbook): string | undefined {
  const anchor = parseAddress(address);
  const sheet = anchor && (anchor.sheet === undefined ? home : sheetNamed(book, anchor.sheet));
  const array = sheet?.formulaAt(anchor!.top, anchor!.left)?.array;
  return array && rangeText(array, sheet!, home);
}

function tableRange(text: string, cell: FormulaCell, home: Sheet, book: Workbook): string | undefined {
  const reference = parseStructRef(text);
  if (!reference) return undefined;
  const wanted = reference.table?.toLowerCase();
  const table = book.tables.find((one) =>
    wanted ? one.name.toLowerCase() === wanted : one.sheet === home.name && holds(one.area, cell),
  );
  const part = table && tableArea(table, reference.columns ?? [], reference.sections ?? [], cell.row);
  const sheet = table && sheetNamed(book, table.sheet);
  return part && sheet && !isCellError(part) ? rangeText(part, sheet, home) : undefined;
}

function holds(area: Area, { row, column }: FormulaCell): boolean {
  return row >= area.top && row <= area.bottom && column >= area.left && column <= area.right;
}

/** Written with $: the range doesn't move when the formula is filled elsewhere, as the name of the spill or table did not. */
function rangeText({ top, left, bottom, right }: Area, sheet: Sheet, home: Sheet): string {
  const cells = formatAddress({ top, left, bottom, right }).replace(/([A-Z]+)(\d+)/g, "$$$1$$$2");
  return sheet === home
    ? cells
    : `${formatAddress({ sheet: sheet.name, top, left, bottom: top, right: left }).replace(/![^!]*$/, "!")}${cells}`;
}
