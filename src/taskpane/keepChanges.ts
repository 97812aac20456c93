import type { Port } from "../hosts/port";
import type { Observable } from "./observable";

const QUIET_MS = 600;

/** Keeps a value with the workbook once it has changed and rested: never on opening, so that looking on leaves the file as it was. */
export function keepChanges<T>(port: Port, key: string, value: Observable<T>): void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let first = true;
  value.watch((current) => {
    if (first) return void (first = false);
    clearTimeout(timer);
    // A workbook that may not be written to keeps nothing: the pane works all the same.
    timer = setTimeout(() => void port.keepSetting(key, current).catch(() => undefined), QUIET_MS);
  });
}
