import { DomainError, NoAnswerError, showValue } from "../core/domain";
import { isBlank, isCellError, ordinalCell, type Cell, type Range } from "./cell";
import { readColumns } from "./readColumn";

export interface Group {
  /** As it stands where the group first appears, white space around it left off. */
  readonly label: Cell;
  assessed: number;
  passed: number;
}

/**
 * Counts those assessed and those passed in each group, in order of first appearance. Labels are the same in any case and with any
 * white space around them, as a sheet compares texts; the number 1 and the text "1" are one label. Rows blank in both are skipped.
 */
export function readGroups(groups: Range, passed: Range): readonly Group[] {
  const [labels, marks] = readColumns("groups", groups, "passed", passed);
  refuseMarks(marks);
  const found = new Map<string, Group>();
  labels.forEach((label, index) => {
    const mark = marks[index];
    if (isBlank(label) && isBlank(mark)) return;
    if (isBlank(label)) refuseCell("groups", label, "filled wherever passed is", index);
    if (isBlank(mark)) refuseCell("passed", mark, "filled wherever groups is", index);
    if (isCellError(label)) refuseCell("groups", label, "labels: texts or numbers", index);
    const key = String(label).trim().toLowerCase();
    let group = found.get(key);
    if (!group)
      found.set(key, (group = { label: typeof label === "string" ? label.trim() : label, assessed: 0, passed: 0 }));
    group.assessed++;
    if (mark === true || mark === 1) group.passed++;
  });
  if (found.size === 0)
    throw new NoAnswerError("groups", "groups and passed hold no entries yet: fill them in or take a longer range.");
  return [...found.values()];
}

function refuseMarks(marks: readonly Cell[]): void {
  const bad = (mark: Cell) => !(typeof mark === "boolean" || mark === 1 || mark === 0 || isBlank(mark));
  const first = marks.findIndex(bad);
  if (first < 0) return;
  const many = marks.filter(bad).length;
  const heading = many === 1 && first === 0 && marks.length > 1 && typeof marks[0] === "string";
  const what = heading
    ? ", which looks like a heading: start both ranges one cell further down"
    : many > 1
      ? ` and ${many - 1} more are something else`
      : "";
  refuseCell("passed", marks[first], "TRUE or FALSE (or 1 or 0) in each cell", first, what);
}

function refuseCell(argument: string, cell: Cell, requirement: string, index: number, more = ""): never {
  throw new DomainError(
    argument,
    cell,
    requirement,
    `${ordinalCell(index + 1)} holds ${showValue(isBlank(cell) ? null : cell)}${more}`,
  );
}
