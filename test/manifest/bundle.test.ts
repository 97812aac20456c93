import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import { describe, expect, test } from "vitest";
import { callFunction, functionEntry } from "../../src/functions/call";
import { callParts, caseFiles, parseArgument, readCases } from "../support/cases";

const dist = join(__dirname, "../../dist");

describe("the functions bundle", () => {
  const bundle = readFileSync(join(dist, "functions.js"));

  test("keeps within 30 KiB gzip, since every first formula waits for it", () => {
    expect(gzipSync(bundle).length).toBeLessThanOrEqual(30 * 1024);
  });

  test("holds no pane, no engine of the trial sheet, no second library of statistics", () => {
    const text = bundle.toString("utf8");
    for (const stranger of ["univer", "jStat", "mountPane", "d3-"])
      expect(text.includes(stranger), stranger).toBe(false);
  });

  test("associates every function of the table when it is evaluated, with only the host's registry in reach", () => {
    const associated: string[] = [];
    const registry = { associate: (id: string) => associated.push(id) };
    const scope = {
      CustomFunctions: registry,
      self: {},
      document: { currentScript: { src: "https://localhost:3000/functions.js", tagName: "SCRIPT" } },
    };
    new Function(...Object.keys(scope), bundle.toString("utf8"))(...Object.values(scope));
    const table = JSON.parse(readFileSync(join(dist, "functions.json"), "utf8")) as { functions: { id: string }[] };
    expect(new Set(associated).size).toBe(associated.length);
    expect(associated.sort()).toEqual(table.functions.map(({ id }) => id).sort());
  });

  test("comes with the chunk of the functions that load on demand", () => {
    const chunks = readdirSync(join(dist, "pane")).map((file) => readFileSync(join(dist, "pane", file), "utf8"));
    expect(chunks.some((chunk) => chunk.includes("RESERVE_SCORE") && chunk.includes("GROUP_PASS_RATES"))).toBe(true);
  });
});

describe("what the host is told of results", () => {
  test("every function that ever gives a table of more than one cell is declared to spill", () => {
    const undeclared = new Set<string>();
    for (const file of caseFiles) {
      const { columns, cases } = readCases(file);
      for (const { formula, error } of cases) {
        const { name, args } = callParts(formula);
        if (error || functionEntry(name)?.result === "matrix") continue;
        const outcome = callFunction(
          name,
          args.map((text) => parseArgument(text, columns)),
        )!;
        if ("value" in outcome && Array.isArray(outcome.value)) undeclared.add(name);
      }
    }
    expect([...undeclared]).toEqual([]);
  });
});
