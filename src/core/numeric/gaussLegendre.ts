/** Nodes and weights of a quadrature rule on [−1, 1]. */
export interface Quadrature {
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

const known = new Map<number, Quadrature>();
const MOST_KNOWN = 32;

/**
 * The Gauss-Legendre rule with this many points on [−1, 1], exact for polynomials of degree 2·points − 1.
 *
 * Domain     points a whole number from 1 to 1000; nodes rise.
 * Edges      anything else gives an empty rule, whose integral is 0.
 * Method     Newton on the Legendre polynomial from Tricomi's start; the weights from its slope. The 32 rules asked
 *            for first are kept.
 * Accuracy   nodes 2 ulp of 1, weights 1e-14 relative up to 200 points; test/core/numeric/gaussLegendre.test.ts.
 * Reference  Abramowitz & Stegun (1964), Handbook of Mathematical Functions, 25.4.29.
 */
export function gaussLegendre(points: number): Quadrature {
  const old = known.get(points);
  if (old) return old;
  const size = Number.isInteger(points) && points >= 1 && points <= 1000 ? points : 0;
  const nodes = new Float64Array(size);
  const weights = new Float64Array(size);
  for (let i = 0; 2 * i < size; i++) {
    // The middle node of an odd rule is 0; Newton would leave some 1e-17 there.
    let x = 2 * i + 1 === size ? 0 : Math.cos((Math.PI * (i + 0.75)) / (size + 0.5));
    let slope = 1;
    for (let step = 0; step < 6; step++) {
      let before = 0;
      let value = 1;
      for (let j = 1; j <= size; j++) {
        const next = ((2 * j - 1) * x * value - (j - 1) * before) / j;
        before = value;
        value = next;
      }
      slope = (size * (before - x * value)) / (1 - x * x);
      x -= value / slope;
    }
    nodes[i] = -x;
    nodes[size - 1 - i] = x;
    weights[i] = weights[size - 1 - i] = 2 / ((1 - x * x) * slope * slope);
  }
  const rule = { nodes, weights };
  if (known.size < MOST_KNOWN) known.set(points, rule);
  return rule;
}
