import type { Cell } from "../sheet/cell";

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

/** How this user types and sees numbers and arguments. */
export interface Separators {
  readonly decimal: "." | ",";
  readonly argument: "," | ";";
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
  insertPicture(address: string, picture: Picture): Promise<void>;
  /** All cells of the workbook that call one of our functions. */
  calls(): Promise<CallCell[]>;
  theme(): "light" | "dark";
  separators(): Separators;
  /** A setting kept with the workbook; undefined where none was kept. Values are plain JSON. */
  readSetting(key: string): Promise<unknown>;
  keepSetting(key: string, value: unknown): Promise<void>;
}
