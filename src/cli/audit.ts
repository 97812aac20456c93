import { auditWorkbook, type Audit } from "../audit/auditWorkbook";
import type { Judgement, Notice } from "../audit/judgement";
import { formatSheetName } from "../sheet/address";
import { isCellError, type Cell } from "../sheet/cell";
import { Stop, type Command, type Io } from "./io";
import { loadWorkbook } from "./loadWorkbook";
import { plainCell, printable } from "../report/plainText";
import { readArguments } from "./readArguments";
import { auditReport, summarySentence, type AuditReport } from "../report/auditReport";
import { csvReport } from "../report/csvReport";
import { htmlReport } from "../report/htmlReport";
import { xlsxReport } from "../report/xlsxReport";

const OPTIONS = { tolerance: "string", json: "boolean", strict: "boolean", report: "string", help: "boolean" } as const;
const USUAL_TOLERANCE = 1e-9;
/** Up to so many calls the ones that agree are listed too. */
const FEW = 40;

export const audit: Command = {
  name: "audit",
  usage: "audit FILE.xlsx [--tolerance 1e-9] [--json] [--strict] [--report OUT.(xlsx|html|csv)]",
  summary: "work out again every call of these functions in a workbook, on the values it holds",
  help: `Every cell that calls one of these functions, alone or inside a larger formula, gets a verdict: agrees, differs or not checkable, and
the reason in a sentence. Nothing is changed, nothing is sent.

  --tolerance T     how far two numbers may lie apart, as a part of the larger (1e-9)
  --json            one object a line: {"sheet","cell","formula","stored","recomputed","verdict","why"}, with "notices" where something
                    else was noticed at that cell; behind them the notices at cells that call no function
  --strict          what is not checkable makes the exit code 1
  --report OUT      the same as a report to keep: OUT ends in .xlsx, .html or .csv

Beside wrong values it names: a number typed over where the neighbours call a function, a range that leaves out data below or above it,
skips rows, takes in a total or has hidden rows, one column judged in two ways, and fixed marks that no longer follow from their scores.

Exit code: 0 none differs, 1 any differs, 2 the file or an option can't be used. A notice changes no exit code.`,
  run: runAudit,
};

async function runAudit(args: readonly string[], io: Io): Promise<number> {
  const { positionals, values } = readArguments("audit", args, OPTIONS);
  const [path, ...more] = positionals;
  if (path === undefined || more.length > 0) throw new Stop(`audit takes one file: weirmark ${audit.usage}`);
  const tolerance = readTolerance(values["tolerance"] as string | undefined);
  const out = values["report"] as string | undefined;
  const write = out === undefined ? undefined : reportWriter(out);
  const result = await auditWorkbook(await loadWorkbook(path, io), { tolerance });
  io.out(values["json"] ? jsonLines(result) : plainLines(result));
  if (out !== undefined) await io.write(out, write!(auditReport(path, result, tolerance)));
  if (result.counts.differs > 0) return 1;
  return values["strict"] && result.counts["not checkable"] > 0 ? 1 : 0;
}

function readTolerance(text: string | undefined): number {
  const tolerance = text === undefined ? USUAL_TOLERANCE : Number(text);
  if (text?.trim() === "" || !(tolerance >= 0 && tolerance < 1))
    throw new Stop(`--tolerance must be a number from 0 to below 1, such as 1e-9; ${text} was given.`);
  return tolerance;
}

function reportWriter(out: string): (report: AuditReport) => Uint8Array {
  const ending = /\.([^./\\]*)$/.exec(out)?.[1]?.toLowerCase();
  const text = (make: (report: AuditReport) => string) => (report: AuditReport) =>
    new TextEncoder().encode(make(report));
  if (ending === "html") return text(htmlReport);
  if (ending === "csv") return text(csvReport);
  if (ending === "xlsx") return xlsxReport;
  throw new Stop(`A report ends in .xlsx, .html or .csv; ${out} was given.`);
}

function jsonLines({ judgements, notices }: Audit): string {
  const plain = (value: Cell | Cell[][] | undefined): unknown =>
    value === undefined
      ? null
      : Array.isArray(value)
        ? value.map((row) => row.map(plain))
        : isCellError(value)
          ? value.code
          : value;
  const used = new Set<unknown>();
  const byCell = new Map<string, Notice[]>();
  for (const one of notices) {
    const key = `${one.sheet}!${one.address}`;
    byCell.set(key, [...(byCell.get(key) ?? []), one]);
  }
  const lines = judgements.map(({ sheet, address, formula, stored, recomputed, verdict, why }) => {
    const here = byCell.get(`${sheet.name}!${address}`) ?? [];
    here.forEach((one) => used.add(one));
    const line = {
      sheet: sheet.name,
      cell: address,
      formula,
      stored: plain(stored),
      recomputed: plain(recomputed),
      verdict,
      why,
    };
    return here.length === 0
      ? line
      : { ...line, notices: here.map(({ kind, why: reason }) => ({ kind, why: reason })) };
  });
  const beside = notices
    .filter((one) => !used.has(one))
    .map(({ sheet, address, kind, why, stored, recomputed }) => ({
      sheet,
      cell: address,
      notice: kind,
      stored: plain(stored),
      recomputed: plain(recomputed),
      why,
    }));
  return [...lines, ...beside].map((line) => `${JSON.stringify(line)}\n`).join("");
}

function plainLines(result: Audit): string {
  const { judgements, notices } = result;
  const listed = judgements.filter(({ verdict }) => verdict !== "agrees" || judgements.length <= FEW);
  const where = (sheet: string, cell: string) => printable(`${formatSheetName(sheet)}!${cell}`);
  const calls = listed.flatMap((one) => [
    "",
    `${where(one.sheet.name, one.address)}  ${one.verdict}  ${printable(one.formula)}`,
    ...values(one),
    `    ${printable(one.why)}`,
  ]);
  const beside = notices.flatMap(({ sheet, address, kind, why }) => [
    "",
    `${where(sheet, address)}  ${kind}`,
    `    ${printable(why)}`,
  ]);
  return `${[summarySentence(result), ...calls, ...beside].join("\n")}\n`;
}

function values({ stored, recomputed, verdict }: Judgement): string[] {
  if (verdict === "not checkable" || Array.isArray(stored) || Array.isArray(recomputed)) return [];
  return [`    stored ${plainCell(stored)}, recomputed ${plainCell(recomputed)}`];
}
