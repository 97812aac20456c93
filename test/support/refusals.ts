import { expect, test } from "vitest";

/** One test a row: the call is refused with a DomainError that names the argument. */
export function testRefusals<Args extends unknown[]>(
  f: (...args: Args) => unknown,
  rows: readonly (readonly [argument: string, ...args: Args])[],
): void {
  test.each(rows.map(([argument, ...args]) => ({ argument, args: args as unknown as Args })))(
    `${f.name} refuses a bad $argument and names it: $args`,
    ({ argument, args }) => {
      expect(() => f(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
    },
  );
}
