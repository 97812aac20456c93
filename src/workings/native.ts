/*
 * Pieces of native formulas: texts that the host's own functions compute. Operands are texts too: a caller's address, a literal, or an
 * expression in parentheses.
 *
 * `x<""` picks the numbers of a range: in the order of the host every number stands before every text, and a blank cell, "" and a cell of
 * spaces do not. `x<>""` would take the spaces for a score.
 */

/** A number of ours inside a native formula, all its digits; a negative one in parentheses. */
export function literal(value: number): string {
  return value < 0 ? `(${value})` : String(value);
}

/**
 * P(T ≤ t) of the noncentral t distribution, for which the host has no function: E[Φ(tS − δ)] over S = √(χ²/ν), by the trapezoidal rule
 * in y = ln S. The weights are normalised by their own sum. Needs LET, SEQUENCE and MAP (Excel 2021 or 365). `degrees` and
 * `noncentrality` are also given as numbers, to choose the nodes: with them the rule is good to 1e-12.
 */
export function noncentralTNative(t: string, degrees: string, noncentrality: string, v: number, delta: number): string {
  // Where the weight exp(v(y − (e^2y − 1)/2)) has fallen to e^-36 of its peak, on either side.
  const low = lowerEnd(v);
  const high = Math.min(6, 6.1 / Math.sqrt(v) + 1.5 / v);
  const step = Math.min(0.1, 0.5 / Math.sqrt(2 * v + (Math.abs(delta) + 2.5) ** 2));
  const nodes = Math.ceil((high - low) / step) + 1;
  return (
    `LET(t,${t},v,${degrees},d,${noncentrality},y,SEQUENCE(${nodes},1,${low},${(high - low) / (nodes - 1)}),` +
    `w,EXP(v*(y-(EXP(2*y)-1)/2)),SUM(w*MAP(y,LAMBDA(a,NORM.S.DIST(t*EXP(a)-d,TRUE))))/SUM(w))`
  );
}

function lowerEnd(v: number): number {
  let low = -0.1 / Math.sqrt(v);
  while (v * (low - Math.expm1(2 * low) / 2) > -36) low *= 1.2;
  return low;
}
