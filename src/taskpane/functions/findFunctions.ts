import type { FunctionEntry } from "../../sheet/functionTable";

/** The topics in the order in which a user meets them. */
export const TOPICS = [
  "plan",
  "describe",
  "cutoff",
  "search",
  "stopping",
  "risk",
  "combine",
  "watch",
  "simulate",
  "audit",
] as const;
export type Topic = (typeof TOPICS)[number];

/** The functions that fit what was typed, best first: every word must occur in name, summary, questions or parameters. */
export function findFunctions(table: readonly FunctionEntry[], typed: string, topic: string): FunctionEntry[] {
  const words = typed
    .toLowerCase()
    .split(/[\s,;?]+/)
    .filter((word) => word !== "");
  return table
    .filter((entry) => topic === "" || entry.topic === topic)
    .map((entry) => ({ entry, rank: rankOf(entry, words) }))
    .filter(({ rank }) => rank !== undefined)
    .sort((a, b) => b.rank! - a.rank! || order(a.entry) - order(b.entry))
    .map(({ entry }) => entry);
}

function order({ topic }: FunctionEntry): number {
  const at = TOPICS.indexOf(topic as Topic);
  return at < 0 ? TOPICS.length : at;
}

/** Where the words were found: in the name counts most, then in a question, then in the rest. Undefined where one was found nowhere. */
function rankOf(
  { name, description, questions, parameters }: FunctionEntry,
  words: readonly string[],
): number | undefined {
  const spoken = name.toLowerCase().replace(/_/g, " ");
  const asked = questions.join(" ").toLowerCase();
  const rest = [description, ...parameters.map((one) => `${one.name} ${one.description}`)].join(" ").toLowerCase();
  let rank = 0;
  for (const word of words) {
    // A plural or an ending more or less is the same word to whoever asks.
    const stem = word.length > 4 ? word.replace(/(es|s|ed|ing)$/, "") : word;
    if (spoken.includes(stem) || name.toLowerCase().includes(word)) rank += 4;
    else if (asked.includes(stem)) rank += 2;
    else if (rest.includes(stem)) rank += 1;
    else if (!SMALL_WORDS.has(word)) return undefined;
  }
  return rank;
}

/** Words of a question that say nothing of what is asked. */
const SMALL_WORDS = new Set(
  "a an and are at be by can do does for from how i if in is it many may me much must my of on one or that the this to what when where which will with".split(
    " ",
  ),
);
