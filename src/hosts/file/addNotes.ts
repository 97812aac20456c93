import { formatAddress } from "../../sheet/address";
import { addContentType, addRelation, freePart, override, partText, type Parts } from "./writtenParts";
import { escapeXml } from "./write/xmlText";
import { readRelations } from "./xlsxParts";
import { edited, walkXml, type Edit } from "./xmlEdits";
import type { ZipArchive } from "./zipArchive";

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const NOTES_TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml.comments+xml";
const DRAWING_TYPE = "application/vnd.openxmlformats-officedocument.vmlDrawing";
const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const COLUMNS = 16_384;
/** What stands behind a sheet's old-style drawing, in the order of the format. */
const BEHIND_DRAWING = /^(legacyDrawingHF|drawingHF|picture|oleObjects|controls|webPublishItems|tableParts|extLst)$/;

/**
 * Puts notes on cells of a sheet, as the hover notes of the host. A sheet that has notes or old-style drawings of its own keeps them and gets
 * none: two parts of the one kind are taken for damage, and what is noted stands on the added sheet as well.
 */
export function addNotes(archive: ZipArchive, parts: Parts, part: string, notes: ReadonlyMap<number, string>): void {
  if (readRelations(archive, part).some(({ kind }) => kind === "comments" || kind === "vmlDrawing")) return;
  const xml = partText(archive, parts, part)!;
  let place: Edit | undefined;
  let own = false;
  walkXml(
    xml,
    (tag) => {
      own ||= tag.depth === 1 && tag.name === "legacyDrawing";
      if (tag.depth === 1 && BEHIND_DRAWING.test(tag.name)) place ??= { start: tag.start, end: tag.start, text: "" };
    },
    (tag, start) => {
      if (tag.depth === 0) place ??= { start, end: start, text: "" };
    },
  );
  if (own || !place) return;
  const folder = part.replace(/worksheets\/[^/]*$/, "");
  const comments = freePart(archive, parts, `${folder}weirmarkNotes`, ".xml");
  const drawing = freePart(archive, parts, `${folder}drawings/weirmarkNotes`, ".vml");
  parts.set(comments, commentsXml(notes));
  parts.set(drawing, drawingXml(notes));
  addRelation(archive, parts, part, "comments", `/${comments}`);
  const id = addRelation(archive, parts, part, "vmlDrawing", `/${drawing}`);
  addContentType(archive, parts, override(comments, NOTES_TYPE) + override(drawing, DRAWING_TYPE));
  parts.set(
    part,
    edited(xml, [{ ...place, text: `<legacyDrawing xmlns="${MAIN}" xmlns:r="${OFFICE}" r:id="${id}"/>` }]),
  );
}

function places(notes: ReadonlyMap<number, string>) {
  return [...notes]
    .sort(([a], [b]) => a - b)
    .map(([key, text]) => ({ row: Math.floor(key / COLUMNS), column: key % COLUMNS, text }));
}

function commentsXml(notes: ReadonlyMap<number, string>): string {
  const list = places(notes).map(({ row, column, text }) => {
    const address = formatAddress({ top: row, left: column, bottom: row, right: column });
    return `<comment ref="${address}" authorId="0"><text><t xml:space="preserve">${escapeXml(text)}</t></text></comment>`;
  });
  return `${HEAD}<comments xmlns="${MAIN}"><authors><author>Weirmark</author></authors><commentList>${list.join("")}</commentList></comments>`;
}

/** The boxes of the notes, hidden until the pointer rests on the cell. */
function drawingXml(notes: ReadonlyMap<number, string>): string {
  const shapes = places(notes).map(
    ({ row, column }, index) =>
      `<v:shape id="_x0000_s${1025 + index}" type="#_x0000_t202" style="position:absolute;visibility:hidden;width:240pt;height:90pt" fillcolor="#ffffe1" o:insetmode="auto"><v:fill color2="#ffffe1"/><v:path o:connecttype="none"/><v:textbox/><x:ClientData ObjectType="Note"><x:MoveWithCells/><x:SizeWithCells/><x:Anchor>${column + 1}, 15, ${row}, 2, ${column + 5}, 15, ${row + 6}, 4</x:Anchor><x:AutoFill>False</x:AutoFill><x:Row>${row}</x:Row><x:Column>${column}</x:Column></x:ClientData></v:shape>`,
  );
  return `<xml xmlns:v="urn:schemas-microsoft-com:vml" xmlns:o="urn:schemas-microsoft-com:office:office" xmlns:x="urn:schemas-microsoft-com:office:excel"><o:shapelayout v:ext="edit"><o:idmap v:ext="edit" data="1"/></o:shapelayout><v:shapetype id="_x0000_t202" coordsize="21600,21600" o:spt="202" path="m,l,21600r21600,l21600,xe"><v:stroke joinstyle="miter"/><v:path gradientshapeok="t" o:connecttype="rect"/></v:shapetype>${shapes.join("")}</xml>`;
}
