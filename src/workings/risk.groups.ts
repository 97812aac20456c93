import { normalUpperTailQuantile } from "../core/distribution/normalUpperTailQuantile";
import { groupPassRates, type GroupPassRate } from "../core/method/groupPassRates";
import { MOST_PEOPLE, passRateRatio } from "../core/method/passRateRatio";
import { readCount, readFraction } from "../sheet/readArgument";
import { readGroups } from "../sheet/readGroups";
import { literal } from "./native";
import { pickItem } from "./pickItem";
import { Steps, type Step } from "./steps";
import { addTable } from "./tableSteps";
import { literalText, type WorkingsCall } from "./workingsCall";

const FISHER = "Fisher 1935: tables no more probable than the one seen";
const KOOPMAN = "Koopman 1984";
const FOUR_FIFTHS = "29 CFR 1607.4 D, in whole numbers: a screening rule";
/** So many tables are summed in one formula; of more people the p-value stands without one. */
const MOST_TABLES = 400;

/** One side of a comparison: how many passed of how many, as texts and numbers. */
interface Side {
  readonly x: string;
  readonly n: string;
  readonly passed: number;
  readonly assessed: number;
}

export function PASS_RATE_RATIO(call: WorkingsCall): readonly Step[] {
  const confidence = readFraction("confidence", call.cell("confidence"), 0.95);
  const a = readSide(call, "a");
  const b = readSide(call, "b");
  const { rateA, rateB, ratio, belowFourFifths, pValue, limits } = passRateRatio(
    a.passed,
    a.assessed,
    b.passed,
    b.assessed,
    confidence,
  );
  const [low, high] = rateA <= rateB ? [a, b] : [b, a];
  const z = normalUpperTailQuantile((1 - confidence) / 2);
  const quantile = `NORM.S.INV((1+${call.text("confidence", "0.95")})/2)^2`;
  const steps = new Steps();
  if (limits) {
    steps.add("chi-square that the ratio of rates may reach at its limits", z * z, quantile);
    for (const [name, limit] of [
      ["lower", limits.lower],
      ["upper", limits.upper],
    ] as const)
      if (limit > 0)
        steps.add(
          `check: chi-square at the ${name} limit, must be the same`,
          z * z,
          koopmanNative(low, high, limit),
          KOOPMAN,
        );
  }
  steps
    .add("rate a", rateA, `${a.x}/${a.n}`)
    .add("rate b", rateB, `${b.x}/${b.n}`)
    .add(
      "ratio of lower to higher",
      ratio ?? "none",
      ratio === undefined ? "" : `(${low.x}/${low.n})/(${high.x}/${high.n})`,
    )
    .add("below four fifths", belowFourFifths, `5*${low.x}*${high.n}<4*${high.x}*${low.n}`, FOUR_FIFTHS)
    .add("Fisher exact p-value", pValue, fisherNative(a, b), FISHER)
    .add("ratio lower limit", limits?.lower ?? "none", "", limits ? KOOPMAN : "")
    .add("ratio upper limit", limits?.upper ?? "none", "", limits ? KOOPMAN : "");
  return pickItem(steps.rows, 7, call.cell("item"));
}

function readSide(call: WorkingsCall, side: "a" | "b"): Side {
  const assessed = readCount(`assessed_${side}`, call.cell(`assessed_${side}`), 1, MOST_PEOPLE);
  const passed = readCount(`passed_${side}`, call.cell(`passed_${side}`), 0, assessed);
  return { x: call.text(`passed_${side}`), n: call.text(`assessed_${side}`), passed, assessed };
}

/** Two-sided: the chances of all tables with these margins that are no more probable than the one seen. */
function fisherNative(a: Side, b: Side): string {
  const good = a.passed + b.passed;
  const least = Math.max(0, good - b.assessed);
  const tables = Math.min(good, a.assessed) - least + 1;
  if (tables === 1) return "1";
  if (tables > MOST_TABLES) return "";
  const chance = (x: string) => `HYPGEOM.DIST(${x},${a.n},${a.x}+${b.x},${a.n}+${b.n},FALSE)`;
  const sum = `SUM(MAP(SEQUENCE(${tables},1,${least}),LAMBDA(i,LET(h,${chance("i")},IF(h<=o*(1+1E-7),h,0)))))`;
  return `LET(o,${chance(a.x)},MIN(1,${sum}))`;
}

/** Koopman's chi-square of two rates against a ratio of the first to the second. */
function koopmanNative(low: Side, high: Side, ratio: number): string {
  const p = `((f*(m+y)+x+n)-SQRT((f*(m+y)+x+n)^2-4*f*(m+n)*(x+y)))/(2*(m+n))`;
  // Where everyone passed on the first side its fitted rate is 1, and its own part nothing.
  const chiSquare = "IF(1-p<1E-9,0,(x-m*p)^2/(m*p*(1-p)))+IF(1-p/f<1E-9,0,(y-n*p/f)^2/(n*p/f*(1-p/f)))";
  return `LET(x,${low.x},m,${low.n},y,${high.x},n,${high.n},f,${literal(ratio)},p,${p},${chiSquare})`;
}

export function GROUP_PASS_RATES(call: WorkingsCall): readonly Step[] {
  const groups = readGroups(call.range("groups"), call.range("passed"));
  const rates = groupPassRates(groups);
  const highest = rates.reduce((best, one) => (one.passed * best.assessed > best.passed * one.assessed ? one : best));
  const others = rates.filter((one) => one !== highest).sort((one, other) => one.pValue - other.pValue);
  const [labels, marks] = [call.text("groups"), call.text("passed")];
  const side = ({ passed, assessed }: GroupPassRate): Side => ({
    x: String(passed),
    n: String(assessed),
    passed,
    assessed,
  });
  const headings = [
    "group",
    "assessed",
    "passed",
    "pass rate",
    "ratio to highest",
    "below four fifths",
    "Fisher exact p-value",
    "Holm-adjusted p-value",
  ];
  const steps = new Steps().add("groups compared with the highest", others.length);
  return addTable(steps, headings, rates.length, (index) => {
    const one = rates[index]!;
    const { label } = groups[index]!;
    const is = `${labels}=${literalText(label)}`;
    const [x, n, top, of] = [one.passed, one.assessed, highest.passed, highest.assessed];
    const place = others.indexOf(one);
    const upTo = others.slice(0, place + 1).map(({ pValue }, i) => `MIN(1,${others.length - i}*${literal(pValue)})`);
    return {
      name: `group ${String(label)}`,
      cells: [
        [label],
        [n, `SUM(IF(${is},1,0))`],
        [x, `SUM(IF(${is},${marks}*1,0))`],
        [one.rate, `${x}/${n}`],
        one.ratioToHighest === undefined ? ["none"] : [one.ratioToHighest, `(${x}/${n})/(${top}/${of})`],
        [one.belowFourFifths, `5*${x}*${of}<4*${top}*${n}`, FOUR_FIFTHS],
        [one.pValue, one === highest ? "1" : fisherNative(side(one), side(highest)), FISHER],
        [one.adjustedPValue, place < 0 ? "1" : `MAX(${upTo.join(",")})`, "Holm 1979"],
      ],
    };
  }).rows;
}
