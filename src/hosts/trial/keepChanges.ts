import { CommandType, IResourceManagerService, UniverInstanceType, type IWorkbookData } from "@univerjs/core";
import { keepBook } from "./keptBook";
import type { TrialSheet } from "./startSheet";

const QUIET = 400;
/** A large workbook takes the page a while to hand over: it is kept the less often, so that one can go on typing. */
const REST = 5;
/** What changes the workbook; the engine also reports what it does in its formula line and in its formula memory. */
const CHANGE = /^sheet\.mutation\.|defined-name/;
/** What the engine does by itself when it lays a sheet out; none of it is a change that the user made. */
const LAYOUT = /auto-height|worksheet-active|scroll|selection/;

/** Keeps the workbook in this browser shortly after each change. `kept` hears whether that worked. Gives the way to ask for it. */
export function keepChanges(sheet: TrialSheet, kept: (worked: boolean) => void): () => void {
  let waiting: ReturnType<typeof setTimeout> | undefined;
  let took = 0;
  const keep = (): void => {
    waiting = undefined;
    const start = performance.now();
    void keepBook(bookNow(sheet)).then((worked) => {
      took = performance.now() - start;
      kept(worked);
    });
  };
  const soon = (): void => {
    clearTimeout(waiting);
    waiting = setTimeout(keep, Math.max(QUIET, REST * took));
  };
  sheet.api.onCommandExecuted((command, options) => {
    if (command.type !== CommandType.MUTATION || options?.fromFormula) return;
    if (CHANGE.test(command.id) && !LAYOUT.test(command.id)) soon();
  });
  // A page that is left right after a change would lose it.
  document.addEventListener("visibilitychange", () => {
    if (document.visibilityState !== "hidden" || waiting === undefined) return;
    clearTimeout(waiting);
    keep();
  });
  return soon;
}

/** The workbook as it is, not a copy of it: the browser makes one anyway when it takes it. */
function bookNow({ api, univer }: TrialSheet): IWorkbookData {
  const book = api.getActiveWorkbook()!.getWorkbook();
  const resources = univer.__getInjector().get(IResourceManagerService);
  return {
    ...book.getSnapshot(),
    resources: resources.getResources(book.getUnitId(), UniverInstanceType.UNIVER_SHEET),
  };
}
