import type { BookToWrite } from "./book";
import { escapeXml, HEAD, OFFICE, PACKAGE } from "./xmlText";

const SPREADSHEET = "application/vnd.openxmlformats-officedocument.spreadsheetml";
const DRAWING = "application/vnd.openxmlformats-officedocument.drawing";
const CORE = "http://schemas.openxmlformats.org/package/2006/metadata/core-properties";

/** Other programs show the stored text results of a file only where its program is known to calculate: they look for the first word. */
const PROGRAM = "Microsoft Excel workbook written by Weirmark";

const TYPES: readonly (readonly [part: RegExp, type: string])[] = [
  [/^xl\/workbook\.xml$/, `${SPREADSHEET}.sheet.main+xml`],
  [/^xl\/worksheets\/[^/]+\.xml$/, `${SPREADSHEET}.worksheet+xml`],
  [/^xl\/styles\.xml$/, `${SPREADSHEET}.styles+xml`],
  [/^xl\/metadata\.xml$/, `${SPREADSHEET}.sheetMetadata+xml`],
  [/^xl\/drawings\/[^/]+\.xml$/, `${DRAWING}+xml`],
  [/^xl\/charts\/[^/]+\.xml$/, `${DRAWING}ml.chart+xml`],
  [/^docProps\/app\.xml$/, "application/vnd.openxmlformats-officedocument.extended-properties+xml"],
  [/^docProps\/core\.xml$/, "application/vnd.openxmlformats-package.core-properties+xml"],
];

/** What says of a cell's `cm="1"` that its formula spills by itself. */
export const METADATA = `${HEAD}<metadata xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main" xmlns:xda="http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray"><metadataTypes count="1"><metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" splitFirst="1" rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/></metadataTypes><futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}"><xda:dynamicArrayProperties fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata><cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata></metadata>`;

/** The parts that hold a package together: what kind each part is, where the workbook is, and what it is called. */
export function packageXml({ title }: BookToWrite, names: readonly string[]): Record<string, string> {
  const core = "docProps/core.xml";
  const program = "docProps/app.xml";
  const all = [...names, program, ...(title === undefined ? [] : [core])];
  const overrides = all.flatMap((name) => {
    const type = TYPES.find(([part]) => part.test(name))?.[1];
    return type === undefined ? [] : [`<Override PartName="/${name}" ContentType="${type}"/>`];
  });
  const relations: (readonly [string, string])[] = [
    ["officeDocument", "xl/workbook.xml"],
    ["extended-properties", program],
  ];
  if (title !== undefined) relations.push([`${PACKAGE}/relationships/metadata/core-properties`, core]);
  return {
    "[Content_Types].xml": `${HEAD}<Types xmlns="${PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/><Default Extension="png" ContentType="image/png"/>${overrides.join("")}</Types>`,
    "_rels/.rels": relationsXml(relations),
    [program]: `${HEAD}<Properties xmlns="http://schemas.openxmlformats.org/officeDocument/2006/extended-properties"><Application>${PROGRAM}</Application></Properties>`,
    ...(title !== undefined && {
      [core]: `${HEAD}<cp:coreProperties xmlns:cp="${CORE}" xmlns:dc="http://purl.org/dc/elements/1.1/"><dc:title>${escapeXml(title)}</dc:title><dc:creator>Weirmark</dc:creator></cp:coreProperties>`,
    }),
  };
}

/** The relations of a part, the i-th of them `rId{i}`: by the last word of their kind, or its whole name. */
export function relationsXml(list: readonly (readonly [kind: string, target: string])[]): string {
  const inside = list.map(
    ([kind, target], index) =>
      `<Relationship Id="rId${index + 1}" Type="${kind.includes("/") ? kind : `${OFFICE}/${kind}`}" Target="${target}"/>`,
  );
  return `${HEAD}<Relationships xmlns="${PACKAGE}/relationships">${inside.join("")}</Relationships>`;
}
