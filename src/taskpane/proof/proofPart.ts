import type { PaneContext } from "../context";
import { part, type PanePart } from "../dom/part";
import { bookReader } from "./bookReader";
import { checkView } from "./checkView";
import { workingsView } from "./workingsView";
import "./proof.css";

/** Proof: every call of the workbook worked out again, and the workings of one cell step by step. */
export function proofPart(context: PaneContext): PanePart {
  const reader = bookReader(context.port);
  const made = part("proof", context.texts.proofHeading, checkView(context, reader), workingsView(context, reader));
  return { ...made, leave: reader.stop };
}
