/*
 * exp and ln for drawing random numbers. The language leaves the last bit of Math.exp and Math.log to the engine, so that a stream of
 * deviates made with them could part ways between two browsers; these are made of + − × ÷ alone, which every engine rounds alike.
 */

const LN2_HIGH = 0.6931471803691238; // ln 2 cut to 33 bits, so that a small multiple of it is exact
const LN2_LOW = 1.9082149292705877e-10; // what was cut off

/**
 * e^−x.
 *
 * Domain     0 ≤ x ≤ 700.
 * Method     x = k ln 2 + r with |r| ≤ ½ ln 2; Taylor's series of e^−r to the 14th power, halved k times.
 * Accuracy   relative error ≤ 3e-16; test/core/numeric/portableExpLog.test.ts.
 */
export function portableExpMinus(x: number): number {
  const halvings = Math.round(x / Math.LN2);
  const r = halvings * LN2_HIGH - x + halvings * LN2_LOW;
  let sum = 1;
  for (let i = 14; i > 0; i--) sum = 1 + (sum * r) / i;
  for (let i = 0; i < halvings; i++) sum *= 0.5;
  return sum;
}

/**
 * ln x.
 *
 * Domain     2⁻¹⁰²² ≤ x ≤ 1.
 * Method     x = m / 2^k with m near 1; ln m = 2 artanh s, s = (m − 1)/(m + 1), by its series to s²⁵.
 * Accuracy   relative error ≤ 4e-16; test/core/numeric/portableExpLog.test.ts.
 */
export function portableLog(x: number): number {
  let m = x;
  let doublings = 0;
  for (; m < Math.SQRT1_2; m *= 2) doublings++;
  const s = (m - 1) / (m + 1);
  let sum = 0;
  for (let power = 25; power > 0; power -= 2) sum = sum * s * s + 1 / power;
  return 2 * s * sum - doublings * LN2_LOW - doublings * LN2_HIGH;
}
