// The table of functions, read from the JSDoc above each cell function in src/functions.
// `npm run table` writes src/functions/functions.json, with --check it only compares; a test calls functionTable() and compares.
import { readFileSync, readdirSync, writeFileSync } from "node:fs";
import { basename, dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import ts from "typescript";

const folder = join(dirname(fileURLToPath(import.meta.url)), "../src/functions");
const TOPICS = ["plan", "describe", "cutoff", "search", "stopping", "risk", "combine", "watch", "simulate", "audit"];

/** @returns {object[]} one entry a function, in the order of the topics and of the files. */
export function functionTable() {
  const files = readdirSync(folder).filter((file) => file.endsWith(".ts"));
  return TOPICS.flatMap((topic) =>
    files
      .filter((file) => basename(file, ".ts") === topic || basename(file, ".ts").startsWith(`${topic}.`))
      .sort()
      .flatMap((file) => readTopic(topic, join(folder, file))),
  );
}

function readTopic(topic, path) {
  const source = ts.createSourceFile(path, readFileSync(path, "utf8"), ts.ScriptTarget.ES2020, true);
  const entries = [];
  source.forEachChild((node) => {
    if (!ts.isFunctionDeclaration(node) || !node.name) return;
    const tags = ts.getJSDocTags(node);
    const id = tags.find((tag) => tag.tagName.text === "customfunction");
    if (id) entries.push(readEntry(topic, node, tags, text(id.comment)));
  });
  return entries;
}

function readEntry(topic, node, tags, id) {
  const name = node.name.text;
  const fail = (what) => {
    throw new Error(`${topic}: ${name}: ${what}`);
  };
  if (id !== name) fail(`@customfunction says "${id}"`);
  if (!/^[A-Z][A-Z0-9_.]{2,127}$/.test(name)) fail("is no name for a cell function");
  if (/^[A-Z]{1,3}\d+$/.test(name)) fail("reads like a cell address");
  const all = (tag) => tags.filter((one) => one.tagName.text === tag).map((one) => text(one.comment));
  const description = text(node.jsDoc.at(-1).comment) || fail("has no description");
  const paramTags = tags.filter(ts.isJSDocParameterTag);
  const choices = Object.fromEntries(
    all("choices").map((line) => [line.split(" ")[0], [...line.matchAll(/"([^"]*)"/g)].map((m) => m[1])]),
  );
  const takesAddresses = tags.some((tag) => tag.tagName.text === "requiresParameterAddresses");
  const declared = node.parameters.slice(0, takesAddresses ? -1 : undefined);
  const parameters = declared.map((parameter) => {
    const argument = parameter.name.text;
    const tag = paramTags.find((one) => one.name.getText() === argument) ?? fail(`describes no ${argument}`);
    const type = parameter.type?.getText();
    if (type !== "any" && type !== "any[][]") fail(`${argument} must be any or any[][]`);
    return {
      name: argument,
      description: text(tag.comment).replace(/^-\s*/, "") || fail(`says nothing of ${argument}`),
      optional: parameter.questionToken !== undefined,
      dimensionality: type === "any" ? "scalar" : "matrix",
      ...(choices[argument] && { choices: choices[argument] }),
    };
  });
  for (const argument of Object.keys(choices))
    if (!parameters.some((one) => one.name === argument)) fail(`@choices of an unknown ${argument}`);
  const examples = all("example").map((line) => {
    const [formula, value] = line.split(" => ");
    if (!formula?.startsWith("=WEIR.") || !value) fail(`@example must read =WEIR.X(…) => value: ${line}`);
    return { formula: formula.trim(), value: value.trim() };
  });
  if (examples.length === 0) fail("has no @example");
  const returnTag = tags.find(ts.isJSDocReturnTag) ?? fail("has no @returns");
  return {
    name,
    topic,
    description,
    parameters,
    returns: text(returnTag.comment),
    result: returnTag.typeExpression?.type.getText() === "any[][]" ? "matrix" : "scalar",
    helpPath: `help/${name}.html`,
    examples,
    questions: all("question"),
    cautions: all("caution"),
    takesAddresses,
  };
}

function text(comment) {
  return (typeof comment === "string" ? comment : (comment ?? []).map((part) => part.text).join(""))
    .replace(/\s+/g, " ")
    .trim();
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  const table = functionTable();
  const path = join(folder, "functions.json");
  const text = `${JSON.stringify(table, null, 1)}\n`;
  if (!process.argv.includes("--check")) writeFileSync(path, text);
  else if (readFileSync(path, "utf8") !== text) {
    console.error("functions.json is not what the JSDoc says. Run: npm run table");
    process.exitCode = 1;
  }
  console.log(`${table.length} functions`);
}
