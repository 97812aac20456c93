/** The scale on which scores are taken as normal. A Box-Cox power left out is fitted by maximum likelihood. */
export type Shape =
  | { readonly kind: "normal" }
  | { readonly kind: "lognormal" }
  | { readonly kind: "logit"; readonly low: number; readonly high: number }
  | { readonly kind: "boxcox"; readonly power?: number };

export const NORMAL: Shape = { kind: "normal" };

/** A shape as it is typed and shown: lower case, no spaces. */
export function shapeText(shape: Shape): string {
  if (shape.kind === "logit") return `logit(${shape.low},${shape.high})`;
  if (shape.kind === "boxcox" && shape.power !== undefined) return `boxcox(${shape.power})`;
  return shape.kind;
}
