/*
 * Accuracy and speed of the distributions beside jstat 1.9.6, in the same run on the same points.
 *
 *   node bench/run.mjs distributions
 *
 * Error: the largest relative error on the reference vectors (test/reference/vectors, 25 digits by mpmath). Time: processor time a call over the
 * points of the file, the best of many rounds, ours and theirs in turn, so that what else the machine does counts little.
 */
import jstat from "jstat";
import betaCdfRows from "../test/reference/vectors/beta_cdf.json";
import betaQuantileRows from "../test/reference/vectors/beta_quantile.json";
import binomialRows from "../test/reference/vectors/binom_cdf.json";
import bivariateRows from "../test/reference/vectors/bvn_cdf.json";
import chiSquareCdfRows from "../test/reference/vectors/chisq_cdf.json";
import chiSquareQuantileRows from "../test/reference/vectors/chisq_quantile.json";
import chiSquareTailRows from "../test/reference/vectors/chisq_sf.json";
import gammaCdfRows from "../test/reference/vectors/gamma_cdf.json";
import gammaQuantileRows from "../test/reference/vectors/gamma_quantile.json";
import gammaTailRows from "../test/reference/vectors/gamma_sf.json";
import hypergeometricRows from "../test/reference/vectors/hyper_cdf.json";
import logGammaRows from "../test/reference/vectors/lgamma.json";
import negativeBinomialRows from "../test/reference/vectors/nbinom_cdf.json";
import noncentralTCdfRows from "../test/reference/vectors/nct_cdf.json";
import noncentralTQuantileRows from "../test/reference/vectors/nct_quantile.json";
import normalCdfRows from "../test/reference/vectors/norm_cdf.json";
import normalQuantileRows from "../test/reference/vectors/norm_quantile.json";
import studentTCdfRows from "../test/reference/vectors/t_cdf.json";
import studentTQuantileRows from "../test/reference/vectors/t_quantile.json";
import oneSidedRows from "../test/reference/vectors/tol_k1.json";
import { betaCdf } from "../src/core/distribution/betaCdf";
import { betaQuantile } from "../src/core/distribution/betaQuantile";
import { binomialCdf } from "../src/core/distribution/binomialCdf";
import { bivariateNormalCdf } from "../src/core/distribution/bivariateNormalCdf";
import { chiSquareCdf } from "../src/core/distribution/chiSquareCdf";
import { chiSquareQuantile } from "../src/core/distribution/chiSquareQuantile";
import { chiSquareUpperTail } from "../src/core/distribution/chiSquareUpperTail";
import { gammaCdf } from "../src/core/distribution/gammaCdf";
import { gammaQuantile } from "../src/core/distribution/gammaQuantile";
import { gammaUpperTail } from "../src/core/distribution/gammaUpperTail";
import { hypergeometricCdf } from "../src/core/distribution/hypergeometricCdf";
import { negativeBinomialCdf } from "../src/core/distribution/negativeBinomialCdf";
import { noncentralTCdf } from "../src/core/distribution/noncentralTCdf";
import { noncentralTQuantile } from "../src/core/distribution/noncentralTQuantile";
import { normalCdf } from "../src/core/distribution/normalCdf";
import { normalQuantile } from "../src/core/distribution/normalQuantile";
import { studentTCdf } from "../src/core/distribution/studentTCdf";
import { studentTQuantile } from "../src/core/distribution/studentTQuantile";
import { logGamma } from "../src/core/special/logGamma";

const { jStat } = jstat;
type Call = (a: number, b: number, c: number, d: number) => number;
type Row = { args: number[]; value: string };

const SUBJECTS: [name: string, rows: Row[], ours: Call, theirs: Call | null][] = [
  ["normal cdf", normalCdfRows, normalCdf, (x) => jStat.normal.cdf(x, 0, 1)],
  ["normal quantile", normalQuantileRows, normalQuantile, (p) => jStat.normal.inv(p, 0, 1)],
  ["log gamma", logGammaRows, logGamma, (x) => jStat.gammaln(x)],
  ["chi-square cdf", chiSquareCdfRows, chiSquareCdf, (x, df) => jStat.chisquare.cdf(x, df)],
  ["chi-square upper tail", chiSquareTailRows, chiSquareUpperTail, (x, df) => 1 - jStat.chisquare.cdf(x, df)],
  ["chi-square quantile", chiSquareQuantileRows, chiSquareQuantile, (p, df) => jStat.chisquare.inv(p, df)],
  ["gamma cdf", gammaCdfRows, gammaCdf, (x, shape) => jStat.gamma.cdf(x, shape, 1)],
  ["gamma upper tail", gammaTailRows, gammaUpperTail, (x, shape) => 1 - jStat.gamma.cdf(x, shape, 1)],
  ["gamma quantile", gammaQuantileRows, gammaQuantile, (p, shape) => jStat.gamma.inv(p, shape, 1)],
  ["beta cdf", betaCdfRows, betaCdf, (x, a, b) => jStat.beta.cdf(x, a, b)],
  ["beta quantile", betaQuantileRows, betaQuantile, (p, a, b) => jStat.beta.inv(p, a, b)],
  ["Student t cdf", studentTCdfRows, studentTCdf, (x, df) => jStat.studentt.cdf(x, df)],
  ["Student t quantile", studentTQuantileRows, studentTQuantile, (p, df) => jStat.studentt.inv(p, df)],
  ["noncentral t cdf", noncentralTCdfRows, noncentralTCdf, (x, df, ncp) => jStat.noncentralt.cdf(x, df, ncp)],
  ["noncentral t quantile", noncentralTQuantileRows, noncentralTQuantile, null],
  ["one-sided factor", oneSidedRows, oneSidedFactor, null],
  ["binomial cdf", binomialRows, binomialCdf, (k, n, p) => jStat.binomial.cdf(k, n, p)],
  ["negative binomial cdf", negativeBinomialRows, negativeBinomialCdf, (k, r, p) => jStat.negbin.cdf(k, r, p)],
  ["hypergeometric cdf", hypergeometricRows, hypergeometricCdf, (k, N, K, n) => jStat.hypgeom.cdf(k, N, K, n)],
  ["bivariate normal cdf", bivariateRows, bivariateNormalCdf, null],
];

function oneSidedFactor(n: number, content: number, confidence: number): number {
  return noncentralTQuantile(confidence, n - 1, normalQuantile(content) * Math.sqrt(n)) / Math.sqrt(n);
}

/** The largest relative error, and how many points gave no number at all. */
function accuracy(rows: Row[], f: Call): { worst: number; without: number } {
  let worst = 0;
  let without = 0;
  for (const { args, value } of rows) {
    const expected = Number(value);
    if (Math.abs(expected) < 2 ** -1022) continue;
    const got = f(args[0], args[1], args[2], args[3]);
    if (!Number.isFinite(got)) without++;
    else worst = Math.max(worst, Math.abs(got - expected) / Math.abs(expected));
  }
  return { worst, without };
}

let sink = 0;
/** Nanoseconds of processor time a call, for each function: the best of up to 15 rounds in turn, two seconds at most. */
function speed(rows: Row[], functions: Call[]): number[] {
  const clock = () => process.cpuUsage().user * 1000;
  const best = functions.map(() => Infinity);
  const spent = functions.map(() => 0);
  for (let round = 0; round < 15; round++)
    functions.forEach((f, i) => {
      if (spent[i] > 2e9) return;
      const started = clock();
      let calls = 0;
      while (calls === 0 || clock() - started < 1e7) {
        for (const { args } of rows) sink += f(args[0], args[1], args[2], args[3]);
        calls += rows.length;
      }
      const took = clock() - started;
      spent[i] += took;
      best[i] = Math.min(best[i], took / calls);
    });
  return best;
}

const time = (ns: number) => (ns < 1000 ? `${ns.toFixed(0)} ns` : `${(ns / 1000).toFixed(1)} µs`);
const table = [["function", "points", "our error", "jstat's error", "our time", "jstat's time", "times as fast"]];
for (const [name, rows, ours, theirs] of SUBJECTS) {
  const mine = accuracy(rows, ours);
  const other = theirs && accuracy(rows, theirs);
  const [myTime, otherTime] = speed(rows, theirs ? [ours, theirs] : [ours]);
  table.push([
    name,
    String(rows.length),
    mine.worst.toExponential(1) + (mine.without ? `, ${mine.without} without a number` : ""),
    other ? other.worst.toExponential(1) + (other.without ? `, ${other.without} without a number` : "") : "none",
    time(myTime),
    theirs ? time(otherTime) : "none",
    theirs ? (otherTime / myTime).toFixed(1) : "",
  ]);
}
for (const row of table) console.log(`| ${row.join(" | ")} |`);
if (Number.isNaN(sink)) console.log("(some points gave no number)");
