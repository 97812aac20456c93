import type { FWorkbook } from "@univerjs/preset-sheets-core";
import { absoluteAddress, formatAddress, parseAddress } from "../../sheet/address";
import type { NamedCells } from "../port";

/** Names that lead to cells; one whose cells were deleted leads nowhere, and is left out. */
export function readNames(book: FWorkbook): NamedCells[] {
  return book.getDefinedNames().flatMap((one) => {
    const area = parseAddress(one.getFormulaOrRefString().replace(/^=/, ""));
    return area?.sheet === undefined ? [] : [{ name: one.getName(), address: formatAddress(area) }];
  });
}

export function defineNames(book: FWorkbook, names: readonly NamedCells[]): void {
  for (const { name, address } of names) {
    const area = parseAddress(address);
    if (area?.sheet === undefined) throw new Error(`"${address}" is no address with its sheet`);
    const ref = absoluteAddress(area);
    const known = book.getDefinedName(name);
    if (known) {
      if (known.getFormulaOrRefString() !== ref) known.setRef(ref);
    } else book.insertDefinedNameBuilder(book.newDefinedNameBuilder().setName(name).setRef(ref).build());
  }
}
