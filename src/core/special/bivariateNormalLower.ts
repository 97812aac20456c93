import { gaussLegendre } from "../numeric/gaussLegendre";
import { normalTail } from "./normalTail";

/**
 * P(X ≤ h, Y ≤ k) for standard normal X and Y with correlation rho, unchecked.
 *
 * Domain     h, k finite; −1 < rho < 1.
 * Method     Plackett's ∂P/∂ρ = φ₂(h, k; ρ), integrated from ρ = −1, where P = max(0, Φ(h) − Φ(−k)): all parts are
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
  // The peak of the integrand right of `low`, by halving: it need not be exact.
  let peak = low;
  if (slopeAt(low) > 0) {
    let right = Math.max(low, 0) + 1;
    while (slopeAt(right) > 0) right += 2;
    let left = low;
    for (let i = 0; i < 20; i++) {
      peak = (left + right) / 2;
      if (slopeAt(peak) > 0) left = peak;
      else right = peak;
    }
  }
  const height = logAt(peak);
  const edge = (inside: number, direction: number) => {
    let step = 1;
    while (logAt(inside + direction * step) > height - 40) step *= 2;
    let near = step / 2;
    let far = step;
    if (step === 1) near = 0;
    for (let i = 0; i < 12; i++) {
      const middle = (near + far) / 2;
      if (logAt(inside + direction * middle) > height - 40) near = middle;
      else far = middle;
    }
    return inside + direction * far;
  };
  const from = Math.max(low, peak > low ? edge(peak, -1) : low);
  const to = edge(peak, 1);
  const panels = Math.max(2, Math.ceil((to - from) / 1.5));
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
  return base(h, k) + (sum * width) / (2 * Math.PI);
}

/** max(0, Φ(h) − Φ(−k)), without cancellation. */
export function base(h: number, k: number): number {
  const gap = h + k;
  if (!(gap > 0)) return 0;
  if (gap < 1) {
    const { nodes, weights } = gaussLegendre(20);
    let sum = 0;
    for (let i = 0; i < nodes.length; i++) {
      const x = (h - k + gap * nodes[i]) / 2;
      sum += weights[i] * Math.exp(-0.5 * x * x);
    }
    return (sum * gap) / (2 * Math.sqrt(2 * Math.PI));
  }
  return h <= 0
    ? normalTail(-h) - normalTail(k)
    : k <= 0
      ? normalTail(-k) - normalTail(h)
      : 1 - normalTail(h) - normalTail(k);
}
