/** Which scores are the better ones. */
export type Better = "high" | "low";

/** 1 where higher is better, −1 where lower is: what is measured towards better is multiplied by it, so that the two mirror exactly. */
export function directionOf(better: Better): 1 | -1 {
  return better === "low" ? -1 : 1;
}
