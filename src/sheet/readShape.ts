import { DomainError } from "../core/domain";
import { NORMAL, type Shape } from "../core/sample/shape";
import { isBlank, type Cell } from "./cell";

const REQUIREMENT =
  '"normal", "lognormal", "logit(low,high)" such as "logit(0,100)", "boxcox" or "boxcox(power)" such as "boxcox(0.5)"';
const NUMBER = "[+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:e[+-]?\\d+)?";
const LOGIT = new RegExp(`^logit\\((${NUMBER}),(${NUMBER})\\)$`);
const BOXCOX = new RegExp(`^boxcox(?:\\((${NUMBER})\\))?$`);

/** The shape argument: any case, white space anywhere. */
export function readShape(cell: Cell, argument = "shape"): Shape {
  if (isBlank(cell)) return NORMAL;
  const typed = typeof cell === "string" ? cell.toLowerCase().replace(/\s+/g, "") : "";
  if (typed === "normal" || typed === "lognormal") return { kind: typed };
  const logit = LOGIT.exec(typed);
  if (logit) {
    const low = Number(logit[1]);
    const high = Number(logit[2]);
    if (!(low < high)) throw new DomainError(argument, cell, "logit(low,high) with low below high");
    return { kind: "logit", low, high };
  }
  const boxcox = BOXCOX.exec(typed);
  if (!boxcox) throw new DomainError(argument, cell, REQUIREMENT);
  if (boxcox[1] === undefined) return { kind: "boxcox" };
  const power = Number(boxcox[1]);
  if (!Number.isFinite(power)) throw new DomainError(argument, cell, REQUIREMENT);
  return { kind: "boxcox", power };
}
