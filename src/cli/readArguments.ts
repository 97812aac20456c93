import { parseArgs, type ParseArgsConfig } from "node:util";
import { nearestName } from "../functions/nearestName";
import { Stop } from "./io";

export type OptionKinds = Readonly<Record<string, "boolean" | "string">>;

export interface ReadArguments {
  readonly positionals: readonly string[];
  readonly values: Readonly<Record<string, string | boolean | undefined>>;
}

/** The options and the rest of a command's arguments; what it doesn't know ends it, with the options that there are. */
export function readArguments(command: string, args: readonly string[], kinds: OptionKinds): ReadArguments {
  const options: NonNullable<ParseArgsConfig["options"]> = {};
  for (const [name, type] of Object.entries(kinds)) options[name] = { type, ...(name === "out" && { short: "o" }) };
  try {
    const { values, positionals } = parseArgs({ args: [...args], options, allowPositionals: true, strict: true });
    return { values: values as ReadArguments["values"], positionals };
  } catch (failure) {
    throw new Stop(explain(command, kinds, failure));
  }
}

function explain(command: string, kinds: OptionKinds, failure: unknown): string {
  const { code, message } = failure as { code?: string; message: string };
  const known = Object.keys(kinds);
  const named = /'(-[^' ]*)/.exec(message)?.[1] ?? "";
  if (code === "ERR_PARSE_ARGS_UNKNOWN_OPTION") {
    const nearest = nearestName(named.replace(/^-+/, ""), known);
    const hint = nearest ? ` Did you mean --${nearest}?` : "";
    return `${command} has no option ${named}.${hint} It has ${known.map((name) => `--${name}`).join(", ")}. (A formula that begins with “-” goes behind “--”, or is given an “=” in front.)`;
  }
  const option = /--[a-z-]+/.exec(message)?.[0] ?? named;
  if (kinds[option.slice(2)] === "boolean") return `The option ${option} takes no value.`;
  return `The option ${option} needs a value behind it.`;
}
