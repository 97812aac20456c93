declare module "jstat" {
  interface Distribution3 {
    cdf(x: number, a: number, b: number): number;
    inv(p: number, a: number, b: number): number;
  }
  interface Distribution2 {
    cdf(x: number, df: number): number;
    inv(p: number, df: number): number;
  }
  export interface JStat {
    mean(values: readonly number[]): number;
    stdev(values: readonly number[], sample: boolean): number;
    normal: Distribution3;
    gamma: Distribution3;
    studentt: Distribution2;
    chisquare: Distribution2;
    noncentralt: { cdf(x: number, df: number, ncp: number): number };
    binomial: { cdf(k: number, n: number, p: number): number };
    hypgeom: { cdf(k: number, pool: number, good: number, drawn: number): number };
  }
  const library: { jStat: JStat };
  export default library;
}
