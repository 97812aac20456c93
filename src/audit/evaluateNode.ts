import type { AstExpression, BinaryExpression, CallExpression, LetExpression } from "@borgar/fx/xlsx";
import type { Cell, Range } from "../sheet/cell";
import { broadcast } from "./broadcast";
import { callOurs } from "./callOurs";
import type { Evaluation } from "./evaluation";
import { readFunctionName } from "./functionName";
import { lambdaFunctions } from "./lambda";
import { lazyFunctions } from "./lazy";
import { nearestName } from "../functions/nearestName";
import { natives } from "./natives/index";
import { applyOperator, applySign } from "./operators";
import { combineReferences, singleOf, spilledFrom } from "./reference";
import { resolveReference } from "./resolve";
import { errorCell, NotKnown, type Value } from "./value";

/** The value of one node of a formula. */
export function evaluateNode(node: AstExpression, at: Evaluation): Value {
  switch (node.type) {
    case "Literal":
      // A number beyond the largest is read as Infinity.
      return typeof node.value === "number" && !Number.isFinite(node.value) ? errorCell("#NUM!") : node.value;
    case "ErrorLiteral":
      return errorCell(node.value);
    case "ReferenceIdentifier":
      return resolveReference(node, at);
    case "ArrayExpression":
      return node.elements.map((row) => row.map((element) => evaluateNode(element, at) as Cell)) as Range;
    case "UnaryExpression": {
      const value = at.value(node.arguments[0]!);
      if (node.operator === "#") return spilledFrom(value);
      if (node.operator === "@") return singleOf(value, at);
      return broadcast([at.operand(value)], ([cell]) => applySign(node.operator, cell));
    }
    case "BinaryExpression":
      return evaluateBinary(node, at);
    case "LetExpression":
      return evaluateLet(node, at);
    case "CallExpression":
      return evaluateCall(node, at);
    case "LambdaExpression":
      throw new NotKnown("a LAMBDA is not worked out here");
  }
}

/** A long sum is a deep chain to the left: it is walked, not recursed into, so that it can't exhaust the stack. */
function evaluateBinary(node: BinaryExpression, at: Evaluation): Value {
  const chain: BinaryExpression[] = [];
  let first: AstExpression = node;
  while (first.type === "BinaryExpression") {
    chain.push(first);
    first = first.arguments[0]!;
  }
  let left = at.value(first);
  for (const { operator, arguments: sides } of chain.reverse()) {
    const right = at.value(sides[1]!);
    if (operator === ":" || operator === " " || operator === ",") left = combineReferences(operator, left, right);
    else left = broadcast([at.operand(left), at.operand(right)], ([a, b]) => applyOperator(operator, a, b));
  }
  return left;
}

function evaluateLet(node: LetExpression, at: Evaluation): Value {
  let inside = at;
  for (const { id, init } of node.declarations) inside = named(inside, id.name, inside.value(init));
  return inside.value(node.body);
}

export function named(at: Evaluation, name: string, value: Value): Evaluation {
  const key = name.replace(/^_xlpm\./i, "").toLowerCase();
  return at.with({ scope: { name: key, value, outer: at.setting.scope } });
}

function evaluateCall(node: CallExpression, at: Evaluation): Value {
  if (node.callee.type !== "Identifier") throw new NotKnown("a LAMBDA is not worked out here");
  const callee = readFunctionName(node.callee.name);
  if (callee.kind === "ours") return callOurs(callee.entry, node, at);
  if (callee.kind === "unknown") {
    const nearest = callee.nearest ? `; the nearest is ${callee.nearest}` : "";
    return errorCell("#NAME?", `There is no function ${callee.shown}${nearest}.`);
  }
  const lazy = lazyFunctions.get(callee.name) ?? lambdaFunctions.get(callee.name);
  if (lazy) return lazy(node.arguments, at);
  const native = natives.get(callee.name);
  if (!native) throw new UnknownFunction(callee.name);
  const count = node.arguments.length;
  if (count < native.least || count > native.most)
    return errorCell("#VALUE!", `${callee.name} takes ${arity(native.least, native.most)}; ${count} were given.`);
  const inside = native.takesArrays ? at.withArrays : at;
  return native.run(
    node.arguments.map((argument) => inside.value(argument)),
    inside,
  );
}

function arity(least: number, most: number): string {
  if (least === most) return `${least} argument${least === 1 ? "" : "s"}`;
  return most === Infinity ? `at least ${least} arguments` : `${least} to ${most} arguments`;
}

/** A function of the host, or a mistyped one, that this evaluator doesn't have. */
export class UnknownFunction extends NotKnown {
  constructor(readonly functionName: string) {
    super(`the function ${functionName} is not known here`);
  }

  get nearest(): string | undefined {
    return nearestName(this.functionName, [...natives.keys(), ...lazyFunctions.keys(), ...lambdaFunctions.keys()]);
  }
}
