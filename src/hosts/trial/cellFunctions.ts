import { BaseFunction, ErrorValueObject, type BaseValueObject, type ErrorType } from "@univerjs/preset-sheets-core";
import { argumentOf, valueOf } from "./engineValues";
import type { FunctionSet } from "./functionSet";
import type { MessageBook } from "./messageBook";

type FunctionClass = new (name: string) => BaseFunction;

/** A name of ours as formulas spell it, and as it stands in a file that a spreadsheet program saved. */
function spellings(name: string): string[] {
  return [`WEIR.${name}`, `_XLDUDF_WEIR_${name.replace(/\./g, "_")}`];
}

/** Our functions as the engine registers them: [class, name] pairs. */
export function cellFunctions(functions: FunctionSet, messages: MessageBook): [FunctionClass, string][] {
  return functions.table.flatMap((entry) => {
    class CellFunction extends BaseFunction {
      // Any count of arguments is let in: the engine's own refusal would be an #N/A that says nothing.
      override minParams = 0;
      override maxParams = 255;

      // Else the result is shown in the number format of an argument: 71.4 as 7140 % for a fraction typed as 5 %.
      override isArgumentsIgnoreNumberPattern() {
        return true;
      }

      override calculate(...given: BaseValueObject[]): BaseValueObject {
        const cells = given.map(argumentOf);
        while (cells.length > 0 && cells[cells.length - 1] === undefined) cells.pop();
        const outcome = functions.call(entry.name, cells, {})!;
        if ("value" in outcome) return valueOf(outcome.value);
        messages.keep(this.subUnitId ?? "", this.row, this.column, outcome.message);
        return ErrorValueObject.create(outcome.error as ErrorType);
      }
    }
    return spellings(entry.name).map((name): [FunctionClass, string] => [CellFunction as FunctionClass, name]);
  });
}
