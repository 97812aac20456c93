import { formatAddress } from "../../sheet/address";
import { isCellError, type Cell } from "../../sheet/cell";
import { Sheet } from "../../sheet/workbook";
import { cellReference } from "./cellReference";
import { escapeXml } from "./write/xmlText";
import { edited, walkXml, type Edit, type OpenTag } from "./xmlEdits";

/** What is to become of one formula cell: another formula, or its value alone. */
export interface CellPatch {
  /** In the spelling of files, without "="; it is entered as an array formula of this one cell, so that ranges in it stay ranges. */
  readonly formula?: string;
  /** Entered as an ordinary formula instead. */
  readonly ordinary?: boolean;
  /** The value to put in; left out, the stored one stays. */
  readonly value?: Cell;
}

/** The XML of a sheet with some of its cells patched, by `Sheet.key`; every other byte stays. */
export function patchSheet(xml: string, patches: ReadonlyMap<number, CellPatch>): string {
  const edits: Edit[] = [];
  let row = -1;
  let column = -1;
  let cell: OpenTag | undefined;
  let formula: Edit | undefined;
  walkXml(
    xml,
    (tag) => {
      if (tag.name === "row") {
        row = tag.attributes["r"] === undefined ? row + 1 : Number(tag.attributes["r"]) - 1;
        column = -1;
      } else if (tag.name === "c") {
        cell = tag;
        formula = undefined;
        if (tag.attributes["r"] === undefined) column++;
        else ({ row, column } = cellReference(tag.attributes["r"]));
      }
    },
    (tag, _, end) => {
      if (tag.name === "f" && cell) formula = { start: tag.start, end, text: tag.rawName };
      if (tag.name !== "c" || !cell || !formula) return;
      const patch = patches.get(Sheet.key(row, column));
      if (patch) edits.push(...cellEdits(xml, cell, formula, end, patch, row, column));
      cell = undefined;
    },
  );
  return edited(xml, edits);
}

function cellEdits(
  xml: string,
  cell: OpenTag,
  formula: Edit,
  end: number,
  patch: CellPatch,
  row: number,
  column: number,
): Edit[] {
  const name = formula.text;
  const address = formatAddress({ top: row, left: column, bottom: row, right: column });
  const array = patch.ordinary ? "" : ` t="array" ref="${address}"`;
  const fresh = patch.formula === undefined ? "" : `<${name}${array}>${escapeXml(patch.formula)}</${name}>`;
  // A cell that no longer spills must not be marked as one that does.
  const head = withoutAttributes(xml.slice(cell.start, cell.end), patch.value === undefined ? ["cm"] : ["cm", "t"]);
  if (patch.value === undefined)
    return [
      { start: cell.start, end: cell.end, text: head },
      { start: formula.start, end: formula.end, text: fresh },
    ];
  const [kind, text] = valueXml(patch.value);
  const prefix = name.includes(":") ? name.slice(0, name.indexOf(":") + 1) : "";
  const value = `<${prefix}v>${escapeXml(text)}</${prefix}v>`;
  const open = kind === "" ? head : `${head.slice(0, -1)} t="${kind}">`;
  return [{ start: cell.start, end, text: `${open}${fresh}${value}</${cell.rawName}>` }];
}

function withoutAttributes(tag: string, names: readonly string[]): string {
  return names.reduce((text, name) => text.replace(new RegExp(`\\s${name}\\s*=\\s*("[^"]*"|'[^']*')`), ""), tag);
}

function valueXml(value: Cell): [kind: string, text: string] {
  if (typeof value === "number") return ["", String(value)];
  if (typeof value === "boolean") return ["b", value ? "1" : "0"];
  if (isCellError(value)) return ["e", value.code];
  return ["str", value ?? ""];
}
