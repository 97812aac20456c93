import { expect, test } from "vitest";
import { decimalsOfStep, numberText } from "../../src/plot/numberText";
import { percentText } from "../../src/plot/percentText";

test("a number is read with the user's decimal mark, a true minus, and thousands apart from 10,000 on", () => {
  expect(numberText(71.4, 1)).toBe("71.4");
  expect(numberText(-0.25, 2, ",")).toBe("−0,25");
  expect(numberText(9999, 0)).toBe("9999");
  expect(numberText(1048576, 0)).toBe("1\u202f048\u202f576");
  expect(numberText(-0.001, 1)).toBe("0.0");
});

test("steps that are no binary fractions keep their decimals", () => {
  expect([5, 0.5, 0.02, 0.1, 0.25, 1e-7].map(decimalsOfStep)).toEqual([0, 1, 2, 1, 2, 7]);
});

test("a percentage shows two digits that matter, or what was typed", () => {
  const style = { decimal: ".", percentGap: "" } as const;
  const read = (fraction: number) => percentText(fraction, style);
  expect([0.05, 0.02458, 0.0951, 0.1139, 0.00013, 0.999, 0.5].map(read)).toEqual([
    "5%",
    "2.5%",
    "9.5%",
    "11%",
    "0.013%",
    "99.9%",
    "50%",
  ]);
  expect(percentText(0.125, style, true)).toBe("12.5%");
  expect(percentText(0.057, { decimal: ",", percentGap: "\u00a0" }, true)).toBe("5,7\u00a0%");
});
