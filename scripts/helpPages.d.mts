import type { FunctionEntry } from "../src/sheet/functionTable";
import type { MethodPage } from "./methodPages.mjs";
export function helpPages(
  table: readonly FunctionEntry[],
  methods: readonly MethodPage[],
): [path: string, text: string][];
export function withSemicolons(formula: string): string | undefined;
