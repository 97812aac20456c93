/**
 * A picture as plain data: flat parts in drawing order, each with the role it plays. Nothing here knows of a screen; `svgText` writes it out.
 * Coordinates are CSS pixels from the top left corner.
 */
export type Role =
  | "bar"
  | "curve"
  | "second-curve"
  | "rug"
  | "axis"
  | "grid"
  | "mark"
  | "hatch"
  | "edge"
  | "dot"
  | "flagged"
  | "guide"
  | "label"
  | "strong-label"
  | "mark-label";

export interface PathPart {
  readonly kind: "path";
  readonly role: Role;
  readonly d: string;
}

export interface TextPart {
  readonly kind: "text";
  readonly role: Role;
  readonly x: number;
  readonly y: number;
  readonly anchor: "start" | "middle" | "end";
  readonly text: string;
}

export type Part = PathPart | TextPart;

export interface PictureModel {
  readonly width: number;
  readonly height: number;
  /** What the picture is, in a few words. */
  readonly title: string;
  /** What it says, in a sentence: what someone hears who can't see it. */
  readonly description: string;
  readonly parts: readonly Part[];
}

export interface Size {
  readonly width: number;
  readonly height: number;
}

export function path(role: Role, d: string): PathPart {
  return { kind: "path", role, d };
}

export function text(role: Role, x: number, y: number, words: string, anchor: TextPart["anchor"] = "middle"): TextPart {
  return { kind: "text", role, x: round(x), y: round(y), anchor, text: words };
}

/** To a hundredth of a pixel: finer is noise in the file and in a comparison of two pictures. */
export function round(value: number): number {
  const rounded = Math.round(value * 100) / 100;
  return rounded === 0 ? 0 : rounded;
}

export function line(x1: number, y1: number, x2: number, y2: number): string {
  return `M${round(x1)},${round(y1)}L${round(x2)},${round(y2)}`;
}

export function box(x: number, y: number, width: number, height: number): string {
  return `M${round(x)},${round(y)}h${round(width)}v${round(height)}h${round(-width)}Z`;
}
