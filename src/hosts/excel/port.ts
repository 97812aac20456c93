import { formatAddress, formatSheetName, parseAddress } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import { dress } from "./dress";
import { defineNames, readNames } from "./names";
import { pngOfSvg } from "../pngOfSvg";
import type { Block, CallCell, Picture, Port, Separators } from "../port";
import { followChanges } from "./followChanges";
import { insertChart } from "./charts";
import { cellsForHost, cellsFromHost } from "./cells";
import { readBook } from "./readBook";

/** Office.js reads at most 5 million cells at once; a score column is never that long. */
const MOST_CELLS = 2_000_000;
const OUR_CALL = /(^|[^A-Z0-9_.])(_xldudf_)?WEIR[._][A-Z]/i;

/** The port of the pane in Excel. Made once, after Office.onReady. */
export async function excelPort(): Promise<Port> {
  const separators = await readSeparators();
  return {
    kind: "excel",
    selection: () =>
      Excel.run(async (context) => readUsed(context, context.workbook.getSelectedRange())).catch(() => undefined),
    onChange: followChanges,
    read: (address) => Excel.run(async (context) => readAll(context, rangeAt(context, address))),
    write: (address, cells) =>
      Excel.run(async (context) => {
        const rows = cells.length;
        const columns = cells[0]?.length ?? 0;
        if (rows === 0 || columns === 0) return;
        rangeAt(context, address)
          .getCell(0, 0)
          .getResizedRange(rows - 1, columns - 1).formulas = cellsForHost(cells);
        await context.sync();
      }),
    select: (address) =>
      Excel.run(async (context) => {
        rangeAt(context, address).select();
        await context.sync();
      }),
    sheetNames: () =>
      Excel.run(async (context) => {
        const { worksheets } = context.workbook;
        worksheets.load("items/name");
        await context.sync();
        return worksheets.items.map((sheet) => sheet.name);
      }),
    addSheet: (name) => Excel.run((context) => addSheet(context, name)),
    insertPicture: (address, picture) => Excel.run((context) => insertPicture(context, address, picture)),
    ...(Office.context.requirements.isSetSupported("ExcelApi", "1.7") && {
      insertChart: (address, chart) => Excel.run((context) => insertChart(context, rangeAt, address, chart)),
    }),
    readNames: () => Excel.run(readNames),
    defineNames: (names) => Excel.run((context) => defineNames(context, rangeAt, names)),
    dress: (sheet, look) => Excel.run((context) => dress(context, sheet, look)),
    calls: () => Excel.run(readCalls),
    workbook: () => Excel.run(readBook),
    theme,
    separators: () => separators,
    readSetting: async (key) => Office.context.document.settings.get(key) ?? undefined,
    keepSetting: (key, value) =>
      new Promise((resolve, reject) => {
        Office.context.document.settings.set(key, value);
        Office.context.document.settings.saveAsync((result) =>
          result.status === Office.AsyncResultStatus.Succeeded ? resolve() : reject(new Error(result.error.message)),
        );
      }),
  };
}

function rangeAt(context: Excel.RequestContext, address: string): Excel.Range {
  const area = parseAddress(address);
  if (!area) throw new Error(`"${address}" is no address of cells.`);
  const { worksheets } = context.workbook;
  const sheet = area.sheet === undefined ? worksheets.getActiveWorksheet() : worksheets.getItem(area.sheet);
  return sheet.getRange(formatAddress({ ...area, sheet: undefined }));
}

async function readUsed(context: Excel.RequestContext, range: Excel.Range): Promise<Block | undefined> {
  const used = range.getUsedRangeOrNullObject(true);
  used.load("address,cellCount");
  await context.sync();
  if (used.isNullObject) {
    range.load("address");
    await context.sync();
    return { address: range.address, values: [] };
  }
  if (used.cellCount > MOST_CELLS || used.cellCount < 0) return undefined;
  return readAll(context, used);
}

async function readAll(context: Excel.RequestContext, range: Excel.Range): Promise<Block> {
  range.load("address,values,valueTypes");
  await context.sync();
  return { address: range.address, values: cellsFromHost(range.values, range.valueTypes) };
}

async function addSheet(context: Excel.RequestContext, name: string): Promise<string> {
  const { worksheets } = context.workbook;
  worksheets.load("items/name");
  await context.sync();
  const taken = new Set(worksheets.items.map((sheet) => sheet.name.toLowerCase()));
  let free = name.slice(0, 31);
  for (let i = 2; taken.has(free.toLowerCase()); i++) free = `${name.slice(0, 27)} ${i}`;
  worksheets.add(free);
  await context.sync();
  return free;
}

async function insertPicture(context: Excel.RequestContext, address: string, picture: Picture): Promise<void> {
  const range = rangeAt(context, address);
  range.load("left,top");
  const png = await pngOfSvg(picture);
  const shape = range.worksheet.shapes.addImage(png.slice(png.indexOf(",") + 1));
  await context.sync();
  shape.name = picture.name;
  shape.left = range.left;
  shape.top = range.top;
  // A CSS pixel is 3/4 of a point.
  shape.width = picture.width * 0.75;
  shape.height = picture.height * 0.75;
  await context.sync();
}

async function readCalls(context: Excel.RequestContext): Promise<CallCell[]> {
  const { worksheets } = context.workbook;
  worksheets.load("items/name");
  await context.sync();
  const found = worksheets.items.map((sheet) => {
    const areas = sheet.getUsedRange().getSpecialCellsOrNullObject(Excel.SpecialCellType.formulas);
    areas.load(
      "areas/items/rowIndex,areas/items/columnIndex,areas/items/formulas,areas/items/values,areas/items/valueTypes",
    );
    return { sheet: sheet.name, areas };
  });
  await context.sync();
  return found.flatMap(({ sheet, areas }) =>
    areas.isNullObject
      ? []
      : areas.areas.items.flatMap((area) => {
          const values = cellsFromHost(area.values, area.valueTypes as unknown as string[][]);
          return callsOf(sheet, area.rowIndex, area.columnIndex, area.formulas, values);
        }),
  );
}

function callsOf(sheet: string, top: number, left: number, formulas: any[][], values: Cell[][]): CallCell[] {
  return formulas.flatMap((row, r) =>
    row.flatMap((formula, c) => {
      if (typeof formula !== "string" || !OUR_CALL.test(formula)) return [];
      const value = values[r]![c];
      const address = `${formatSheetName(sheet)}!${formatAddress({ top: top + r, left: left + c, bottom: top + r, right: left + c })}`;
      return [{ address, formula, value: isCellError(value) ? value : (value ?? null) }];
    }),
  );
}

function theme(): "light" | "dark" {
  const background = Office.context.officeTheme?.bodyBackgroundColor;
  const colour = background && /^#?([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})/i.exec(background);
  if (!colour) return matchMedia("(prefers-color-scheme: dark)").matches ? "dark" : "light";
  const [red, green, blue] = colour.slice(1, 4).map((part) => parseInt(part, 16)) as [number, number, number];
  return 0.299 * red + 0.587 * green + 0.114 * blue < 128 ? "dark" : "light";
}

async function readSeparators(): Promise<Separators> {
  if (!Office.context.requirements.isSetSupported("ExcelApi", "1.11")) return { decimal: ".", argument: "," };
  return Excel.run(async (context) => {
    const { numberFormat } = context.application.cultureInfo;
    numberFormat.load("numberDecimalSeparator");
    await context.sync();
    // The host does not tell its list separator; where the decimal is a comma it is a semicolon.
    return numberFormat.numberDecimalSeparator === ","
      ? { decimal: ",", argument: ";" }
      : { decimal: ".", argument: "," };
  });
}
