import { tokenize } from "@borgar/fx/xlsx";
import { evaluate } from "../../audit/evaluate";
import type { OwnCall } from "../../audit/evaluation";
import { storedFormula } from "../../audit/formulaText";
import { Reference } from "../../audit/value";
import { callFunction } from "../../functions/call";
import { formatAddress, parseAddress, type Area } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import { sheetNamed, type FormulaCell, type Sheet, type Workbook } from "../../sheet/workbook";
import { workings } from "../../workings/index";

export interface WorkedStep {
  readonly meaning: string;
  readonly value: Cell;
  /** With its "="; "" where the host has no function for the step. */
  readonly formula: string;
  readonly source: string;
}

/** One call of ours, step by step; what it refuses has no steps but its own words. */
export interface WorkedCall {
  /** As it stands in the formula. */
  readonly text: string;
  readonly steps: readonly WorkedStep[];
  readonly refusal: string;
}

export interface WorkedCell {
  /** The cell that holds the formula: of a result that fills several cells the first one. */
  readonly address: string;
  /** The whole formula first where it is one call, then what stands inside. */
  readonly calls: readonly WorkedCall[];
  /** The cells that its result fills, and the ranges that it reads. */
  readonly touches: readonly Area[];
}

const MOST_CALLS = 50;

/** The workings of every call of ours in a cell, on the values that stand in the workbook; undefined where it calls none that has any. */
export function workingsOf(workbook: Workbook, address: string): WorkedCell | undefined {
  const area = parseAddress(address);
  const sheet = area?.sheet === undefined ? undefined : sheetNamed(workbook, area.sheet);
  const cell = area && sheet && formulaBehind(sheet, area.top, area.left);
  if (!cell) return undefined;
  const { row, column } = cell;
  const calls: OwnCall[] = [];
  const formula = storedFormula(cell);
  evaluate(formula, { workbook, sheet, row, column, single: !cell.array, calls });
  const different = new Map(calls.filter(({ entry }) => entry.name in workings).map((call) => [placeOf(call), call]));
  const outermost = [...different.values()].sort((a, b) => lengthOf(b) - lengthOf(a));
  if (outermost.length === 0) return undefined;
  const here = { top: row, left: column, bottom: row, right: column };
  return {
    address: formatAddress({ sheet: sheet.name, ...here }),
    calls: outermost.slice(0, MOST_CALLS).map((call) => workedCall(call, sheet)),
    touches: [{ sheet: sheet.name, ...(cell.array ?? here) }, ...readBy(formula, calls, sheet)],
  };
}

/** The formula of a cell, or the one whose result fills it. */
function formulaBehind(sheet: Sheet, row: number, column: number): FormulaCell | undefined {
  const own = sheet.formulaAt(row, column);
  if (own) return own;
  for (const cell of sheet.formulas.values()) {
    const { array } = cell;
    if (array && array.top <= row && row <= array.bottom && array.left <= column && column <= array.right) return cell;
  }
  return undefined;
}

function placeOf({ node, source }: OwnCall): string {
  return `${node.loc?.join()} ${source}`;
}

function lengthOf({ node, source }: OwnCall): number {
  return node.loc ? node.loc[1] - node.loc[0] : source.length;
}

function workedCall(call: OwnCall, sheet: Sheet): WorkedCall {
  const { entry, given, node, source } = call;
  const text = node.loc ? source.slice(...node.loc) : `WEIR.${entry.name}`;
  // Names that LET or LAMBDA give mean nothing in another cell.
  const named = /\b(LET|LAMBDA)\(/i.test(source);
  const parameterTexts = node.arguments.map((argument, i) => {
    const value = call.values[i];
    const place = value instanceof Reference && value.places.length === 1 ? value.places[0] : undefined;
    if (named && place) return formatAddress(addressOf(place.sheet, place.area, sheet));
    return named || !argument?.loc ? undefined : source.slice(...argument.loc);
  });
  const outcome = callFunction("WORKINGS", [entry.name, ...given], "null", {
    parameterTexts: [undefined, ...parameterTexts],
  })!;
  if ("error" in outcome) return { text, steps: [], refusal: `${outcome.error} ${outcome.message}` };
  const rows = (outcome.value as Cell[][]).slice(1);
  return {
    text,
    steps: rows.map(([, meaning, value, formula, from]) => ({
      meaning: String(meaning),
      value,
      formula: String(formula),
      source: String(from),
    })),
    refusal: "",
  };
}

/** Without the sheet where the formula stands on it. */
function addressOf(home: Sheet, area: Area, sheet: Sheet): Area {
  return home === sheet ? area : { ...area, sheet: home.name };
}

/** Every range that the formula names, by address or in another way. */
function readBy(formula: string, calls: readonly OwnCall[], sheet: Sheet): Area[] {
  const typed = tokenize(formula).flatMap(({ type, value }) => {
    const area = type.startsWith("range") ? parseAddress(value) : undefined;
    return area ? [{ ...area, sheet: area.sheet ?? sheet.name }] : [];
  });
  const reached = calls.flatMap(({ values }) =>
    values.flatMap((value) =>
      value instanceof Reference ? value.places.map(({ sheet: home, area }) => ({ ...area, sheet: home.name })) : [],
    ),
  );
  return [...typed, ...reached];
}
