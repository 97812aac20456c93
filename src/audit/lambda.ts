import type { AstExpression } from "@borgar/fx/xlsx";
import { isCellError, type Cell } from "../sheet/cell";
import { broadcast, requireSize } from "./broadcast";
import { toNumber } from "./coerce";
import type { Evaluation } from "./evaluation";
import { named } from "./evaluateNode";
import { readFunctionName } from "./functionName";
import { errorCell, isArray, type Value } from "./value";

type Node = AstExpression | null;

interface Lambda {
  readonly names: readonly string[];
  readonly body: Node;
}

/** Functions that take a LAMBDA as their last argument, written out in its place. */
export const lambdaFunctions: ReadonlyMap<string, (nodes: readonly Node[], at: Evaluation) => Value> = new Map([
  ["MAP", map],
  ["REDUCE", (nodes: readonly Node[], at: Evaluation) => fold(nodes, at, false)],
  ["SCAN", (nodes: readonly Node[], at: Evaluation) => fold(nodes, at, true)],
  ["BYROW", (nodes: readonly Node[], at: Evaluation) => by(nodes, at, true)],
  ["BYCOL", (nodes: readonly Node[], at: Evaluation) => by(nodes, at, false)],
  ["MAKEARRAY", makeArray],
]);

/** LAMBDA as it is typed, and as a file stores it: a plain call with the prefix of newer functions. */
function lambdaOf(node: Node | undefined): Lambda | undefined {
  if (node?.type === "LambdaExpression") return { names: node.params.map(({ name }) => name), body: node.body };
  if (node?.type !== "CallExpression" || node.callee.type !== "Identifier") return undefined;
  const callee = readFunctionName(node.callee.name);
  if (callee.kind !== "native" || callee.name !== "LAMBDA" || node.arguments.length === 0) return undefined;
  const names = node.arguments.slice(0, -1).map((one) => (one?.type === "ReferenceIdentifier" ? one.value : ""));
  return names.includes("") ? undefined : { names, body: node.arguments[node.arguments.length - 1]! };
}

function apply({ names, body }: Lambda, values: readonly Value[], at: Evaluation): Value {
  if (names.length !== values.length) return errorCell("#VALUE!", `LAMBDA takes ${names.length} values here.`);
  let inside = at.withArrays;
  names.forEach((name, index) => (inside = named(inside, name, values[index]!)));
  return inside.value(body);
}

/** A cell of an answer can hold no array. */
function oneCell(value: Value, at: Evaluation): Cell {
  const cells = at.cells(value);
  return isArray(cells) ? errorCell("#CALC!") : cells;
}

function map(nodes: readonly Node[], at: Evaluation): Value {
  const lambda = lambdaOf(nodes[nodes.length - 1]);
  if (!lambda || nodes.length < 2) return errorCell("#VALUE!", "MAP takes arrays and a LAMBDA.");
  const arrays = nodes.slice(0, -1).map((node) => at.withArrays.cells(at.withArrays.value(node)));
  return broadcast(arrays, (cells) => oneCell(apply(lambda, cells, at), at));
}

function fold(nodes: readonly Node[], at: Evaluation, keeps: boolean): Value {
  const lambda = lambdaOf(nodes[nodes.length - 1]);
  const name = keeps ? "SCAN" : "REDUCE";
  if (!lambda || nodes.length < 2 || nodes.length > 3)
    return errorCell("#VALUE!", `${name} takes a start, an array and a LAMBDA.`);
  const [start, array] = nodes.length === 3 ? nodes : [null, nodes[0]!];
  let sum: Value = nodes.length === 3 ? at.withArrays.value(start!) : null;
  let begun = nodes.length === 3;
  const rows = at.withArrays.rows(at.withArrays.value(array!)).map((row) =>
    row.map((cell) => {
      sum = begun ? apply(lambda, [sum, cell], at) : cell;
      begun = true;
      return keeps ? oneCell(sum, at) : cell;
    }),
  );
  return keeps ? rows : sum;
}

function by(nodes: readonly Node[], at: Evaluation, rowwise: boolean): Value {
  const lambda = lambdaOf(nodes[1]);
  if (!lambda || nodes.length !== 2) return errorCell("#VALUE!", "An array and a LAMBDA are wanted.");
  const rows = at.withArrays.rows(at.withArrays.value(nodes[0]!));
  if (rowwise) return rows.map((row) => [oneCell(apply(lambda, [[row]], at), at)]);
  return [(rows[0] ?? []).map((_, column) => oneCell(apply(lambda, [rows.map((row) => [row[column]!])], at), at))];
}

function makeArray(nodes: readonly Node[], at: Evaluation): Value {
  const lambda = lambdaOf(nodes[2]);
  if (!lambda || nodes.length !== 3) return errorCell("#VALUE!", "MAKEARRAY takes rows, columns and a LAMBDA.");
  const sizes = [0, 1].map((index) => toNumber(at.cell(at.value(nodes[index]!))));
  const error = sizes.find(isCellError);
  if (error) return error;
  const [rows, columns] = (sizes as number[]).map(Math.trunc) as [number, number];
  if (!(rows >= 1 && columns >= 1)) return errorCell("#VALUE!");
  requireSize(rows, columns);
  return Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (__, column) => oneCell(apply(lambda, [row + 1, column + 1], at), at)),
  );
}
