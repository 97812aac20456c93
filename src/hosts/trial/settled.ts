import { CommandType } from "@univerjs/core";
import type { FUniver } from "@univerjs/core/facade";

/**
 * Gives a way to wait until every change made so far has been calculated. The engine's own wait takes half a second also where there
 * is nothing to wait for, so it is asked only after a change.
 */
export function settledAfterChanges(api: FUniver): () => Promise<void> {
  const formulas = api.getFormula();
  let changes = 0;
  let calculated = 0;
  api.onCommandExecuted((command, options) => {
    if (command.type === CommandType.MUTATION && !options?.fromFormula && command.id.startsWith("sheet.mutation."))
      changes++;
  });
  return async () => {
    if (changes === calculated) return;
    const upTo = changes;
    await formulas.onCalculationResultApplied();
    calculated = Math.max(calculated, upTo);
  };
}
