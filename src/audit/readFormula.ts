import { parse, tokenize, type AstExpression, type Token } from "@borgar/fx/xlsx";
import { UnreadableFormula } from "./value";

export const MOST_CHARACTERS = 8_192;
const DEEPEST = 128;
const MOST_REMEMBERED = 20_000;
const remembered = new Map<string, AstExpression | UnreadableFormula>();

/**
 * Reads a formula, with or without its "=", as it is typed or as a file stores it. Formulas are remembered by their text. Longer than a
 * sheet allows, or nested deeper than anyone writes: refused, so that no file can exhaust the stack.
 */
export function readFormula(text: string): AstExpression {
  let known = remembered.get(text);
  if (known === undefined) {
    known = attempt(text);
    if (remembered.size >= MOST_REMEMBERED) remembered.clear();
    remembered.set(text, known);
  }
  if (known instanceof UnreadableFormula) throw known;
  return known;
}

function attempt(text: string): AstExpression | UnreadableFormula {
  if (text.length > MOST_CHARACTERS)
    return new UnreadableFormula(`it has ${text.length} characters; a cell takes ${MOST_CHARACTERS}`);
  try {
    const tokens = withoutStrayPrefixes(tokenize(text.startsWith("=") ? text : `=${text}`, { withLocation: true }));
    refuseDepth(tokens);
    return parse(tokens);
  } catch (failure) {
    return failure instanceof UnreadableFormula ? failure : new UnreadableFormula(reason(failure, text));
  }
}

/** `[2]!` before one of our functions and `Bids!` before #REF! are written by hosts, and say nothing. */
function withoutStrayPrefixes(tokens: Token[]): Token[] {
  return tokens.filter((_, index) => {
    const prefix = tokens[index]!.type === "context" ? index : index - 1;
    const [first, mark, behind] = tokens.slice(prefix, prefix + 3);
    if (first?.type !== "context" || mark?.value !== "!") return true;
    return !(behind?.type === "func" || (behind?.type === "error" && behind.value.toUpperCase() === "#REF!"));
  });
}

function refuseDepth(tokens: readonly Token[]): void {
  let depth = 0;
  let run = 0;
  for (const { type, value } of tokens) {
    if (value === "(") depth++;
    else if (value === ")") depth--;
    // A row of signs nests as deep as it is long.
    run = type === "operator" && value !== ")" ? run + 1 : type === "whitespace" ? run : 0;
    if (depth > DEEPEST || run > DEEPEST) throw new UnreadableFormula(`it is nested more than ${DEEPEST} deep`);
  }
}

function reason(failure: unknown, text: string): string {
  const message = failure instanceof Error ? failure.message : String(failure);
  const bare = text.replace(/"[^"]*"/g, '""');
  const missing = [...bare].reduce((depth, c) => depth + (c === "(" ? 1 : c === ")" ? -1 : 0), 0);
  if (text.replace(/^=/, "").trim() === "") return "it is empty";
  if (missing > 0) return "a bracket is not closed";
  if (missing < 0) return "a bracket is closed that was never opened";
  if (message.includes("Unexpected , operator") || bare.replace(/\{[^}]*\}/g, "").includes(";"))
    return "arguments are parted by commas, decimals by a point";
  if (message.includes("(END)")) return "something stands behind its end";
  if (message === "Invalid syntax") return "a sign or a value is missing or one too many";
  return message.charAt(0).toLowerCase() + message.slice(1);
}
