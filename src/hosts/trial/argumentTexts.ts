/**
 * The arguments of the one call of `name` in a formula, as typed. Undefined where the formula calls it twice, since nobody can then
 * tell which of the two is being computed.
 */
export function argumentTexts(formula: string, name: string): string[] | undefined {
  const spelling = name.replace(/\./g, "[._]");
  const calls = [...withoutTexts(formula).matchAll(new RegExp(`(?:WEIR\\.|_XLDUDF_WEIR_)${spelling}\\s*\\(`, "gi"))];
  if (calls.length !== 1) return undefined;
  const start = calls[0]!.index + calls[0]![0].length;
  const blind = withoutTexts(formula);
  const texts: string[] = [];
  let depth = 0;
  let from = start;
  for (let place = start; place < formula.length; place++) {
    const sign = blind[place]!;
    if (depth === 0 && (sign === "," || sign === ")")) {
      texts.push(formula.slice(from, place).trim());
      from = place + 1;
      if (sign === ")") return texts;
    } else if (sign === "(" || sign === "{") depth++;
    else if (sign === ")" || sign === "}") depth--;
  }
  return undefined;
}

/** The formula with texts and quoted sheet names blanked out, place by place: a comma inside them parts nothing. */
function withoutTexts(formula: string): string {
  return formula.replace(/"(?:[^"]|"")*"|'(?:[^']|'')*'/g, (quoted) => " ".repeat(quoted.length));
}
