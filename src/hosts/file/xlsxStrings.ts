import { readXml } from "./readXml";
import type { ZipArchive } from "./zipArchive";

/** The texts that the cells of all sheets share. */
export function readSharedStrings(archive: ZipArchive, part: string | undefined): string[] {
  const strings: string[] = [];
  let current = "";
  let inText = false;
  let inPhonetic = false;
  if (part === undefined) return strings;
  readXml(archive, part, {
    open(name) {
      if (name === "si") current = "";
      else if (name === "rPh") inPhonetic = true;
      else if (name === "t") inText = !inPhonetic;
    },
    text(text) {
      if (inText) current += text;
    },
    close(name) {
      if (name === "t") inText = false;
      else if (name === "rPh") inPhonetic = false;
      else if (name === "si") strings.push(unescapeText(current));
    },
  });
  return strings;
}

/** Characters that XML can't hold stand as `_x000D_` in the texts of a workbook. */
export function unescapeText(text: string): string {
  if (!text.includes("_x")) return text;
  return text.replace(/_x([0-9A-Fa-f]{4})_/g, (_, code: string) => String.fromCharCode(parseInt(code, 16)));
}
