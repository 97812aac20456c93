import type { Audit } from "../../audit/auditWorkbook";
import type { PaneContext } from "../context";

/** How many calls agree, differ and can't be checked, and how much more there is to look at. */
export function checkSummary({ texts, numbers }: Pick<PaneContext, "texts" | "numbers">, audit: Audit): string {
  const { counts, notices } = audit;
  const { agrees, differs, "not checkable": unchecked } = counts;
  const calls = agrees + differs + unchecked;
  if (calls === 0 && notices.length === 0) return texts.checkNoCalls;
  const [all, agree, differ, not] = [calls, agrees, differs, unchecked].map(numbers.count) as [
    string,
    string,
    string,
    string,
  ];
  const beside = notices.length === 1 ? texts.checkOneNotice : texts.checkNotices(numbers.count(notices.length));
  return [calls > 0 && texts.checkCounts(all, agree, differ, not), notices.length > 0 && beside]
    .filter((sentence) => sentence !== false)
    .join(" ");
}
