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

/** ln((x − low)/(high − x)), as a difference of logarithms only where neither distance can vanish. */
export function logitScale(low: number, high: number): Scale {
  return {
    toScale: (score) => (score > low && score < high ? Math.log((score - low) / (high - score)) : NaN),
    fromScale: (point) =>
      point < 0
        ? low + (high - low) * (Math.exp(point) / (1 + Math.exp(point)))
        : high - (high - low) * (Math.exp(-point) / (1 + Math.exp(-point))),
    shownMean: same,
    shownSd: same,
  };
}

/** The logarithm of score / centre; through log1p near the centre, where the quotient has already lost the digits that tell scores apart. */
export function logRatio(score: number, centre: number): number {
  const ratio = (score - centre) / centre;
  return Math.abs(ratio) < 0.5 ? Math.log1p(ratio) : Math.log(score / centre);
}

/** ((x/c)^λ − 1)/λ for a positive centre c; ln(x/c) where λ is 0. Shown as (x^λ − 1)/λ, or ln x. */
export function powerScale(power: number, centre: number): Scale {
  const logCentre = Math.log(centre);
  const factor = Math.exp(power * logCentre);
  const atCentre = power === 0 ? logCentre : Math.expm1(power * logCentre) / power;
  return {
    toScale: (score) => {
      const log = score > 0 ? logRatio(score, centre) : NaN;
      return power === 0 ? log : Math.expm1(power * log) / power;
    },
    fromScale: (point) => {
      const log = power === 0 ? point : power * point > -1 ? Math.log1p(power * point) / power : NaN;
      return finite(centre * Math.exp(log));
    },
    shownMean: (mean) => atCentre + factor * mean,
    shownSd: (sd) => factor * sd,
  };
}
