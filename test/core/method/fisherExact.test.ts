import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fisherExact } from "../../../src/core/method/fisherExact";
import memory from "../../reference/published/from-memory.json";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

type Counts = [number, number, number, number];
const group = fc
  .integer({ min: 1, max: 60 })
  .chain((assessed) => fc.tuple(fc.integer({ min: 0, max: assessed }), fc.constant(assessed)));

describe("fisherExact", () => {
  test.each(reference.fisher as unknown as [...Counts, number][])(
    "%d of %d against %d of %d agrees with exact counting of tables",
    (a, ofA, b, ofB, expected) => {
      expect(relativeError(fisherExact(a, ofA, b, ofB), expected)).toBeLessThanOrEqual(1e-13);
    },
  );

  test("Fisher's tea: 3 of 4 against 1 of 4 is 0.4857 (Fisher 1935, from memory), that is 34/70", () => {
    const { printed, tolerance } = memory.items.find(({ id }) => id === "fisher-tea") as unknown as {
      printed: number;
      tolerance: { abs: number };
    };
    expect(Math.abs(fisherExact(3, 4, 1, 4) - printed)).toBeLessThanOrEqual(tolerance.abs);
    expect(relativeError(fisherExact(3, 4, 1, 4), 34 / 70)).toBeLessThanOrEqual(1e-14);
  });

  test("laws: the same with groups changed and with passed and failed changed; never above 1; 1 for equal rates", () => {
    fc.assert(
      fc.property(group, group, ([a, ofA], [b, ofB]) => {
        const p = fisherExact(a, ofA, b, ofB);
        expect(p).toBeLessThanOrEqual(1);
        expect(p).toBeGreaterThan(0);
        expect(relativeError(fisherExact(b, ofB, a, ofA), p)).toBeLessThanOrEqual(1e-12);
        expect(relativeError(fisherExact(ofA - a, ofA, ofB - b, ofB), p)).toBeLessThanOrEqual(1e-12);
        expect(fisherExact(a, ofA, a, ofA)).toBe(1);
      }),
      { numRuns: 200 },
    );
  });
});
