import { describe, expect, test } from "vitest";
import { normalUpperTailQuantile } from "../../../src/core/distribution/normalUpperTailQuantile";
import { trueTopAmongPassed } from "../../../src/core/method/trueTopAmongPassed";
import { worthAmongPassed } from "../../../src/core/method/worthAmongPassed";
import memory from "../../reference/published/from-memory.json";
import selection from "../../reference/published/selection.json";
import reference from "../../reference/risk/values.json";
import { relativeError } from "../../support/relativeError";

interface Table {
  id: string;
  source: string;
  inputs: { base: number; validity: number; selection: number[] };
  printed: number[];
  tolerance: { abs: number };
}
const tables = [...selection.items, ...memory.items.filter(({ id }) => id.startsWith("tr-"))] as unknown as Table[];

describe("trueTopAmongPassed", () => {
  test.each(reference.trueTop)(
    "true %d, pass %d, validity %d agrees with quadrature in 34 digits",
    (top, pass, validity, share) => {
      expect(relativeError(trueTopAmongPassed(top!, pass!, validity!).share, share!)).toBeLessThanOrEqual(1e-13);
    },
  );

  test.each(tables)("$id: $source", ({ inputs, printed, tolerance }) => {
    inputs.selection.forEach((pass, i) => {
      const { share } = trueTopAmongPassed(inputs.base, pass, inputs.validity);
      expect(Math.abs(share - printed[i]!)).toBeLessThanOrEqual(tolerance.abs);
    });
  });

  test("by hand: validity 1 passes the truly best, −1 the truly worst, 0 a random share", () => {
    expect(trueTopAmongPassed(0.3, 0.6, 1).share).toBe(0.5);
    expect(trueTopAmongPassed(0.6, 0.3, 1).share).toBe(1);
    expect(trueTopAmongPassed(0.7, 0.5, -1).share).toBeCloseTo(0.4, 15);
    expect(trueTopAmongPassed(0.1, 0.9, -1).share).toBe(0);
    expect(trueTopAmongPassed(0.3, 0.2, -1).share).toBe(0);
    expect(relativeError(trueTopAmongPassed(0.3, 0.6, 0).share, 0.3)).toBeLessThanOrEqual(1e-15);
  });

  test("by hand: halves at validity ½ share 1/3 of all, so 2/3 of those passed (Sheppard)", () => {
    expect(trueTopAmongPassed(0.5, 0.5, 0.5).share).toBeCloseTo(2 / 3, 14);
  });

  test("laws: rises with validity to its limits at ±1; who is passed and who is top may change places", () => {
    for (const [top, pass] of [
      [0.2, 0.3],
      [0.6, 0.7],
      [0.05, 0.01],
    ] as const) {
      let before = trueTopAmongPassed(top, pass, -1).share;
      expect(trueTopAmongPassed(top, pass, -1 + 1e-12).share - before).toBeLessThan(1e-5);
      for (const validity of [-0.9, -0.5, 0, 0.3, 0.7, 0.99, 1]) {
        const { share, passedAndTop } = trueTopAmongPassed(top, pass, validity);
        expect(share).toBeGreaterThanOrEqual(before);
        expect(relativeError(trueTopAmongPassed(pass, top, validity).passedAndTop, passedAndTop)).toBeLessThanOrEqual(
          1e-12,
        );
        before = share;
      }
      expect(before - trueTopAmongPassed(top, pass, 1 - 1e-12).share).toBeLessThan(1e-5);
    }
  });

  test.each<[string, [number, number, number]]>([
    ["true_fraction", [0, 0.5, 0.5]],
    ["true_fraction", [NaN, 0.5, 0.5]],
    ["pass_fraction", [0.5, 1, 0.5]],
    ["pass_fraction", [0.5, NaN, 0.5]],
    ["validity", [0.5, 0.5, 1.0001]],
    ["validity", [0.5, 0.5, NaN]],
    ["validity", [0.5, 0.5, -Infinity]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => trueTopAmongPassed(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});

describe("worthAmongPassed", () => {
  test("the mean standard scores of Naylor & Shine 1965 (from memory)", () => {
    const { inputs, printed, tolerance } = memory.items.find(({ id }) => id === "naylor-shine") as unknown as Table;
    inputs.selection.forEach((pass, i) =>
      expect(Math.abs(worthAmongPassed(pass, 1).meanWorth - printed[i]!)).toBeLessThanOrEqual(tolerance.abs),
    );
  });

  test("by hand: the better half is 2φ(0) = √(2/π) above the mean, and worth follows the validity", () => {
    expect(worthAmongPassed(0.5, 1).meanWorth).toBeCloseTo(Math.sqrt(2 / Math.PI), 15);
    expect(worthAmongPassed(0.5, -0.4).meanWorth).toBeCloseTo(-0.4 * Math.sqrt(2 / Math.PI), 15);
    expect(worthAmongPassed(0.2, 0).meanWorth).toBe(0);
  });

  test("laws: lies beyond the mark, rises as fewer pass, and those passed and not passed average to 0", () => {
    let before = 0;
    for (const pass of [0.95, 0.6, 0.2, 0.01, 1e-6, 1e-30]) {
      const { meanWorth } = worthAmongPassed(pass, 1);
      expect(meanWorth).toBeGreaterThan(Math.max(before, normalUpperTailQuantile(pass)));
      if (pass > 1e-3)
        expect(pass * meanWorth - (1 - pass) * worthAmongPassed(1 - pass, 1).meanWorth).toBeCloseTo(0, 14);
      before = meanWorth;
    }
  });

  test.each<[string, [number, number]]>([
    ["pass_fraction", [0, 0.5]],
    ["pass_fraction", [NaN, 0.5]],
    ["validity", [0.5, -1.1]],
    ["validity", [0.5, NaN]],
  ])("refuses a bad %s: %o", (argument, args) => {
    expect(() => worthAmongPassed(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
  });
});
