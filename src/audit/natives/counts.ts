import { binomialCdf } from "../../core/distribution/binomialCdf";
import { binomialPmf } from "../../core/distribution/binomialPmf";
import { gammaUpperTail } from "../../core/distribution/gammaUpperTail";
import { hypergeometricCdf } from "../../core/distribution/hypergeometricCdf";
import { hypergeometricPmf } from "../../core/distribution/hypergeometricPmf";
import { negativeBinomialCdf } from "../../core/distribution/negativeBinomialCdf";
import { logGamma } from "../../core/special/logGamma";
import { numeric, type NativeTable } from "./native";

/** Counts lose what stands behind the point, as the host does it. */
const whole = Math.trunc;

const binomial = numeric(4, 4, (k, n, p, cumulative) => {
  if (!(whole(k) >= 0 && whole(k) <= whole(n))) return NaN;
  return cumulative ? binomialCdf(whole(k), whole(n), p) : binomialPmf(whole(k), whole(n), p);
});
const binomialInverse = numeric(3, 3, (n, p, chance) => smallestCount(whole(n), p, chance));
const poisson = numeric(3, 3, (k, mean, cumulative) => {
  const count = whole(k);
  if (!(count >= 0 && mean >= 0)) return NaN;
  if (mean === 0) return count === 0 || cumulative ? 1 : 0;
  if (cumulative) return gammaUpperTail(mean, count + 1);
  return Math.exp(count * Math.log(mean) - mean - logGamma(count + 1));
});
const failures = (k: number, r: number, p: number) =>
  (whole(r) / (whole(k) + whole(r))) * binomialPmf(whole(r), whole(k) + whole(r), p);

/** Distributions of counts, by our own kernel. */
export const counts: NativeTable = {
  "BINOM.DIST": binomial,
  BINOMDIST: binomial,
  "BINOM.INV": binomialInverse,
  CRITBINOM: binomialInverse,
  "BINOM.DIST.RANGE": numeric(3, 4, (n, p, from, to = from) => {
    const [low, high] = [whole(from), whole(to)];
    if (!(low >= 0 && low <= high && high <= whole(n))) return NaN;
    let sum = 0;
    if (high - low > 10_000) return binomialCdf(high, whole(n), p) - (low > 0 ? binomialCdf(low - 1, whole(n), p) : 0);
    for (let k = low; k <= high; k++) sum += binomialPmf(k, whole(n), p);
    return sum;
  }),
  "NEGBINOM.DIST": numeric(4, 4, (k, r, p, cumulative) => {
    if (!(whole(k) >= 0 && whole(r) >= 1)) return NaN;
    return cumulative ? negativeBinomialCdf(whole(k), whole(r), p) : failures(k, r, p);
  }),
  NEGBINOMDIST: numeric(3, 3, (k, r, p) => (whole(k) >= 0 && whole(r) >= 1 ? failures(k, r, p) : NaN)),
  "HYPGEOM.DIST": numeric(5, 5, (k, drawn, good, pool, cumulative) =>
    (cumulative ? hypergeometricCdf : hypergeometricPmf)(whole(k), whole(pool), whole(good), whole(drawn)),
  ),
  HYPGEOMDIST: numeric(4, 4, (k, drawn, good, pool) =>
    hypergeometricPmf(whole(k), whole(pool), whole(good), whole(drawn)),
  ),
  "POISSON.DIST": poisson,
  POISSON: poisson,
};

/** The smallest count whose chance of not being passed reaches `chance`, by halving. */
function smallestCount(n: number, p: number, chance: number): number {
  if (!(n >= 0 && p >= 0 && p <= 1 && chance > 0 && chance < 1)) return NaN;
  let low = 0;
  let high = n;
  while (low < high) {
    const middle = Math.floor((low + high) / 2);
    if (binomialCdf(middle, n, p) >= chance * (1 - 2e-14)) high = middle;
    else low = middle + 1;
  }
  return low;
}
