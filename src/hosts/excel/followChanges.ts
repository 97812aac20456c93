type Listener = (what: "selection" | "cells") => void;
type Registered = OfficeExtension.EventHandlerResult<unknown>;

/**
 * Tells of each change of the selection or of a cell; returns the way to stop. Each is asked for by itself, so that a workbook that
 * refuses the one (a protected view, an older host) still tells the other. Where the selection isn't told, it is taken
 * to have changed whenever the user comes to the pane: following late is better than showing a column long left.
 */
export function followChanges(listener: Listener): () => void {
  let stopped = false;
  const stops: (() => void)[] = [];
  const onStop = (stop: () => void) => void (stopped ? stop() : stops.push(stop));
  const follow = (register: (workbook: Excel.Workbook) => Registered): Promise<void> =>
    Excel.run(async (context) => {
      const handler = register(context.workbook);
      await context.sync();
      onStop(() => remove(handler));
    });
  const followVisits = (): void => {
    const visited = () => listener("selection");
    // Two ways to come: by pointer, and by keyboard from the sheet.
    document.documentElement.addEventListener("pointerenter", visited);
    window.addEventListener("focus", visited);
    onStop(() => {
      document.documentElement.removeEventListener("pointerenter", visited);
      window.removeEventListener("focus", visited);
    });
  };
  follow((workbook) => workbook.onSelectionChanged.add(async () => listener("selection"))).catch(followVisits);
  if (Office.context.requirements.isSetSupported("ExcelApi", "1.9"))
    follow((workbook) => workbook.worksheets.onChanged.add(async () => listener("cells"))).catch(() => undefined);
  return () => {
    stopped = true;
    for (const stop of stops.splice(0)) stop();
  };
}

/** A handler that can't be taken away, since its workbook is closed, tells nothing any more either. */
function remove(handler: Registered): void {
  Excel.run(handler.context as Excel.RequestContext, async (context) => {
    handler.remove();
    await context.sync();
  }).catch(() => undefined);
}
