import type { PaneContext } from "../context";
import { element } from "../dom/element";
import { part, type PanePart } from "../dom/part";
import { fixedMarkView } from "./fixedMarkView";
import { groupsView } from "./groupsView";
import { planView } from "../plan/planView";
import { verdictView } from "./verdictView";

/** What to do with the mark: judge the entries, write it down, look at the groups. */
export function usePart(context: PaneContext): PanePart {
  const { texts, answer } = context;
  const waiting = element("p", { class: "quiet" }, texts.useWaits);
  answer.watch((current) => (waiting.hidden = current?.report !== undefined));
  return part(
    "use",
    texts.useHeading,
    waiting,
    verdictView(context),
    fixedMarkView(context),
    groupsView(context),
    planView(context),
  );
}
