import type { IBorderData, IStyleData, Nullable } from "@univerjs/core";
import type { RoleLook } from "../../sheet/cellLook";

/** How a cell looks and how its number is shown, as files have it. */
export interface Styled {
  readonly format?: string;
  readonly look?: RoleLook;
}

// The engine's numbers, written out since its own lists would bring the whole engine into the background.
const WRAP = 3;
const MIDDLE = 2;
const ALIGN: readonly (RoleLook["align"] | undefined)[] = [undefined, "left", "center", "right"];
/** One step of indent, in pixels. */
const INDENT = 9;
const THIN = 1;
const MEDIUM = 8;
const USUAL_SIZE = 10;
const ORDINARY_LINE = "9AA5AE";

/** The engine's style for a look. */
export function styleOfLook({ format, look = {} }: Styled): IStyleData {
  const { size, bold, italic, ink, fill, rule, wrap, align, indent } = look;
  const style = {
    ...(format !== undefined && { n: { pattern: format } }),
    ...(size !== undefined && { fs: size }),
    ...(bold && { bl: 1 }),
    ...(italic && { it: 1 }),
    ...(ink && { cl: { rgb: `#${ink}` } }),
    ...(fill && { bg: { rgb: `#${fill}` } }),
    ...(rule && { bd: borderOf(rule) }),
    ...(wrap && { tb: WRAP }),
    ...(align && { ht: ALIGN.indexOf(align) }),
    ...(indent && { pd: { [align === "right" ? "r" : "l"]: indent * INDENT } }),
  };
  // A style that names no place would stand at the bottom, beside plain cells in the middle.
  return (Object.keys(style).length === 0 ? {} : { vt: MIDDLE, ...style }) as IStyleData;
}

function borderOf({ side, colour, thick }: NonNullable<RoleLook["rule"]>) {
  const line = { s: thick ? MEDIUM : THIN, cl: { rgb: `#${colour}` } };
  if (side === "box") return { t: line, r: line, b: line, l: line };
  return side === "bottom" ? { b: line } : { l: line };
}

/** The look of a style of the engine; undefined where it is like any other. */
export function lookOfStyle(style: Nullable<IStyleData>): Styled | undefined {
  if (!style) return undefined;
  const align = ALIGN[style.ht ?? 0];
  const ink = hexadecimal(style.cl?.rgb);
  const fill = hexadecimal(style.bg?.rgb);
  const rule = ruleOf(style.bd);
  const indent = Math.round(((align === "right" ? style.pd?.r : style.pd?.l) ?? 0) / INDENT);
  const look: RoleLook = {
    ...(style.fs && style.fs !== USUAL_SIZE && { size: style.fs }),
    ...(style.bl && { bold: true }),
    ...(style.it && { italic: true }),
    ...(ink && { ink }),
    ...(fill && { fill }),
    ...(rule && { rule }),
    ...(style.tb === WRAP && { wrap: true }),
    ...(align && { align }),
    ...(indent > 0 && { indent }),
  };
  const format = style.n?.pattern;
  const own = Object.keys(look).length > 0;
  return format || own ? { ...(format && { format }), ...(own && { look }) } : undefined;
}

function ruleOf(border: Nullable<IBorderData>): RoleLook["rule"] {
  const line = border?.b ?? border?.l;
  if (!border || !line) return undefined;
  const side = border.b && border.l && border.t && border.r ? "box" : border.b ? "bottom" : "left";
  const thick = line.s === MEDIUM;
  return { side, colour: hexadecimal(line.cl?.rgb) ?? ORDINARY_LINE, ...(thick && { thick }) };
}

/** `#0b4a6b` or `rgb(11,74,107)` as six digits. */
function hexadecimal(colour: Nullable<string>): string | undefined {
  const digits = /^#?([0-9a-f]{6})$/i.exec(colour ?? "")?.[1];
  if (digits) return digits.toUpperCase();
  const parts = /^rgba?\((\d+),\s*(\d+),\s*(\d+)/.exec(colour ?? "")?.slice(1, 4);
  return parts?.map((part) => Number(part).toString(16).padStart(2, "0").toUpperCase()).join("");
}
