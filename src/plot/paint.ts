import type { Role } from "./picture";

/*
 * How each role looks on paper. The attributes stand in the picture itself, so that a saved picture needs no style sheet; a page overrides
 * them by the class of the same name. Roles differ by form as well as by colour: thin, thick, dashed, hatched, filled, hollow.
 */
const INK = "#1c2024";
const QUIET = "#565e66";
const FAINT = "#dbe1e5";
const ACCENT = "#0b4a6b";

export const PAPER = "#ffffff";
export const FONT = "system-ui, 'Segoe UI', 'Helvetica Neue', Arial, sans-serif";

export const paint: Readonly<Record<Role, Readonly<Record<string, string | number>>>> = {
  bar: { fill: "#e3e9ec", stroke: "#8d99a2", "stroke-width": 0.75 },
  curve: { fill: "none", stroke: INK, "stroke-width": 1.25 },
  "second-curve": { fill: "none", stroke: INK, "stroke-width": 1.25, "stroke-dasharray": "5 3" },
  rug: { fill: "none", stroke: INK, "stroke-width": 0.75 },
  axis: { fill: "none", stroke: QUIET, "stroke-width": 1 },
  grid: { fill: "none", stroke: FAINT, "stroke-width": 1 },
  mark: { fill: "none", stroke: ACCENT, "stroke-width": 2.25 },
  hatch: { fill: "none", stroke: ACCENT, "stroke-width": 0.75 },
  edge: { fill: "none", stroke: ACCENT, "stroke-width": 1, "stroke-dasharray": "2 2" },
  dot: { fill: INK, stroke: "none" },
  flagged: { fill: PAPER, stroke: ACCENT, "stroke-width": 1.75 },
  guide: { fill: "none", stroke: QUIET, "stroke-width": 1, "stroke-dasharray": "1 3" },
  label: { fill: QUIET, "font-size": 11 },
  "strong-label": { fill: INK, "font-size": 11, "font-weight": 600 },
  "mark-label": { fill: ACCENT, "font-size": 12, "font-weight": 600 },
};
