import type { FunctionEntry } from "../src/sheet/functionTable";
export function helpPages(table: readonly FunctionEntry[]): [path: string, text: string][];
export function withSemicolons(formula: string): string | undefined;
