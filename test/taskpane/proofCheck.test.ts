import { strFromU8, unzipSync } from "fflate";
import { describe, expect, test } from "vitest";
import type { Cell } from "../../src/sheet/cell";
import { bookReader } from "../../src/taskpane/proof/bookReader";
import { Cancelled, checkBook } from "../../src/taskpane/proof/checkBook";
import { findings } from "../../src/taskpane/proof/findings";
import { reportFile } from "../../src/taskpane/proof/reportFile";
import { readCases } from "../support/cases";
import { fakePort } from "./fakePort";

// "rope score" of the public cases in A1:A61; 81.95271223532491 and 84.78644216025558: test/reference/cases/cutoff.json.
const { heading, cells } = readCases("cutoff.json").columns[0]!;
const unwatched = { progress: () => undefined, cancelled: () => false };

/** A cutoff that is right, one that is not, one in another row of a pattern typed over, and a call that no release has. */
function ropes() {
  const sheet: Cell[][] = [[heading], ...cells.map((cell) => [cell === "" ? null : cell])];
  const port = fakePort({ Ropes: sheet }, "Ropes!A1");
  const put = (address: string, row: number, column: number, formula: string, value: Cell) => {
    sheet[row]![column] = value;
    port.formulas.set(`Ropes!${address}`, formula);
  };
  put("C2", 1, 2, "WEIR.TOP_FRACTION_CUTOFF(A2:A61,5%)", 81.95271223532491);
  put("C3", 2, 2, "WEIR.SAFE_CUTOFF(A2:A61,5%)", 85);
  put("C4", 3, 2, "WEIR.NO_SUCH_MARK(A2:A61,5%)", { code: "#NAME?" });
  for (const row of [6, 7, 8, 10])
    put(`E${row + 1}`, row, 4, "WEIR.CURVE_CUTOFF(60,10,5%)", 60 + 1.6448536269514729 * 10);
  sheet[9]![4] = 75;
  return port;
}

describe("checking all calls of the open workbook", () => {
  test("what differs comes first, then what nobody could check, then what was noticed, then what agrees", async () => {
    const found = findings(await checkBook(await ropes().workbook(), unwatched));
    expect(found.map(({ address, found: what }) => [address, what])).toEqual([
      ["Ropes!C3", "differs"],
      ["Ropes!C4", "not checkable"],
      ["Ropes!E10", "typed over"],
      ["Ropes!C2", "agrees"],
      ["Ropes!E7", "agrees"],
      ["Ropes!E8", "agrees"],
      ["Ropes!E9", "agrees"],
      ["Ropes!E11", "agrees"],
    ]);
    expect(found[0]!.why).toContain("84.78644");
    expect(found[0]!.formula).toBe("=WEIR.SAFE_CUTOFF(A2:A61,5%)");
    expect(found[2]!.why).toContain("75");
  });

  test("a name of a sheet that an address would not take bare is quoted, so that the jump finds it", async () => {
    const port = fakePort({ "Round 2": [[16.448536269514729]] }, "'Round 2'!A1");
    port.formulas.set("'Round 2'!A1", "WEIR.CURVE_CUTOFF(0,10,5%)");
    const [only] = findings(await checkBook(await port.workbook(), unwatched));
    expect(only).toMatchObject({ address: "'Round 2'!A1", found: "agrees" });
  });

  test("the window gets its turn once a slice of time is used up, and is told how far it is", async () => {
    let time = 0;
    const told: (readonly [number, number])[] = [];
    const watch = { progress: (done: number, calls: number) => void told.push([done, calls]), cancelled: () => false };
    await checkBook(await ropes().workbook(), watch, () => (time += 20));
    // 7 calls, 20 ms by this clock at each look: the limit of 30 ms is passed at every second one.
    expect(told.length).toBeGreaterThan(2);
    expect(told.every(([done, calls]) => calls === 7 && done < 7)).toBe(true);
    expect(told.map(([done]) => done)).toEqual([...told.map(([done]) => done)].sort((a, b) => a - b));
  });

  test("a cancel ends it at the next turn", async () => {
    let time = 0;
    let turns = 0;
    const watch = { progress: () => void turns++, cancelled: () => true };
    const check = checkBook(await ropes().workbook(), watch, () => (time += 1000));
    await expect(check).rejects.toThrow(Cancelled);
    expect(turns).toBe(1);
  });
});

describe("the reading of the workbook", () => {
  test("holds until a cell has changed", async () => {
    const port = ropes();
    const reader = bookReader(port);
    const first = await reader.current();
    expect(await reader.current()).toBe(first);
    port.pick("Ropes!B2");
    expect(await reader.current()).toBe(first);
    port.changed();
    expect(reader.edits.get()).toBe(1);
    expect(await reader.current()).not.toBe(first);
  });

  test("cells that change before it ends are read once more, so that it holds afterwards", async () => {
    const port = ropes();
    const workbook = port.workbook;
    let readings = 0;
    port.workbook = async () => {
      if (++readings === 1) port.changed();
      return workbook();
    };
    const reader = bookReader(port);
    expect((await reader.read()).upTo).toBe(1);
    expect(readings).toBe(2);
    await reader.current();
    expect(readings).toBe(2);
  });

  test("of cells that never rest it takes what it has, and knows that it no longer holds", async () => {
    const port = ropes();
    const workbook = port.workbook;
    port.workbook = async () => {
      port.changed();
      return workbook();
    };
    const reader = bookReader(port);
    const { upTo } = await reader.read();
    expect(upTo).toBeLessThan(reader.edits.get());
  });

  test("one that took long is not repeated unasked", async () => {
    let time = 0;
    const port = ropes();
    const reader = bookReader(port, () => (time += 600));
    expect(reader.slow()).toBe(false);
    await reader.read();
    expect(reader.slow()).toBe(false);
    port.changed();
    expect(reader.slow()).toBe(true);
  });

  test("one that failed is tried again, and the next change is heard only until it is stopped", async () => {
    const port = ropes();
    const workbook = port.workbook;
    port.workbook = () => Promise.reject(new Error("protected view"));
    const reader = bookReader(port);
    await expect(reader.current()).rejects.toThrow("protected view");
    port.workbook = workbook;
    expect((await reader.current()).book.title).toBe("Bids of spring.xlsx");
    reader.stop();
    port.changed();
    expect(reader.edits.get()).toBe(0);
  });
});

describe("the report of a check", () => {
  /** Names that would be markup in a page, and a formula in a sheet. */
  async function hostile() {
    const name = `=HYPERLINK("x")<img src=x onerror=alert(1)>`;
    const port = fakePort({ [name]: [[1]] }, "A1");
    const book = await port.workbook();
    book.sheets[0]!.addFormula({
      row: 0,
      column: 0,
      formula: `WEIR.CURVE_CUTOFF("<script>",10,5%)`,
      array: { top: 0, left: 0, bottom: 0, right: 0 },
      dynamic: true,
      calculated: true,
    });
    return checkBook(book, unwatched);
  }

  test("tells file, date and time, revision and every verdict", async () => {
    const audit = await checkBook(await ropes().workbook(), unwatched);
    const page = await reportFile("html", audit, "Bids of spring.xlsx", "2026-03-14 09:05").text();
    for (const said of ["Bids of spring.xlsx", "checked 2026-03-14 09:05", "revision 1 of the numbers", "typed over"])
      expect(page).toContain(said);
    expect(page.match(/<td class="short[^>]*>(agrees|differs|not checkable)<\/td>/g)).toHaveLength(7);
  });

  test("as a page it holds no markup out of the workbook", async () => {
    const page = await reportFile("html", await hostile(), "<b>.xlsx", "").text();
    expect(page).not.toMatch(/<(img|script|b)\b/);
    expect(page).toContain("&lt;img src=x onerror=alert(1)&gt;");
  });

  test("as CSV and as a workbook nothing out of it becomes a formula", async () => {
    const audit = await hostile();
    const plain = await reportFile("csv", audit, "=1+1", "").text();
    for (const line of plain.split("\r\n").slice(1)) expect(line).not.toMatch(/(^|,)"?[=+@]/);
    const bytes = new Uint8Array(await reportFile("xlsx", audit, "=1+1", "").arrayBuffer());
    const parts = Object.entries(unzipSync(bytes)).filter(([name]) => name.startsWith("xl/worksheets/"));
    expect(parts.length).toBeGreaterThan(2);
    for (const [, part] of parts) expect(strFromU8(part)).not.toContain("<f");
  });
});
