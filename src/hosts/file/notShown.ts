import type { ZipArchive } from "./zipArchive";

/** What a workbook may hold beside cells, by what people call it. */
export type Extra =
  | "charts"
  | "pictures"
  | "pivots"
  | "notes"
  | "controls"
  | "otherWorkbooks"
  | "conditions"
  | "validations"
  | "links"
  | "decoration";

/** How many of each there are in a file, as far as that can be counted. */
export type Extras = Map<Extra, number>;

const PARTS: readonly (readonly [Extra, RegExp])[] = [
  ["charts", /^xl\/(charts\/chart(Ex)?\d+\.xml|chartsheets\/sheet)/],
  ["pictures", /^xl\/media\//],
  ["pivots", /^xl\/pivotTables\/pivotTable/],
  ["notes", /^xl\/(threadedComments\/threadedComment|(weirmarkNotes|comments)\d*\.xml$)/],
  ["controls", /^xl\/(ctrlProps|activeX|slicers|embeddings)\//],
  ["otherWorkbooks", /^xl\/externalLinks\/externalLink/],
];
const TAGS: Readonly<Record<string, Extra>> = {
  conditionalFormatting: "conditions",
  dataValidation: "validations",
  hyperlink: "links",
};

/** What of a file's parts no reader here reads. */
export function extraParts(archive: ZipArchive): Extras {
  const extras: Extras = new Map();
  for (const name of archive.names)
    for (const [extra, pattern] of PARTS) if (pattern.test(name)) countExtra(extras, extra);
  return extras;
}

/** Counts a tag of a sheet, where it is one of those that are not read. */
export function countTag(extras: Extras, tag: string): void {
  const extra = TAGS[tag];
  if (extra) countExtra(extras, extra);
}

export function countExtra(extras: Extras, extra: Extra): void {
  extras.set(extra, (extras.get(extra) ?? 0) + 1);
}
