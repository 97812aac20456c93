import { parse, tokenize, type AstExpression, type CallExpression, type LambdaExpression } from "@borgar/fx/xlsx";
import { formatAddress, parseAddress } from "../../src/sheet/address";

/** Functions that LibreOffice 7.4 doesn't have, and that don't expand into those that it has. */
const LACKING = /^(LET|LAMBDA|MAP|REDUCE|SCAN|SEQUENCE|SORT|FILTER|TOCOL|TAKE|DROP|VSTACK|MAKEARRAY|BYROW|BYCOL)$/;
/** Functions of whole arrays: a name of LAMBDA inside one is a single value there, and can't stand for the array. */
const OF_ARRAYS =
  /^(SUM|MAX|MIN|COUNT|AVERAGE|MEDIAN|STDEV\.[SP]|VAR\.[SP]|DEVSQ|SKEW|KURT|SMALL|LARGE|INDEX|AND|OR|MMULT|GCD|CORREL|PERCENTILE\.INC)$/;
const LONGEST = 30_000;

interface Given {
  /** Names given by LET and LAMBDA, as the texts that they stand for. */
  readonly names: ReadonlyMap<string, string>;
  readonly cellFor: (formula: string) => string;
}

/** Thrown with the name of the function that stands in the way. */
export class Lacking extends Error {}

/**
 * A formula in the words of LibreOffice 7.4, to be entered as an array formula: names of LET are put in where they are used, MAP by its
 * array (which lifts by itself), SEQUENCE by row numbers, SORT by SMALL, REDUCE by a cell a round. `cellFor` puts a formula into a cell
 * of its own and gives its address. Throws Lacking where that can't be done.
 */
export function officeFormula(formula: string, cellFor: (formula: string) => string): string {
  const text = print(parse(tokenize(formula, { withLocation: true })), { names: new Map(), cellFor });
  if (text.length > LONGEST) throw new Lacking("LET, too long without it");
  return text;
}

function print(node: AstExpression | null, given: Given): string {
  if (node === null) return "";
  switch (node.type) {
    case "Literal":
      return typeof node.value === "string" ? `"${node.value.replace(/"/g, '""')}"` : String(node.value).toUpperCase();
    case "ErrorLiteral":
      return node.value;
    case "ReferenceIdentifier":
      return given.names.get(node.value.toLowerCase()) ?? node.value;
    case "ArrayExpression":
      return `{${node.elements.map((row) => row.map((one) => print(one, given)).join(",")).join(";")}}`;
    case "UnaryExpression": {
      const inside = print(node.arguments[0]!, given);
      return node.operator === "%" ? `(${inside}%)` : `(${node.operator}${inside})`;
    }
    case "BinaryExpression": {
      const [left, right] = node.arguments.map((one) => print(one, given));
      return `(${left!}${node.operator}${right!})`;
    }
    case "LetExpression": {
      const names = new Map(given.names);
      for (const { id, init } of node.declarations) {
        const text = print(init, { ...given, names });
        if (text.length > LONGEST) throw new Lacking("LET, too long without it");
        names.set(id.name.toLowerCase(), text);
      }
      return print(node.body, { ...given, names });
    }
    case "CallExpression":
      return printCall(node, given);
    case "LambdaExpression":
      throw new Lacking("LAMBDA");
  }
}

function printCall(node: CallExpression, given: Given): string {
  const name = node.callee.name.toUpperCase();
  const args = () => node.arguments.map((one) => print(one, given));
  if (name === "MAP") return printMap(node, given);
  if (name === "SEQUENCE") return printSequence(args());
  if (name === "REDUCE") return printReduce(node, given);
  if (name === "SORT" || name === "TAKE" || name === "DROP") return printSorted(node, given);
  if (LACKING.test(name)) throw new Lacking(name);
  return `${name}(${args().join(",")})`;
}

/** The body of the LAMBDA with the arrays in place of its names. */
function printMap(node: CallExpression, given: Given): string {
  const lambda = node.arguments.at(-1) as LambdaExpression;
  const arrays = node.arguments.slice(0, -1).map((one) => print(one, given));
  const names = new Set(lambda.params.map(({ name }) => name.toLowerCase()));
  if (usedInAggregate(lambda.body, names, false)) throw new Lacking("MAP of an aggregate");
  return print(lambda.body, withNames(given, lambda, arrays));
}

function withNames(given: Given, { params }: LambdaExpression, texts: readonly string[]): Given {
  const names = new Map(given.names);
  params.forEach(({ name }, index) => names.set(name.toLowerCase(), texts[index]!));
  return { ...given, names };
}

/** Each round in a cell of its own, which the next one refers to. */
function printReduce({ arguments: [start, array, lambda] }: CallExpression, given: Given): string {
  let reached = print(start!, given);
  for (const item of items(array!, given))
    reached = given.cellFor(
      print((lambda as LambdaExpression).body, withNames(given, lambda as LambdaExpression, [reached, item])),
    );
  return reached;
}

/** The cells of a column, or the numbers of a SEQUENCE whose count is written out. */
function items(array: AstExpression, given: Given): string[] {
  if (array.type === "ReferenceIdentifier") {
    const area = parseAddress(given.names.get(array.value.toLowerCase()) ?? array.value);
    if (!area) throw new Lacking("REDUCE");
    const { top, left, bottom } = area;
    return Array.from({ length: bottom - top + 1 }, (_, i) =>
      formatAddress({ top: top + i, left, bottom: top + i, right: left }),
    );
  }
  const call = array.type === "CallExpression" && array.callee.name.toUpperCase() === "SEQUENCE" ? array : undefined;
  const [count = "", columns = "1", start = "1", step = "1"] = call
    ? call.arguments.map((one) => print(one, given))
    : [];
  if (!/^\d+$/.test(count) || columns !== "1") throw new Lacking("REDUCE");
  return Array.from({ length: Number(count) }, (_, i) => `(${start}+${i}*${step})`);
}

/** True where one of the names stands inside a function of whole arrays. */
function usedInAggregate(node: unknown, names: ReadonlySet<string>, inside: boolean): boolean {
  if (Array.isArray(node)) return node.some((one) => usedInAggregate(one, names, inside));
  if (typeof node !== "object" || node === null) return false;
  const { type, value, callee } = node as { type?: string; value?: unknown; callee?: { name: string } };
  if (type === "ReferenceIdentifier") return inside && names.has(String(value).toLowerCase());
  const within = inside || (callee !== undefined && OF_ARRAYS.test(callee.name.toUpperCase()));
  return Object.entries(node).some(([key, part]) => key !== "callee" && usedInAggregate(part, names, within));
}

/** The numbers of the rows 1 to n, and from there what is asked. */
function printSequence([rows = "1", columns = "1", start = "1", step = "1"]: readonly string[]): string {
  if (rows !== "1" && columns !== "1") throw new Lacking("SEQUENCE of rows and columns");
  const numbers = `ROW(INDIRECT("1:"&(${rows === "1" ? columns : rows})))`;
  const down = start === "1" && step === "1" ? numbers : `(${start}+(${numbers}-1)*${step})`;
  return rows === "1" && columns !== "1" ? `TRANSPOSE(${down})` : down;
}

/** SORT, and TAKE and DROP of it, from the top: the first to the last of the sorted numbers. */
function printSorted(node: CallExpression, given: Given): string {
  const { numbers, first, count } = sortedPart(node, given);
  return `SMALL(${numbers},${first}+ROW(INDIRECT("1:"&(${count}))))`;
}

function sortedPart(node: AstExpression, given: Given): { numbers: string; first: string; count: string } {
  const name = node.type === "CallExpression" ? node.callee.name.toUpperCase() : "";
  const [inner, size] = node.type === "CallExpression" ? node.arguments : [];
  if (name === "SORT" && size === undefined) {
    const numbers = numbersIn(inner!, given);
    return { numbers, first: "0", count: `COUNT(${numbers})` };
  }
  if ((name !== "TAKE" && name !== "DROP") || !size) throw new Lacking(name || "TAKE");
  const part = sortedPart(inner!, given);
  const rows = print(size, given);
  return name === "TAKE"
    ? { ...part, count: rows }
    : { ...part, first: `(${part.first}+${rows})`, count: `${part.count}-${rows}` };
}

/** Of `TOCOL(x,3)`, which leaves errors out, the numbers alone. */
function numbersIn(node: AstExpression, given: Given): string {
  if (node.type !== "CallExpression" || node.callee.name.toUpperCase() !== "TOCOL") return print(node, given);
  const array = print(node.arguments[0]!, given);
  return `IF(ISNUMBER(${array}),${array},"")`;
}
