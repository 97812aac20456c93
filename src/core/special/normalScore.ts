// Wichura's rational approximations, highest power first.
const CENTRE = [
  [
    2.5090809287301226727e3, 3.3430575583588128105e4, 6.7265770927008700853e4, 4.5921953931549871457e4,
    1.3731693765509461125e4, 1.9715909503065514427e3, 1.3314166789178437745e2, 3.387132872796366608,
  ],
  [
    5.226495278852854561e3, 2.8729085735721942674e4, 3.930789580009271061e4, 2.1213794301586595867e4,
    5.3941960214247511077e3, 6.871870074920579083e2, 4.2313330701600911252e1, 1,
  ],
];
const SHOULDER = [
  [
    7.7454501427834140764e-4, 2.27238449892691845833e-2, 2.4178072517745061177e-1, 1.27045825245236838258,
    3.64784832476320460504, 5.7694972214606914055, 4.6303378461565452959, 1.42343711074968357734,
  ],
  [
    1.05075007164441684324e-9, 5.475938084995344946e-4, 1.51986665636164571966e-2, 1.4810397642748007459e-1,
    6.8976733498510000455e-1, 1.6763848301838038494, 2.05319162663775882187, 1,
  ],
];
const TAIL = [
  [
    2.01033439929228813265e-7, 2.71155556874348757815e-5, 1.2426609473880784386e-3, 2.6532189526576123093e-2,
    2.9656057182850489123e-1, 1.7848265399172913358, 5.4637849111641143699, 6.6579046435011037772,
  ],
  [
    2.04426310338993978564e-15, 1.4215117583164458887e-7, 1.8463183175100546818e-5, 7.868691311456132591e-4,
    1.48753612908506148525e-2, 1.3692988092273580531e-1, 5.9983220655588793769e-1, 1,
  ],
];

/**
 * The x that a standard normal variable exceeds with chance `upper`, unchecked, for the inner loops.
 *
 * Edges      0 gives ∞, 1 gives −∞, anything outside [0, 1] NaN.
 * Method     Rational approximations on three intervals of the smaller tail.
 * Accuracy   1e-15 relative; test/core/distribution/normal.test.ts.
 * Reference  Wichura (1988), Algorithm AS 241: The percentage points of the normal distribution, Appl. Statist. 37.
 */
export function normalScore(upper: number): number {
  const q = 0.5 - upper;
  if (Math.abs(q) <= 0.425) return q * ratio(CENTRE, 0.180625 - q * q);
  const tail = q > 0 ? upper : 1 - upper;
  if (!(tail > 0)) return tail === 0 ? (q > 0 ? Infinity : -Infinity) : NaN;
  const r = Math.sqrt(-Math.log(tail));
  const x = r <= 5 ? ratio(SHOULDER, r - 1.6) : ratio(TAIL, r - 5);
  return q > 0 ? x : -x;
}

function ratio(coefficients: readonly (readonly number[])[], x: number): number {
  const [over, under] = coefficients;
  let a = over[0];
  let b = under[0];
  for (let i = 1; i < 8; i++) {
    a = a * x + over[i];
    b = b * x + under[i];
  }
  return a / b;
}
