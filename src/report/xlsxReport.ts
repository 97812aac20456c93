import { listSheet } from "../hosts/file/write/listSheet";
import { writeXlsx } from "../hosts/file/writeXlsx";
import { CALL_HEADINGS, callRow, NOTICE_HEADINGS, noticeRow, type AuditReport } from "./auditReport";

/** The report as a workbook: a summary, the calls, and what else was noticed. */
export function xlsxReport({ file, summary, audit, by }: AuditReport): Uint8Array {
  const sheets = [
    {
      name: "Summary",
      rows: [
        ["Audit of", file],
        ["result", summary],
        ["by", by],
      ],
      widths: [14, 90],
    },
    {
      name: "Calls",
      rows: [[...CALL_HEADINGS], ...audit.judgements.map(callRow)],
      widths: [14, 9, 50, 18, 18, 14, 90],
    },
    { name: "Notices", rows: [[...NOTICE_HEADINGS], ...audit.notices.map(noticeRow)], widths: [14, 9, 22, 110] },
  ];
  return writeXlsx({ sheets: sheets.map(listSheet) });
}
