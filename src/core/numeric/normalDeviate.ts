import { portableExpMinus, portableLog } from "./portableExpLog";
import type { SeededRandom } from "./seededRandom";

const LAYERS = 256;
const TWO_TO_MINUS_52 = 2 ** -52;
/** Where the bottom layer's tail begins, and the area of each layer: they close a stack of 256 layers (recomputed to 40 digits). */
const TAIL = 3.654152885361009;
const AREA = 0.004928673233974655;

/** Layer i lies between heights[i] and heights[i + 1] and reaches out to widths[i]; beyond TAIL the bottom one stands for the tail. */
const widths = new Float64Array(LAYERS + 1);
const heights = new Float64Array(LAYERS + 1);
layOut();

/**
 * A draw from the standard normal.
 *
 * Method     Marsaglia & Tsang's ziggurat of 256 layers: 99 of 100 draws cost one multiplication. Layer, sign and the 53 bits of the
 *            position come from different bits of two words, as Doornik asks: the original used the same bits twice, and it shows.
 *            Inverting the cdf would cost three times as much.
 * Accuracy   the exact law up to the resolution of 53 bits, and the same bits in every engine: nothing but + − × ÷ and square roots
 *            enters. Moments, quantiles and tails: test/core/numeric/normalDeviate.test.ts.
 * Reference  Marsaglia & Tsang (2000), The ziggurat method for generating random variables, J. Stat. Softw. 5(8);
 *            Doornik (2005), An improved ziggurat method to generate normal random samples, University of Oxford.
 */
export function normalDeviate(random: SeededRandom): number {
  const low = random.word();
  const layer = low & 255;
  // The top bit of the place is its sign: choosing the sign by a branch costs as much as all the rest.
  const x = ((random.word() | 0) * 0x200000 + (low >>> 11)) * TWO_TO_MINUS_52 * widths[layer];
  return Math.abs(x) < widths[layer + 1] ? x : outsideTheCore(random, layer, x);
}

/** The rare part: x lies beside the layer above, so it counts only under the curve; else another layer and place are drawn. */
function outsideTheCore(random: SeededRandom, layer: number, x: number): number {
  if (layer === 0) return x < 0 ? -tailDeviate(random) : tailDeviate(random);
  const height = heights[layer] + random.fraction() * (heights[layer + 1] - heights[layer]);
  return height < portableExpMinus((x * x) / 2) ? x : normalDeviate(random);
}

/** A draw from the normal beyond TAIL (Marsaglia 1964): an exponential one, kept as often as the normal falls below it. */
function tailDeviate(random: SeededRandom): number {
  for (;;) {
    const beyond = -portableLog(1 - random.fraction()) / TAIL;
    if (-2 * portableLog(1 - random.fraction()) >= beyond * beyond) return TAIL + beyond;
  }
}

function layOut(): void {
  widths[0] = AREA / portableExpMinus((TAIL * TAIL) / 2);
  widths[1] = TAIL;
  for (let i = 1; i < LAYERS; i++) {
    heights[i] = portableExpMinus((widths[i] * widths[i]) / 2);
    if (i < LAYERS - 1) widths[i + 1] = Math.sqrt(-2 * portableLog(heights[i] + AREA / widths[i]));
  }
  heights[LAYERS] = 1;
}
