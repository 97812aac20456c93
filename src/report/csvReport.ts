import type { Cell } from "../sheet/cell";
import { CALL_HEADINGS, callRow, noticeRow, type AuditReport } from "./auditReport";

/** The report as CSV in UTF-8: calls first, then what else was noticed, in the same columns. */
export function csvReport({ audit }: AuditReport): string {
  const notices = audit.notices.map((notice) => {
    const [sheet, cell, kind, why] = noticeRow(notice);
    return [sheet, cell, "", notice.stored ?? "", notice.recomputed ?? "", kind, why] as Cell[];
  });
  const rows = [[...CALL_HEADINGS], ...audit.judgements.map(callRow), ...notices];
  return `\ufeff${rows.map((row) => row.map(csvField).join(",")).join("\r\n")}\r\n`;
}

/** Quoted; a text that a sheet would take for a formula gets an apostrophe in front, so that nothing out of the file is ever worked out. */
function csvField(cell: Cell): string {
  if (typeof cell === "number") return String(cell);
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  const text = typeof cell === "string" ? cell : "";
  const harmless = /^[=+\-@\t\r\n]/.test(text) ? `'${text}` : text;
  return `"${harmless.replace(/"/g, '""')}"`;
}
