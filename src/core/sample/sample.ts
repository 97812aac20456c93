import { symmetricSum } from "../numeric/symmetricSum";

/**
 * The numbers that were scored, in the order in which they came, with what is derived from them worked out once, when first asked for.
 *
 * Sums go through the sorted values, so that sorting a sheet changes no bit of any result, and from both
 * ends, so that scores where lower is better give the mirror image to the bit.
 */
export class Sample {
  readonly count: number;
  private sortedKept?: Float64Array;
  private meanKept?: number;
  private meanRestKept?: number;
  private sumOfSquaresKept?: number;

  /** Takes the array as it is: the caller must not change it afterwards. `sort` where the order is known more cheaply than by sorting. */
  constructor(
    readonly values: Float64Array,
    private readonly sort = () => values.slice().sort(),
  ) {
    this.count = values.length;
  }

  /** The sample carried through a rising function, in rising order. */
  mapped(rising: (value: number) => number): Sample {
    const sorted = this.sorted.map(rising);
    return new Sample(sorted, () => sorted);
  }

  /** The values in rising order. */
  get sorted(): Float64Array {
    return (this.sortedKept ??= this.sort());
  }

  get minimum(): number {
    return this.sorted[0]!;
  }

  get maximum(): number {
    return this.sorted[this.count - 1]!;
  }

  /** The mean, corrected by the mean of the residuals: exact to the last digits also where the values share many leading digits. */
  get mean(): number {
    if (this.meanKept === undefined) {
      const first = symmetricSum(this.sorted) / this.count;
      this.meanKept = Number.isFinite(first) ? first + symmetricSum(this.sorted, (x) => x - first) / this.count : first;
    }
    return this.meanKept;
  }

  /**
   * What the true mean is above `mean`: less than half its last digit, and yet a part of the spread where all scores share their leading
   * digits. Powers of the deviations above the second need it: of 1e9 + 1, 1e9 + 2, 1e9 + 4 the skewness would be off in the 7th digit.
   */
  get meanRest(): number {
    const { mean } = this;
    return (this.meanRestKept ??= symmetricSum(this.sorted, (x) => x - mean) / this.count);
  }

  /** Sum of squared deviations from the mean. */
  get sumOfSquares(): number {
    if (this.sumOfSquaresKept === undefined) {
      const { mean } = this;
      const aboutMean = symmetricSum(this.sorted, (x) => (x - mean) * (x - mean));
      this.sumOfSquaresKept = Number.isFinite(aboutMean) ? aboutMean - this.count * this.meanRest ** 2 : aboutMean;
    }
    return this.sumOfSquaresKept;
  }

  /** The sample standard deviation, divisor n − 1. */
  get sd(): number {
    return Math.sqrt(this.sumOfSquares / (this.count - 1));
  }
}
