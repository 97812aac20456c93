import type { FunctionEntry } from "../src/sheet/functionTable";
export function functionTable(): FunctionEntry[];
