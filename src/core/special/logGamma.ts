import { stirlingError } from "./stirlingError";

const HALF_LOG_TWO_PI = 0.91893853320467274178;

// ln Γ(2 + z) = (1 − γ) z + Σ (−1)ᵏ (ζ(k) − 1)/k · zᵏ: the coefficients from k = 1 on (mpmath 1.3).
const SERIES = [
  0.42278433509846713939, 0.3224670334241132182, -0.06735230105319809513, 0.02058080842778454788,
  -0.007385551028673985266, 0.002890510330741523286, -0.001192753911703260977, 0.0005096695247430424223,
  -0.0002231547584535793798, 0.00009945751278180853371, -0.0000449262367381331417, 0.00002050721277567069155,
  -9.439488275268395904e-6, 4.374866789907487804e-6, -2.039215753801366237e-6, 9.551412130407419833e-7,
  -4.492469198764566043e-7, 2.120718480555466587e-7, -1.004322482396809961e-7, 4.769810169363980566e-8,
  -2.271109460894316491e-8, 1.083865921489695409e-8, -5.183475041970046655e-9, 2.483674543802478317e-9,
  -1.192140140586091207e-9, 5.731367241678862013e-10, -2.759522885124233145e-10,
];

/**
 * ln Γ(x), the logarithm of the gamma function.
 *
 * Domain     x > 0.
 * Edges      0 and Infinity give Infinity; a negative x or NaN gives NaN.
 * Method     Next to 2 the Taylor series, from 0.5 to 10 carried there by Γ(x + 1) = x Γ(x), above by Stirling's
 *            formula and its error. The usual Lanczos formula loses all relative accuracy next to the zeros 1 and 2.
 * Accuracy   1e-15 relative, next to the zeros too; test/core/special/logGamma.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 6.1.33 and 6.1.41.
 */
export function logGamma(x: number): number {
  if (!(x > 0)) return x === 0 ? Infinity : NaN;
  if (x > 1e305) return x * (Math.log(x) - 1);
  if (x >= 10) return (x - 0.5) * Math.log(x) - x + HALF_LOG_TWO_PI + stirlingError(x);
  if (x < 0.5) return nearTwo(x) - Math.log(x) - Math.log1p(x);
  if (x < 1.5) return nearTwo(x - 1) - Math.log1p(x - 1);
  let z = x - 2;
  let product = 1;
  while (z > 0.5) product *= z-- + 1;
  return nearTwo(z) + Math.log(product);
}

/** ln Γ(1 + a) for 0 ≤ a < 1, with digits also for the smallest a. */
export function logGammaOnePlus(a: number): number {
  return a < 0.5 ? nearTwo(a) - Math.log1p(a) : nearTwo(a - 1);
}

/** ln Γ(2 + z) for |z| ≤ 0.5. */
function nearTwo(z: number): number {
  let sum = 0;
  for (let i = SERIES.length - 1; i >= 0; i--) sum = sum * z + SERIES[i];
  return sum * z;
}
