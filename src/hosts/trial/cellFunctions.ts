import {
  BaseFunction,
  ErrorValueObject,
  type BaseReferenceObject,
  type BaseValueObject,
  type ErrorType,
} from "@univerjs/preset-sheets-core";
import { formatAddress } from "../../sheet/address";
import type { FunctionEntry } from "../../sheet/functionTable";
import type { Invocation, Outcome } from "../../sheet/invoke";
import { argumentTexts } from "./argumentTexts";
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
    const FunctionOfEntry = functionClass(entry, functions, messages);
    return spellings(entry.name).map((name): [FunctionClass, string] => [FunctionOfEntry, name]);
  });
}

function functionClass(entry: FunctionEntry, functions: FunctionSet, messages: MessageBook): FunctionClass {
  return class CellFunction extends BaseFunction {
    // Any count of arguments is let in: the engine's own refusal would be an #N/A that says nothing.
    override minParams = 0;
    override maxParams = 255;
    override needsReferenceObject = entry.takesAddresses;
    override needsSheetsInfo = entry.takesAddresses;
    override needsFormulaDataModel = entry.takesAddresses;

    // Else the result is shown in the number format of an argument: 71.4 as 7140 % for a fraction typed as 5 %.
    override isArgumentsIgnoreNumberPattern() {
      return true;
    }

    override calculate(...given: BaseValueObject[]): BaseValueObject {
      const invocation = entry.takesAddresses ? this.invocation(given) : {};
      const cells = given.map((one) => argumentOf(isReference(one) ? one.toArrayValueObject() : one));
      while (cells.length > 0 && cells[cells.length - 1] === undefined) cells.pop();
      return this.result(functions.call(entry.name, cells, invocation)!);
    }

    private result(outcome: Outcome): BaseValueObject {
      if ("value" in outcome) return valueOf(outcome.value);
      messages.keep(this.subUnitId ?? "", this.row, this.column, outcome);
      return ErrorValueObject.create(outcome.error as ErrorType);
    }

    private invocation(given: readonly BaseValueObject[]): Invocation {
      const { sheetNameMap } = this.getSheetsInfo();
      const formula = this._formulaDataModel?.getFormulaStringByCell(
        this.row,
        this.column,
        this.subUnitId ?? "",
        this.unitId ?? "",
      );
      return {
        parameterAddresses: given.map((one) => (isReference(one) ? addressOf(one, sheetNameMap) : undefined)),
        parameterTexts: argumentTexts(formula || "", entry.name),
      };
    }
  };
}

function isReference(value: unknown): value is BaseReferenceObject {
  return (value as BaseValueObject).isReferenceObject();
}

function addressOf(reference: BaseReferenceObject, names: Readonly<Record<string, string>>): string {
  const { startRow, startColumn, endRow, endColumn } = reference.getRangePosition();
  const sheet = names[reference.getSheetId()];
  const area = { top: startRow, left: startColumn, bottom: endRow, right: endColumn };
  return formatAddress(sheet === undefined ? area : { sheet, ...area });
}
