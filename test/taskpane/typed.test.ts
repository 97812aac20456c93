import { describe, expect, test } from "vitest";
import { typedCount, typedFraction, typedNumber } from "../../src/taskpane/typed";

describe("a typed fraction", () => {
  test.each([
    ["5%", ".", 0.05],
    ["5 %", ".", 0.05],
    ["5\u00a0%", ",", 0.05],
    ["0,05", ",", 0.05],
    ["0.05", ".", 0.05],
    ["0.05", ",", 0.05],
    ["0,05", ".", 0.05],
    ["2,5 %", ",", 0.025],
    [" .5 % ", ".", 0.005],
    ["5.7%", ".", 0.057],
    ["99.9%", ".", 0.999],
  ] as const)("%j with the decimal mark %j is %d, to the bit", (typed, decimal, value) => {
    expect(typedFraction(typed, decimal)).toEqual({ value });
  });

  test.each([
    ["5", "percent-sign-missing"],
    ["95", "percent-sign-missing"],
    ["1", "percent-sign-missing"],
    ["0", "not-between"],
    ["0%", "not-between"],
    ["100%", "not-between"],
    ["250", "not-between"],
    ["-5%", "not-between"],
    ["five", "no-number"],
    ["1e999", "no-number"],
    ["1.2.3", "no-number"],
    ["", "empty"],
    ["  ", "empty"],
  ])("%j is asked back: %s", (typed, problem) => {
    expect(typedFraction(typed, ".")).toEqual({ problem });
  });

  test("a comma that parts thousands is no decimal mark", () => {
    expect(typedNumber("1,250", ".")).toBe(1250);
    expect(typedNumber("1.250", ",")).toBe(1250);
    expect(typedNumber("1,25", ".")).toBe(1.25);
    expect(typedNumber("1,250.5", ".")).toBe(1250.5);
    expect(typedNumber("1 250,5", ",")).toBe(1250.5);
  });

  test("a count is whole", () => {
    expect(typedCount("12.5", ".")).toEqual({ problem: "not-whole" });
    expect(typedCount("0", ".")).toEqual({ problem: "too-small", least: 1 });
    expect(typedCount("12", ".")).toEqual({ value: 12 });
  });
});
