import { strToU8, zipSync, type Zippable } from "fflate";
import type { BookToWrite } from "./write/book";
import type { CellSetting } from "./write/cellXml";
import { chartXml } from "./write/chartXml";
import { drawingXml } from "./write/drawingXml";
import { METADATA, packageXml, relationsXml } from "./write/packageXml";
import { SETTINGS_PART, settingsXml } from "./keptSettings";
import { sheetXml } from "./write/sheetXml";
import { StyleTable } from "./write/styleTable";
import { workbookXml } from "./write/workbookXml";

/** The first day that a zip archive can name: the same workbook gives the same bytes on any day. */
const NO_DAY = new Date(1980, 0, 1, 12);

/**
 * The bytes of a new .xlsx file (ECMA-376, no macros): values, formulas with what they came to, looks, names, print setup, charts and pictures. For a
 * new file only: a user's workbook is patched (patchXlsx), never written anew.
 */
export function writeXlsx(book: BookToWrite): Uint8Array {
  const styles = new StyleTable();
  const setting: CellSetting = { styles, dynamic: false };
  const parts: Record<string, string> = {};
  const media: Record<string, Uint8Array> = {};
  let charts = 0;
  let drawings = 0;
  book.sheets.forEach((sheet, index) => {
    const part = `sheet${index + 1}.xml`;
    const { charts: drawn = [], pictures = [] } = sheet;
    const shown = index === (book.active ?? 0);
    const bare = drawn.length + pictures.length === 0;
    parts[`xl/worksheets/${part}`] = sheetXml(sheet, setting, shown, bare ? undefined : "rId1");
    if (bare) return;
    drawings++;
    parts[`xl/worksheets/_rels/${part}.rels`] = relationsXml([["drawing", `../drawings/drawing${drawings}.xml`]]);
    parts[`xl/drawings/drawing${drawings}.xml`] = drawingXml(drawn, pictures);
    const targets = drawn.map((chart) => {
      parts[`xl/charts/chart${++charts}.xml`] = chartXml(chart);
      return ["chart", `../charts/chart${charts}.xml`] as const;
    });
    const images = pictures.map(({ png }) => {
      const image = `media/image${Object.keys(media).length + 1}.png`;
      media[`xl/${image}`] = png;
      return ["image", `../${image}`] as const;
    });
    parts[`xl/drawings/_rels/drawing${drawings}.xml.rels`] = relationsXml([...targets, ...images]);
  });
  parts["xl/workbook.xml"] = workbookXml(book);
  parts["xl/styles.xml"] = styles.xml();
  if (setting.dynamic) parts["xl/metadata.xml"] = METADATA;
  if (book.settings) parts[SETTINGS_PART] = settingsXml(book.settings);
  parts["xl/_rels/workbook.xml.rels"] = relationsXml([
    ...book.sheets.map((_, index) => ["worksheet", `worksheets/sheet${index + 1}.xml`] as const),
    ["styles", "styles.xml"],
    ...(setting.dynamic ? [["sheetMetadata", "metadata.xml"] as const] : []),
    ...(book.settings ? [["customXml", `../${SETTINGS_PART}`] as const] : []),
  ]);
  Object.assign(parts, packageXml(book, Object.keys(parts)));
  const files: Zippable = {};
  for (const [name, text] of Object.entries(parts)) files[name] = [strToU8(text), { mtime: NO_DAY }];
  // A PNG is packed already.
  for (const [name, bytes] of Object.entries(media)) files[name] = [bytes, { mtime: NO_DAY, level: 0 }];
  return zipSync(files);
}
