import type { Audit } from "../../audit/auditWorkbook";
import { auditReport } from "../../report/auditReport";
import { csvReport } from "../../report/csvReport";
import { htmlReport } from "../../report/htmlReport";
import { xlsxReport } from "../../report/xlsxReport";
import { TOLERANCE } from "./checkBook";

export type ReportKind = "html" | "xlsx" | "csv";

const TYPES: Readonly<Record<ReportKind, string>> = {
  html: "text/html;charset=utf-8",
  xlsx: "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet",
  csv: "text/csv;charset=utf-8",
};

/** The report of a check as a file: what is checked by its name, and when that was. */
export function reportFile(kind: ReportKind, audit: Audit, of: string, checked: string): Blob {
  const report = auditReport(of, audit, TOLERANCE, checked);
  const content = kind === "html" ? htmlReport(report) : kind === "csv" ? csvReport(report) : xlsxReport(report);
  return new Blob([content as BlobPart], { type: TYPES[kind] });
}
