import { Stop, type Command, type Io } from "./io";
import { chooseSheet, loadWorkbook } from "./loadWorkbook";
import { planBook } from "./plan/planBook";
import { readPlanColumn } from "./plan/readPlanColumn";
import { readPlanOptions } from "./plan/readPlanOptions";
import { planWords } from "./plan/planWords";
import { readArguments } from "./readArguments";

const OPTIONS = {
  column: "string",
  fraction: "string",
  confidence: "string",
  shape: "string",
  better: "string",
  sheet: "string",
  out: "string",
  replace: "boolean",
  help: "boolean",
} as const;

export const plan: Command = {
  name: "plan",
  usage:
    "plan FILE --column NAME --fraction 5% [--confidence 95%] [--shape normal] [--better high] [--sheet NAME] -o OUT.xlsx [--replace]",
  summary: "write a workbook with the whole plan for a score column: inputs, live formulas, a chart",
  help: `FILE is a .csv, .tsv or .xlsx; OUT is a new workbook. Its sheet "Plan" has labelled, named inputs and formulas of ours for the whole job
(how many to score, the curve, the mark and its limits, looks, time, cost, reserve, errors, the mark that is held), formatted for print,
with a native chart. The scores' sheet goes along with all its columns, as values.

  --column NAME     the heading above the scores
  --fraction F      the share that is to pass, such as 5% or 0.05
  --confidence C    of limits and safe mark (95%)
  --shape S         normal, lognormal, logit(low,high), boxcox or boxcox(power) (normal)
  --better B        high or low: which scores are better (high)
  --sheet NAME      the sheet of an .xlsx file; the first where left out
  -o, --out OUT     the workbook to be written, another file than FILE
  --replace         write over OUT where there is one already; what was changed in it is lost

A number stands in every cell, also for those who open OUT without the add-in. weirmark audit OUT proves them.

Exit code: 0 the plan was written, 2 it could not be.`,
  run: runPlan,
};

async function runPlan(args: readonly string[], io: Io): Promise<number> {
  const { positionals, values } = readArguments("plan", args, OPTIONS);
  const [path, ...more] = positionals;
  if (path === undefined || more.length > 0) throw new Stop(`plan takes one file: weirmark ${plan.usage}`);
  const options = readPlanOptions(values, path, plan.usage);
  const workbook = await loadWorkbook(path, io);
  const sheet = chooseSheet(workbook, options.sheet, path);
  const column = readPlanColumn(sheet, options.column);
  const planned = planBook(sheet, column, { ...options.asked, day: today() });
  const { writeXlsx } = await import("../hosts/file/writeXlsx");
  await io.write(options.out, writeXlsx(planned.book), values["replace"] ? undefined : "new");
  io.out(planWords(options.out, column, planned));
  return 0;
}

/** The day where this computer is. */
function today(): string {
  const now = new Date();
  return [now.getFullYear(), now.getMonth() + 1, now.getDate()].map((part) => String(part).padStart(2, "0")).join("-");
}
