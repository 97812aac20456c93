/** The way between the scores and one working scale, and from there to the scale that is shown. */
export interface Scale {
  readonly toScale: (score: number) => number;
  readonly fromScale: (point: number) => number;
  readonly shownMean: (mean: number) => number;
  readonly shownSd: (sd: number) => number;
}

const same = (value: number) => value;
const finite = (value: number) => (Number.isFinite(value) ? value : NaN);

export const NORMAL_SCALE: Scale = { toScale: same, fromScale: same, shownMean: same, shownSd: same };

/** ln((x − low)/(high − x)); the way back is measured from the nearer bound, next to which a score keeps its digits. */
export function logitScale(low: number, high: number): Scale {
  const share = (point: number) => ((high - low) * Math.exp(point)) / (1 + Math.exp(point));
  return {
    toScale: (score) => (score > low && score < high ? Math.log((score - low) / (high - score)) : NaN),
    fromScale: (point) => (point < 0 ? low + share(point) : high - share(-point)),
    shownMean: same,
    shownSd: same,
  };
}

/**
 * ln(x/c) for a positive centre c, shown as ln x; through log1p near the centre, where x/c has lost the digits that tell scores apart.
 * Neither x/c nor e^point need be numbers for the result to be one.
 */
export function logScale(centre: number): Scale {
  return {
    toScale: (score) => {
      const ratio = score > 0 ? (score - centre) / centre : NaN;
      if (Math.abs(ratio) < 0.5) return Math.log1p(ratio);
      const quotient = score / centre;
      return quotient > 1e-290 && quotient < Infinity ? Math.log(quotient) : Math.log(score) - Math.log(centre);
    },
    fromScale: (point) =>
      finite(Math.abs(point) < 700 ? centre * Math.exp(point) : centre * Math.exp(point / 2) * Math.exp(point / 2)),
    shownMean: (mean) => Math.log(centre) + mean,
    shownSd: same,
  };
}

/** (e^{λy} − 1)/λ of a point y of the logarithmic scale. */
export function powerOfLog(power: number): (log: number) => number {
  return power === 0 ? same : (log) => Math.expm1(power * log) / power;
}

/** ((x/c)^λ − 1)/λ for a positive centre c, shown as (x^λ − 1)/λ. */
export function powerScale(power: number, centre: number): Scale {
  const log = logScale(centre);
  if (power === 0) return log;
  const ofLog = powerOfLog(power);
  const logCentre = Math.log(centre);
  const factor = Math.exp(power * logCentre);
  return {
    toScale: (score) => ofLog(log.toScale(score)),
    fromScale: (point) => (power * point > -1 ? log.fromScale(Math.log1p(power * point) / power) : NaN),
    shownMean: (mean) => ofLog(logCentre) + factor * mean,
    shownSd: (sd) => factor * sd,
  };
}
