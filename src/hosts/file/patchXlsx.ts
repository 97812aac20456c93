import { strToU8, zipSync, type Zippable } from "fflate";
import { endSpills, type EndedSpill } from "../../sheet/endSpills";
import { addNotes } from "./addNotes";
import { patchSheet, type CellPatch } from "./patchSheet";
import { sheetParts } from "./readXlsx";
import { listSheet, type ListToWrite } from "./write/listSheet";
import { sheetXml } from "./write/sheetXml";
import { escapeXml } from "./write/xmlText";
import { workbookPart } from "./xlsxParts";
import { addContentType, addRelation, freePart, override, partText, relationsPart, type Parts } from "./writtenParts";
import { edited, walkXml, type Edit } from "./xmlEdits";
import { ZipArchive } from "./zipArchive";

export interface WorkbookPatch {
  /** By sheet, then by `Sheet.key`. */
  readonly cells: ReadonlyMap<string, ReadonlyMap<number, CellPatch>>;
  readonly notes: ReadonlyMap<string, ReadonlyMap<number, string>>;
  /** Results that spill no more; formulas that refer to one get its cells instead. */
  readonly endedSpill: EndedSpill | undefined;
  /** A sheet to add behind the others, under its name or the next free one like it. */
  readonly sheet: ListToWrite;
}

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const STRICT = "http://purl.oclc.org/ooxml/";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const SHEET_TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml";

/**
 * A workbook with some cells patched and a sheet added. Parts that this doesn't concern keep every byte; the order of calculation is
 * left out, since the host makes it anew and takes one that names a cell without a formula for damage.
 */
export function patchXlsx(bytes: Uint8Array, patch: WorkbookPatch): Uint8Array {
  const archive = new ZipArchive(bytes);
  const main = workbookPart(archive);
  const parts: Parts = new Map();
  const dropped = new Set<string>();
  for (const [sheet, part] of sheetParts(archive, main)) {
    const cells = patch.cells.get(sheet);
    if (cells) parts.set(part, patchSheet(partText(archive, parts, part)!, cells));
    const notes = patch.notes.get(sheet);
    if (notes && notes.size > 0) addNotes(archive, parts, part, notes);
    if (patch.endedSpill) rewrite(archive, parts, part, sheet, patch.endedSpill);
  }
  if (patch.endedSpill) rewrite(archive, parts, main, "", patch.endedSpill);
  addSheet(archive, parts, main, patch.sheet);
  dropCalculationOrder(archive, parts, main, dropped);
  if (partText(archive, parts, main)!.includes(STRICT))
    for (const [name, xml] of parts) parts.set(name, strictXml(xml));
  const files: Zippable = {};
  for (const name of archive.names) if (!dropped.has(name) && !parts.has(name)) files[name] = archive.whole(name)!;
  for (const [name, xml] of parts) files[name] = strToU8(xml);
  return zipSync(files);
}

function rewrite(archive: ZipArchive, parts: Parts, part: string, sheet: string, ended: EndedSpill): void {
  const xml = partText(archive, parts, part)!;
  const changed = endSpills(xml, sheet, ended);
  if (changed !== xml) parts.set(part, changed);
}

/** What was put in, in the words of a file of the strict form, which knows no others. */
function strictXml(xml: string): string {
  return xml
    .replaceAll(MAIN, `${STRICT}spreadsheetml/main`)
    .replaceAll(OFFICE, `${STRICT}officeDocument/relationships`);
}

function addSheet(archive: ZipArchive, parts: Parts, main: string, sheet: ListToWrite): void {
  const folder = main.slice(0, main.lastIndexOf("/") + 1);
  const part = freePart(archive, parts, `${folder}worksheets/handover`, ".xml");
  const xml = partText(archive, parts, main)!;
  const taken = new Set<string>();
  let highest = 0;
  let end: Edit | undefined;
  walkXml(
    xml,
    ({ name, attributes }) => {
      if (name !== "sheet") return;
      taken.add((attributes["name"] ?? "").toLowerCase());
      highest = Math.max(highest, Number(attributes["sheetId"]) || 0);
    },
    (tag, start) => {
      if (tag.name === "sheets") end = { start, end: start, text: tag.rawName.replace(/sheets$/, "sheet") };
    },
  );
  let name = sheet.name;
  for (let number = 2; taken.has(name.toLowerCase()); number++) name = `${sheet.name} ${number}`;
  const id = addRelation(archive, parts, main, "worksheet", `/${part}`);
  const inside = `<${end!.text} xmlns:r="${OFFICE}" name="${escapeXml(name)}" sheetId="${highest + 1}" r:id="${id}"/>`;
  parts.set(main, edited(xml, [{ ...end!, text: inside }]));
  parts.set(part, sheetXml(listSheet(sheet), { styles: undefined, dynamic: false }, false));
  addContentType(archive, parts, override(part, SHEET_TYPE));
}

function dropCalculationOrder(archive: ZipArchive, parts: Parts, main: string, dropped: Set<string>): void {
  const folder = main.slice(0, main.lastIndexOf("/") + 1);
  const part = `${folder}calcChain.xml`;
  if (!archive.has(part)) return;
  dropped.add(part);
  const without = (name: string, matches: (attributes: Readonly<Record<string, string>>) => boolean) => {
    const xml = partText(archive, parts, name)!;
    const edits: Edit[] = [];
    walkXml(
      xml,
      () => undefined,
      (tag, _, end) => {
        if (tag.depth === 1 && matches(tag.attributes)) edits.push({ start: tag.start, end, text: "" });
      },
    );
    parts.set(name, edited(xml, edits));
  };
  without(relationsPart(main), ({ Type = "" }) => Type.endsWith("/calcChain"));
  without("[Content_Types].xml", ({ PartName = "" }) => PartName === `/${part}`);
}
