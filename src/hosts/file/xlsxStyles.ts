import type { RoleLook } from "../../sheet/cellLook";
import { BUILT_IN_FORMATS } from "./builtInFormats";
import { readXml, type Attributes } from "./readXml";
import type { CellStyle } from "./sheetLook";
import type { ZipArchive } from "./zipArchive";

const LONGEST_FORMAT = 255;
const MOST_INDENT = 15;

export interface BookStyles {
  /** By the number that a cell gives; the first is the plain one. */
  readonly cells: readonly CellStyle[];
  /** True where cells have colours or borders that are not read: those of a theme, patterns, borders on some sides. */
  readonly decorated: boolean;
}

type Draft<Look> = { -readonly [Key in keyof Look]: Look[Key] };
/** A font, fill or border: what is read of it, and whether there is more to it. */
interface Piece {
  look: Draft<RoleLook>;
  more: boolean;
}
interface Border extends Piece {
  sides: { side: string; colour: string; thick: boolean }[];
}
const LISTS = /^(fonts|fills|borders|cellXfs|cellStyleXfs|dxfs|numFmts)$/;

/** What the styles of a workbook say: number formats, letters, fills, borders, wrapped and aligned texts. */
export function readStyles(archive: ZipArchive, part: string | undefined): BookStyles {
  const formats = new Map<number, string>();
  const fonts: Piece[] = [];
  const fills: Piece[] = [];
  const borders: Border[] = [];
  const cells: CellStyle[] = [];
  let decorated = false;
  let list = "";
  const heard: Readonly<Record<string, (tag: string, attributes: Attributes) => void>> = {
    numFmts(tag, { numFmtId, formatCode = "" }) {
      const general = formatCode.toLowerCase() === "general";
      if (tag === "numFmt" && formatCode.length <= LONGEST_FORMAT && !general)
        formats.set(Number(numFmtId), formatCode);
    },
    fonts: (tag, attributes) => hearFont(fonts, tag, attributes),
    fills: (tag, attributes) => hearFill(fills, tag, attributes),
    borders: (tag, attributes) => hearBorder(borders, tag, attributes),
    cellXfs(tag, attributes) {
      if (tag === "xf") {
        const pieces = [
          fonts[Number(attributes["fontId"] ?? 0)],
          fills[Number(attributes["fillId"] ?? 0)],
          settled(borders[Number(attributes["borderId"] ?? 0)]),
        ];
        decorated ||= pieces.some((piece) => piece?.more);
        const id = Number(attributes["numFmtId"] ?? 0);
        const format = formats.get(id) ?? BUILT_IN_FORMATS[id];
        const look = Object.assign({}, ...pieces.map((piece) => piece?.look)) as RoleLook;
        cells.push({ format, look: look.size === fonts[0]?.look.size ? withoutSize(look) : look });
      } else if (tag === "alignment" && cells.length > 0) {
        const last = cells[cells.length - 1]!;
        cells[cells.length - 1] = { ...last, look: { ...last.look, ...alignment(attributes) } };
      }
    },
  };
  if (part !== undefined)
    readXml(archive, part, {
      open(tag, attributes) {
        if (LISTS.test(tag)) list = tag;
        else heard[list]?.(tag, attributes);
      },
      close(tag) {
        if (tag === list) list = "";
      },
    });
  return { cells, decorated };
}

function hearFont(fonts: Piece[], tag: string, attributes: Attributes): void {
  if (tag === "font") fonts.push({ look: {}, more: false });
  const font = fonts[fonts.length - 1];
  if (!font) return;
  const size = Number(attributes["val"]);
  if (tag === "b" && isOn(attributes["val"])) font.look.bold = true;
  else if (tag === "i" && isOn(attributes["val"])) font.look.italic = true;
  else if (tag === "sz" && size > 0 && size < 410) font.look.size = size;
  else if (tag === "color") {
    const ink = colourOf(attributes);
    // The first dark colour of a theme is the ordinary ink.
    if (ink !== undefined) font.look.ink = ink;
    else if (attributes["theme"] !== undefined && attributes["theme"] !== "1") font.more = true;
  }
}

function hearFill(fills: Piece[], tag: string, attributes: Attributes): void {
  if (tag === "fill") fills.push({ look: {}, more: false });
  const fill = fills[fills.length - 1];
  if (!fill) return;
  // The second fill is the format's own grey, which no cell has.
  if (tag === "patternFill") fill.more = attributes["patternType"] === "solid";
  else if (tag === "gradientFill") fill.more = true;
  else if (tag === "fgColor" && fill.more) {
    const colour = colourOf(attributes);
    if (colour === undefined) return;
    fill.look.fill = colour;
    fill.more = false;
  }
}

function hearBorder(borders: Border[], tag: string, attributes: Attributes): void {
  if (tag === "border") borders.push({ look: {}, more: false, sides: [] });
  const border = borders[borders.length - 1];
  const { style } = attributes;
  if (!border) return;
  if (tag === "color") {
    const side = border.sides[border.sides.length - 1];
    if (side) side.colour = colourOf(attributes) ?? side.colour;
  } else if (tag !== "border" && style !== undefined && style !== "none")
    border.sides.push({ side: tag, colour: "000000", thick: /^(medium|thick|double)/.test(style) });
}

/** A line below, on the left, or all around: other borders are not shown. */
function settled(border: Border | undefined): Piece | undefined {
  if (!border || border.sides.length === 0) return undefined;
  const names = border.sides.map(({ side }) => side);
  const { colour, thick } = border.sides[0]!;
  const side = names.length === 4 && !names.includes("diagonal") ? "box" : names.length === 1 ? names[0] : undefined;
  if (side !== "box" && side !== "bottom" && side !== "left") return { look: {}, more: true };
  return { look: { rule: { side, colour, ...(thick && { thick }) } }, more: false };
}

function alignment({ horizontal, wrapText, indent }: Attributes): RoleLook {
  const align = horizontal === "left" || horizontal === "right" || horizontal === "center" ? horizontal : undefined;
  const steps = Number(indent ?? 0);
  return {
    ...(align && { align }),
    ...(wrapText !== undefined && isOn(wrapText) && { wrap: true }),
    ...(Number.isInteger(steps) && steps > 0 && steps <= MOST_INDENT && { indent: steps }),
  };
}

function withoutSize(look: RoleLook): RoleLook {
  const rest: Draft<RoleLook> = { ...look };
  delete rest.size;
  return rest;
}

function colourOf({ rgb }: Attributes): string | undefined {
  return rgb !== undefined && /^[0-9A-Fa-f]{8}$/.test(rgb) ? rgb.slice(2).toUpperCase() : undefined;
}

function isOn(value: string | undefined): boolean {
  return value === undefined || value === "1" || value === "true";
}
