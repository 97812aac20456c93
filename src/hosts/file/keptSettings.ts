import { readXml } from "./readXml";
import { cellText, HEAD } from "./write/xmlText";
import { unescapeText } from "./xlsxStrings";
import type { ZipArchive } from "./zipArchive";

/** A part of XML of one's own, as the format allows for any program (ECMA-376, custom XML data storage): hosts keep it as it is. */
export const SETTINGS_PART = "customXml/item1.xml";
const ROOT = "paneSettings";
const NAMESPACE = "urn:weirmark:pane-settings";
const LONGEST = 1_000_000;

export function settingsXml(settings: Readonly<Record<string, unknown>>): string {
  return `${HEAD}<${ROOT} xmlns="${NAMESPACE}">${cellText(JSON.stringify(settings))}</${ROOT}>`;
}

/** The settings that one of these parts holds; none where no part is ours, or where it was damaged: no result hangs on them. */
export function readKeptSettings(archive: ZipArchive, parts: readonly string[]): Readonly<Record<string, unknown>> {
  for (const part of parts) {
    let ours = false;
    let text = "";
    readXml(archive, part, {
      open: (tag, attributes) => (ours ||= tag === ROOT && attributes["xmlns"] === NAMESPACE),
      text(piece) {
        if (ours && text.length < LONGEST) text += piece;
      },
    });
    if (ours) return plainRecord(unescapeText(text));
  }
  return {};
}

function plainRecord(text: string): Readonly<Record<string, unknown>> {
  try {
    const value: unknown = JSON.parse(text);
    return typeof value === "object" && value !== null && !Array.isArray(value) ? { ...value } : {};
  } catch {
    return {};
  }
}
