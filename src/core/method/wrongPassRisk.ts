import { gaussLegendre } from "../numeric/gaussLegendre";
import { erfcx } from "../special/erfcx";
import { normalTail } from "../special/normalTail";

/** Below −40 a standard normal mark lets everyone pass; φ has nothing beyond 10. */
const LOWEST = -40;
const HIGHEST = 10;

/**
 * R(a) = E[Φ̄(slope·X − need) | X ≥ a], X standard normal: the chance that one who passed at a is truly short of the limit.
 *
 * Domain     a ≥ −40; slope > 0; need finite; falls in a.
 * Edges      a = −40 gives the chance without any mark.
 * Method     Quadrature against the conditional density, e^(−at − t²/2) over Mills' ratio, so that neither tail underflows; the panels are
 *            cut where the chance turns and, where it falls from the start, in doubling steps. The bivariate normal over Φ̄(a) has no
 *            digits left from a = 38 on.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/guardedCutoff.test.ts).
 */
export function wrongPassRisk(a: number, slope: number, need: number): number {
  const { nodes, weights } = gaussLegendre(20);
  const edges = panelEdges(a, slope, need);
  const ahead = a > 0;
  let sum = 0;
  for (let panel = 1; panel < edges.length; panel++) {
    const half = (edges[panel] - edges[panel - 1]) / 2;
    for (let i = 0; i < nodes.length; i++) {
      const t = edges[panel - 1] + half * (1 + nodes[i]);
      const x = a + t;
      const weight = Math.exp(ahead ? -t * (a + t / 2) : (-x * x) / 2);
      sum += weights[i] * half * weight * normalTail(slope * x - need);
    }
  }
  return sum / (ahead ? Math.sqrt(Math.PI / 2) * erfcx(a * Math.SQRT1_2) : Math.sqrt(2 * Math.PI) * normalTail(a));
}

function panelEdges(a: number, slope: number, need: number): number[] {
  const start = Math.max(0, LOWEST - a);
  const end = a > 1 ? 40 / a : HIGHEST - a;
  const edges = [start, end];
  const panels = a > 1 ? 10 : Math.ceil((end - start) / 2);
  for (let i = 1; i < panels; i++) edges.push(start + ((end - start) * i) / panels);
  // The chance turns at t = turn, over a width of a few 1/slope.
  const turn = need / slope - a;
  for (let i = -8; i <= 8; i += 4) edges.push(turn + i / slope);
  const steepness = slope * (1 + Math.max(0, -turn * slope));
  // Halves from the far end down to the scale of the fall, at most 60: an infinite steepness must not go on for ever.
  if (turn < 8 / slope) for (let i = 1; i <= 60 && end * 2 ** -i > 4 / steepness; i++) edges.push(end * 2 ** -i);
  return edges.filter((t) => t >= start && t <= end).sort((one, other) => one - other);
}
