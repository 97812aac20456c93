import { logGamma } from "../../core/special/logGamma";
import { power } from "../operators";
import { errorCell } from "../value";
import type { CellError } from "../../sheet/cell";
import { numeric, type NativeTable } from "./native";

const NUM = errorCell("#NUM!");
const DIV0 = errorCell("#DIV/0!");

/** Rounding, powers, logarithms, trigonometry, counting ways. */
export const arithmetic: NativeTable = {
  ABS: numeric(1, 1, Math.abs),
  SIGN: numeric(1, 1, Math.sign),
  SQRT: numeric(1, 1, (x) => (x < 0 ? NUM : Math.sqrt(x))),
  EXP: numeric(1, 1, Math.exp),
  LN: numeric(1, 1, (x) => (x > 0 ? Math.log(x) : NUM)),
  LOG10: numeric(1, 1, (x) => (x > 0 ? Math.log10(x) : NUM)),
  LOG: numeric(1, 2, (x, base = 10) => logarithm(x, base)),
  POWER: numeric(2, 2, (x, y) => power(x, y) as number | CellError),
  MOD: numeric(2, 2, (x, y) => (y === 0 ? DIV0 : x - y * Math.floor(x / y))),
  QUOTIENT: numeric(2, 2, (x, y) => (y === 0 ? DIV0 : Math.trunc(x / y))),
  INT: numeric(1, 1, Math.floor),
  TRUNC: numeric(1, 2, (x, digits = 0) => roundBy(x, digits, Math.trunc)),
  ROUND: numeric(2, 2, (x, digits) => roundBy(x, digits, (scaled) => Math.sign(scaled) * Math.round(Math.abs(scaled)))),
  ROUNDUP: numeric(2, 2, (x, digits) =>
    roundBy(x, digits, (scaled) => Math.sign(scaled) * Math.ceil(Math.abs(scaled))),
  ),
  ROUNDDOWN: numeric(2, 2, (x, digits) => roundBy(x, digits, Math.trunc)),
  MROUND: numeric(2, 2, (x, step) => (step === 0 ? 0 : x * step < 0 ? NUM : step * Math.round(nearly(x / step)))),
  CEILING: numeric(2, 2, (x, step) => (x > 0 && step < 0 ? NUM : step === 0 ? 0 : step * Math.ceil(nearly(x / step)))),
  FLOOR: numeric(2, 2, (x, step) =>
    x > 0 && step < 0 ? NUM : step === 0 ? (x === 0 ? 0 : DIV0) : step * Math.floor(nearly(x / step)),
  ),
  "CEILING.MATH": numeric(1, 3, (x, step = 1, away = 0) => toMultiple(x, step, x < 0 && away !== 0 ? "floor" : "ceil")),
  "FLOOR.MATH": numeric(1, 3, (x, step = 1, away = 0) => toMultiple(x, step, x < 0 && away !== 0 ? "ceil" : "floor")),
  EVEN: numeric(1, 1, (x) => Math.sign(x) * 2 * Math.ceil(Math.abs(x) / 2)),
  ODD: numeric(1, 1, (x) => (x < 0 ? -1 : 1) * Math.max(1, 2 * Math.ceil((Math.abs(x) + 1) / 2) - 1)),
  PI: numeric(0, 0, () => Math.PI),
  SIN: numeric(1, 1, Math.sin),
  COS: numeric(1, 1, Math.cos),
  TAN: numeric(1, 1, Math.tan),
  ASIN: numeric(1, 1, Math.asin),
  ACOS: numeric(1, 1, Math.acos),
  ATAN: numeric(1, 1, Math.atan),
  ATAN2: numeric(2, 2, (x, y) => (x === 0 && y === 0 ? DIV0 : Math.atan2(y, x))),
  SINH: numeric(1, 1, Math.sinh),
  COSH: numeric(1, 1, Math.cosh),
  TANH: numeric(1, 1, Math.tanh),
  ASINH: numeric(1, 1, Math.asinh),
  ACOSH: numeric(1, 1, Math.acosh),
  ATANH: numeric(1, 1, Math.atanh),
  RADIANS: numeric(1, 1, (x) => (x * Math.PI) / 180),
  DEGREES: numeric(1, 1, (x) => (x * 180) / Math.PI),
  FACT: numeric(1, 1, (x) => (x < 0 ? NUM : wholeProduct(2, Math.trunc(x)))),
  COMBIN: numeric(2, 2, (n, k) => ways(Math.trunc(n), Math.trunc(k))),
  PERMUT: numeric(2, 2, (n, k) =>
    Math.trunc(k) < 0 || Math.trunc(n) < Math.trunc(k)
      ? NUM
      : wholeProduct(Math.trunc(n) - Math.trunc(k) + 1, Math.trunc(n)),
  ),
  STANDARDIZE: numeric(3, 3, (x, mean, sd) => (sd > 0 ? (x - mean) / sd : NUM)),
  FISHER: numeric(1, 1, (x) => (Math.abs(x) < 1 ? Math.atanh(x) : NUM)),
  FISHERINV: numeric(1, 1, Math.tanh),
};

function logarithm(x: number, base: number): number | CellError {
  if (!(x > 0 && base > 0)) return NUM;
  if (base === 1) return DIV0;
  return base === 10 ? Math.log10(x) : base === 2 ? Math.log2(x) : Math.log(x) / Math.log(base);
}

/** What is a whole number but for the last bits counts as one: 2.3 / 0.1 is 23 to whoever typed it. */
function nearly(value: number): number {
  const whole = Math.round(value);
  return Math.abs(value - whole) <= 1e-14 * Math.max(1, Math.abs(value)) ? whole : value;
}

/** Rounds at a decimal place, on the 15 digits that a sheet shows: 1.005 to two places is 1.01 there. */
function roundBy(x: number, places: number, whole: (scaled: number) => number): number {
  const digits = Math.trunc(places);
  if (digits > 300) return x;
  if (digits < -300) return 0;
  const scale = 10 ** Math.abs(digits);
  const scaled = Number((digits >= 0 ? x * scale : x / scale).toPrecision(15));
  if (!Number.isFinite(scaled)) return x;
  const rounded = whole(scaled);
  return digits >= 0 ? rounded / scale : rounded * scale;
}

function toMultiple(x: number, step: number, way: "floor" | "ceil"): number {
  const size = Math.abs(step);
  return size === 0 ? 0 : size * Math[way](nearly(x / size));
}

function wholeProduct(from: number, to: number): number {
  // 171! is past the largest number.
  if (to - from > 400) return to < 1e15 && logGamma(to + 1) - logGamma(from) < 709 ? NaN : Infinity;
  let product = 1;
  for (let i = from; i <= to; i++) product *= i;
  return product;
}

function ways(n: number, k: number): number | CellError {
  if (k < 0 || n < k) return NUM;
  const few = Math.min(k, n - k);
  let result = 1;
  for (let i = 1; i <= few && Number.isFinite(result); i++) result = (result * (n - few + i)) / i;
  return Math.round(result) <= Number.MAX_SAFE_INTEGER ? Math.round(result) : result;
}
