import type { Block, Port } from "../../hosts/port";
import { formatAddress, parseAddress } from "../../sheet/address";
import { isBlank, isCellError, type Cell } from "../../sheet/cell";
import type { Observable } from "../observable";
import { cellAbove, cellsBelow, numberColumns, readColumn, type Column } from "./readColumn";

/** What the pane knows of the selection, for the words above the column. */
export type Selection =
  | { readonly kind: "nothing" }
  | { readonly kind: "reading" }
  | { readonly kind: "failed"; readonly message: string }
  /** Nothing to take: the column shown stays. */
  | { readonly kind: "no-numbers"; readonly address: string; readonly letters: string }
  | { readonly kind: "column" }
  | { readonly kind: "columns"; readonly block: Block; readonly places: readonly number[]; readonly place: number };

const QUIET_MS = 80;
const FEWEST_NUMBERS = 2;
/** Scores that may be added below a column between two readings and still be taken for its own. */
const MOST_ADDED = 500;

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
  let growing = false;
  let turn = 0;
  // How often selection and cells changed, and up to which change each was read: a reading may be overtaken before it ends.
  const changes = { selection: 0, cells: 0 };
  const done = { selection: 0, cells: 0 };
  let timer: ReturnType<typeof setTimeout> | undefined;

  /** Does what follows from a reading, unless another was begun meanwhile; `stillLatest` tells the same later on. */
  async function latest<T>(work: Promise<T>, then: (result: T, stillLatest: () => boolean) => unknown): Promise<void> {
    const mine = ++turn;
    try {
      const result = await work;
      if (mine === turn) await then(result, () => mine === turn);
    } catch (failure) {
      if (mine === turn)
        selection.set({ kind: "failed", message: failure instanceof Error ? failure.message : String(failure) });
    }
  }

  async function take(block: Block, place: number, stillLatest: () => boolean): Promise<boolean> {
    const taken = readColumn(block, place);
    if (!taken) return false;
    const above = taken.heading === "" ? cellAbove(taken.address) : undefined;
    const [over, under] = await Promise.all([above, cellsBelow(taken.address, 1)].map(readIfAny));
    if (!stillLatest()) return false;
    growing = isBlank(under?.values[0]?.[0]);
    column.set(above === undefined ? taken : { ...taken, heading: headingIn(over) });
    return true;
  }

  async function readIfAny(address: string | undefined): Promise<Block | undefined> {
    return address === undefined ? undefined : port.read(address).catch(() => undefined);
  }

  async function readSelection(block: Block | undefined, stillLatest: () => boolean): Promise<void> {
    if (!block) return selection.set({ kind: "nothing" });
    selected.set(block.address);
    if (held) return;
    const places = numberColumns(block, FEWEST_NUMBERS);
    const best = places[0];
    if (best === undefined) {
      const letters = columnOf(block.address);
      return selection.set({ kind: "no-numbers", address: block.address, letters });
    }
    if (!(await take(block, best, stillLatest))) return;
    selection.set(places.length > 1 ? { kind: "columns", block, places, place: best } : { kind: "column" });
  }

  function lookAgain(): Promise<void> {
    const moves = changes.selection;
    return latest(port.selection(), async (block, stillLatest) => {
      await readSelection(block, stillLatest);
      if (stillLatest()) done.selection = moves;
    });
  }

  /** The same cells once more, and what was added right below them where the column ended there. */
  async function readAgain(address: string): Promise<Column | undefined> {
    const [block, more] = await Promise.all([
      port.read(address),
      readIfAny(growing ? cellsBelow(address, MOST_ADDED) : undefined),
    ]);
    const end = more?.values.findIndex(([cell]) => isBlank(cell)) ?? 0;
    const added = more?.values.slice(0, end < 0 ? undefined : end) ?? [];
    return readColumn({ address: block.address, values: [...block.values, ...added] }, 0);
  }

  function renew(taken: Column | undefined): void {
    const before = column.get();
    if (taken && before && !sameCells(taken, before)) column.set({ ...taken, heading: before.heading });
  }

  const stop = port.onChange((what) => {
    changes[what]++;
    clearTimeout(timer);
    timer = setTimeout(() => {
      const current = column.get();
      const edits = changes.cells;
      // A column that can't be read any more (its sheet is gone) must not keep the pane from the next one.
      const again =
        edits > done.cells && current ? readAgain(current.address).catch(() => undefined) : Promise.resolve(undefined);
      void latest(again, (taken) => {
        done.cells = edits;
        renew(taken);
        return changes.selection > done.selection || !current ? lookAgain() : undefined;
      });
    }, QUIET_MS);
  });
  void lookAgain();

  return {
    selection,
    hold(on) {
      held = on;
      if (!on) void lookAgain();
    },
    takeColumn: (letters) => latest(port.read(wholeColumn(letters, selected.get())), readSelection),
    takePlace: (block, place) =>
      latest(Promise.resolve(block), async (_, stillLatest) => {
        if (await take(block, place, stillLatest))
          selection.set({ kind: "columns", block, places: numberColumns(block, FEWEST_NUMBERS), place });
      }),
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
