import { gaussLegendre } from "../numeric/gaussLegendre";
import { normalTail } from "./normalTail";

/**
 * P(low < Z < high) for a standard normal Z, unchecked; 0 where high is not above low.
 *
 * Method     A difference of the tails on one side of 0, or of 1 and both; for a narrow gap 20 points of Gauss on the density,
 *            since the tails agree in their leading digits there.
 * Accuracy   2e-15 relative; test/core/special/normalBetween.test.ts.
 */
export function normalBetween(low: number, high: number): number {
  const gap = high - low;
  if (!(gap > 0)) return 0;
  if (gap < 1) {
    const { nodes, weights } = gaussLegendre(20);
    let sum = 0;
    for (let i = 0; i < nodes.length; i++) {
      const x = (low + high + gap * nodes[i]) / 2;
      sum += weights[i] * Math.exp(-0.5 * x * x);
    }
    return (sum * gap) / (2 * Math.sqrt(2 * Math.PI));
  }
  if (high <= 0) return normalTail(-high) - normalTail(-low);
  return low >= 0 ? normalTail(low) - normalTail(high) : 1 - normalTail(high) - normalTail(-low);
}
