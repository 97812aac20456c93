import type { Audit } from "../audit/auditWorkbook";
import type { Judgement, Notice } from "../audit/judgement";
import { isCellError, type Cell } from "../sheet/cell";
import { NUMBERS_REVISION, RELEASE_NAME, RELEASE_VERSION } from "../core/release";
import { plainCell } from "./plainText";

/** What every form of the report says. */
export interface AuditReport {
  /** The file's name, without its folders. */
  readonly file: string;
  readonly summary: string;
  readonly audit: Audit;
  readonly by: string;
}

export const CALL_HEADINGS = ["sheet", "cell", "formula", "stored", "recomputed", "verdict", "why"] as const;
export const NOTICE_HEADINGS = ["sheet", "cell", "what", "why"] as const;
const LONGEST_TABLE = 500;

/** `checked` is the date and time of the check, where the report tells it. */
export function auditReport(path: string, audit: Audit, tolerance: number, checked = ""): AuditReport {
  return {
    file: path.replace(/^.*[/\\]/, ""),
    summary: summarySentence(audit),
    audit,
    by: `${RELEASE_NAME} ${RELEASE_VERSION}, revision ${NUMBERS_REVISION} of the numbers; tolerance ${tolerance}${checked && `; checked ${checked}`}`,
  };
}

export function summarySentence({ counts, notices }: Audit): string {
  const { agrees, differs, "not checkable": unchecked } = counts;
  const calls = agrees + differs + unchecked;
  if (calls === 0 && notices.length === 0) return "No cell calls one of these functions.";
  const parts = [
    `${agrees} agree${agrees === 1 ? "s" : ""}`,
    `${differs} differ${differs === 1 ? "s" : ""}`,
    `${unchecked} ${unchecked === 1 ? "is" : "are"} not checkable`,
  ];
  const beside =
    notices.length === 0 ? "" : ` ${notices.length} more thing${notices.length === 1 ? "" : "s"} to look at.`;
  return `${calls} call${calls === 1 ? "" : "s"}: ${parts.join(", ")}.${beside}`;
}

/** A value as one line: a table's rows one behind the other. */
export function inOneLine(value: Cell | Cell[][] | undefined): Cell {
  if (value === undefined) return "";
  if (!Array.isArray(value)) return isCellError(value) ? value.code : value;
  const text = value.map((row) => row.map(plainCell).join(" | ")).join("; ");
  return text.length > LONGEST_TABLE ? `${text.slice(0, LONGEST_TABLE)}…` : text;
}

export function callRow({ sheet, address, formula, stored, recomputed, verdict, why }: Judgement): Cell[] {
  return [sheet.name, address, formula, inOneLine(stored), inOneLine(recomputed), verdict, why];
}

export function noticeRow({ sheet, address, kind, why }: Notice): Cell[] {
  return [sheet, address, kind, why];
}
