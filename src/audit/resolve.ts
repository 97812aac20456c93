import { parseA1Ref, parseStructRef, type ReferenceIdentifier } from "@borgar/fx/xlsx";
import type { Area } from "../sheet/address";
import { isCellError } from "../sheet/cell";
import { tableArea } from "../sheet/tableArea";
import { sheetNamed, type DefinedName, type Sheet, type Table } from "../sheet/workbook";
import type { Evaluation } from "./evaluation";
import { nearestName } from "../functions/nearestName";
import { readFormula } from "./readFormula";
import { LAST_COLUMN, LAST_ROW } from "./reference";
import { errorCell, NotKnown, Reference, type Value } from "./value";

type Parsed = NonNullable<ReturnType<typeof parseA1Ref>>;
const MOST_NAMES_DEEP = 32;
const parsed = new WeakMap<ReferenceIdentifier, Parsed>();

/** What a reference in a formula leads to: cells, a name, a part of a table. */
export function resolveReference(node: ReferenceIdentifier, at: Evaluation): Value {
  if (node.kind === "table") return resolveTable(node.value, at);
  let reference = parsed.get(node);
  if (!reference) {
    const read = parseA1Ref(node.value);
    if (!read) return errorCell("#NAME?", `“${node.value}” is no reference.`);
    parsed.set(node, (reference = read));
  }
  if (reference.workbookName && reference.workbookName !== "0") throw new NotKnown("it refers to another workbook");
  if ("name" in reference) return resolveName(reference.name, reference.sheetName ?? "", at);
  const sheets = sheetsCalled(reference.sheetName ?? "", at);
  if (sheets.length === 0) return unknownSheet(reference.sheetName ?? "", at);
  const area = shifted(reference.range, at);
  if (!area) return errorCell("#REF!", `${node.value} lies outside the sheet.`);
  return new Reference(sheets.map((sheet) => ({ sheet, area })));
}

/** One sheet, or the run of sheets from one to another (`First:Last!A1`). */
function sheetsCalled(name: string, at: Evaluation): Sheet[] {
  const { workbook, sheet } = at.setting;
  if (name === "") return [sheet];
  const [first, last] = name.split(":").map((one) => sheetNamed(workbook, one));
  if (!first || (name.includes(":") && !last)) return [];
  const places = [first, last ?? first].map((one) => workbook.sheets.indexOf(one)).sort((a, b) => a - b);
  return workbook.sheets.slice(places[0], places[1]! + 1);
}

function unknownSheet(name: string, at: Evaluation): Value {
  const names = at.setting.workbook.sheets.map((sheet) => `“${sheet.name}”`).join(", ");
  return errorCell("#REF!", `There is no sheet “${name}”; the sheets are ${names}.`);
}

type ParsedRange = Extract<Parsed, { range: unknown }>["range"];

function shifted(range: ParsedRange, at: Evaluation): Area | undefined {
  const { rows, columns } = at.setting.shift;
  const area = {
    top: range.top == null ? 0 : range.top + (range.$top ? 0 : rows),
    left: range.left == null ? 0 : range.left + (range.$left ? 0 : columns),
    bottom: range.bottom == null ? LAST_ROW : range.bottom + (range.$bottom ? 0 : rows),
    right: range.right == null ? LAST_COLUMN : range.right + (range.$right ? 0 : columns),
  };
  const { top, left, bottom, right } = area;
  if (!(Math.min(top, bottom) >= 0 && Math.max(top, bottom) <= LAST_ROW)) return undefined;
  if (!(Math.min(left, right) >= 0 && Math.max(left, right) <= LAST_COLUMN)) return undefined;
  return {
    top: Math.min(top, bottom),
    left: Math.min(left, right),
    bottom: Math.max(top, bottom),
    right: Math.max(left, right),
  };
}

function resolveName(text: string, sheetName: string, at: Evaluation): Value {
  const wanted = text.replace(/^_xlpm\./i, "").toLowerCase();
  if (sheetName === "")
    for (let scope = at.setting.scope; scope; scope = scope.outer) if (scope.name === wanted) return scope.value;
  const { workbook, sheet, names } = at.setting;
  const home = sheetName === "" ? sheet.name : sheetName;
  const defined = workbook.names.filter((one) => one.name.toLowerCase() === wanted);
  const name =
    defined.find((one) => one.sheet?.toLowerCase() === home.toLowerCase()) ??
    defined.find((one) => one.sheet === undefined);
  if (name) return nameValue(name, names, at);
  const table = workbook.tables.find((one) => one.name.toLowerCase() === wanted);
  if (table) return tablePart(table, [], [], at);
  const known = [...workbook.names, ...workbook.tables].map((one) => one.name);
  const nearest = nearestName(text, known);
  const hint = nearest ? `; the nearest is ${nearest}` : known.length === 0 ? "; the file defines none" : "";
  return errorCell("#NAME?", `There is no name “${text}”${hint}.`);
}

function nameValue(name: DefinedName, names: readonly string[], at: Evaluation): Value {
  const key = `${name.sheet ?? ""}!${name.name.toLowerCase()}`;
  if (names.includes(key)) throw new NotKnown(`the name ${name.name} leads back to itself`);
  if (names.length >= MOST_NAMES_DEEP) throw new NotKnown(`names lead to names more than ${MOST_NAMES_DEEP} deep`);
  const { row, column, budget } = at.setting;
  const known = budget.names.get(key);
  if (known !== undefined) return known;
  const inside = at.with({
    names: [...names, key],
    shift: { rows: row, columns: column },
    source: `=${name.formula}`,
    sheet:
      name.sheet === undefined ? at.setting.sheet : (sheetNamed(at.setting.workbook, name.sheet) ?? at.setting.sheet),
    single: false,
    scope: undefined,
  });
  const value = inside.value(readFormula(`=${name.formula}`));
  budget.names.set(key, value);
  return value;
}

function resolveTable(text: string, at: Evaluation): Value {
  const reference = parseStructRef(text);
  if (!reference) return errorCell("#NAME?", `“${text}” is no reference into a table.`);
  if (reference.workbookName && reference.workbookName !== "0") throw new NotKnown("it refers to another workbook");
  const { workbook, sheet, row, column } = at.setting;
  const wanted = reference.table?.toLowerCase();
  const inside = ({ area }: Table) =>
    row >= area.top && row <= area.bottom && column >= area.left && column <= area.right;
  const table = workbook.tables.find((one) =>
    wanted ? one.name.toLowerCase() === wanted : one.sheet === sheet.name && inside(one),
  );
  if (!table) {
    const nearest = nearestName(
      reference.table ?? "",
      workbook.tables.map((one) => one.name),
    );
    return errorCell(
      "#NAME?",
      `There is no table “${reference.table ?? ""}”${nearest ? `; the nearest is ${nearest}` : ""}.`,
    );
  }
  return tablePart(table, reference.columns ?? [], reference.sections ?? [], at);
}

function tablePart(table: Table, columns: readonly string[], sections: readonly string[], at: Evaluation): Value {
  const part = tableArea(table, columns, sections, at.setting.row);
  if (isCellError(part)) return errorCell(part.code, part.message!);
  return new Reference([{ sheet: sheetNamed(at.setting.workbook, table.sheet)!, area: part }]);
}
