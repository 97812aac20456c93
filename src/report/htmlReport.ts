import { escapeXml } from "../hosts/file/write/xmlText";
import type { Cell } from "../sheet/cell";
import { plainCell } from "./plainText";
import { CALL_HEADINGS, callRow, NOTICE_HEADINGS, noticeRow, type AuditReport } from "./auditReport";

/** Ink on paper with one accent; a printed page says the same as the screen. */
const STYLE = `
:root { --ink: #1b2430; --pale: #5d6b7a; --line: #d5dbe1; --accent: #0f4c6b; }
body { font: 15px/1.45 system-ui, sans-serif; color: var(--ink); background: #fff; margin: 2.5rem auto; max-width: 76rem; padding: 0 1.5rem; }
h1 { font-size: 1.6rem; font-weight: 600; margin: 0 0 .3rem; }
h2 { font-size: 1.1rem; font-weight: 600; margin: 2rem 0 .5rem; color: var(--accent); }
p { margin: 0 0 .4rem; }
.by { color: var(--pale); }
table { border-collapse: collapse; width: 100%; font-variant-numeric: tabular-nums; }
th, td { text-align: left; vertical-align: top; padding: .35rem .7rem .35rem 0; border-bottom: 1px solid var(--line); overflow-wrap: break-word; }
th { font-weight: 600; border-bottom: 2px solid var(--accent); }
th, td.short { white-space: nowrap; }
td.number { text-align: right; }
td.formula { font-family: ui-monospace, monospace; font-size: .87em; overflow-wrap: anywhere; min-width: 16rem; }
.differs { font-weight: 600; }
@media print { body { margin: 0; max-width: none; } tr { break-inside: avoid; } }
`;

/** The report as one page without scripts or anything fetched. What comes out of the file is text, whatever it looks like. */
export function htmlReport({ file, summary, audit, by }: AuditReport): string {
  const worst = { differs: 0, "not checkable": 1, agrees: 2 } as const;
  const calls = [...audit.judgements].sort((a, b) => worst[a.verdict] - worst[b.verdict]);
  const notices =
    audit.notices.length > 0 ? `<h2>To look at</h2>${table(NOTICE_HEADINGS, audit.notices.map(noticeRow))}` : "";
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'">
<title>Audit of ${escapeXml(file)}</title><style>${STYLE}</style></head><body>
<h1>${escapeXml(summary)}</h1>
<p>Audit of ${escapeXml(file)}, on the values that the file itself holds.</p>
<p class="by">${escapeXml(by)}</p>
${notices}
<h2>Calls</h2>
${table(CALL_HEADINGS, calls.map(callRow))}
</body></html>
`;
}

function table(headings: readonly string[], rows: readonly (readonly Cell[])[]): string {
  const head = headings.map((heading) => `<th scope="col">${escapeXml(heading)}</th>`).join("");
  const body = rows.map((row) => `<tr>${row.map((cell, at) => field(cell, headings[at]!)).join("")}</tr>`).join("\n");
  return `<table><thead><tr>${head}</tr></thead><tbody>\n${body}\n</tbody></table>`;
}

/** Columns whose words are never broken. */
const SHORT: readonly string[] = ["sheet", "cell", "verdict", "what"];

function field(cell: Cell, heading: string): string {
  const classes = [
    typeof cell === "number" && "number",
    heading === "formula" && "formula",
    SHORT.includes(heading) && "short",
    heading === "verdict" && cell === "differs" && "differs",
  ].filter(Boolean);
  return `<td${classes.length > 0 ? ` class="${classes.join(" ")}"` : ""}>${escapeXml(plainCell(cell))}</td>`;
}
