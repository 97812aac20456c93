import { gaussLegendre } from "../numeric/gaussLegendre";
import { normalBetween } from "./normalBetween";

/** Below e^(−40) of its peak the integrand adds nothing. */
const DEPTH = 40;
/** The reach of 20 points: e^(−c·e^(2y)) still has its digits on a panel of this width. */
const PANEL = 1.5;

/**
 * P(X ≤ h, Y ≤ k) for standard normal X and Y with correlation rho, unchecked.
 *
 * Domain     h, k finite; −1 < rho < 1.
 * Method     Plackett's ∂P/∂ρ = φ₂(h, k; ρ), integrated from ρ = −1, where P = P(−k < Z < h): all parts are
 *            positive, so that far tails keep their digits (integration from ρ = 0, as usual, subtracts where ρ < 0). With
 *            ρ = −tanh y the integrand is exp(−((h − k)² e^(−2y) + (h + k)² e^(2y))/8)/cosh y, which has one peak.
 * Accuracy   1e-13 relative, 1e-12 below 1e-100; test/core/distribution/bivariateNormal.test.ts.
 * Reference  Plackett (1954), A reduction formula for normal multivariate integrals, Biometrika 41; Drezner & Wesolowsky (1990).
 */
export function bivariateNormalLower(h: number, k: number, rho: number): number {
  const A = (h - k) ** 2;
  const B = (h + k) ** 2;
  const low = -Math.atanh(rho);
  const logAt = (y: number) => -(A * Math.exp(-2 * y) + B * Math.exp(2 * y)) / 8 - Math.log(Math.cosh(y));
  const slopeAt = (y: number) => (A * Math.exp(-2 * y) - B * Math.exp(2 * y)) / 4 - Math.tanh(y);
  const peak = slopeAt(low) > 0 ? crossing(slopeAt, low, 1, 20) : low;
  const floor = logAt(peak) - DEPTH;
  const above = (y: number) => logAt(y) - floor;
  const from = peak > low ? Math.max(low, crossing(above, peak, -1, 12)) : low;
  const to = crossing(above, peak, 1, 12);
  const panels = Math.max(2, Math.ceil((to - from) / PANEL));
  const { nodes, weights } = gaussLegendre(20);
  const width = (to - from) / panels;
  let sum = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = from + (panel + 0.5) * width;
    for (let i = 0; i < nodes.length; i++) {
      const v = Math.exp(2 * (middle + 0.5 * width * nodes[i]));
      sum += weights[i] * Math.exp(-(A / v + B * v) / 8 - (h * h + k * k) / 4) * (Math.sqrt(v) / (1 + v));
    }
  }
  return normalBetween(-k, h) + (sum * width) / (2 * Math.PI);
}

/** The first place from `start` in this direction where f is no longer above 0, or a little beyond: it need not be exact. */
function crossing(f: (y: number) => number, start: number, direction: 1 | -1, halvings: number): number {
  let near = 0;
  let far = 1;
  while (f(start + direction * far) > 0) {
    near = far;
    far *= 2;
  }
  for (let i = 0; i < halvings; i++) {
    const middle = (near + far) / 2;
    if (f(start + direction * middle) > 0) near = middle;
    else far = middle;
  }
  return start + direction * far;
}
