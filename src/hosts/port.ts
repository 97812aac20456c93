import type { Area } from "../sheet/address";
import type { Cell } from "../sheet/cell";
import type { CellRole } from "../sheet/cellLook";
import type { Workbook } from "../sheet/workbook";

/**
 * What the pane may ask of the world it stands in, and nothing more: the same pane runs in Excel and in the trial page, each behind one
 * implementation of this port. Addresses are A1 with the sheet in front, quoted where needed: `Bids!F2:F61`, `'Round 2'!A1`.
 */
export interface Block {
  /** The address of just these cells: of a whole column only its used part. */
  readonly address: string;
  /** Plain values row by row; null for a blank cell, {code} for an error. */
  readonly values: readonly (readonly Cell[])[];
}

/** A cell that calls one of our functions. */
export interface CallCell {
  readonly address: string;
  readonly formula: string;
  readonly value: Cell;
}

export interface Picture {
  readonly name: string;
  readonly svg: string;
  /** Size in CSS pixels. */
  readonly width: number;
  readonly height: number;
}

/** A defined name of the workbook and the cells that it leads to. */
export interface NamedCells {
  readonly name: string;
  readonly address: string;
}

/** How the cells of a sheet look, from A1 on. Dressed before formulas are written: the trial's engine loses sight of those that are there. */
export interface SheetLook {
  readonly cells: readonly (readonly ({ readonly role: CellRole; readonly format?: string } | undefined)[])[];
  /** In characters, from column A on. */
  readonly widths: readonly number[];
  /** In points, by row from 0. */
  readonly heights: ReadonlyMap<number, number>;
  readonly merged: readonly Area[];
}

/** A chart of lines through points, which the host draws from cells. */
export interface HostChart {
  readonly title: string;
  readonly xTitle: string;
  readonly yTitle: string;
  readonly from: number;
  readonly to: number;
  readonly series: readonly {
    readonly name: string;
    readonly x: string;
    readonly y: string;
    /** Six hexadecimal digits. */
    readonly colour: string;
    /** Points. */
    readonly width: number;
    readonly dash: "solid" | "dash" | "sysDot";
  }[];
}

/** How this user types and sees numbers and arguments. */
export interface Separators {
  readonly decimal: "." | ",";
  readonly argument: "," | ";";
}

/** All sheets with their values, formulas and hidden rows, as they stand at this moment. */
export interface OpenWorkbook extends Workbook {
  /** The file's name where the host tells it, else "". */
  readonly title: string;
}

export interface Port {
  readonly kind: "excel" | "trial";
  /** The selected range cut to its used part; undefined where nothing readable is selected (a shape, several areas). */
  selection(): Promise<Block | undefined>;
  /** Calls `listener` after each change of the selection or of a cell; returns the way to stop. The pane waits for quiet itself. */
  onChange(listener: (what: "selection" | "cells") => void): () => void;
  read(address: string): Promise<Block>;
  /** Writes values and formulas (texts that begin with "=", English names, comma between arguments), as one step that can be undone. */
  write(address: string, cells: readonly (readonly Cell[])[]): Promise<void>;
  /** Brings a range into view and selects it. Only on the user's own request. */
  select(address: string): Promise<void>;
  sheetNames(): Promise<string[]>;
  /** Adds a sheet, under the name given or the next free one like it, and returns that name. */
  addSheet(name: string): Promise<string>;
  /** Puts a picture over the sheet, its upper left corner on a cell; in the place of one with the same name that stands there. */
  insertPicture(address: string, picture: Picture): Promise<void>;
  /** Draws a chart over a range of cells; missing where the host has no charts of its own. */
  insertChart?(address: string, chart: HostChart): Promise<void>;
  /** Names that lead to cells and are known in the whole workbook. */
  readNames(): Promise<NamedCells[]>;
  /** Gives names to cells; a name that is there already is led to them. */
  defineNames(names: readonly NamedCells[]): Promise<void>;
  dress(sheet: string, look: SheetLook): Promise<void>;
  /** All cells of the workbook that call one of our functions. */
  calls(): Promise<CallCell[]>;
  workbook(): Promise<OpenWorkbook>;
  theme(): "light" | "dark";
  separators(): Separators;
  /** A setting kept with the workbook; undefined where none was kept. Values are plain JSON. */
  readSetting(key: string): Promise<unknown>;
  keepSetting(key: string, value: unknown): Promise<void>;
}
