import { describe, expect, test } from "vitest";
import { gaussLegendre } from "../../../src/core/numeric/gaussLegendre";

describe("gaussLegendre", () => {
  test("by hand: two points are ±1/√3 with weight 1, three are 0 and ±√(3/5) with 8/9 and 5/9", () => {
    const two = gaussLegendre(2);
    expect(two.nodes[1]).toBeCloseTo(Math.sqrt(1 / 3), 15);
    expect(two.nodes[0]).toBeCloseTo(-Math.sqrt(1 / 3), 15);
    expect(two.weights[0]).toBeCloseTo(1, 15);
    const three = gaussLegendre(3);
    expect(three.nodes[1]).toBe(0);
    expect(three.nodes[2]).toBeCloseTo(Math.sqrt(0.6), 15);
    expect(three.weights[1]).toBeCloseTo(8 / 9, 15);
    expect(three.weights[0]).toBeCloseTo(5 / 9, 15);
  });

  test.each([1, 2, 5, 8, 20, 64, 199])("%d points integrate every power up to 2·points − 1", (points) => {
    const { nodes, weights } = gaussLegendre(points);
    for (let power = 0; power < 2 * points; power++) {
      let sum = 0;
      for (let i = 0; i < points; i++) sum += weights[i] * nodes[i] ** power;
      expect(Math.abs(sum - (power % 2 ? 0 : 2 / (power + 1)))).toBeLessThan(2e-14);
    }
  });

  test("Abramowitz & Stegun table 25.4, 20 points: outermost node .993128599185095, weight .017614007139152", () => {
    const { nodes, weights } = gaussLegendre(20);
    expect(nodes[19]).toBeCloseTo(0.993128599185095, 14);
    expect(weights[19]).toBeCloseTo(0.017614007139152, 14);
  });

  test("the same rule is handed out again, and a size that makes no sense is empty", () => {
    expect(gaussLegendre(20)).toBe(gaussLegendre(20));
    for (const points of [0, -1, 2.5, NaN, Infinity, 1001]) expect(gaussLegendre(points).nodes).toHaveLength(0);
  });
});
