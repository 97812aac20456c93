import { describe, expect, test } from "vitest";
import { DomainError, NoAnswerError } from "../../../src/core/domain";
import { functionTable, implementations } from "../../../src/functions/call";
import { immediate } from "../../../src/functions/immediate";
import { later } from "../../../src/functions/later";
import { associateAll } from "../../../src/hosts/excel/associate";
import { onDemand } from "../../../src/hosts/excel/onDemand";
import { cellsForHost, cellsFromHost } from "../../../src/hosts/excel/cells";

class HostError extends Error {
  constructor(
    readonly code: string,
    message?: string,
  ) {
    super(message);
  }
}

function register(functions: Parameters<typeof associateAll>[1], spilling: readonly string[] = [], plain = false) {
  const registered = new Map<string, (...cells: unknown[]) => unknown>();
  const associate = (id: string, one: (...cells: unknown[]) => unknown) => void registered.set(id, one);
  const errors = { Error: HostError, ErrorCode: { invalidValue: "#VALUE!", notAvailable: "#N/A" } };
  associateAll(plain ? { associate } : { associate, ...errors }, functions, spilling);
  return registered;
}

describe("registering with Excel", () => {
  test("registers every function of the table under its name", () => {
    expect([...register(implementations).keys()].sort()).toEqual(functionTable.map(({ name }) => name).sort());
  });

  test("hands a bad argument on as #VALUE! with the message of core", () => {
    const registered = register({ BAD: () => fail(new DomainError("fraction", 5, "a number between 0 and 1")) });
    expect(() => registered.get("BAD")!()).toThrow(
      expect.objectContaining({ code: "#VALUE!", message: "fraction must be a number between 0 and 1; 5 was given." }),
    );
  });

  test("hands a question without an answer on as #N/A with its message", () => {
    const registered = register({ NONE: () => fail(new NoAnswerError("scores", "scores needs at least 2 numbers.")) });
    expect(() => registered.get("NONE")!()).toThrow(
      expect.objectContaining({ code: "#N/A", message: "scores needs at least 2 numbers." }),
    );
  });

  test("throws a plain exception where the runtime knows no error class, so that the cell still shows #VALUE!", () => {
    const registered = register({ BAD: () => fail(new DomainError("x", NaN, "a number")) }, [], true);
    expect(() => registered.get("BAD")!()).toThrow("x must be a number; NaN was given.");
  });

  test("gives one value of a function that may spill as a table of one cell, any other as it is", () => {
    const registered = register({ TABLE: () => 3, ONE: () => 3, ROWS: () => [["a", null]] }, ["TABLE", "ROWS"]);
    expect(registered.get("TABLE")!()).toEqual([[3]]);
    expect(registered.get("ONE")!()).toBe(3);
    // null in a table would show as 0.
    expect(registered.get("ROWS")!()).toEqual([["a", ""]]);
  });

  test("waits for a function that is loaded when first asked for, and hands on its refusals", async () => {
    const registered = register(
      { LATE: async () => 7, BAD: async () => fail(new DomainError("name", "X", "a function")) },
      ["LATE"],
    );
    await expect(registered.get("LATE")!()).resolves.toEqual([[7]]);
    await expect(registered.get("BAD")!()).rejects.toMatchObject({
      code: "#VALUE!",
      message: 'name must be a function; "X" was given.',
    });
  });

  test("loads functions on demand once asked for, and by their own names", async () => {
    let loads = 0;
    const load = async () => (loads++, { TWICE: (x: number) => 2 * x, HALF: (x: number) => x / 2 });
    const registered = register(onDemand(["TWICE", "HALF"], load));
    expect(loads).toBe(0);
    await expect(registered.get("HALF")!(4)).resolves.toBe(2);
    await expect(registered.get("TWICE")!(4)).resolves.toBe(8);
  });

  test("what loads on demand and what loads at once are all functions but WORKINGS, each in one of the two", () => {
    const names = [...Object.keys(immediate), ...Object.keys(later), "WORKINGS"];
    expect(names.sort()).toEqual(functionTable.map(({ name }) => name).sort());
  });

  test("never lets a number that is none into a cell", () => {
    expect(() => register({ NAN: () => NaN }).get("NAN")!()).toThrow(/fault in the add-in/);
  });
});

describe("cells of Office.js", () => {
  test("are read with their types: blanks, errors, numbers, texts, booleans", () => {
    expect(
      cellsFromHost([["", 1.5, "#N/A", "#N/A", true]], [["Empty", "Double", "Error", "String", "Boolean"]]),
    ).toEqual([[null, 1.5, { code: "#N/A" }, "#N/A", true]]);
  });

  test("are written so that a text stays a text, a formula a formula, and a blank clears", () => {
    expect(cellsForHost([["5%", "1/2", "=WEIR.RELEASE()", "upper limit", null, 2, false, { code: "#N/A" }]])).toEqual([
      ["'5%", "'1/2", "=WEIR.RELEASE()", "upper limit", "", 2, false, "=#N/A"],
    ]);
  });
});

function fail(failure: Error): never {
  throw failure;
}
