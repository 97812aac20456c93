import { describe, expect, test } from "vitest";
import { portableExpMinus, portableLog } from "../../../src/core/numeric/portableExpLog";
import { relativeError } from "../../support/relativeError";

describe("portableExpMinus and portableLog", () => {
  test("by mpmath (50 digits): e^-1, e^-6.676..., ln 0.1, ln 2^-60", () => {
    expect(relativeError(portableExpMinus(1), 0.36787944117144233)).toBeLessThanOrEqual(3e-16);
    expect(relativeError(portableExpMinus(6.6764166), 0.0012602859995573448)).toBeLessThanOrEqual(3e-16);
    expect(relativeError(portableLog(0.1), -2.3025850929940455)).toBeLessThanOrEqual(4e-16);
    expect(relativeError(portableLog(2 ** -60), -41.58883083359672)).toBeLessThanOrEqual(4e-16);
  });

  test("agree with Math.exp and Math.log, which are good to one unit in the last place, all over their domains", () => {
    for (let i = 0; i <= 7000; i++) {
      const x = i / 10 + 0.0123;
      if (x <= 700) expect(relativeError(portableExpMinus(x), Math.exp(-x))).toBeLessThanOrEqual(5e-16);
      const u = (i + 0.5) / 7001;
      expect(relativeError(portableLog(u), Math.log(u))).toBeLessThanOrEqual(6e-16);
    }
    expect(portableExpMinus(0)).toBe(1);
    expect(portableLog(1)).toBe(0);
  });
});
