/**
 * a·b − c·d with a relative error of about one rounding, however much the two products cancel.
 *
 * Domain     products below 1e290, factors below 1e290.
 * Method     Dekker's exact products: plain `a * b - c * d` loses every digit where the products agree, and a λ of
 *            the incomplete beta function next to its mean is such a place.
 * Accuracy   2 ulp; test/core/numeric/productDifference.test.ts.
 * Reference  Dekker (1971), A floating-point technique for extending the available precision, Numer. Math. 18.
 */
export function productDifference(a: number, b: number, c: number, d: number): number {
  const first = a * b;
  const second = c * d;
  return first - second + (productError(a, b, first) - productError(c, d, second));
}

/** What rounding took from `product` = a·b: the exact a·b − product. */
export function productError(a: number, b: number, product: number): number {
  const aSplit = 134217729 * a;
  const aHigh = aSplit - (aSplit - a);
  const aLow = a - aHigh;
  const bSplit = 134217729 * b;
  const bHigh = bSplit - (bSplit - b);
  const bLow = b - bHigh;
  return aLow * bLow - (product - aHigh * bHigh - aLow * bHigh - aHigh * bLow);
}
