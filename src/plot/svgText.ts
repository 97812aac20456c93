import { FONT, paint, PAPER } from "./paint";
import type { Part, PictureModel, Role } from "./picture";

/**
 * The picture as SVG that stands alone: title and description inside, paper behind, no script, no style sheet, no outside reference.
 * `margin` is room around it, for a picture that leaves the pane.
 */
export function svgText(picture: PictureModel, margin = 0): string {
  const { title, description, parts } = picture;
  const [width, height] = [picture.width + 2 * margin, picture.height + 2 * margin];
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="${0 - margin} ${0 - margin} ${width} ${height}" role="img"`,
    ` aria-label="${escape(`${title}. ${description}`)}" font-family="${FONT}">`,
    `<title>${escape(title)}</title><desc>${escape(description)}</desc>`,
    `<rect class="paper" x="${0 - margin}" y="${0 - margin}" width="${width}" height="${height}" fill="${PAPER}"/>`,
    ...parts.map(partText),
    "</svg>",
  ].join("");
}

function partText(part: Part): string {
  if (part.kind === "path") return part.d === "" ? "" : `<path ${roleText(part.role)} d="${part.d}"/>`;
  return `<text ${roleText(part.role)} x="${part.x}" y="${part.y}" text-anchor="${part.anchor}">${escape(part.text)}</text>`;
}

function roleText(role: Role): string {
  const attributes = Object.entries(paint[role]).map(([name, value]) => `${name}="${value}"`);
  return [`class="${role}"`, ...attributes].join(" ");
}

const ENTITIES: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

/** Text as it may stand in XML: the five marks escaped, control characters (not allowed in XML 1.0, a heading may hold one) dropped. */
function escape(words: string): string {
  return words
    .replace(/[&<>"']/g, (mark) => ENTITIES[mark]!)
    .replace(/[^\t\n\r\u0020-\uD7FF\uE000-\uFFFD\u{10000}-\u{10FFFF}]/gu, "");
}
