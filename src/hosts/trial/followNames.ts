import type { Univer } from "@univerjs/core";
import type { FUniver } from "@univerjs/core/facade";
import { IFunctionService, SetDefinedNameMutation } from "@univerjs/preset-sheets-core";

/** Every formula that the engine remembers has this in its key. */
const EVERY_FORMULA = "";

/**
 * The engine remembers formulas as read with a name's cells put in, and goes on using those: a row inserted above would give the numbers of
 * other cells. So each change of a name makes it forget what it has read and calculate again.
 */
export function followNames(api: FUniver, univer: Univer): void {
  const functions = univer.__getInjector().get(IFunctionService);
  let waiting: ReturnType<typeof setTimeout> | undefined;
  api.onCommandExecuted(({ id }) => {
    if (id !== SetDefinedNameMutation.id) return;
    functions.deleteFormulaAstCacheKey(EVERY_FORMULA);
    clearTimeout(waiting);
    waiting = setTimeout(() => {
      functions.deleteFormulaAstCacheKey(EVERY_FORMULA);
      api.getFormula().executeCalculation();
    });
  });
}
