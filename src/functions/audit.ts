import { NUMBERS_REVISION, RELEASE_NAME, RELEASE_VERSION } from "../core/release";
import { isBlank } from "../sheet/cell";
import { labelTable } from "../sheet/tables";

/**
 * Says which release computes these cells, and which revision of the numbers it is: keep it beside a mark that must be defended later.
 *
 * @customfunction RELEASE
 * @param {any} [item] One label alone: "name", "version" or "revision". Left out: the whole table.
 * @returns {any[][]} Two columns, label and value. The revision is raised whenever any result changes beyond its stated accuracy.
 * @choices item "name" "version" "revision"
 * @question Which release computed this sheet?
 * @example =WEIR.RELEASE("revision") => 1
 */
export function RELEASE(item?: any): any {
  return labelTable(
    [
      ["name", RELEASE_NAME],
      ["version", RELEASE_VERSION],
      ["revision", NUMBERS_REVISION],
    ],
    item,
  );
}

/**
 * Tells what this build of the host does with a blank cell: some hand it over as 0, which would count as a score.
 *
 * @customfunction BLANK_CHECK
 * @param {any[][]} cell One empty cell of the sheet.
 * @returns {any} A sentence: blanks arrive as blanks, or as 0 and what to do about it.
 * @question Are my blank cells skipped, or counted as 0?
 * @example =WEIR.BLANK_CHECK("") => "blanks arrive as blanks"
 */
export function BLANK_CHECK(cell: any[][]): any {
  const value = cell[0]?.[0];
  if (isBlank(value)) return "blanks arrive as blanks";
  if (value === 0)
    return "blanks arrive as 0: a blank inside a range counts as a score of 0 here, so hand over ranges without blanks (this also shows for a cell that really holds 0: give an empty one)";
  return "give an empty cell";
}
