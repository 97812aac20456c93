import type { Cell } from "./cell";
import { DomainError } from "../core/domain";

/** A limit: a number, or "none" where there is no limit on that side, which is read as `none`. */
export function readLimit(argument: string, cell: Cell, none: number): number {
  if (typeof cell === "number" && Number.isFinite(cell)) return cell;
  if (typeof cell === "string" && cell.trim().toLowerCase() === "none") return none;
  throw new DomainError(argument, cell, 'a number, or "none" where there is no limit on that side');
}
