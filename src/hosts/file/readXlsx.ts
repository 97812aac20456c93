import { Sheet, type DefinedName, type Table, type Workbook } from "../../sheet/workbook";
import { countExtra, extraParts, type Extras } from "./notShown";
import { readKeptSettings } from "./keptSettings";
import { readXml } from "./readXml";
import { SheetLook, type CellStyle } from "./sheetLook";
import { UnusableFile } from "./unusableFile";
import { readDynamicMarks } from "./xlsxMetadata";
import { readRelations, workbookPart } from "./xlsxParts";
import { readSheet } from "./xlsxSheet";
import { readSharedStrings } from "./xlsxStrings";
import { readStyles } from "./xlsxStyles";
import { readTable } from "./xlsxTable";
import { ZipArchive } from "./zipArchive";

export interface ListedSheet {
  readonly name: string;
  readonly relation: string;
  readonly visible: boolean;
}

/** The parts of the sheets with cells, by name, in the order of the workbook. */
export function sheetParts(archive: ZipArchive, part: string): Map<string, string> {
  const relations = readRelations(archive, part);
  const parts = new Map<string, string>();
  for (const { name, relation } of readWorkbookPart(archive, part).listed) {
    const { kind, target } = relations.find(({ id }) => id === relation) ?? {};
    if (kind === "worksheet" && target !== undefined) parts.set(name, target);
  }
  return parts;
}

/** A workbook with how it looks: what an opened file is laid out from. */
export interface OpenedXlsx {
  readonly workbook: Workbook;
  /** By the name of the sheet. */
  readonly looks: ReadonlyMap<string, SheetLook>;
  readonly styles: readonly CellStyle[];
  /** What the file holds beside all that. */
  readonly extras: Extras;
  /** What the pane kept with it. */
  readonly settings: Readonly<Record<string, unknown>>;
}

/** Reads the bytes of an .xlsx file (ECMA-376) into a workbook: stored values, formulas as stored, names, tables, what is hidden. */
export function readXlsx(bytes: Uint8Array): Workbook {
  return readArchive(new ZipArchive(bytes));
}

/** The same with number formats, widths and what stays in view, and a count of what is not read. */
export function openXlsx(bytes: Uint8Array): OpenedXlsx {
  const archive = new ZipArchive(bytes);
  const looks = new Map<string, SheetLook>();
  const extras = extraParts(archive);
  const workbook = readArchive(archive, looks, extras);
  const relations = readRelations(archive, workbookPart(archive));
  const styles = relations.find(({ kind }) => kind === "styles")?.target;
  const custom = relations.filter(({ kind }) => kind === "customXml").map(({ target }) => target);
  const { cells, decorated } = readStyles(archive, styles);
  if (decorated) countExtra(extras, "decoration");
  return { workbook, looks, styles: cells, extras, settings: readKeptSettings(archive, custom) };
}

function readArchive(archive: ZipArchive, looks?: Map<string, SheetLook>, extras?: Extras): Workbook {
  const part = workbookPart(archive);
  const relations = readRelations(archive, part);
  const { listed, names, date1904 } = readWorkbookPart(archive, part);
  const partOf = (kind: string) => relations.find((relation) => relation.kind === kind)?.target;
  const context = {
    archive,
    strings: readSharedStrings(archive, partOf("sharedStrings")),
    date1904,
    dynamicMarks: readDynamicMarks(archive, partOf("sheetMetadata")),
    cells: 0,
    arrayCells: 0,
    extras,
  };
  const sheets: Sheet[] = [];
  const tables: Table[] = [];
  for (const { name, relation, visible } of listed) {
    const { kind, target } = relations.find(({ id }) => id === relation) ?? {};
    if (target === undefined) throw new UnusableFile(`The file is damaged: the sheet “${name}” leads nowhere.`);
    // A sheet that is nothing but a chart has no cells.
    if (kind !== "worksheet") continue;
    const sheet = new Sheet(name, visible);
    const look = looks && new SheetLook();
    readSheet(context, target, sheet, look);
    if (look) looks.set(name, look);
    sheets.push(sheet);
    for (const table of readRelations(archive, target).filter((one) => one.kind === "table"))
      tables.push(...[readTable(archive, table.target, name)].filter((one) => one !== undefined));
  }
  if (sheets.length === 0) throw new UnusableFile("The file holds no sheet with cells.");
  return { sheets, names, tables, date1904 };
}

export function readWorkbookPart(archive: ZipArchive, part: string) {
  const listed: ListedSheet[] = [];
  const named: { name: string; formula: string; local?: number }[] = [];
  let date1904 = false;
  let name: { name: string; formula: string; local?: number } | undefined;
  readXml(archive, part, {
    open(tag, attributes) {
      if (tag === "sheet")
        listed.push({
          name: attributes["name"] ?? "",
          relation: relationId(attributes),
          visible: (attributes["state"] ?? "visible") === "visible",
        });
      else if (tag === "workbookPr") date1904 = /^(1|true)$/.test(attributes["date1904"] ?? "");
      else if (tag === "definedName") {
        const local = attributes["localSheetId"];
        name = { name: attributes["name"] ?? "", formula: "", local: local === undefined ? undefined : Number(local) };
      }
    },
    text(text) {
      if (name) name.formula += text;
    },
    close(tag) {
      if (tag !== "definedName" || !name) return;
      // Print areas, filters and the like are the host's own.
      if (!name.name.startsWith("_xlnm.")) named.push(name);
      name = undefined;
    },
  });
  const names: DefinedName[] = named.map(({ name: text, formula, local }) => ({
    name: text,
    formula,
    sheet: local === undefined ? undefined : listed[local]?.name,
  }));
  return { listed, names, date1904 };
}

/** The attribute `r:id`, whose prefix is free to choose. */
function relationId(attributes: Readonly<Record<string, string>>): string {
  const name = Object.keys(attributes).find((key) => key.endsWith(":id"));
  return name === undefined ? "" : attributes[name]!;
}
