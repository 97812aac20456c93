import { cumulativeSums, SUM_ALLOWANCE, SUM_LIMIT } from "../core/method/cumulativeSums";
import { SMOOTHING_WEIGHT, SMOOTHING_WIDTH, smoothedScores } from "../core/method/smoothedScores";
import { parseAddress } from "../sheet/address";
import { isBlank } from "../sheet/cell";
import { readNumber, readPositive, readWord } from "../sheet/readArgument";
import { readScores } from "../sheet/readScores";
import { Steps, type Step } from "./steps";
import { addTable } from "./tableSteps";
import type { WorkingsCall } from "./workingsCall";

const ROBERTS = "Roberts 1959; Lucas & Saccucci 1990";
const PAGE = "Page 1954";
/** What keeps a score that lies on a limit by its digits from being flagged by rounding. */
const ON_LIMIT = "*(1+1E-12)";

/** Headed, a row a score. */
export function DRIFT_FLAGS(call: WorkingsCall): readonly Step[] {
  const way = readWord("method", call.cell("method"), ["ewma", "cusum"], "ewma");
  return way === "cusum" ? summed(call) : smoothed(call);
}

function smoothed(call: WorkingsCall): readonly Step[] {
  const { values, centre, spread, mean, sd, folded } = readDrift(call);
  const found = smoothedScores(values, centre, spread);
  const [weight, width] = [SMOOTHING_WEIGHT, SMOOTHING_WIDTH];
  const steps = new Steps()
    .add("share that each new score counts", weight, "", ROBERTS)
    .add("width of the limits in standard errors", width, "", ROBERTS);
  return addTable(steps, ["score number", "smoothed", "lower limit", "upper limit", "flag"], values.length, (i) => {
    const reach = `${width}*${sd}*SQRT(${weight}/${2 - weight}*(1-${1 - weight}^${2 * (i + 1)}))`;
    const smooth = folded(i, mean, `a+${weight}*(x-a)`);
    return {
      name: `score ${i + 1}`,
      cells: [
        [i + 1, folded(i, "0", "a+1")],
        [found.smoothed[i], smooth, ROBERTS],
        [found.lower[i], `${mean}-${reach}`, ROBERTS],
        [found.upper[i], `${mean}+${reach}`, ROBERTS],
        [found.flags[i], `ABS(${smooth}-${mean})>${reach}${ON_LIMIT}`],
      ],
    };
  }).rows;
}

function summed(call: WorkingsCall): readonly Step[] {
  const { values, centre, spread, mean, sd, folded } = readDrift(call);
  const found = cumulativeSums(values, centre, spread);
  const steps = new Steps()
    .add("what is allowed for at each score, in standard deviations", SUM_ALLOWANCE, "", PAGE)
    .add("sum above which is flagged, in standard deviations", SUM_LIMIT, "", PAGE);
  return addTable(steps, ["score number", "high side", "low side", "flag"], values.length, (i) => {
    const high = folded(i, "0", `MAX(0,a+(x-${mean})/${sd}-${SUM_ALLOWANCE})`);
    const low = folded(i, "0", `MAX(0,a-(x-${mean})/${sd}-${SUM_ALLOWANCE})`);
    return {
      name: `score ${i + 1}`,
      cells: [
        [i + 1, folded(i, "0", "a+1")],
        [found.high[i], high, PAGE],
        [found.low[i], low, PAGE],
        [found.flags[i], `MAX(${high},${low})>${SUM_LIMIT}${ON_LIMIT}`],
      ],
    };
  }).rows;
}

function readDrift(call: WorkingsCall) {
  const { values } = readScores("recent", call.range("recent"), 1, "any").sample;
  return {
    values,
    centre: readNumber("mean", call.cell("mean")),
    spread: readPositive("sd", call.cell("sd")),
    mean: call.text("mean"),
    sd: call.text("sd"),
    folded: foldedScores(call),
  };
}

/** Native text that goes through the scores up to the i-th, one by one: from `start`, a the result so far and x the score. */
function foldedScores(call: WorkingsCall): (i: number, start: string, step: string) => string {
  const range = call.range("recent");
  const columns = range[0]!.length;
  const places = range.flat().flatMap((cell, place) => (isBlank(cell) ? [] : [place]));
  const text = call.text("recent");
  const inLine = parseAddress(text) !== undefined && (columns === 1 || range.length === 1);
  return (i, start, step) => {
    const place = places[i]!;
    const over = `IF(x<"",${step},a)`;
    if (inLine) {
      const upTo = columns === 1 ? call.partText("recent", 0, 0, place, 0) : call.partText("recent", 0, 0, 0, place);
      return `REDUCE(${start},${upTo},LAMBDA(a,x,${over}))`;
    }
    const cell = `INDEX(${text},INT((k-1)/${columns})+1,MOD(k-1,${columns})+1)`;
    return `REDUCE(${start},SEQUENCE(${place + 1}),LAMBDA(a,k,LET(x,${cell},${over})))`;
  };
}
