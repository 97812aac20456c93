import { line } from "./picture";

/**
 * A box filled with slanting strokes, as one path: plain geometry, so that it prints and pastes alike everywhere, where a fill pattern
 * depends on ids that clash as soon as two pictures share a page.
 */
export function hatch(x: number, y: number, width: number, height: number, gap = 6): string {
  if (!(width > 0 && height > 0)) return "";
  const strokes: string[] = [];
  // Strokes rise to the right: x + y is the same all along one, on a grid of the whole page, so that neighbouring boxes fit together.
  const first = Math.ceil((x + y) / gap) * gap;
  for (let sum = first; sum < x + width + y + height; sum += gap) {
    const startX = Math.max(x, sum - (y + height));
    const endX = Math.min(x + width, sum - y);
    if (endX - startX > 0.5) strokes.push(line(startX, sum - startX, endX, sum - endX));
  }
  return strokes.join("");
}
