import type { MissCost } from "../core/method/missCosts";

/** More terms than this would make a sheet slow. */
const MOST_TERMS = 1500;

/** A kind of miss with the texts of what it pays, in units, and of its share of all looks. */
export interface NativeMiss extends MissCost {
  readonly unitsText: string;
  readonly shareText: string;
}

/**
 * The chance that all misses before the last hit pay no more than `units`, as native text; "" where it would take too many terms.
 *
 * Kind by kind, the dearest first: looks of that kind before the last hit are negative binomial in number, given them so are those of the next
 * kind (with as many more looks that don't count), and the cheapest may come as often as what is left pays for. Exact, and a different way
 * than the recursion. Needs LET, SEQUENCE and MAP (Excel 2021 or 365).
 */
export function missCostNative(
  misses: readonly NativeMiss[],
  fraction: string,
  hits: string,
  units: string,
  mostUnits: number,
): string {
  const kinds = misses.filter((kind) => kind.units > 0).sort((a, b) => b.units - a.units);
  if (kinds.length === 0 || terms(kinds, mostUnits) > MOST_TERMS) return "";
  const named = kinds.map((kind, j) => `pay_${LETTERS[j]},${kind.unitsText},share_${LETTERS[j]},${kind.shareText}`);
  return `LET(p,${fraction},h,${hits},s,${units},${named.join(",")},${chanceOf(kinds.length, 0, "h", "s", "p")})`;
}

const LETTERS = "abcdefghij";

/** The chance from the j-th kind on: `successes` looks end the count, `left` units may still be paid, `rate` is the share of what ends it. */
function chanceOf(kinds: number, j: number, successes: string, left: string, rate: string): string {
  const [pay, share, times] = [`pay_${LETTERS[j]}`, `share_${LETTERS[j]}`, `n_${LETTERS[j]}`];
  const odds = `(${rate})/(${rate}+${share})`;
  if (j === kinds - 1) return `NEGBINOM.DIST(INT((${left})/${pay}),${successes},${odds},TRUE)`;
  const further = chanceOf(kinds, j + 1, `${successes}+${times}`, `${left}-${times}*${pay}`, `${rate}+${share}`);
  return (
    `SUM(MAP(SEQUENCE(INT((${left})/${pay})+1,1,0),` +
    `LAMBDA(${times},NEGBINOM.DIST(${times},${successes},${odds},FALSE)*${further})))`
  );
}

/** How many combinations of the dearer kinds there are. */
function terms(kinds: readonly MissCost[], units: number): number {
  if (kinds.length > LETTERS.length) return Infinity;
  if (kinds.length === 1) return 1;
  const most = Math.floor(units / kinds[0]!.units);
  if (most > MOST_TERMS) return Infinity;
  let sum = 0;
  for (let times = 0; times <= most && sum <= MOST_TERMS; times++)
    sum += terms(kinds.slice(1), units - times * kinds[0]!.units);
  return sum;
}
