import { resolve } from "node:path";
import { DomainError } from "../../core/domain";
import { shapeText } from "../../core/sample/shape";
import type { PlanQuestion } from "../../plan/planModel";
import { readShape } from "../../sheet/readShape";
import { Stop } from "../io";

export interface PlanOptions {
  readonly column: string;
  readonly sheet: string | undefined;
  readonly out: string;
  readonly asked: Pick<PlanQuestion, "fraction" | "confidence" | "better" | "shape">;
}

type Values = Readonly<Record<string, string | boolean | undefined>>;

/** The options of a plan, each refused by its name where it can't be used. */
export function readPlanOptions(values: Values, path: string, usage: string): PlanOptions {
  const text = (name: string) => values[name] as string | undefined;
  const [column, fraction, out] = [text("column"), text("fraction"), text("out")];
  if (column === undefined || column.trim() === "")
    throw new Stop(`plan needs the heading of the scores by --column: weirmark ${usage}`);
  if (fraction === undefined)
    throw new Stop(`plan needs the share that is to pass by --fraction, such as 5%: weirmark ${usage}`);
  if (out === undefined) throw new Stop(`plan needs a name for the workbook by -o: weirmark ${usage}`);
  if (!/\.xlsx$/i.test(out)) throw new Stop(`The plan is a workbook: its name ends in .xlsx; ${out} was given.`);
  if (path !== "-" && resolve(out) === resolve(path))
    throw new Stop("The plan must be another file than the scores: they would be written over.");
  const better = (text("better") ?? "high").trim().toLowerCase();
  if (better !== "high" && better !== "low") throw new Stop(`--better is high or low; ${better} was given.`);
  return {
    column,
    sheet: text("sheet"),
    out,
    asked: {
      fraction: readShare("--fraction", fraction),
      confidence: readShare("--confidence", text("confidence") ?? "95%"),
      better,
      shape: shapeOf(text("shape") ?? "normal"),
    },
  };
}

/** 5% or 0.05. A 5 alone is asked back, never guessed. */
function readShare(option: string, typed: string): number {
  const match = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)\s*(%?)$/i.exec(typed.trim());
  // A comma may be a decimal comma: 2,5%.
  const comma = !match && /^\d*,\d+\s*%?$/.test(typed.trim());
  if (comma) return readShare(option, typed.replace(",", "."));
  const share = match ? Number(match[1]) / (match[2] === "%" ? 100 : 1) : NaN;
  if (share > 0 && share < 1) return share;
  const percent = match && match[2] === "" && Number(match[1]) >= 1 && Number(match[1]) < 100;
  const hint = percent ? ` If you mean ${match[1]} percent, write ${match[1]}%.` : "";
  throw new Stop(`${option} must lie between 0 and 1, such as 5% or 0.05; ${typed} was given.${hint}`);
}

function shapeOf(typed: string): string {
  try {
    return shapeText(readShape(typed, "--shape"));
  } catch (failure) {
    if (failure instanceof DomainError) throw new Stop(failure.message);
    throw failure;
  }
}
