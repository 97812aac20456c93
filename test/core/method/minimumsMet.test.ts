import { expect, test } from "vitest";
import { minimumsMet } from "../../../src/core/method/minimumsMet";

const of = (...numbers: number[]) => Float64Array.from(numbers);

test("minimumsMet: at or above meets, a minimum of NaN asks for nothing, an entry without values meets nothing asked for", () => {
  const values = of(70, 5, 69.999, 5, 70, 4, NaN, NaN);
  expect(minimumsMet(values, of(70, 5))).toEqual([true, false, false, false]);
  expect(minimumsMet(values, of(NaN, 5))).toEqual([true, true, false, false]);
  expect(minimumsMet(of(-2, 0), of(-2, -0))).toEqual([true]);
});
