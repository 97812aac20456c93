import { describe, expect, test } from "vitest";
import { unitNormalLoss } from "../../../src/core/method/unitNormalLoss";
import memory from "../../reference/published/from-memory.json";
import reference from "../../reference/stopping/values.json";
import { relativeError } from "../../support/relativeError";

describe("unitNormalLoss", () => {
  test.each(reference.unitNormalLoss)("at %d agrees with 60 digits of mpmath", (u, expected) => {
    expect(relativeError(unitNormalLoss(u!), expected!)).toBeLessThanOrEqual(1e-14);
  });

  test("the table of the unit normal loss (Raiffa & Schlaifer, from memory)", () => {
    const item = memory.items.find(({ id }) => id === "unit-loss")! as unknown as {
      inputs: { z: number[] };
      printed: number[];
      tolerance: number[];
    };
    item.inputs.z.forEach((z, i) =>
      expect(Math.abs(unitNormalLoss(z) - item.printed[i]!)).toBeLessThanOrEqual(item.tolerance[i]!),
    );
  });

  test("law: ψ(−u) = u + ψ(u), and it never rises", () => {
    let before = Infinity;
    for (let u = -12; u <= 39; u += 0.0625) {
      const loss = unitNormalLoss(u);
      expect(loss).toBeLessThanOrEqual(before);
      if (u > 0) expect(relativeError(unitNormalLoss(-u), u + loss)).toBeLessThanOrEqual(1e-15);
      before = loss;
    }
  });

  test("ends: 0 far above, the distance itself far below; NaN is refused", () => {
    expect([unitNormalLoss(60), unitNormalLoss(Infinity), unitNormalLoss(-60)]).toEqual([0, 0, 60]);
    expect(() => unitNormalLoss(NaN)).toThrow(expect.objectContaining({ name: "DomainError" }));
  });
});
