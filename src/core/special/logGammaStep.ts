import { stirlingError } from "./stirlingError";

/**
 * ln Γ(b + a) − ln Γ(b), with digits also where a is so small that the two logarithms agree.
 *
 * Domain     b > 0, a ≥ 0.0005.
 * Method     Stirling's formula for both, the large parts cancelled on paper; small b are first raised by Γ(b + 1) = b Γ(b).
 * Accuracy   2e-14 of a·(1 + |ln b|); test/core/special/logGammaStep.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 6.1.41.
 */
export function logGammaStep(b: number, a: number): number {
  let raised = 0;
  for (; b < 8; b++) raised += Math.log1p(a / b);
  const main = (b - 0.5) * Math.log1p(a / b) + a * Math.log(a + b) - a;
  return main + (stirlingError(a + b) - stirlingError(b)) - raised;
}
