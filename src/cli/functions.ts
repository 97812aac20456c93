import { nearestName } from "../functions/nearestName";
import { functionEntry, functionTable } from "../functions/call";
import type { FunctionEntry } from "../sheet/functionTable";
import { Stop, type Command, type Io } from "./io";
import { readArguments } from "./readArguments";

const OPTIONS = { json: "boolean", help: "boolean" } as const;
const LINE = 100;

export const functions: Command = {
  name: "functions",
  usage: "functions [NAME] [--json]",
  summary: "the table of functions, or one of them with its arguments",
  help: `  --json            the whole table (or the one function) as it is used by every part of the tool`,
  run: runFunctions,
};

async function runFunctions(args: readonly string[], io: Io): Promise<number> {
  const { positionals, values } = readArguments("functions", args, OPTIONS);
  const [name, ...more] = positionals;
  if (more.length > 0) throw new Stop(`functions takes one name; ${positionals.length} were given.`);
  if (name === undefined) {
    io.out(values["json"] ? `${JSON.stringify(functionTable, null, 1)}\n` : overview());
    return 0;
  }
  const entry = functionEntry(name);
  if (!entry) {
    const nearest = nearestName(
      name.replace(/^weir[._]/i, ""),
      functionTable.map((one) => one.name),
    );
    throw new Stop(`There is no function ${name}${nearest ? `; the nearest is WEIR.${nearest}` : ""}.`);
  }
  io.out(values["json"] ? `${JSON.stringify(entry, null, 1)}\n` : page(entry));
  return 0;
}

function signature({ name, parameters }: FunctionEntry): string {
  return `WEIR.${name}(${parameters.map((one) => (one.optional ? `[${one.name}]` : one.name)).join(", ")})`;
}

function overview(): string {
  const topics = [...new Set(functionTable.map(({ topic }) => topic))];
  return topics
    .map((topic) => {
      const entries = functionTable.filter((entry) => entry.topic === topic);
      const lines = entries.flatMap((entry) => [`  ${signature(entry)}`, ...wrapped(entry.description, "      ")]);
      return `${topic}\n${lines.join("\n")}\n`;
    })
    .join("\n");
}

function page(entry: FunctionEntry): string {
  const width = Math.max(0, ...entry.parameters.map(({ name }) => name.length));
  const parameters = entry.parameters.flatMap(({ name, description }) => {
    const [first = "", ...rest] = wrapped(description, " ".repeat(width + 4));
    return [`  ${name.padEnd(width)}  ${first.trim()}`, ...rest];
  });
  const examples = entry.examples.map(({ formula, value }) => `  ${formula} → ${value}`);
  const parts = [
    [signature(entry), ...wrapped(entry.description, "")],
    parameters,
    ["Gives:", ...wrapped(entry.returns, "  ")],
    examples.length > 0 ? ["Example:", ...examples] : [],
    entry.cautions.length > 0 ? ["Mind:", ...entry.cautions.flatMap((one) => wrapped(one, "  "))] : [],
  ];
  return `${parts
    .filter((part) => part.length > 0)
    .map((part) => part.join("\n"))
    .join("\n\n")}\n`;
}

function wrapped(text: string, indent: string): string[] {
  const lines: string[] = [];
  let line = indent;
  for (const word of text.split(" ")) {
    if (line.length + word.length > LINE && line.trim() !== "") {
      lines.push(line.trimEnd());
      line = indent;
    }
    line += `${word} `;
  }
  return [...lines, line.trimEnd()];
}
