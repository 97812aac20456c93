import type { Table } from "../../sheet/workbook";
import { areaReference } from "./cellReference";
import { readXml } from "./readXml";
import { unescapeText } from "./xlsxStrings";
import type { ZipArchive } from "./zipArchive";

/** A table of a sheet, for references such as `Bids[Score]`. */
export function readTable(archive: ZipArchive, part: string, sheet: string): Table | undefined {
  let table: Table | undefined;
  const columns: string[] = [];
  readXml(archive, part, {
    open(tag, { displayName, name, ref, headerRowCount = "1", totalsRowCount = "0" }) {
      if (tag === "tableColumn") columns.push(unescapeText(name ?? ""));
      else if (tag === "table" && ref !== undefined)
        table = {
          name: displayName ?? name ?? "",
          sheet,
          area: areaReference(ref),
          columns,
          headerRows: Number(headerRowCount),
          totalsRows: Number(totalsRowCount),
        };
    },
  });
  return table;
}
