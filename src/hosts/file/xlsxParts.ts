import { readXml } from "./readXml";
import { UnusableFile } from "./unusableFile";
import type { ZipArchive } from "./zipArchive";

export interface Relation {
  readonly id: string;
  /** The last word of its type: "worksheet", "sharedStrings" … */
  readonly kind: string;
  /** The part it leads to, from the root of the archive. */
  readonly target: string;
}

/** The relations of a part; none where it has no list of them. */
export function readRelations(archive: ZipArchive, part: string): Relation[] {
  const slash = part.lastIndexOf("/");
  const folder = part.slice(0, slash + 1);
  const relations: Relation[] = [];
  readXml(archive, `${folder}_rels/${part.slice(slash + 1)}.rels`, {
    open(name, { Id = "", Type = "", Target = "", TargetMode }) {
      if (name !== "Relationship" || TargetMode === "External") return;
      relations.push({ id: Id, kind: Type.slice(Type.lastIndexOf("/") + 1), target: resolvePart(folder, Target) });
    },
  });
  return relations;
}

/** The part that holds the workbook. What is no workbook, or one with macros in it, is refused. */
export function workbookPart(archive: ZipArchive): string {
  const part = readRelations(archive, "").find(({ kind }) => kind === "officeDocument")?.target;
  if (part?.endsWith(".bin")) throw new UnusableFile("The file is a binary workbook (.xlsb): save it as .xlsx.");
  if (part === undefined || !archive.has(part) || !/workbook/i.test(part))
    throw new UnusableFile("The file is a zip archive, but no workbook (.xlsx) in it.");
  let macros = archive.names.some((name) => /(^|\/)vbaProject\.bin$/i.test(name));
  readXml(archive, "[Content_Types].xml", {
    open(tag, { ContentType = "" }) {
      // Some programs list kinds for endings of which the file has no part: only what is said of a part itself counts.
      macros ||= tag === "Override" && /macroEnabled|vbaProject/i.test(ContentType);
    },
  });
  if (macros) throw new UnusableFile("The file holds macros: save a copy as .xlsx, without them.");
  return part;
}

function resolvePart(folder: string, target: string): string {
  if (target.startsWith("/")) return target.slice(1);
  const steps = folder.split("/").filter(Boolean);
  for (const step of target.split("/")) {
    if (step === "..") steps.pop();
    else if (step !== "" && step !== ".") steps.push(step);
  }
  return steps.join("/");
}
