import { describe, expect, test } from "vitest";
import { pricePoints } from "../../../src/core/method/pricePoints";

const of = (...numbers: number[]) => Float64Array.from(numbers);

describe("pricePoints", () => {
  test("by hand: 800 of 800, 1000 and 1600 gets all 40 points, 1000 gets 32, 1600 gets 20; a blank gets none", () => {
    const { lowest, points } = pricePoints(of(1000, NaN, 800, 1600), 40);
    expect(lowest).toBe(800);
    expect([...points]).toEqual([32, NaN, 40, 20]);
  });

  test("the lowest price is found on either side of a blank, and among none there is none", () => {
    expect(pricePoints(of(800, NaN, 1600, NaN), 40).lowest).toBe(800);
    expect(pricePoints(of(NaN, 1600, NaN, 800), 40).lowest).toBe(800);
    expect([...pricePoints(of(NaN, NaN), 40).points]).toEqual([NaN, NaN]);
  });

  test("the lowest price may be written down beforehand", () => {
    expect([...pricePoints(of(1000), 40, 500).points]).toEqual([20]);
  });

  test("law: prices in another currency get the same points, also next to the ends of the range of numbers", () => {
    const plain = pricePoints(of(3, 7, 11), 35).points;
    for (const rate of [2 ** 1015, 2 ** -1020])
      expect(pricePoints(of(3 * rate, 7 * rate, 11 * rate), 35).points[1]).toBeCloseTo(plain[1], 10);
  });

  test.each<[string, Parameters<typeof pricePoints>, string]>([
    ["points", [of(1), 0], "0 was given"],
    ["points", [of(1), NaN], "NaN"],
    ["prices", [of(5, 0), 10], "the 2nd cell holds 0"],
    ["prices", [of(5, NaN, -3), 10], "the 3rd cell holds -3"],
    ["prices", [of(5, 4), 10, 4.5], "at or above lowest (4.5); the 2nd cell holds 4"],
    ["lowest", [of(5), 10, 0], "0 was given"],
    ["lowest", [of(5), 10, Infinity], "Infinity"],
  ])("refuses bad %s", (argument, args, came) => {
    expect(() => pricePoints(...args)).toThrow(expect.objectContaining({ name: "DomainError", argument }));
    expect(() => pricePoints(...args)).toThrow(came);
  });
});
