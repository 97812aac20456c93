import { parseAddress, type Area } from "../sheet/address";
import { NUMBER_FORMATS } from "../sheet/cellLook";
import { PREFIX, SCORES, STAGE_COSTS, STAGE_REACH } from "./names";
import type { PlanCell, PlanLine, PlanModel, PlanName, PlanQuestion } from "./planModel";
import { curveCheck } from "./sections/curveCheck";
import { inputs } from "./sections/inputs";
import { mark } from "./sections/mark";
import { scoreFirst } from "./sections/scoreFirst";
import { search } from "./sections/search";
import { settle } from "./sections/settle";
import { words } from "./sections/words";

/** Widths in characters: label, value, second value, meaning. One page of A4 or Letter, a little reduced. */
const WIDTHS = [34, 17, 11, 62];
const LINE = 15;
/** Letters to a unit of width: a digit takes one, most letters less. */
const LETTERS = 1.08;

/** What is known of the scores when the plan is written, for the constants in it. */
export interface PlanFacts {
  readonly count: number;
  /** The mark to be held: the plain cutoff of the day, on the grid of the scores; undefined where there is none yet. */
  readonly mark: number | undefined;
}

/** Lays the plan out: inputs, live formulas for the whole job, and what must be said beside them. */
export function layPlan(question: PlanQuestion, { count, mark: held }: PlanFacts): PlanModel {
  const lines: PlanLine[] = [
    { kind: "title", text: `Plan for a pass mark on “${question.heading}”` },
    { kind: "note", text: "Framed cells are inputs: change them, and every number below follows." },
    {
      kind: "caution",
      text: "The number is no decision: groups can be hit unequally; local law and licensed practice come first.",
    },
    ...inputs(question),
    ...scoreFirst(),
    ...curveCheck(),
    ...mark(),
    ...search(question),
    ...settle(question, held, count),
    ...words(question),
  ];
  const sheet = new Layout();
  sheet.names.push({ name: SCORES, area: parseAddress(question.scores)!, input: false });
  for (const line of lines) sheet.add(line);
  return { ...sheet.done(), widths: WIDTHS };
}

class Layout {
  readonly names: PlanName[] = [];
  readonly #rows: (PlanCell | undefined)[][] = [];
  readonly #merged: Area[] = [];
  readonly #heights = new Map<number, number>();
  readonly #choices: PlanModel["choices"][number][] = [];
  readonly #stages: number[] = [];
  readonly #breaks: number[] = [];
  #picture: PlanModel["picture"];

  add(line: PlanLine): void {
    const row = this.#rows.length;
    switch (line.kind) {
      case "gap":
        this.#rows.push([]);
        return;
      case "picture":
        this.#picture = { top: row, bottom: row + line.rows - 1 };
        for (let i = 0; i < line.rows; i++) this.#rows.push([]);
        return;
      case "heading":
        this.#rows.push(
          line.texts.map((value, column) => ({ value, role: column % 3 === 0 ? "heading" : "number heading" })),
        );
        return;
      case "stage":
        this.#stages.push(row);
        this.#rows.push([
          { value: line.label, role: "label" },
          { value: line.reach, role: "input", format: NUMBER_FORMATS.percent },
          { value: line.cost, role: "input", format: NUMBER_FORMATS.decimals },
          { value: line.meaning, role: "note" },
        ]);
        return;
      case "input":
      case "result":
        this.#named(line, row);
        return;
      case "section":
        if (line.newPage) this.#breaks.push(row + 1);
        this.#text(line.kind, line.text);
        return;
      default:
        this.#text(line.kind, line.text);
    }
  }

  #named(line: Extract<PlanLine, { kind: "input" | "result" }>, row: number): void {
    const { name, label, cell, second, meaning, words } = line;
    const input = line.kind === "input";
    this.names.push({ name, area: { top: row, left: 1, bottom: row, right: second ? 2 : 1 }, input });
    if (words) this.#choices.push({ area: { top: row, left: 1, bottom: row, right: 1 }, words });
    this.#rows.push([
      { value: label, role: "label" },
      { ...cell, role: line.kind },
      second && { ...second, role: line.kind },
      { value: meaning, role: "note" },
    ]);
    this.#tall(row, Math.max(label.length / WIDTHS[0]!, meaning.length / WIDTHS[3]!) / LETTERS);
  }

  #text(role: "title" | "section" | "caution" | "note" | "wrapped", text: string): void {
    if (role === "section") this.#rows.push([]);
    const row = this.#rows.length;
    const rule = role === "section" || role === "caution";
    const first: PlanCell = { value: text, role };
    this.#rows.push(
      rule ? [first, ...[1, 2, 3].map((): PlanCell => ({ role: role === "section" ? role : "plain" }))] : [first],
    );
    if (role === "title") this.#heights.set(row, 24);
    if (role === "section") this.#heights.set(row, 18);
    if (role === "title" || role === "section") return;
    this.#merged.push({ top: row, left: 0, bottom: row, right: WIDTHS.length - 1 });
    // Bold letters are wider.
    const letters = role === "caution" ? text.length * 1.12 : text.length;
    this.#tall(row, letters / WIDTHS.reduce((sum, width) => sum + width, 0) / LETTERS);
  }

  #tall(row: number, lines: number): void {
    if (lines > 1) this.#heights.set(row, Math.ceil(lines) * LINE);
  }

  done(): Omit<PlanModel, "widths"> {
    const [top, bottom] = [this.#stages[0]!, this.#stages[this.#stages.length - 1]!];
    const stages: PlanName[] = [
      { name: STAGE_REACH, area: { top, left: 1, bottom, right: 1 }, input: true },
      { name: STAGE_COSTS, area: { top, left: 2, bottom, right: 2 }, input: true },
    ];
    return {
      rows: this.#rows,
      names: [...this.names, ...stages],
      merged: this.#merged,
      heights: this.#heights,
      choices: this.#choices,
      breaksBefore: this.#breaks,
      picture: this.#picture,
    };
  }
}

/** True for a name that a plan gives. */
export function isPlanName(name: string): boolean {
  return name.toLowerCase().startsWith(PREFIX);
}
