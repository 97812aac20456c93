import type { Size } from "./picture";

/** Where the drawing stands inside a picture: room for numbers at the left and below, for words above. */
export interface Frame {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly floor: number;
}

export function frameOf({ width, height }: Size, top = 20, left = 44): Frame {
  return { left, right: width - 12, top, floor: height - 36 };
}
