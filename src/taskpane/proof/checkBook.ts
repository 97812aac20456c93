import { auditWorkbook, type Audit } from "../../audit/auditWorkbook";
import type { Workbook } from "../../sheet/workbook";

/** How far two numbers may lie apart, as a part of the larger: the same as at the command line. */
export const TOLERANCE = 1e-9;
/** So long the window waits for us at most. */
const SLICE_MS = 30;

export class Cancelled extends Error {}

export interface CheckWatch {
  /** Told before each pause, never in between. */
  progress(done: number, calls: number): void;
  cancelled(): boolean;
}

/** Checks all calls of a workbook in slices, with the window drawn and presses heard in between. Throws Cancelled where it was. */
export function checkBook(
  workbook: Workbook,
  watch: CheckWatch,
  now: () => number = () => performance.now(),
): Promise<Audit> {
  let began = now();
  return auditWorkbook(workbook, {
    tolerance: TOLERANCE,
    async between(done, calls) {
      if (now() - began < SLICE_MS) return;
      watch.progress(done, calls);
      await new Promise((resolve) => setTimeout(resolve));
      if (watch.cancelled()) throw new Cancelled("The check was cancelled.");
      began = now();
    },
  });
}
