import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { followSelection, type Selection } from "../../src/taskpane/column/followSelection";
import type { Column } from "../../src/taskpane/column/readColumn";
import { observable } from "../../src/taskpane/observable";
import { fakePort } from "./fakePort";

const bids = () => ({
  Bids: [
    ["bidder", "score", "days"],
    ["a", 71, 3],
    ["b", 64.5, 4],
    ["c", null, 9],
    ["d", 80, 2],
    [null, null, null],
    ["note", null, null],
  ] as (string | number | null)[][],
});

function follow(port = fakePort(bids(), "Bids!B1:B5")) {
  const column = observable<Column | undefined>(undefined);
  const selection = observable<Selection>({ kind: "reading" });
  const follower = followSelection(port, column, observable<string | undefined>(undefined), selection);
  return { port, column, selection, follower };
}

describe("following the selection", () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());
  const quiet = () => vi.advanceTimersByTimeAsync(160);

  test("the column that is selected when the pane opens is taken at once", async () => {
    const { column } = follow();
    await quiet();
    expect(column.get()).toMatchObject({ address: "Bids!B2:B5", heading: "score", count: 3, blanks: ["B4"] });
  });

  test("many changes in a row are one reading, after 80 ms of quiet", async () => {
    const { port, column } = follow();
    await quiet();
    const spy = vi.spyOn(port, "selection");
    for (let i = 0; i < 20; i++) {
      port.pick("Bids!C1:C5");
      await vi.advanceTimersByTimeAsync(50);
    }
    expect(spy).not.toHaveBeenCalled();
    await quiet();
    expect(spy).toHaveBeenCalledTimes(1);
    expect(column.get()!.heading).toBe("days");
  });

  test("a heading above the selection is found", async () => {
    const { column } = follow(fakePort(bids(), "Bids!C2:C5"));
    await quiet();
    expect(column.get()).toMatchObject({ address: "Bids!C2:C5", heading: "days" });
  });

  test("a click into a cell without scores leaves the column, and offers its whole column", async () => {
    const { port, column, selection, follower } = follow();
    await quiet();
    port.pick("Bids!C3");
    await quiet();
    expect(column.get()!.address).toBe("Bids!B2:B5");
    expect(selection.get()).toEqual({ kind: "no-numbers", address: "Bids!C3", letters: "C" });
    await follower.takeColumn("C");
    expect(column.get()).toMatchObject({ address: "Bids!C2:C5", heading: "days" });
  });

  test("of several columns the first with scores is taken, the others can be", async () => {
    const { column, selection, follower } = follow(fakePort(bids(), "Bids!A1:C5"));
    await quiet();
    const several = selection.get();
    expect(several).toMatchObject({ kind: "columns", places: [1, 2], place: 1 });
    if (several.kind === "columns") await follower.takePlace(several.block, 2);
    expect(column.get()!.heading).toBe("days");
  });

  test("held on, another selection changes nothing; let go, it counts", async () => {
    const { port, column, follower } = follow();
    await quiet();
    follower.hold(true);
    port.pick("Bids!C1:C5");
    await quiet();
    expect(column.get()!.heading).toBe("score");
    follower.hold(false);
    await quiet();
    expect(column.get()!.heading).toBe("days");
  });

  test("a score that changes is read anew, another cell that changes draws nothing anew", async () => {
    const { port, column } = follow();
    await quiet();
    const before = column.get();
    await port.write("Bids!D1", [["elsewhere"]]);
    port.changed();
    await quiet();
    expect(column.get()).toBe(before);
    await port.write("Bids!B4", [[75]]);
    port.changed();
    await quiet();
    expect(column.get()).toMatchObject({ count: 4, heading: "score" });
  });

  test("a column that grows at its end grows in the pane, a part that was selected stays that part", async () => {
    const { port, column } = follow();
    await quiet();
    await port.write("Bids!B6", [[90]]);
    port.changed();
    await quiet();
    expect(column.get()).toMatchObject({ address: "Bids!B2:B6", count: 4 });
    port.pick("Bids!C2:C3");
    await quiet();
    await port.write("Bids!C4", [[75]]);
    port.changed();
    await quiet();
    expect(column.get()!.address).toBe("Bids!C2:C3");
  });

  test("an edit that moves the selection on counts as both", async () => {
    const { port, column } = follow();
    await quiet();
    await port.write("Bids!B4", [[75]]);
    port.pick("Bids!B7");
    port.changed();
    await quiet();
    expect(column.get()).toMatchObject({ address: "Bids!B2:B5", count: 4 });
    port.changed();
    port.pick("Bids!C1:C5");
    await quiet();
    expect(column.get()!.heading).toBe("days");
  });

  test("of two readings under way only the later one counts", async () => {
    const { port, column } = follow();
    await quiet();
    let slow!: (block: Awaited<ReturnType<typeof port.selection>>) => void;
    vi.spyOn(port, "selection").mockImplementationOnce(() => new Promise((resolve) => (slow = resolve)));
    port.pick("Bids!B1:B5");
    await quiet();
    port.pick("Bids!C1:C5");
    await quiet();
    slow({ address: "Bids!B1:B5", values: [["score"], [1], [2]] });
    await quiet();
    expect(column.get()!.heading).toBe("days");
  });

  test("a selection is not forgotten where the reading before it is overtaken by an edit", async () => {
    const { port, column } = follow();
    await quiet();
    const read = port.read;
    vi.spyOn(port, "read").mockImplementationOnce(
      (address) => new Promise((resolve) => setTimeout(() => resolve(read(address)), 1000)),
    );
    port.changed();
    port.pick("Bids!C1:C5");
    await quiet();
    port.changed();
    await vi.advanceTimersByTimeAsync(2000);
    expect(column.get()!.heading).toBe("days");
  });

  test("what changes while the sheet is being read is read too", async () => {
    const { port, column } = follow();
    await quiet();
    const selection = port.selection;
    vi.spyOn(port, "selection").mockImplementationOnce(async () => {
      const before = await selection();
      await new Promise((resolve) => setTimeout(resolve, 100));
      return before;
    });
    port.pick("Bids!B1:B3");
    await quiet();
    port.pick("Bids!C1:C5");
    await vi.advanceTimersByTimeAsync(1000);
    expect(column.get()!.heading).toBe("days");
    const read = port.read;
    vi.spyOn(port, "read").mockImplementationOnce(async (address) => {
      const before = await read(address);
      await new Promise((resolve) => setTimeout(resolve, 100));
      return before;
    });
    port.changed();
    await quiet();
    await port.write("Bids!C2", [[7]]);
    port.changed();
    await vi.advanceTimersByTimeAsync(1000);
    expect(column.get()!.values[0]).toBe(7);
  });

  test("a column whose sheet is gone does not keep the pane from the next one", async () => {
    const { port, column } = follow();
    await quiet();
    vi.spyOn(port, "read").mockRejectedValueOnce(new Error("no such sheet"));
    port.changed();
    port.pick("Bids!C1:C5");
    await quiet();
    expect(column.get()!.heading).toBe("days");
  });

  test("a sheet that can't be read is said, and the next selection is read all the same", async () => {
    const { port, column, selection } = follow();
    await quiet();
    vi.spyOn(port, "selection").mockRejectedValueOnce(new Error("busy"));
    port.pick("Bids!C1:C5");
    await quiet();
    expect(selection.get()).toEqual({ kind: "failed", message: "busy" });
    port.pick("Bids!C1:C5");
    await quiet();
    expect(column.get()!.heading).toBe("days");
  });
});
