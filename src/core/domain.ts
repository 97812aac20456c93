/**
 * The two ways in which a question can fail, and the checks at the door.
 *
 * A `DomainError` says that an argument is not allowed: it names the argument, shows what came and says what is allowed.
 * A `NoAnswerError` says that the input is good but no answer exists (yet): too few scores, no such mark.
 * Nothing else is thrown on purpose; a loop that passes its cap throws an `UnsettledError`, which is a fault of ours.
 */
export class DomainError extends Error {
  override readonly name: string = "DomainError";
  constructor(
    readonly argument: string,
    readonly value: unknown,
    readonly requirement: string,
    /** What came, in words, where the value alone would not tell: "2 of 60 cells hold text". */
    came = `${showValue(value)} was given`,
  ) {
    super(`${argument} must be ${requirement}; ${came}.`);
  }
}

export class NoAnswerError extends Error {
  override readonly name: string = "NoAnswerError";
  /** `message` is a whole sentence that names the argument and says what to do next. */
  constructor(
    readonly argument: string,
    message: string,
  ) {
    super(message);
  }
}

export class UnsettledError extends Error {
  override readonly name: string = "UnsettledError";
  constructor(where: string) {
    super(`${where} did not settle. Please report the arguments: this is a fault in the add-in, not in your data.`);
  }
}

/** How a refused value is shown in a message: text in quotes and cut, numbers as typed, nothing as "nothing". */
export function showValue(value: unknown): string {
  if (value === null || value === undefined || value === "") return "nothing";
  if (typeof value === "string") return `"${value.length > 40 ? `${value.slice(0, 40)}…` : value}"`;
  if (typeof value === "boolean") return value ? "TRUE" : "FALSE";
  if (typeof value === "number") return Object.is(value, -0) ? "0" : String(value);
  if (Array.isArray(value)) return "a range";
  if (typeof value === "object" && "code" in value) return `an error cell (${String(value.code)})`;
  return String(value);
}

/** Fails unless `value` is a number strictly between 0 and 1. NaN fails. */
export function requireFraction(argument: string, value: number): void {
  if (!(value > 0 && value < 1)) throw new DomainError(argument, value, "a number between 0 and 1, such as 5% or 0.05");
}

/** Fails unless `value` is a probability, 0 and 1 included. NaN fails. */
export function requireProbability(argument: string, value: number): void {
  if (!(value >= 0 && value <= 1)) throw new DomainError(argument, value, "a number from 0 to 1");
}

/** Fails unless `value` is a whole number of at least `least` (and at most `most`). NaN fails. */
export function requireCount(argument: string, value: number, least = 0, most = Number.MAX_SAFE_INTEGER): void {
  if (!(Number.isInteger(value) && value >= least && value <= most)) {
    const upTo = most === Number.MAX_SAFE_INTEGER ? `of at least ${least}` : `from ${least} to ${most}`;
    throw new DomainError(argument, value, `a whole number ${upTo}`);
  }
}

/** Fails unless `value` is finite. */
export function requireFinite(argument: string, value: number): void {
  if (!Number.isFinite(value)) throw new DomainError(argument, value, "a number");
}

/** Fails unless `value` is finite and above zero. */
export function requirePositive(argument: string, value: number): void {
  if (!(value > 0 && value < Infinity)) throw new DomainError(argument, value, "a number above 0");
}

/** Fails unless `value` is finite and not below zero. */
export function requireNotNegative(argument: string, value: number): void {
  if (!(value >= 0 && value < Infinity)) throw new DomainError(argument, value, "0 or a number above 0");
}

/** Fails only for what is no number: ±Infinity, where a distribution function has its limits, may pass. NaN fails. */
export function requireReal(argument: string, value: number): void {
  if (typeof value !== "number" || Number.isNaN(value)) throw new DomainError(argument, value, "a number");
}

/** Fails unless `value` is a whole number, negative ones included. */
export function requireInteger(argument: string, value: number): void {
  if (!Number.isSafeInteger(value)) throw new DomainError(argument, value, "a whole number");
}

/** Fails unless `value` is a shape or degrees of freedom for which the distributions are accurate. NaN fails. */
export function requireShape(argument: string, value: number): void {
  if (!(value >= 0.001 && value <= 1e15)) throw new DomainError(argument, value, "a number from 0.001 to 1e15");
}
