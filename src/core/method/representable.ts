import { DomainError } from "../domain";

/** `result` itself, unless it has left the range of numbers: then the argument that carried it there is refused. */
export function representable(argument: string, value: unknown, result: number): number {
  if (!Number.isFinite(result)) throw new DomainError(argument, value, "of a size whose result is still a number");
  return result;
}
