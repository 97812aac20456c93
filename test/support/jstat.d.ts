/** The few functions of jstat 1.9.6 that serve as a second opinion; the package has no types of its own. */
declare module "jstat" {
  interface Continuous<P extends number[]> {
    cdf(x: number, ...parameters: P): number;
    inv(p: number, ...parameters: P): number;
  }
  const library: {
    jStat: {
      normal: Continuous<[mean: number, sd: number]>;
      chisquare: Continuous<[df: number]>;
      gamma: Continuous<[shape: number, scale: number]>;
      beta: Continuous<[a: number, b: number]>;
      studentt: Continuous<[df: number]>;
      centralF: Continuous<[df1: number, df2: number]>;
      noncentralt: { cdf(x: number, df: number, ncp: number): number };
      binomial: { cdf(k: number, n: number, p: number): number };
      negbin: { cdf(k: number, r: number, p: number): number };
      hypgeom: { cdf(k: number, pool: number, good: number, drawn: number): number };
      gammaln(x: number): number;
    };
  };
  export default library;
}
