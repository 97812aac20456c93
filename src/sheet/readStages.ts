import { DomainError } from "../core/domain";
import { isBlank, ordinalCell, type Cell, type Range } from "./cell";
import { numberCells } from "./numberCells";

/**
 * The reach and the cost of each stage, read side by side: places blank in both are skipped. One blank beside a number would shift all
 * later costs to the wrong stage, and is refused.
 */
export function readStages(reach: Range, costs: Range): { reach: number[]; costs: number[] } {
  numberCells("reach", reach);
  numberCells("costs", costs);
  const [fractions, prices] = [filled(reach), filled(costs)];
  const used = fractions.map((cell) => !isBlank(cell));
  for (let place = 0; place < Math.min(fractions.length, prices.length); place++) {
    if (isBlank(prices[place]) !== used[place]) continue;
    const [argument, other] = used[place] ? ["costs", "reach"] : ["reach", "costs"];
    const came = `${ordinalCell(place + 1)} is blank where ${other} holds a number`;
    throw new DomainError(argument, null, `one number a stage, side by side with ${other}`, came);
  }
  const numbers = (cells: Cell[]) => cells.filter((cell) => typeof cell === "number");
  return { reach: numbers(fractions), costs: numbers(prices) };
}

/** The cells row by row, without the blanks at the end. */
function filled(range: Range): Cell[] {
  const cells = range.flat();
  while (cells.length > 0 && isBlank(cells[cells.length - 1])) cells.pop();
  return cells;
}
