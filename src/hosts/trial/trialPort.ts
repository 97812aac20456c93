import { CommandType, type Univer } from "@univerjs/core";
import type { FUniver } from "@univerjs/core/facade";
import {
  FormulaDataModel,
  SetSelectionsOperation,
  SetWorksheetActiveOperation,
  type FWorksheet,
} from "@univerjs/preset-sheets-core";
import { formatSheetName, parseAddress, type Area } from "../../sheet/address";
import type { Picture, Port } from "../port";
import { callCells } from "./callCells";
import { cellData } from "./cellData";
import { dressSheet } from "./dressSheet";
import { keepSettings, readSettings } from "./keptSettings";
import type { MessageBook } from "./messageBook";
import { defineNames, readNames } from "./names";
import type { PictureLayer } from "./pictureLayer";
import { readArea, type ReadFrom } from "./readArea";
import { selectedArea } from "./selectedArea";
import { openWorkbook } from "./openWorkbook";
import { savedBook } from "./savedBook";
import { settledAfterChanges } from "./settled";

/** Where a whole column and a whole row end. */
const LAST_ROW = 1_048_575;
const LAST_COLUMN = 16_383;

export interface TrialHost {
  readonly api: FUniver;
  readonly univer: Univer;
  readonly messages: MessageBook;
  readonly pictures: PictureLayer;
  dark(): boolean;
}

/** The port of the trial sheet. */
export function trialPort({ api, univer, messages, pictures, dark }: TrialHost): Port {
  const book = api.getActiveWorkbook()!;
  const settled = settledAfterChanges(api);
  const settings = readSettings();
  const from: ReadFrom = { formulas: univer.__getInjector().get(FormulaDataModel), messages };

  const place = (address: string): { sheet: FWorksheet; area: Area } => {
    const area = parseAddress(address);
    if (!area) throw new Error(`"${address}" is no address`);
    const sheet = area.sheet === undefined ? book.getActiveSheet() : book.getSheetByName(area.sheet);
    if (!sheet) throw new Error(`there is no sheet "${area.sheet}"`);
    return { sheet, area };
  };

  return {
    kind: "trial",
    async selection() {
      await settled();
      const area = selectedArea(api);
      return area && readArea(from, book.getActiveSheet(), area, true);
    },
    onChange(listener) {
      // Not the engine's own SelectionChanged: set up while the grid is still being laid out, it stays silent at times.
      const told = api.onCommandExecuted((command) => {
        if (command.id === SetSelectionsOperation.id || command.id === SetWorksheetActiveOperation.id)
          listener("selection");
        else if (command.type === CommandType.MUTATION && command.id.startsWith("sheet.mutation.")) listener("cells");
      });
      return () => told.dispose();
    },
    async read(address) {
      await settled();
      const { sheet, area } = place(address);
      return readArea(from, sheet, area, area.bottom === LAST_ROW || area.right === LAST_COLUMN);
    },
    async write(address, cells) {
      const { sheet, area } = place(address);
      const columns = Math.max(...cells.map((row) => row.length));
      const data = cells.map((row) => Array.from({ length: columns }, (_, column) => cellData(row[column])));
      if (area.top + cells.length > sheet.getMaxRows()) sheet.setRowCount(area.top + cells.length);
      if (area.left + columns > sheet.getMaxColumns()) sheet.setColumnCount(area.left + columns);
      sheet.getRange(area.top, area.left, cells.length, columns).setValues(data);
      await settled();
    },
    async select(address) {
      const { sheet, area } = place(address);
      book.setActiveSheet(sheet);
      const bottom = Math.min(area.bottom, sheet.getMaxRows() - 1);
      const right = Math.min(area.right, sheet.getMaxColumns() - 1);
      sheet.getRange(area.top, area.left, bottom - area.top + 1, right - area.left + 1).activate();
      sheet.scrollToCell(area.top, area.left);
    },
    async sheetNames() {
      return book.getSheets().map((sheet) => sheet.getSheetName());
    },
    async addSheet(name) {
      const taken = new Set(book.getSheets().map((sheet) => sheet.getSheetName().toLowerCase()));
      let free = name;
      for (let count = 2; taken.has(free.toLowerCase()); count++) free = `${name} ${count}`;
      book.insertSheet(free);
      return free;
    },
    async insertPicture(address: string, picture: Picture) {
      const { sheet, area } = place(address);
      pictures.add({ sheetId: sheet.getSheetId(), row: area.top, column: area.left, picture });
    },
    async readNames() {
      return readNames(book);
    },
    async defineNames(names) {
      defineNames(book, names);
      await settled();
    },
    async dress(sheet, look) {
      dressSheet(place(`${formatSheetName(sheet)}!A1`).sheet, look);
    },
    async calls() {
      await settled();
      return book.getSheets().flatMap((sheet) => callCells(from, sheet));
    },
    async workbook() {
      await settled();
      return openWorkbook(savedBook({ api, univer }));
    },
    theme: () => (dark() ? "dark" : "light"),
    separators: () => ({ decimal: ".", argument: "," }),
    readSetting: async (key) => settings[key],
    async keepSetting(key, value) {
      settings[key] = value;
      keepSettings(settings);
    },
  };
}
