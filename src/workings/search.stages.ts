import { searchBudget } from "../core/method/searchBudget";
import { stageLoad, type StageWork } from "../core/method/stageLoad";
import { isBlank, type Cell } from "../sheet/cell";
import { readCount, readFraction } from "../sheet/readArgument";
import { readStages } from "../sheet/readStages";
import { missCostNative, type NativeMiss } from "./missCostNative";
import { literal } from "./native";
import { Steps, type Step } from "./steps";
import { addTable, type TableCell } from "./tableSteps";
import type { WorkingsCall } from "./workingsCall";

export function STAGE_LOAD(call: WorkingsCall): readonly Step[] {
  const { reach, costs } = readStages(call.range("reach"), call.range("costs"));
  const { looks, stages, all } = stageLoad(
    reach,
    costs,
    readFraction("fraction", call.cell("fraction")),
    readCount("learn_count", call.cell("learn_count"), 0, undefined, 0),
    readCount("hits", call.cell("hits"), 1, undefined, 1),
  );
  const [learn, search] = [call.text("learn_count", "0"), `${call.text("hits", "1")}/${call.text("fraction")}`];
  const [reaches, prices] = [filledTexts(call, "reach"), filledTexts(call, "costs")];
  const work = ({ learning, searching, total, cost }: StageWork, reached: string, price: string): TableCell[] => [
    [learning, `${learn}*${reached}`],
    [searching, `${search}*${reached}`, WALD],
    [total, `(${learn}+${search})*${reached}`],
    [cost, `(${learn}+${search})*${price}`],
  ];
  const steps = new Steps().add("expected number of searching looks", looks, search, "mean of the negative binomial");
  const headings = ["stage", "while learning", "while searching", "total", "cost"];
  return addTable(steps, headings, stages.length + 1, (index) => {
    const stage = stages[index];
    if (stage) {
      const price = `${reaches[index]}*${prices[index]}`;
      return { name: `stage ${index + 1}`, cells: [[index + 1], ...work(stage, reaches[index]!, price)] };
    }
    const price = `(${reaches.map((reached, i) => `${reached}*${prices[i]}`).join("+")})`;
    return { name: "all stages", cells: [["all stages"], ...work(all, `(${reaches.join("+")})`, price)] };
  }).rows;
}

const WALD = "Wald 1944: the expected number of looks times the chance that a look gets there";
const PANJER = "Panjer 1981: compound distribution, the number of misses negative binomial";

export function SEARCH_BUDGET(call: WorkingsCall): readonly Step[] {
  const { reach, costs } = readStages(call.range("reach"), call.range("costs"));
  const { unit, misses, hitUnits, missUnits, budget, chance } = searchBudget(
    readFraction("fraction", call.cell("fraction")),
    reach,
    costs,
    readFraction("chance", call.cell("chance")),
    readCount("hits", call.cell("hits"), 1, undefined, 1),
  );
  const [fraction, hits, wanted] = [call.text("fraction"), call.text("hits", "1"), call.text("chance")];
  const [reaches, prices] = [filledTexts(call, "reach"), filledTexts(call, "costs")];
  const total = `(${prices.join("+")})`;
  if (unit === 0) return new Steps().add("budget: no stage costs anything", budget, total).rows;

  const share = (j: number) => `(${reaches[j]}-${reaches[j + 1] ?? fraction})`;
  const kinds: NativeMiss[] = misses.map((kind) => {
    const last = kind.stages[0]!;
    const unitsText = `ROUND((${prices.slice(0, last + 1).join("+")})/${unit},0)`;
    return { ...kind, unitsText, shareText: `(${kind.stages.map(share).join("+")})` };
  });
  const multiples = prices.map((price) => `${price}/${unit}`);
  const rounded = multiples.map((multiple) => `ROUND(${multiple},0)`);
  const apart = multiples.map((multiple, i) => `ABS(${multiple}-${rounded[i]})`);
  const steps = new Steps().add(
    "common unit of the costs",
    unit,
    `IF(MAX(${apart.join(",")})<1E-9,GCD(${rounded.join(",")})*${unit},"no")`,
    "the greatest number of which all costs are multiples",
  );
  for (const { units, share: part, stages, unitsText, shareText } of kinds) {
    const where = stages.map((stage) => stage + 1).join(" or ");
    steps.add(`share of looks that miss at stage ${where}`, part, shareText);
    steps.add(`what a miss at stage ${where} has paid, in units`, units, unitsText);
  }
  const within = (most: number) => missCostNative(kinds, fraction, hits, String(most), missUnits);
  const [enough, less] = [within(missUnits), missUnits > 0 ? within(missUnits - 1) : ""];
  const fewer = less === "" ? "" : `,${less}<${wanted}`;
  const found = enough === "" ? "" : `IF(AND(${enough}>=${wanted}*(1-1E-12)${fewer}),${missUnits},"no")`;
  return steps
    .add("what the hits pay, in units", hitUnits, `${hits}*ROUND(${total}/${unit},0)`)
    .add(`chance that all misses pay no more than ${missUnits} units`, chance, enough, PANJER)
    .add("smallest number of units that covers the misses", missUnits, found, PANJER)
    .add("budget", budget, `(${hits}*ROUND(${total}/${unit},0)+${missUnits})*${literal(unit)}`).rows;
}

/** What stands for each filled cell of a range, row by row. */
function filledTexts(call: WorkingsCall, name: string): string[] {
  const texts = call
    .range(name)
    .map((cells: readonly Cell[], row) =>
      cells.map((cell, column) => (isBlank(cell) ? "" : call.partText(name, row, column))),
    );
  return texts.flat().filter((text) => text !== "");
}
