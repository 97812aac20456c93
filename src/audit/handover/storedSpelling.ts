import { stringifyTokens, tokenize, type Token } from "@borgar/fx/xlsx";

/** Functions without a point in their names that came after the file format was fixed: files spell them with a prefix. */
const NEWER =
  /^(LET|LAMBDA|MAP|REDUCE|SCAN|BYROW|BYCOL|MAKEARRAY|SEQUENCE|UNIQUE|SORTBY|XLOOKUP|XMATCH|IFS|SWITCH|CONCAT|TEXTJOIN|MAXIFS|MINIFS|IFNA|XOR|PHI|GAUSS|GAMMA|PERMUTATIONA|COMBINA|DAYS|TAKE|DROP|VSTACK|HSTACK|TOCOL|TOROW|CHOOSECOLS|CHOOSEROWS|EXPAND|WRAPROWS|WRAPCOLS|BITAND|BITOR|BITXOR|NUMBERVALUE|SINGLE|ANCHORARRAY)$/;
const NEWEST = /^(FILTER|SORT)$/;
/** With a point, but as old as the format. */
const OLD_WITH_POINT = /^(ERROR\.TYPE|NETWORKDAYS\.INTL|WORKDAY\.INTL|ISO\.CEILING)$/;

/** A formula as typed, in the spelling of files: prefixes before newer functions and before the names that LET and LAMBDA give. */
export function storedSpelling(typed: string): string {
  const tokens = tokenize(typed);
  const given = givenNames(tokens);
  return stringifyTokens(
    tokens.map((token) => {
      if (token.type === "func") return { ...token, value: storedFunction(token.value) };
      if (token.type === "range_named" && given.has(token.value.toLowerCase()))
        return { ...token, value: `_xlpm.${token.value}` };
      return token;
    }),
  );
}

function storedFunction(name: string): string {
  const upper = name.toUpperCase();
  if (upper.startsWith("_XL")) return name;
  if (NEWEST.test(upper)) return `_xlfn._xlws.${upper}`;
  if (NEWER.test(upper)) return `_xlfn.${upper}`;
  return upper.includes(".") && !OLD_WITH_POINT.test(upper) ? `_xlfn.${upper}` : name;
}

/** The names that stand where LET and LAMBDA take one: right behind their bracket or a comma of theirs, before a comma. */
function givenNames(tokens: readonly Token[]): ReadonlySet<string> {
  const names = new Set<string>();
  const open: string[] = [];
  tokens.forEach(({ type, value }, index) => {
    if (value === "(") open.push(tokens[index - 1]?.type === "func" ? tokens[index - 1]!.value.toUpperCase() : "");
    else if (value === ")") open.pop();
    const inside = /(LET|LAMBDA)$/.test(open[open.length - 1] ?? "");
    const before = tokens[index - 1]?.value;
    if (inside && type === "range_named" && (before === "(" || before === ",") && tokens[index + 1]?.value === ",")
      names.add(value.toLowerCase());
  });
  return names;
}
