import { OfficeMockObject } from "office-addin-mock";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { followChanges } from "../../../src/hosts/excel/followChanges";

type Handler = () => Promise<void>;

/** An event of the host: remembers its handlers, and refuses them where `refuses`. */
function hostEvent(refuses: boolean) {
  const handlers: Handler[] = [];
  return {
    handlers,
    add(handler: Handler) {
      if (refuses) throw new Error("AccessDenied");
      handlers.push(handler);
      return { context: {}, remove: () => void handlers.splice(handlers.indexOf(handler), 1) };
    },
  };
}

function startHost({ selection = false, cells = false, sync = false, removal = false } = {}) {
  const onSelectionChanged = hostEvent(selection);
  const onChanged = hostEvent(cells);
  const host = new OfficeMockObject({
    context: { workbook: { onSelectionChanged, worksheets: { onChanged } } },
    async run(first: unknown, second?: (context: unknown) => Promise<void>) {
      if (second && removal) throw new Error("the workbook is closed");
      const batch = second ?? (first as (context: unknown) => Promise<void>);
      const context = {
        workbook: { onSelectionChanged, worksheets: { onChanged } },
        sync: async () => {
          if (sync) throw new Error("GeneralException");
        },
      };
      await batch(context);
    },
  });
  vi.stubGlobal("Excel", host);
  return { onSelectionChanged, onChanged };
}

const settled = () => new Promise((resolve) => setTimeout(resolve, 5));

describe("following the workbook in Excel", () => {
  let unhandled: unknown[];
  const note = (reason: unknown) => void unhandled.push(reason);
  beforeEach(() => {
    unhandled = [];
    process.on("unhandledRejection", note);
    vi.stubGlobal("Office", { context: { requirements: { isSetSupported: () => true } } });
    vi.stubGlobal("document", { documentElement: new EventTarget() });
    vi.stubGlobal("window", new EventTarget());
  });
  afterEach(async () => {
    await settled();
    process.off("unhandledRejection", note);
    vi.unstubAllGlobals();
    expect(unhandled).toEqual([]);
  });

  test("tells of selections and of cells, and of nothing once it is stopped", async () => {
    const { onSelectionChanged, onChanged } = startHost();
    const heard: string[] = [];
    const stop = followChanges((what) => heard.push(what));
    await settled();
    await onSelectionChanged.handlers[0]!();
    await onChanged.handlers[0]!();
    expect(heard).toEqual(["selection", "cells"]);
    stop();
    await settled();
    expect([onSelectionChanged.handlers, onChanged.handlers]).toEqual([[], []]);
  });

  test("stopped before the host has answered, it leaves no handler behind", async () => {
    const { onSelectionChanged, onChanged } = startHost();
    followChanges(() => undefined)();
    await settled();
    expect([onSelectionChanged.handlers, onChanged.handlers]).toEqual([[], []]);
  });

  test("where the selection can't be followed, cells still are, and a visit to the pane counts as a change", async () => {
    const { onChanged } = startHost({ selection: true });
    const heard: string[] = [];
    const stop = followChanges((what) => heard.push(what));
    await settled();
    await onChanged.handlers[0]!();
    window.dispatchEvent(new Event("focus"));
    document.documentElement.dispatchEvent(new Event("pointerenter"));
    expect(heard).toEqual(["cells", "selection", "selection"]);
    stop();
    window.dispatchEvent(new Event("focus"));
    expect(heard).toHaveLength(3);
  });

  test("where cells can't be followed, the selection still is", async () => {
    const { onSelectionChanged } = startHost({ cells: true });
    const heard: string[] = [];
    followChanges((what) => heard.push(what));
    await settled();
    await onSelectionChanged.handlers[0]!();
    expect(heard).toEqual(["selection"]);
  });

  test.each([{ sync: true }, { selection: true, cells: true }, { removal: true }])(
    "a host that fails with %o leaves no rejection unheard",
    async (failing) => {
      startHost(failing);
      const stop = followChanges(() => undefined);
      await settled();
      stop();
      await settled();
    },
  );
});
