import type { Block, Port } from "../../hosts/port";
import { formatAddress, parseAddress } from "../../sheet/address";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";
import type { Observable } from "../observable";
import { cellAbove, numberColumns, readColumn, type Column } from "./readColumn";

/** What the pane knows of the selection, for the words above the column. */
export type Selection =
  | { readonly kind: "nothing" }
  | { readonly kind: "reading" }
  | { readonly kind: "failed"; readonly message: string }
  /** Nothing to take: the column shown stays. */
  | { readonly kind: "no-numbers"; readonly address: string; readonly letters: string }
  | { readonly kind: "column" }
  | { readonly kind: "columns"; readonly block: Block; readonly places: readonly number[]; readonly place: number };

const QUIET_MS = 150;
const FEWEST_NUMBERS = 2;

export interface Follower {
  readonly selection: Observable<Selection>;
  hold(on: boolean): void;
  takeColumn(letters: string): Promise<void>;
  takePlace(block: Block, place: number): Promise<void>;
  stop(): void;
}

/**
 * Follows the selection of the sheet: waits until it rests, reads it, and takes it where it holds a column of scores. A selection
 * without one (a click into an empty cell) leaves the column as it is. Of two reads under way only the later one counts.
 */
export function followSelection(
  port: Port,
  column: Observable<Column | undefined>,
  selected: Observable<string | undefined>,
  selection: Observable<Selection>,
): Follower {
  let held = false;
  let turn = 0;
  let timer: ReturnType<typeof setTimeout> | undefined;

  async function latest<T>(work: Promise<T>, then: (result: T) => void | Promise<void>): Promise<void> {
    const mine = ++turn;
    try {
      const result = await work;
      if (mine === turn) await then(result);
    } catch (failure) {
      if (mine === turn)
        selection.set({ kind: "failed", message: failure instanceof Error ? failure.message : String(failure) });
    }
  }

  async function take(block: Block, place: number): Promise<void> {
    const taken = readColumn(block, place);
    if (!taken) return;
    const above = taken.heading === "" ? cellAbove(taken.address) : undefined;
    const heading = above === undefined ? taken.heading : headingIn(await port.read(above).catch(() => undefined));
    column.set({ ...taken, heading });
  }

  async function readSelection(block: Block | undefined): Promise<void> {
    if (!block) return selection.set({ kind: "nothing" });
    selected.set(block.address);
    if (held) return;
    const places = numberColumns(block, FEWEST_NUMBERS);
    const best = places[0];
    if (best === undefined) {
      const letters = columnOf(block.address);
      return selection.set({ kind: "no-numbers", address: block.address, letters });
    }
    await take(block, best);
    selection.set(places.length > 1 ? { kind: "columns", block, places, place: best } : { kind: "column" });
  }

  async function readAgain(address: string): Promise<void> {
    const block = await port.read(address);
    const taken = readColumn(block, 0);
    const before = column.get();
    if (taken && before && !sameCells(taken, before)) column.set({ ...taken, heading: before.heading });
  }

  const stop = port.onChange((what) => {
    clearTimeout(timer);
    timer = setTimeout(() => {
      const current = column.get();
      if (what === "cells" && current) void latest(readAgain(current.address), () => undefined);
      else void latest(port.selection(), readSelection);
    }, QUIET_MS);
  });
  void latest(port.selection(), readSelection);

  return {
    selection,
    hold(on) {
      held = on;
      if (!on) void latest(port.selection(), readSelection);
    },
    takeColumn: (letters) => latest(port.read(wholeColumn(letters, selected.get())), readSelection),
    async takePlace(block, place) {
      await take(block, place);
      selection.set({ kind: "columns", block, places: numberColumns(block, FEWEST_NUMBERS), place });
    },
    stop() {
      clearTimeout(timer);
      stop();
    },
  };
}

/** Some other cell changed: nothing to compute or draw anew. */
function sameCells(a: Column, b: Column): boolean {
  const alike = (one: Cell, other: Cell) =>
    one === other ||
    (isCellError(one) && isCellError(other) && one.code === other.code) ||
    (isBlank(one) && isBlank(other));
  return a.cells.length === b.cells.length && a.cells.every(([cell], row) => alike(cell, b.cells[row]![0]));
}

function headingIn(block: Block | undefined): string {
  const cell = block?.values[0]?.[0];
  return typeof cell === "string" ? cell.trim() : "";
}

function columnOf(address: string): string {
  const area = parseAddress(address);
  return area
    ? formatAddress({ ...area, sheet: undefined, right: area.left, bottom: area.top }).replace(/\d+$/, "")
    : "";
}

function wholeColumn(letters: string, near: string | undefined): string {
  const sheet = near?.includes("!") ? near.slice(0, near.lastIndexOf("!") + 1) : "";
  return `${sheet}${letters}:${letters}`;
}
