import { evaluate } from "../audit/evaluate";
import { decodeText } from "../hosts/file/decodeText";
import { UnusableFile } from "../hosts/file/unusableFile";
import { describeAnswer, type Calculated } from "./calculated";
import { Stop, type Command, type Io } from "./io";
import { chooseSheet, loadWorkbook } from "./loadWorkbook";
import { alignedRows, plainCell, printable } from "../report/plainText";
import { readArguments } from "./readArguments";

const OPTIONS = { formulas: "string", sheet: "string", json: "boolean", help: "boolean" } as const;

export const calc: Command = {
  name: "calc",
  usage: "calc FILE [FORMULA …] [--formulas LIST] [--sheet NAME] [--json]",
  summary: "work out formulas on the cells of a .csv, .tsv or .xlsx file",
  help: `Each formula is worked out as if typed into an empty cell of the sheet. The "=" in front may be left out.

  --formulas LIST   a file with one formula a line ("-": standard input); empty lines and lines that begin with # are passed over
  --sheet NAME      the sheet of an .xlsx file; the first where left out
  --json            one object a line: {"formula","value"} or {"formula","error","message"}, numbers with all their digits

A .csv is UTF-8, with commas, semicolons (then with a decimal comma) or tabs between the fields. Its row 1 is row 1 of the sheet and may hold
headings; an empty field is a blank cell. TRUE and FALSE, 5% and #N/A are taken for what they are; dates stay texts.

Exit code: 0 all were worked out (an error is a value), 2 the file, an option or a formula can't be used.`,
  run: runCalc,
};

async function runCalc(args: readonly string[], io: Io): Promise<number> {
  const { positionals, values } = readArguments("calc", args, OPTIONS);
  const [path, ...typed] = positionals;
  if (path === undefined) throw new Stop(`calc needs a file: weirmark ${calc.usage}`);
  const formulas = [...typed, ...(await listedFormulas(values["formulas"] as string | undefined, io))];
  if (formulas.length === 0)
    throw new Stop("calc needs a formula: give one or more behind the file, or a list by --formulas.");
  if (formulas.some((formula) => formula.replace(/^=/, "").trim() === "")) throw new Stop("A formula is empty.");
  const workbook = await loadWorkbook(path, io);
  const sheet = chooseSheet(workbook, values["sheet"] as string | undefined, path);
  const place = { workbook, sheet, row: sheet.lastRow + 1, column: sheet.lastColumn + 1 };
  let code = 0;
  const results = formulas.map((formula) => {
    const result = describeAnswer(formula, evaluate(formula.trim(), place));
    if (result.unreadable) code = 2;
    if (values["json"]) io.out(`${jsonLine(result)}\n`);
    return result;
  });
  if (!values["json"]) io.out(plainLines(results).join("\n") + "\n");
  return code;
}

async function listedFormulas(list: string | undefined, io: Io): Promise<string[]> {
  if (list === undefined) return [];
  const bytes = await io.read(list);
  try {
    return decodeText(bytes)
      .split(/\r\n|\r|\n/)
      .map((line) => line.trim())
      .filter((line) => line !== "" && !line.startsWith("#"));
  } catch (failure) {
    if (failure instanceof UnusableFile) throw new Stop(`${list}: ${failure.message}`);
    throw failure;
  }
}

function jsonLine({ formula, value, error, message }: Calculated): string {
  return JSON.stringify(error === undefined ? { formula, value } : { formula, error, message });
}

/** One formula: its value alone. Several: each with its formula, single values under one another, tables below their formula. */
function plainLines(results: readonly Calculated[]): string[] {
  const alone = results.length === 1;
  const width = Math.max(
    ...results.map(({ formula, value }) => (Array.isArray(value) ? 0 : printable(formula).length)),
  );
  return results.flatMap(({ formula, value, error, message }) => {
    const name = printable(formula);
    if (Array.isArray(value)) return alone ? alignedRows(value) : [name, ...alignedRows(value, "  ")];
    const text = error === undefined ? plainCell(value) : `${error}  ${printable(message ?? "")}`;
    return [alone ? text : `${name.padEnd(width)}  ${text}`];
  });
}
