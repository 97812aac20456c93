import type { Block, NamedCells, Port, Separators, SheetLook } from "../../src/hosts/port";
import { formatAddress, parseAddress } from "../../src/sheet/address";
import type { Cell } from "../../src/sheet/cell";
import { Sheet } from "../../src/sheet/workbook";

export interface FakePort extends Port {
  /** Selects without telling the pane anything else than a host would. */
  pick(address: string): void;
  /** Tells of a change of cells. */
  changed(): void;
  readonly reads: string[];
  readonly names: Map<string, string>;
  readonly dressed: { sheet: string; look: SheetLook }[];
  readonly pictures: { address: string; name: string }[];
  /** Formulas by the address of their cell, without the "="; the values that they gave stand in the sheets. */
  readonly formulas: Map<string, string>;
  readonly writes: { address: string; cells: readonly (readonly Cell[])[] }[];
}

/** A workbook in memory behind the port, for tests of the pane's logic. */
export function fakePort(sheets: Record<string, Cell[][]>, selected: string, separators?: Separators): FakePort {
  const listeners = new Set<(what: "selection" | "cells") => void>();
  const settings = new Map<string, unknown>();
  const reads: string[] = [];
  const formulas = new Map<string, string>();
  const writes: FakePort["writes"] = [];
  const names = new Map<string, string>();
  const dressed: FakePort["dressed"] = [];
  const pictures: FakePort["pictures"] = [];
  let selection = selected;

  const read = (address: string): Block => {
    const area = parseAddress(address)!;
    const name = area.sheet ?? Object.keys(sheets)[0]!;
    const cells = sheets[name];
    if (!cells) throw new Error(`There is no sheet ${name}.`);
    const whole = area.top === 0 && area.bottom === 1_048_575;
    const bottom = whole ? Math.max(cells.length - 1, 0) : area.bottom;
    const values: Cell[][] = [];
    for (let row = area.top; row <= bottom; row++) {
      const line: Cell[] = [];
      for (let column = area.left; column <= area.right; column++) line.push(cells[row]?.[column] ?? null);
      values.push(line);
    }
    return {
      address: formatAddress({ ...area, sheet: name, bottom }),
      values: whole && cells.length === 0 ? [] : values,
    };
  };

  return {
    kind: "trial",
    reads,
    writes,
    names,
    dressed,
    pictures,
    formulas,
    pick(address) {
      selection = address;
      for (const listener of listeners) listener("selection");
    },
    changed() {
      for (const listener of listeners) listener("cells");
    },
    selection: async () => read(selection),
    onChange(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    async read(address) {
      reads.push(address);
      return read(address);
    },
    async write(address, cells) {
      writes.push({ address, cells });
      const area = parseAddress(address)!;
      const sheet = (sheets[area.sheet ?? Object.keys(sheets)[0]!] ??= []);
      cells.forEach((row, r) =>
        row.forEach((cell, c) => {
          (sheet[area.top + r] ??= [])[area.left + c] = cell;
        }),
      );
    },
    select: async (address) => void (selection = address),
    sheetNames: async () => Object.keys(sheets),
    async addSheet(name) {
      let free = name;
      for (let i = 2; free in sheets; i++) free = `${name} ${i}`;
      sheets[free] = [];
      return free;
    },
    insertPicture: async (address, { name }) => void pictures.push({ address, name }),
    readNames: async () => [...names].map(([name, address]): NamedCells => ({ name, address })),
    defineNames: async (list) => list.forEach(({ name, address }) => names.set(name, address)),
    dress: async (sheet, look) => void dressed.push({ sheet, look }),
    calls: async () => [],
    workbook: async () => ({
      title: "Bids of spring.xlsx",
      sheets: Object.entries(sheets).map(([name, cells]) => {
        const sheet = new Sheet(name);
        cells.forEach((line, row) =>
          line.forEach((cell, column) => {
            if (cell !== null && cell !== undefined) sheet.set(row, column, cell);
          }),
        );
        for (const [address, formula] of formulas) {
          const { sheet: home, ...array } = parseAddress(address)!;
          const cell = { row: array.top, column: array.left, formula, array, dynamic: true, calculated: true };
          if (home === name) sheet.addFormula(cell);
        }
        return sheet;
      }),
      names: [...names].map(([name, formula]) => ({ name, formula })),
      tables: [],
      date1904: false,
    }),
    theme: () => "light",
    separators: () => separators ?? { decimal: ".", argument: "," },
    readSetting: async (key) => settings.get(key),
    keepSetting: async (key, value) => void settings.set(key, value),
  };
}
