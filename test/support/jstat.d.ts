/** What the tests use of jstat 1.9.6 beyond what src/audit/opinion/jstat.d.ts describes; the package has no types of its own. */
declare module "jstat" {
  interface JStat {
    beta: Distribution3;
    centralF: Distribution3;
    negbin: { cdf(k: number, r: number, p: number): number };
    gammaln(x: number): number;
  }
}
