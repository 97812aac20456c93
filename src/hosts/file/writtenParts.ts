import { strFromU8 } from "fflate";
import { appendToRoot, edited, walkXml } from "./xmlEdits";
import type { ZipArchive } from "./zipArchive";

/** The parts of a workbook that are written, as texts. */
export type Parts = Map<string, string>;

const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

export function partText(archive: ZipArchive, parts: Parts, name: string): string | undefined {
  const bytes = parts.has(name) ? undefined : archive.whole(name);
  return parts.get(name) ?? (bytes && strFromU8(bytes));
}

/** The list of relations of a part, and where it stands. */
export function relationsPart(part: string): string {
  const slash = part.lastIndexOf("/");
  return `${part.slice(0, slash + 1)}_rels/${part.slice(slash + 1)}.rels`;
}

/** Adds a relation to a part, and gives its id. */
export function addRelation(archive: ZipArchive, parts: Parts, part: string, kind: string, target: string): string {
  const name = relationsPart(part);
  const xml =
    partText(archive, parts, name) ??
    `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"></Relationships>`;
  const ids = new Set<string>();
  walkXml(
    xml,
    ({ attributes }) => ids.add(attributes["Id"] ?? ""),
    () => undefined,
  );
  let number = 1;
  while (ids.has(`weirmark${number}`)) number++;
  const id = `weirmark${number}`;
  const inside = `<Relationship xmlns="http://schemas.openxmlformats.org/package/2006/relationships" Id="${id}" Type="${OFFICE}/${kind}" Target="${target}"/>`;
  parts.set(name, edited(xml, [appendToRoot(xml, inside)]));
  return id;
}

export function addContentType(archive: ZipArchive, parts: Parts, inside: string): void {
  const xml = partText(archive, parts, "[Content_Types].xml")!;
  parts.set("[Content_Types].xml", edited(xml, [appendToRoot(xml, inside)]));
}

/** `stem1.xml`, or with the next number that is free. */
export function freePart(archive: ZipArchive, parts: Parts, stem: string, ending: string): string {
  let number = 1;
  while (archive.has(`${stem}${number}${ending}`) || parts.has(`${stem}${number}${ending}`)) number++;
  return `${stem}${number}${ending}`;
}

export function override(part: string, type: string): string {
  return `<Override xmlns="http://schemas.openxmlformats.org/package/2006/content-types" PartName="/${part}" ContentType="${type}"/>`;
}
