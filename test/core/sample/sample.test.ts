import { describe, expect, test } from "vitest";
import { Sample } from "../../../src/core/sample/sample";
import strd from "../../reference/published/nist_strd.json";
import { relativeError } from "../../support/relativeError";

const sampleOf = (values: readonly number[]) => new Sample(Float64Array.from(values));
interface Item {
  id: string;
  inputs: { data: keyof typeof strd.data };
  printed: { mean: string; sd: string };
  tolerance: { rel: number };
}

describe("the mean and the standard deviation of a sample", () => {
  test.each(strd.items as unknown as Item[])("$id agrees with the certified values (NIST StRD, univariate)", (item) => {
    const { mean, sd } = sampleOf(strd.data[item.inputs.data]);
    expect(relativeError(mean, Number(item.printed.mean))).toBeLessThanOrEqual(1e-15);
    expect(relativeError(sd, Number(item.printed.sd))).toBeLessThanOrEqual(item.tolerance.rel);
  });

  test("NumAcc3 (NIST StRD): 1000000.2 and then 500 times 1000000.1, 1000000.3 has the mean 1000000.2 and the deviation 0.1", () => {
    // The doubles next to these decimals have themselves a deviation that is off by 3.5e-10.
    const values = [1000000.2, ...Array.from({ length: 1000 }, (_, i) => (i % 2 ? 1000000.3 : 1000000.1))];
    const { mean, sd } = sampleOf(values);
    expect(relativeError(mean, 1000000.2)).toBeLessThanOrEqual(1e-15);
    expect(relativeError(sd, 0.1)).toBeLessThanOrEqual(1e-9);
  });

  // mpmath, 40 digits.
  test.each([
    ["1e9 + 1, 2, 4", 1e9, [1, 2, 4], 1.5275252316519467],
    ["1e12 + 1, 2, 4, 8, 9", 1e12, [1, 2, 4, 8, 9], 3.5637059362410923],
    ["1e15 + 1, 2, 4, 8, 9, 11, 12, 40", 1e15, [1, 2, 4, 8, 9, 11, 12, 40], 12.449182417216918],
  ])("%s: the deviation keeps its digits where the last digit of the mean is a part of it", (_, origin, parts, sd) => {
    expect(relativeError(sampleOf(parts.map((part) => origin + part)).sd, sd)).toBeLessThanOrEqual(1e-15);
  });

  test("law: a sample carried through a rising function is in rising order, without sorting anew", () => {
    const sample = sampleOf([3, 1, 2]).mapped((x) => x * x);
    expect(sample.values).toBe(sample.sorted);
    expect([...sample.sorted]).toEqual([1, 4, 9]);
    expect([sample.minimum, sample.maximum]).toEqual([1, 9]);
  });
});
