import type { Audit } from "../../audit/auditWorkbook";
import type { NoticeKind, Verdict } from "../../audit/judgement";
import { formatSheetName } from "../../sheet/address";

/** One line of what a check found: a call with its verdict, or something beside it that somebody should look at. */
export interface Finding {
  readonly address: string;
  readonly found: Verdict | NoticeKind;
  /** The formula as it is typed; "" at a notice. */
  readonly formula: string;
  readonly why: string;
}

/** What must be looked at comes first: what differs, what nobody could check, what was noticed beside; then what agrees. */
export function findings({ judgements, notices }: Audit): Finding[] {
  const at = (sheet: string, cell: string) => `${formatSheetName(sheet)}!${cell}`;
  const calls = judgements.map((one) => ({
    address: at(one.sheet.name, one.address),
    found: one.verdict,
    formula: one.formula,
    why: one.why,
  }));
  const beside = notices.map(({ sheet, address, kind, why }) => ({
    address: at(sheet, address),
    found: kind,
    formula: "",
    why,
  }));
  const only = (verdict: Verdict) => calls.filter(({ found }) => found === verdict);
  return [...only("differs"), ...only("not checkable"), ...beside, ...only("agrees")];
}
