import { CommandType } from "@univerjs/core";
import type { FUniver } from "@univerjs/core/facade";
import { keepBook } from "./keptBook";

const QUIET = 400;
/** What changes the workbook; the engine also reports what it does in its formula line and in its formula memory. */
const CHANGE = /^sheet\.mutation\.|defined-name/;
/** What the engine does by itself when it lays a sheet out; none of it is a change that the user made. */
const LAYOUT = /auto-height|worksheet-active|scroll|selection/;

/** Keeps the workbook in this browser shortly after each change. `kept` hears whether that worked. Gives the way to ask for it. */
export function keepChanges(api: FUniver, kept: (worked: boolean) => void): () => void {
  let waiting: ReturnType<typeof setTimeout> | undefined;
  const keep = (): void => {
    waiting = undefined;
    void keepBook(api.getActiveWorkbook()!.save()).then(kept);
  };
  const soon = (): void => {
    clearTimeout(waiting);
    waiting = setTimeout(keep, QUIET);
  };
  api.onCommandExecuted((command, options) => {
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
