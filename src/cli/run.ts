import { nearestName } from "../functions/nearestName";
import { NUMBERS_REVISION, RELEASE_NAME, RELEASE_VERSION } from "../core/release";
import { audit } from "./audit";
import { calc } from "./calc";
import { functions } from "./functions";
import { handover } from "./handover";
import { Stop, type Command, type Io } from "./io";
import { plan } from "./plan";
import { printable } from "../report/plainText";

const COMMANDS: readonly Command[] = [calc, plan, audit, handover, functions];

/** Runs the command line and gives its exit code. A fault of the input is a sentence on standard error and 2, never a stack. */
export async function run(args: readonly string[], io: Io): Promise<number> {
  const [name, ...rest] = args;
  if (name === "--version" || name === "-V") {
    io.out(`${RELEASE_NAME} ${RELEASE_VERSION}, revision ${NUMBERS_REVISION} of the numbers\n`);
    return 0;
  }
  if (name === undefined || name === "--help" || name === "-h" || name === "help") {
    const asked = COMMANDS.find((command) => command.name === rest[0]);
    (name === undefined ? io.err : io.out)(asked ? commandHelp(asked) : overview());
    return name === undefined ? 2 : 0;
  }
  const command = COMMANDS.find((one) => one.name === name);
  if (!command) {
    const nearest = nearestName(
      name,
      COMMANDS.map((one) => one.name),
    );
    io.err(
      `weirmark has no command ${printable(name)}${nearest ? `; did you mean ${nearest}?` : "."} See weirmark --help.\n`,
    );
    return 2;
  }
  const end = rest.indexOf("--");
  if ((end < 0 ? rest : rest.slice(0, end)).some((arg) => arg === "--help" || arg === "-h")) {
    io.out(commandHelp(command));
    return 0;
  }
  try {
    return await command.run(rest, io);
  } catch (failure) {
    if (!(failure instanceof Stop)) throw failure;
    io.err(`weirmark: ${printable(failure.message)}\n`);
    return 2;
  }
}

function overview(): string {
  const width = Math.max(...COMMANDS.map(({ name }) => name.length));
  const lines = COMMANDS.map(({ name, summary }) => `  ${name.padEnd(width)}  ${summary}`);
  return `weirmark COMMAND …   set, trust and prove a pass mark on a score column

${lines.join("\n")}

weirmark COMMAND --help tells more of one; weirmark --version says which release this is.
A cutoff over people is no decision: local law and licensed practice come first.
`;
}

function commandHelp({ usage, summary, help }: Command): string {
  return `weirmark ${usage}\n\n${summary.charAt(0).toUpperCase()}${summary.slice(1)}.\n\n${help}\n`;
}
