import { absoluteAddress, formatAddress, parseAddress } from "../../sheet/address";
import type { NamedCells } from "../port";

export type RangeAt = (context: Excel.RequestContext, address: string) => Excel.Range;

/** Names that lead to cells; one whose cells were deleted leads nowhere, and is left out. */
export async function readNames(context: Excel.RequestContext): Promise<NamedCells[]> {
  const { names } = context.workbook;
  names.load("items/name,items/type,items/formula");
  await context.sync();
  return names.items.flatMap(({ name, type, formula }) => {
    const area = type === Excel.NamedItemType.range ? parseAddress(String(formula).replace(/^=/, "")) : undefined;
    return area?.sheet === undefined ? [] : [{ name, address: formatAddress(area) }];
  });
}

export async function defineNames(
  context: Excel.RequestContext,
  rangeAt: RangeAt,
  list: readonly NamedCells[],
): Promise<void> {
  const { names } = context.workbook;
  const known = list.map(({ name }) => names.getItemOrNullObject(name));
  known.forEach((one) => one.load("isNullObject"));
  await context.sync();
  const canLead = Office.context.requirements.isSetSupported("ExcelApi", "1.7");
  list.forEach(({ name, address }, index) => {
    const one = known[index]!;
    if (!one.isNullObject && canLead) {
      // Led elsewhere instead of made anew: formulas that speak of it never see it missing.
      one.formula = `=${absoluteAddress(address)}`;
      return;
    }
    if (!one.isNullObject) one.delete();
    names.add(name, rangeAt(context, address));
  });
  await context.sync();
}
