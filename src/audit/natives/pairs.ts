import { compensatedSum } from "../../core/numeric/compensatedSum";
import { isCellError, type CellError } from "../../sheet/cell";
import type { Evaluation } from "../evaluation";
import { errorCell, type Value } from "../value";
import { numberOrError, type Native, type NativeTable } from "./native";

const DIV0 = errorCell("#DIV/0!");

interface Pairs {
  readonly n: number;
  readonly meanX: number;
  readonly meanY: number;
  readonly xx: number;
  readonly yy: number;
  readonly xy: number;
}

const correlation = paired(({ xx, yy, xy }) => (xx > 0 && yy > 0 ? xy / Math.sqrt(xx * yy) : DIV0));

/** What two columns have to do with each other. Slope and the like take the known results first. */
export const pairs: NativeTable = {
  CORREL: correlation,
  PEARSON: correlation,
  RSQ: paired(({ xx, yy, xy }) => (xx > 0 && yy > 0 ? (xy * xy) / (xx * yy) : DIV0)),
  "COVARIANCE.S": paired(({ n, xy }) => (n > 1 ? xy / (n - 1) : DIV0)),
  "COVARIANCE.P": paired(({ n, xy }) => xy / n),
  COVAR: paired(({ n, xy }) => xy / n),
  SLOPE: paired(({ xy, yy }) => (yy > 0 ? xy / yy : DIV0)),
  INTERCEPT: paired(({ xy, yy, meanX, meanY }) => (yy > 0 ? meanX - (xy / yy) * meanY : DIV0)),
  STEYX: paired(({ n, xx, yy, xy }) => (yy > 0 && n > 2 ? Math.sqrt((xx - (xy * xy) / yy) / (n - 2)) : DIV0)),
};

function paired(answer: (pairs: Pairs) => number | CellError): Native {
  return {
    least: 2,
    most: 2,
    takesArrays: true,
    run: ([first, second], at) => {
      const pairs = readPairs(first!, second!, at);
      return isCellError(pairs) ? pairs : numberOrError(() => answer(pairs));
    },
  };
}

/** The pairs of which both are numbers. */
function readPairs(first: Value, second: Value, at: Evaluation): Pairs | CellError {
  const left = at.rows(first).flat();
  const right = at.rows(second).flat();
  if (left.length !== right.length) return errorCell("#N/A", "The two ranges are not of one length.");
  const x: number[] = [];
  const y: number[] = [];
  for (let i = 0; i < left.length; i++) {
    const [a, b] = [left[i], right[i]];
    if (isCellError(a)) return a;
    if (isCellError(b)) return b;
    if (typeof a !== "number" || typeof b !== "number") continue;
    x.push(a);
    y.push(b);
  }
  const n = x.length;
  if (n === 0) return DIV0;
  const meanX = compensatedSum(x) / n;
  const meanY = compensatedSum(y) / n;
  const products = (f: (dx: number, dy: number) => number) =>
    compensatedSum(x.map((_, i) => f(x[i]! - meanX, y[i]! - meanY)));
  return {
    n,
    meanX,
    meanY,
    xx: products((dx) => dx * dx),
    yy: products((_, dy) => dy * dy),
    xy: products((dx, dy) => dx * dy),
  };
}
