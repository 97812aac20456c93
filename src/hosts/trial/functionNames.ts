import { IFunctionService } from "@univerjs/preset-sheets-core";
import type { TrialSheet } from "./startSheet";

/** Computed by the engine itself, without an entry in its list. */
const BUILT_IN = ["LET", "LAMBDA"];

/** The names of all functions that formulas in the trial sheet may call. */
export function functionNames({ univer }: TrialSheet): string[] {
  return [...univer.__getInjector().get(IFunctionService).getExecutors().keys()].map(String).concat(BUILT_IN);
}
