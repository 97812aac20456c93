import type { AstExpression } from "@borgar/fx/xlsx";
import { isCellError, type Cell, type CellError } from "../sheet/cell";
import { broadcast } from "./broadcast";
import { compareCells, toNumber, toTruth } from "./coerce";
import type { Evaluation } from "./evaluation";
import { named } from "./evaluateNode";
import { singleOf, spilledFrom } from "./reference";
import { errorCell, isArray, type Value } from "./value";

type Lazy = (nodes: readonly (AstExpression | null)[], at: Evaluation) => Value;

const WRONG_COUNT = errorCell("#VALUE!", "The number of arguments is wrong.");

/** Functions that evaluate only the arguments they need, so that what is not needed can't spoil the answer. */
export const lazyFunctions: ReadonlyMap<string, Lazy> = new Map<string, Lazy>([
  ["IF", chooseIf],
  ["IFS", chooseIfs],
  ["SWITCH", chooseSwitch],
  ["CHOOSE", choose],
  ["IFERROR", (nodes, at) => instead(nodes, at, () => true)],
  ["IFNA", (nodes, at) => instead(nodes, at, ({ code }) => code === "#N/A")],
  ["LET", letStored],
  ["SINGLE", ([node = null], at) => singleOf(at.value(node), at)],
  ["ANCHORARRAY", ([node = null], at) => spilledFrom(at.value(node))],
]);

function chooseIf(nodes: readonly (AstExpression | null)[], at: Evaluation): Value {
  if (nodes.length < 2 || nodes.length > 3) return WRONG_COUNT;
  const condition = at.operand(at.value(nodes[0]!));
  const otherwise = () => (nodes.length < 3 ? false : at.value(nodes[2]!));
  if (!isArray(condition)) {
    const truth = toTruth(condition);
    return typeof truth !== "boolean" ? truth : truth ? at.value(nodes[1]!) : otherwise();
  }
  const both = [condition, at.operand(at.value(nodes[1]!)), at.operand(otherwise())];
  return broadcast(both, ([cell, yes, no]) => {
    const truth = toTruth(cell);
    return typeof truth !== "boolean" ? truth : truth ? yes : no;
  });
}

function chooseIfs(nodes: readonly (AstExpression | null)[], at: Evaluation): Value {
  if (nodes.length === 0 || nodes.length % 2 === 1) return WRONG_COUNT;
  for (let i = 0; i < nodes.length; i += 2) {
    const truth = toTruth(at.cell(at.value(nodes[i]!)));
    if (typeof truth !== "boolean") return truth;
    if (truth) return at.value(nodes[i + 1]!);
  }
  return errorCell("#N/A");
}

function chooseSwitch(nodes: readonly (AstExpression | null)[], at: Evaluation): Value {
  if (nodes.length < 3) return WRONG_COUNT;
  const wanted = at.cell(at.value(nodes[0]!));
  if (isCellError(wanted)) return wanted;
  for (let i = 1; i + 1 < nodes.length; i += 2) {
    const candidate = at.cell(at.value(nodes[i]!));
    if (isCellError(candidate)) return candidate;
    if (compareCells(wanted, candidate) === 0) return at.value(nodes[i + 1]!);
  }
  return nodes.length % 2 === 0 ? at.value(nodes[nodes.length - 1]!) : errorCell("#N/A");
}

function choose(nodes: readonly (AstExpression | null)[], at: Evaluation): Value {
  const index = toNumber(at.cell(at.value(nodes[0] ?? null)));
  if (typeof index !== "number") return index;
  const place = Math.trunc(index);
  return place >= 1 && place < nodes.length ? at.value(nodes[place]!) : errorCell("#VALUE!");
}

function instead(
  nodes: readonly (AstExpression | null)[],
  at: Evaluation,
  replaces: (error: CellError) => boolean,
): Value {
  if (nodes.length !== 2) return WRONG_COUNT;
  const value = at.value(nodes[0]!);
  const cells = at.operand(value);
  const wrong = (cell: Cell) => isCellError(cell) && replaces(cell);
  if (!isArray(cells)) return wrong(cells) ? at.value(nodes[1]!) : value;
  if (!cells.some((row) => row.some(wrong))) return value;
  return broadcast([cells, at.operand(at.value(nodes[1]!))], ([cell, other]) => (wrong(cell) ? other : cell));
}

/** LET as a file stores it: a plain call with the prefix of newer functions. */
function letStored(nodes: readonly (AstExpression | null)[], at: Evaluation): Value {
  if (nodes.length < 3 || nodes.length % 2 === 0) return WRONG_COUNT;
  let inside = at;
  for (let i = 0; i + 1 < nodes.length; i += 2) {
    const name = nodes[i];
    if (name?.type !== "ReferenceIdentifier" || name.kind !== "name") return errorCell("#NAME?");
    inside = named(inside, name.value, inside.value(nodes[i + 1]!));
  }
  return inside.value(nodes[nodes.length - 1]!);
}
