import { splitRecords } from "./splitRecords";

/** Strongest first: a comma may be a decimal comma, a semicolon or a tab is hardly ever anything but a separator. */
const CANDIDATES = ["\t", ";", ","] as const;
export type Separator = (typeof CANDIDATES)[number];

const RECORDS_LOOKED_AT = 200;
const CHARACTERS_LOOKED_AT = 200_000;

/**
 * Finds what parts the fields: the candidate that cuts the most of the first records into the same number of fields, more than one.
 * A file of one column has none; a comma does no harm there.
 */
export function findSeparator(text: string): Separator {
  const told = /^sep=([\t;,])\r?\n?/i.exec(text);
  if (told) return told[1] as Separator;
  const head = text.slice(0, CHARACTERS_LOOKED_AT);
  let best: Separator = ",";
  let most = 0;
  for (const candidate of CANDIDATES) {
    const alike = alikeRecords(head, candidate, head.length < text.length);
    if (alike > most) {
      most = alike;
      best = candidate;
    }
  }
  return best;
}

function alikeRecords(head: string, separator: Separator, cut: boolean): number {
  // The head may end inside quotes; a closing quote costs nothing where it doesn't.
  const records = splitRecords(cut && oddQuotes(head) ? `${head}"` : head, separator, RECORDS_LOOKED_AT);
  const counts = new Map<number, number>();
  for (const { length } of records) if (length > 1) counts.set(length, (counts.get(length) ?? 0) + 1);
  return Math.max(0, ...counts.values());
}

function oddQuotes(text: string): boolean {
  return text.split('"').length % 2 === 0;
}
