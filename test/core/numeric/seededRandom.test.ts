import { describe, expect, test } from "vitest";
import { SeededRandom, splitMix64 } from "../../../src/core/numeric/seededRandom";

describe("SeededRandom", () => {
  test("gives the first ten words of the reference xoshiro128plusplus.c from the state 1, 2, 3, 4 (vector of the rand_xoshiro crate)", () => {
    const random = new SeededRandom([1, 2, 3, 4]);
    const expected = [
      641, 1573767, 3222811527, 3517856514, 836907274, 4247214768, 3867114732, 1355841295, 495546011, 621204420,
    ];
    expect(expected.map(() => random.word())).toEqual(expected);
  });

  test("has come to 0x2c873cfa after 102,400 words (php-src, ext/random/tests/02_engine/user_xoshiro128plusplus.phpt)", () => {
    const random = new SeededRandom([1, 2, 3, 4]);
    for (let i = 0; i < 102_400; i++) random.word();
    expect(random.word()).toBe(0x2c873cfa);
  });

  test("seeds itself by SplitMix64 (reference sequence for seed 1234567, Rosetta Code)", () => {
    expect(splitMix64(1234567, 5)).toEqual([
      6457827717110365317n,
      3203168211198807973n,
      9817491932198370423n,
      4593380528125082431n,
      16408922859458223821n,
    ]);
    const words = [6457827717110365317n, 3203168211198807973n].flatMap((x) => [x & 0xffffffffn, x >> 32n]).map(Number);
    const byHand = new SeededRandom(words as [number, number, number, number]);
    const seeded = new SeededRandom(1234567);
    for (let i = 0; i < 100; i++) expect(seeded.word()).toBe(byHand.word());
  });

  test("law: fractions lie in [0, 1) and fall evenly into 1000 bins (chi-square within 5 standard deviations), whatever the seed", () => {
    for (const seed of [0, 1, 2, 2 ** 53 - 1]) {
      const random = new SeededRandom(seed);
      const bins = new Float64Array(1000);
      let outside = false;
      for (let i = 0; i < 200_000; i++) {
        const fraction = random.fraction();
        outside ||= !(fraction >= 0 && fraction < 1);
        bins[Math.floor(fraction * 1000)]++;
      }
      expect(outside).toBe(false);
      const chiSquare = bins.reduce((sum, count) => sum + (count - 200) ** 2 / 200, 0);
      expect(Math.abs(chiSquare - 999)).toBeLessThan(5 * Math.sqrt(2 * 999));
    }
  });

  test("law: streams of neighbouring seeds are uncorrelated", () => {
    const [a, b] = [new SeededRandom(1), new SeededRandom(2)];
    let sum = 0;
    for (let i = 0; i < 100_000; i++) sum += (a.fraction() - 0.5) * (b.fraction() - 0.5) * 12;
    expect(Math.abs(sum / 100_000)).toBeLessThan(5 / Math.sqrt(100_000));
  });
});
