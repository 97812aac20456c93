import { requireFraction } from "../domain";
import { fQuantile } from "../distribution/fQuantile";
import { ratingMeanSquares, type RatingMeanSquares } from "./ratingMeanSquares";

export interface ReliabilityForm {
  readonly form: string;
  /** Undefined where the form does not exist for these ratings (a panel's mean with no spread between entries). */
  readonly reliability: number | undefined;
  readonly lower: number | undefined;
  readonly upper: number | undefined;
}

export interface ScoreReliability extends RatingMeanSquares {
  /** Satterthwaite's degrees of freedom of the limits of ICC(2,1). */
  readonly degreesTwoWay: number;
  readonly forms: readonly ReliabilityForm[];
}

/** With fewer degrees of freedom than this no F is worked out. */
const FEWEST_DEGREES = 0.001;

/**
 * The six intraclass correlations of a table of ratings (rows entries, columns raters) with confidence limits: one-way, two-way with
 * raters at random, two-way with these raters; of a single rating and of the mean of all k.
 *
 * Domain     ratings row by row, at least 2 rows and 2 raters; 0 < confidence < 1.
 * Edges      a form whose divisor is not above 0 is undefined, and so are two-way limits with fewer than 0.001 degrees of freedom.
 * Method     Ratios of mean squares; limits from F. ICC(2,1) with Satterthwaite's degrees of freedom, ICC(2,k) by stepping those up:
 *            these two are approximate. F(1 − α/2; a, b) is taken as 1/F(α/2; b, a), which keeps the digits of a small α.
 * Accuracy   relative error ≤ 1e-13 (test/core/method/scoreReliability.test.ts).
 * Reference  Shrout & Fleiss (1979), Psychological Bulletin 86; McGraw & Wong (1996), Psychological Methods 1.
 *
 * @throws {DomainError} if an argument is outside its domain. @throws {NoAnswerError} where the ratings leave no residual.
 */
export function scoreReliability(ratings: Float64Array, raters: number, confidence = 0.95): ScoreReliability {
  requireFraction("confidence", confidence);
  const squares = ratingMeanSquares(ratings, raters);
  const { entries: n, raters: k } = squares;
  const tail = (1 - confidence) / 2;
  const upperF = (df1: number, df2: number) => 1 / fQuantile(tail, df2, df1);

  const oneWay = squares.betweenEntries / squares.withinEntries;
  const oneWayLow = oneWay / upperF(n - 1, n * (k - 1));
  const oneWayHigh = oneWay * upperF(n * (k - 1), n - 1);
  const fixed = squares.betweenEntries / squares.residual;
  const fixedLow = fixed / upperF(n - 1, (n - 1) * (k - 1));
  const fixedHigh = fixed * upperF((n - 1) * (k - 1), n - 1);

  // The two-way forms in units of the residual mean square, so that no product of large squares overflows.
  const raterF = squares.betweenRaters / squares.residual;
  const single = divided(fixed - 1, fixed + k - 1 + (k * (raterF - 1)) / n);
  const degreesTwoWay = satterthwaite(single ?? 0, raterF, n, k);
  const rest = k * raterF + k * n - k - n;
  // Degrees of freedom next to none (raters and residual cancel) allow no limits: F has left the range of numbers.
  const judged = degreesTwoWay >= FEWEST_DEGREES;
  const far = judged ? fQuantile(tail, degreesTwoWay, n - 1) : NaN;
  const near = judged ? upperF(degreesTwoWay, n - 1) : NaN;
  const low = divided(n * (fixed * far - 1), rest + n * fixed * far);
  const high = divided(n * (near * fixed - 1), rest + n * near * fixed);

  const ratio = (f: number) => divided(f - 1, f + k - 1);
  const mean = (f: number) => divided(f - 1, f);
  const forms: ReliabilityForm[] = [
    { form: "ICC(1,1)", reliability: ratio(oneWay), lower: ratio(oneWayLow), upper: ratio(oneWayHigh) },
    { form: "ICC(2,1)", reliability: single, lower: low, upper: high },
    { form: "ICC(3,1)", reliability: ratio(fixed), lower: ratio(fixedLow), upper: ratio(fixedHigh) },
    { form: "ICC(1,k)", reliability: mean(oneWay), lower: mean(oneWayLow), upper: mean(oneWayHigh) },
    {
      form: "ICC(2,k)",
      reliability: divided(fixed - 1, fixed + (raterF - 1) / n),
      lower: steppedUp(low, k),
      upper: steppedUp(high, k),
    },
    { form: "ICC(3,k)", reliability: mean(fixed), lower: mean(fixedLow), upper: mean(fixedHigh) },
  ];
  return { ...squares, degreesTwoWay, forms };
}

/** Degrees of freedom of the mixture of rater and residual mean squares that stands under ICC(2,1). */
function satterthwaite(r: number, raterF: number, n: number, k: number): number {
  const a = k * r * raterF;
  const b = n * (1 + (k - 1) * r) - k * r;
  // Neither entries nor raters differ: the residual stands alone.
  if (a === 0) return (k - 1) * (n - 1);
  return ((k - 1) * (n - 1) * (a + b) ** 2) / ((n - 1) * a * a + b * b);
}

/** The reliability of the mean of k ratings from that of one (Spearman and Brown). */
function steppedUp(reliability: number | undefined, k: number): number | undefined {
  return reliability === undefined ? undefined : divided(k * reliability, 1 + (k - 1) * reliability);
}

function divided(over: number, under: number): number | undefined {
  return under > 0 ? over / under : undefined;
}
