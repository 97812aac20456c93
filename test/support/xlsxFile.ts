import { strToU8, zipSync, type Zippable } from "fflate";

/** One sheet as XML by hand: `rows` is what stands in `<sheetData>`, `behind` what stands behind it. */
export interface SheetXml {
  readonly name: string;
  readonly rows: string;
  readonly behind?: string;
  readonly state?: "hidden";
  /** The XML of its tables. */
  readonly tables?: readonly string[];
}

export interface BookXml {
  readonly sheets: readonly SheetXml[];
  /** What stands in `<definedNames>`. */
  readonly names?: string;
  readonly strings?: readonly string[];
  readonly date1904?: boolean;
  /** More parts, or other ones in place of those made here. */
  readonly parts?: Readonly<Record<string, string>>;
}

const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006/relationships";
const relation = (id: string, kind: string, target: string) =>
  `<Relationship Id="${id}" Type="${OFFICE}/${kind}" Target="${target}"/>`;
const relations = (inside: string) => `${HEAD}<Relationships xmlns="${PACKAGE}">${inside}</Relationships>`;

/** Metadata as Excel writes it beside dynamic arrays: `cm="1"` marks a formula that spills. */
const METADATA = `${HEAD}<metadata xmlns="${MAIN}" xmlns:xda="http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray"><metadataTypes count="1"><metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" cellMeta="1"/></metadataTypes><futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}"><xda:dynamicArrayProperties fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata><cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata></metadata>`;

/** The bytes of a workbook with the parts that Excel writes (ECMA-376), put together from XML by hand and not by a writer of ours. */
export function xlsxFile(book: BookXml): Uint8Array {
  const parts: Zippable = {};
  for (const [name, text] of Object.entries(xlsxParts(book))) parts[name] = strToU8(text);
  return zipSync(parts);
}

export function xlsxParts({ sheets, names, strings = [], date1904, parts = {} }: BookXml): Record<string, string> {
  const made: Record<string, string> = {
    "[Content_Types].xml": `${HEAD}<Types xmlns="http://schemas.openxmlformats.org/package/2006/content-types"><Default Extension="xml" ContentType="application/xml"/><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Override PartName="/xl/workbook.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml"/></Types>`,
    "_rels/.rels": relations(relation("rId1", "officeDocument", "xl/workbook.xml")),
    "xl/workbook.xml": `${HEAD}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><workbookPr${date1904 ? ' date1904="1"' : ""}/><sheets>${sheets
      .map(
        ({ name, state }, index) =>
          `<sheet name="${name}" sheetId="${index + 1}"${state ? ` state="${state}"` : ""} r:id="rId${index + 1}"/>`,
      )
      .join("")}</sheets>${names ? `<definedNames>${names}</definedNames>` : ""}</workbook>`,
    "xl/_rels/workbook.xml.rels": relations(
      sheets.map((_, index) => relation(`rId${index + 1}`, "worksheet", `worksheets/sheet${index + 1}.xml`)).join("") +
        relation("rId100", "sharedStrings", "sharedStrings.xml") +
        relation("rId101", "sheetMetadata", "metadata.xml"),
    ),
    "xl/sharedStrings.xml": `${HEAD}<sst xmlns="${MAIN}" count="${strings.length}" uniqueCount="${strings.length}">${strings.map((text) => `<si>${text.startsWith("<") ? text : `<t>${text}</t>`}</si>`).join("")}</sst>`,
    "xl/metadata.xml": METADATA,
  };
  let tableNumber = 0;
  sheets.forEach(({ rows, behind = "", tables = [] }, index) => {
    made[`xl/worksheets/sheet${index + 1}.xml`] =
      `${HEAD}<worksheet xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheetData>${rows}</sheetData>${behind}</worksheet>`;
    const links = tables.map((xml) => {
      made[`xl/tables/table${++tableNumber}.xml`] = HEAD + xml;
      return relation(`rId${tableNumber}`, "table", `../tables/table${tableNumber}.xml`);
    });
    if (links.length > 0) made[`xl/worksheets/_rels/sheet${index + 1}.xml.rels`] = relations(links.join(""));
  });
  return { ...made, ...parts };
}

/** A column of numbers as rows of XML, from row `first`; gaps for null. */
export function numberRows(column: string, first: number, values: readonly (number | null)[]): string {
  return values
    .map((value, index) => {
      const row = first + index;
      return value === null ? `<row r="${row}"/>` : `<row r="${row}"><c r="${column}${row}"><v>${value}</v></c></row>`;
    })
    .join("");
}
