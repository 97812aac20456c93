import { SaxesParser } from "saxes";
import { expect } from "vitest";
import type { PictureModel } from "../../src/plot/picture";
import { svgText } from "../../src/plot/svgText";

/** Parses the picture's SVG as XML and fails where it is not well formed or a coordinate is no number; gives the elements in order. */
export function elementsOf(picture: PictureModel): { name: string; attributes: Record<string, string> }[] {
  const svg = svgText(picture);
  const found: { name: string; attributes: Record<string, string> }[] = [];
  const parser = new SaxesParser();
  parser.on("error", (error) => {
    throw error;
  });
  parser.on("opentag", ({ name, attributes }) =>
    found.push({ name, attributes: attributes as Record<string, string> }),
  );
  parser.write(svg).close();
  expect(svg).not.toMatch(/NaN|Infinity|undefined|null/);
  return found;
}

/** Every text of the picture lies inside it, by the width that a system font takes at most. */
export function expectTextsInside(picture: PictureModel): void {
  for (const part of picture.parts) {
    if (part.kind !== "text") continue;
    expect(part.y, part.text).toBeGreaterThanOrEqual(8);
    expect(part.y, part.text).toBeLessThanOrEqual(picture.height);
    expect(part.x, part.text).toBeGreaterThanOrEqual(0);
    expect(part.x, part.text).toBeLessThanOrEqual(picture.width);
  }
}
