import { describe, expect, test } from "vitest";
import type { PlanQuestion } from "../../src/plan/planModel";
import { parseAddress } from "../../src/sheet/address";
import type { Cell } from "../../src/sheet/cell";
import { NamesTaken, writePlan } from "../../src/taskpane/plan/writePlan";
import { fakePort, type FakePort } from "./fakePort";

const QUESTION: PlanQuestion = {
  scores: "Bids!B2:B6",
  heading: "score",
  fraction: 0.05,
  confidence: 0.95,
  better: "high",
  shape: "normal",
  day: "2025-03-14",
};
const SCORES = { sorted: Float64Array.of(1, 2, 3, 4, 5), count: 5, mark: 5 };
const bids = (): Record<string, Cell[][]> => ({
  Bids: [["bid", "score"], ...[3, 1, 2, 5, 4].map((score, i) => [i, score])],
});

async function at(port: FakePort, name: string): Promise<Cell> {
  return (await port.read(port.names.get(name)!)).values[0]![0]!;
}

describe("writing the plan", () => {
  test("makes a sheet, gives the names before the formulas, dresses it and draws the picture", async () => {
    const port = fakePort(bids(), "Bids!B1:B6");
    const outcome = await writePlan(port, QUESTION, SCORES);
    expect(outcome).toMatchObject({ sheet: "Plan", updated: false, left: [] });
    expect(await at(port, "weir_fraction")).toBe(0.05);
    expect(await at(port, "weir_safe_cutoff")).toBe(
      "=WEIR.SAFE_CUTOFF(weir_scores,weir_fraction,weir_confidence,weir_shape,weir_better)",
    );
    expect(port.names.get("weir_scores")).toBe("Bids!B2:B6");
    expect(port.dressed.map(({ sheet }) => sheet)).toEqual(["Plan"]);
    expect(parseAddress(outcome.picture!)).toMatchObject({ sheet: "Plan", left: 0 });
    // Nothing of the user's was written to.
    expect(port.writes.every(({ address }) => address.startsWith("Plan!"))).toBe(true);
  });

  test("takes another name for the sheet where that one is taken", async () => {
    const port = fakePort({ ...bids(), Plan: [["my own"]] }, "Bids!B1:B6");
    expect(await writePlan(port, QUESTION, SCORES)).toMatchObject({ sheet: "Plan 2" });
    expect((await port.read("Plan!A1")).values).toEqual([["my own"]]);
  });

  test("refuses where its names are taken by something else, and writes nothing", async () => {
    const port = fakePort(bids(), "Bids!B1:B6");
    port.names.set("WEIR_Fraction", "Bids!A1");
    const refused = writePlan(port, QUESTION, SCORES);
    await expect(refused).rejects.toThrow(NamesTaken);
    await expect(refused).rejects.toThrow("WEIR_Fraction");
    expect(port.writes).toEqual([]);
  });

  test("where only names of a deleted sheet are left over, it is written anew", async () => {
    const port = fakePort(bids(), "Bids!B1:B6");
    port.names.set("weir_fraction", "Gone!B7");
    expect(await writePlan(port, QUESTION, SCORES)).toMatchObject({ sheet: "Plan", updated: false });
  });
});

describe("writing it again", () => {
  async function written() {
    const port = fakePort(bids(), "Bids!B1:B6");
    await writePlan(port, QUESTION, SCORES);
    port.writes.length = 0;
    return port;
  }

  test("leaves the inputs that the user changed, and names them; follows the question in the others", async () => {
    const port = await written();
    await port.write(port.names.get("weir_fraction")!, [[0.2]]);
    const outcome = await writePlan(port, { ...QUESTION, confidence: 0.9, day: "2025-04-01" }, SCORES);
    expect(outcome).toMatchObject({ updated: true, left: ["Top fraction that is to pass"] });
    expect(await at(port, "weir_fraction")).toBe(0.2);
    expect(await at(port, "weir_confidence")).toBe(0.9);
    expect(await at(port, "weir_written")).toBe(45_748);
    // And a third time the changed one is still the user's.
    await writePlan(port, { ...QUESTION, fraction: 0.1 }, SCORES);
    expect(await at(port, "weir_fraction")).toBe(0.2);
  });

  test("puts back a formula that was typed over, and follows the scores", async () => {
    const port = await written();
    await port.write(port.names.get("weir_safe_cutoff")!, [[71]]);
    await writePlan(port, { ...QUESTION, scores: "Bids!B2:B9" }, SCORES);
    expect(await at(port, "weir_safe_cutoff")).toMatch(/^=WEIR\.SAFE_CUTOFF/);
    expect(port.names.get("weir_scores")).toBe("Bids!B2:B9");
  });

  test("does not move the mark that is held, nor what is said about it", async () => {
    const port = await written();
    await port.write(port.names.get("weir_fixed_reason")!, [["agreed on Monday"]]);
    await writePlan(port, { ...QUESTION, day: "2025-04-01" }, { ...SCORES, mark: 9, count: 8 });
    expect(await at(port, "weir_fixed_mark")).toBe(5);
    expect(await at(port, "weir_fixed_count")).toBe(5);
    expect(await at(port, "weir_fixed_reason")).toBe("agreed on Monday");
    expect(await at(port, "weir_fixed_day")).toBe(45_730);
  });

  test("finds its cells by their names: on a sheet that was renamed, in rows that were moved", async () => {
    const sheets = bids();
    const port = fakePort(sheets, "Bids!B1:B6");
    await writePlan(port, QUESTION, SCORES);
    // As a host does it: a row put in at the top, and the sheet renamed.
    sheets["Mine"] = [["my own note"], ...sheets["Plan"]!];
    delete sheets["Plan"];
    for (const [name, address] of port.names) {
      const area = parseAddress(address)!;
      if (area.sheet !== "Plan") continue;
      const letter = (column: number) => String.fromCharCode(65 + column);
      port.names.set(name, `Mine!${letter(area.left)}${area.top + 2}:${letter(area.right)}${area.bottom + 2}`);
    }
    const outcome = await writePlan(port, { ...QUESTION, fraction: 0.1 }, SCORES);
    expect(outcome).toMatchObject({ sheet: "Mine", updated: true });
    expect(await at(port, "weir_fraction")).toBe(0.1);
    expect(sheets["Mine"]![0]).toEqual(["my own note"]);
    expect(Object.keys(sheets)).toEqual(["Bids", "Mine"]);
  });

  test("writes to no cell but the named ones: what stands beside, between and below stays", async () => {
    const port = await written();
    await writePlan(port, QUESTION, SCORES);
    const named = [...port.names.values()].map((address) => parseAddress(address)!);
    for (const { address, cells } of port.writes) {
      const { top, left } = parseAddress(address)!;
      cells.forEach((row, r) =>
        row.forEach((_, c) => {
          const inside = named.some((area) => area.top === top + r && left + c >= area.left && left + c <= area.right);
          expect(inside, `${address} row ${r}`).toBe(true);
        }),
      );
    }
    expect(port.writes.length).toBeLessThan(25);
  });
});
