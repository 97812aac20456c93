import {
  DomainError,
  requireCount,
  requireFinite,
  requireFraction,
  requireNotNegative,
  requirePositive,
} from "../core/domain";
import { isBlank, type Cell } from "./cell";

/*
 * Reading one scalar argument of a cell function. Each takes the argument's name first, so that the message can say it.
 * A `fallback` makes the argument optional: it is what a left-out or blank cell means.
 */

function numberOr(argument: string, cell: Cell, requirement: string, fallback?: number): number {
  if (isBlank(cell) && fallback !== undefined) return fallback;
  if (typeof cell !== "number" || !Number.isFinite(cell)) throw new DomainError(argument, cell, requirement);
  return cell;
}

export function readNumber(argument: string, cell: Cell, fallback?: number): number {
  const value = numberOr(argument, cell, "a number", fallback);
  requireFinite(argument, value);
  return value;
}

/** A fraction, chance or confidence: strictly between 0 and 1. */
export function readFraction(argument: string, cell: Cell, fallback?: number): number {
  const value = numberOr(argument, cell, "a number between 0 and 1, such as 5% or 0.05", fallback);
  requireFraction(argument, value);
  return value;
}

/** A whole number from `least` to `most`; 12.5 is refused, never rounded. */
export function readCount(argument: string, cell: Cell, least = 1, most?: number, fallback?: number): number {
  const value = numberOr(argument, cell, `a whole number of at least ${least}`, fallback);
  requireCount(argument, value, least, most);
  return value;
}

export function readPositive(argument: string, cell: Cell, fallback?: number): number {
  const value = numberOr(argument, cell, "a number above 0", fallback);
  requirePositive(argument, value);
  return value;
}

export function readNotNegative(argument: string, cell: Cell, fallback?: number): number {
  const value = numberOr(argument, cell, "0 or a number above 0", fallback);
  requireNotNegative(argument, value);
  return value;
}

/** A number from `low` to `high`, both included. */
export function readBetween(argument: string, cell: Cell, low: number, high: number, fallback?: number): number {
  const requirement = `a number from ${low} to ${high}`;
  const value = numberOr(argument, cell, requirement, fallback);
  if (!(value >= low && value <= high)) throw new DomainError(argument, value, requirement);
  return value;
}

/** TRUE or FALSE; 1 and 0 are taken for them. */
export function readFlag(argument: string, cell: Cell, fallback: boolean): boolean {
  if (isBlank(cell)) return fallback;
  if (typeof cell === "boolean") return cell;
  if (cell === 1 || cell === 0) return cell === 1;
  throw new DomainError(argument, cell, "TRUE or FALSE");
}

/** One of a few fixed words, in any case, trimmed. */
export function readWord<Word extends string>(
  argument: string,
  cell: Cell,
  allowed: readonly Word[],
  fallback: Word,
): Word {
  if (isBlank(cell)) return fallback;
  const typed = typeof cell === "string" ? cell.trim().toLowerCase() : undefined;
  const word = allowed.find((candidate) => candidate.toLowerCase() === typed);
  if (word === undefined) throw new DomainError(argument, cell, inWords(allowed));
  return word;
}

export type Better = "high" | "low";

export function readBetter(cell: Cell): Better {
  return readWord("better", cell, ["high", "low"], "high");
}

/** `"a", "b" or "c"`, as it stands in a message. */
export function inWords(words: readonly string[]): string {
  const quoted = words.map((word) => `"${word}"`);
  return quoted.length < 2 ? quoted.join("") : `${quoted.slice(0, -1).join(", ")} or ${quoted[quoted.length - 1]}`;
}
