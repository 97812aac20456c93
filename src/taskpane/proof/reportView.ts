import type { Audit } from "../../audit/auditWorkbook";
import type { PaneContext } from "../context";
import { button } from "../dom/choice";
import { download } from "../dom/download";
import { element, fill } from "../dom/element";
import { timeOfDay, today } from "../today";
import { loadProof } from "./loadProof";
import type { ReportKind } from "./reportFile";

/** A check that was made: of which workbook, and when. */
export interface Checked {
  readonly audit: Audit;
  readonly title: string;
  readonly at: Date;
}

/** The ways to take a check along. */
export function reportView({ texts }: PaneContext, { audit, title, at }: Checked): HTMLElement {
  const message = element("p", { "aria-live": "polite" });
  const date = today(at);
  const save = async (kind: ReportKind) => {
    fill(message);
    try {
      const { reportFile } = await loadProof();
      const of = title === "" ? texts.reportUnnamed : title;
      const name = texts.reportName(title.replace(/\.[^.]*$/, ""), date);
      download(reportFile(kind, audit, of, `${date} ${timeOfDay(at)}`), `${name}.${kind}`);
    } catch (failure) {
      message.textContent = texts.checkFailed(failure instanceof Error ? failure.message : String(failure));
    }
  };
  return element(
    "div",
    {},
    element("p", { class: "formula-label" }, texts.reportLabel),
    element(
      "p",
      { class: "actions" },
      button(texts.reportPrint, () => void save("html"), "plain"),
      button(texts.reportBook, () => void save("xlsx"), "plain"),
      button(texts.reportPlain, () => void save("csv"), "plain"),
    ),
    message,
  );
}
