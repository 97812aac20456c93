import { formatAddress } from "../../sheet/address";
import { printable, readableNumber } from "../../report/plainText";
import type { PlannedBook } from "./planBook";
import type { PlanColumn } from "./readPlanColumn";

/** What is said once the plan is written: where it is, what it says in short, and which of its cells have no answer and why. */
export function planWords(out: string, { heading, sorted }: PlanColumn, { book, plan, failed }: PlannedBook): string {
  const number = (name: string) => {
    const area = /\$([A-Z]+)\$(\d+)/.exec(book.names?.find((one) => one.name === name)?.formula ?? "");
    const cell = area && plan.cell(Number(area[2]) - 1, 1);
    return typeof cell === "number" ? readableNumber(Number(cell.toPrecision(6))) : "not to be had";
  };
  const lines = [
    `${out}: the plan for “${heading}”, on ${sorted.length} scores.`,
    `  plain cutoff ${number("weir_plain_cutoff")}, true mark from ${number("weir_lower_limit")} to ${number("weir_upper_limit")}, safe cutoff ${number("weir_safe_cutoff")}`,
    `  still to score ${number("weir_still_to_score")}, looks for the chance wanted ${number("weir_looks_needed")}`,
    ...failed.map(({ row, column, message }) => {
      const address = formatAddress({ top: row, left: column, bottom: row, right: column });
      return `  no answer in ${address}: ${message}`;
    }),
    "The number is no decision: groups can be hit unequally; local law and licensed practice come first.",
  ];
  return `${lines.map(printable).join("\n")}\n`;
}
