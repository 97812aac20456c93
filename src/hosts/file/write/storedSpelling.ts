import { stringifyTokens, tokenize, type Token } from "@borgar/fx/xlsx";
import { NEWER_FUNCTIONS, NEWER_SHEET_FUNCTIONS } from "./newerFunctions";

const OURS = /^(?:_xldudf_|_xll\.)?weir[._](.+)$/i;

/**
 * A typed formula as a file stores it, without its "=": our functions as `_xldudf_WEIR_NAME`, functions newer than the format with
 * `_xlfn.`, parameters of LET and LAMBDA with `_xlpm.`, `A1#` and `@A1` as calls. What can't be read is stored as it is.
 */
export function storedSpelling(formula: string): string {
  const text = formula.replace(/^=/, "");
  let tokens: Token[];
  try {
    tokens = tokenize(`=${text}`, { mergeRefs: true });
  } catch {
    return text;
  }
  const parameters = parameterNames(tokens);
  const spelled = tokens.map((token) => {
    if (token.type === "func") return { ...token, value: storedName(token.value) };
    const named = token.type.startsWith("range") && parameters.has(token.value.toLowerCase());
    return named ? { ...token, value: `_xlpm.${token.value}` } : token;
  });
  return stringifyTokens(asCalls(spelled)).replace(/^=/, "");
}

function storedName(name: string): string {
  const ours = OURS.exec(name)?.[1];
  if (ours !== undefined) return `_xldudf_WEIR_${ours.toUpperCase().replace(/\./g, "_")}`;
  const plain = name.replace(/^(_xlfn\.|_xlws\.)+/i, "").toUpperCase();
  if (NEWER_SHEET_FUNCTIONS.has(plain)) return `_xlfn._xlws.${plain}`;
  return NEWER_FUNCTIONS.has(plain) ? `_xlfn.${plain}` : name;
}

/** The names that LET and LAMBDA bind: an argument that is nothing but a name, at a place where they bind one. */
function parameterNames(tokens: readonly Token[]): ReadonlySet<string> {
  const names = new Set<string>();
  const open: { binds: "LET" | "LAMBDA" | undefined; argument: number }[] = [];
  const solid = tokens.filter(({ type }) => type !== "whitespace" && type !== "newline");
  solid.forEach((token, index) => {
    const call =
      solid[index - 1]?.type === "func" ? solid[index - 1]!.value.replace(/^_xlfn\./i, "").toUpperCase() : "";
    const inside = open[open.length - 1];
    if (token.value === "(") open.push({ binds: call === "LET" || call === "LAMBDA" ? call : undefined, argument: 0 });
    else if (token.value === ")") open.pop();
    else if (token.value === "," && token.type === "operator" && inside) inside.argument++;
    else if (inside?.binds && token.type.startsWith("range")) {
      const alone = /^[(,]$/.test(solid[index - 1]?.value ?? "") && solid[index + 1]?.value === ",";
      if (alone && (inside.binds === "LAMBDA" || inside.argument % 2 === 0))
        names.add(token.value.replace(/^_xlpm\./i, "").toLowerCase());
    }
  });
  return names;
}

/** `A1#` becomes `_xlfn.ANCHORARRAY(A1)`, `@A1` becomes `_xlfn.SINGLE(A1)`. */
function asCalls(tokens: readonly Token[]): Token[] {
  const out: Token[] = [];
  const put = (value: string) => out.push({ type: "operator", value } as Token);
  tokens.forEach((token, index) => {
    const before = tokens[index - 1];
    const behind = tokens[index + 1];
    if (token.value === "@" && token.type === "operator") {
      // Before a call of ours it says nothing that the stored call doesn't say.
      if (behind?.type.startsWith("range")) put("_xlfn.SINGLE(");
      return;
    }
    const spilled = token.type.startsWith("range") && behind?.value === "#";
    if (token.value === "#" && before?.type.startsWith("range")) return;
    if (spilled) put("_xlfn.ANCHORARRAY(");
    out.push(token);
    if (spilled) put(")");
    if (token.type.startsWith("range") && before?.value === "@") put(")");
  });
  return out;
}
