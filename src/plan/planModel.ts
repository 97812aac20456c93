import type { Area } from "../sheet/address";
import type { Cell } from "../sheet/cell";
import type { CellRole } from "../sheet/cellLook";

/** What a plan is made for: where the scores stand, and what is asked of them. */
export interface PlanQuestion {
  /** The scores alone, with their sheet in front: `Scores!C2:C61`. */
  readonly scores: string;
  /** What the column is called. */
  readonly heading: string;
  readonly fraction: number;
  readonly confidence: number;
  readonly better: "high" | "low";
  /** As a cell function takes it: `normal`, `logit(0,100)` … */
  readonly shape: string;
  /** The day it is written, as 2025-03-14. */
  readonly day: string;
  /** What was already said of the search; usual values stand where nothing was. */
  readonly search?: PlanSearch;
}

export interface PlanSearch {
  readonly hits?: number;
  readonly chance?: number;
  readonly arrivals?: number;
  readonly lookCost?: number;
  readonly looks?: number;
  /** Share of the entries that gets to each stage, and what it costs there. */
  readonly stages?: readonly { readonly label?: string; readonly reach: number; readonly cost: number }[];
}

/** A cell of the plan: a constant, or a formula as it is typed. */
export interface PlanCell {
  readonly value?: Cell;
  readonly formula?: string;
  readonly role: CellRole;
  readonly format?: string;
}

/** One line of the plan. Formulas speak of other lines by their names, and only of lines above them. */
export type PlanLine =
  | { readonly kind: "title" | "caution" | "note" | "wrapped"; readonly text: string }
  | { readonly kind: "section"; readonly text: string; readonly newPage?: boolean }
  | { readonly kind: "heading"; readonly texts: readonly [string, string, string, string] }
  | {
      readonly kind: "input" | "result";
      /** The defined name of its cell, or of its two cells where there are two. */
      readonly name: string;
      readonly label: string;
      readonly cell: Omit<PlanCell, "role">;
      readonly second?: Omit<PlanCell, "role">;
      /** What it means, in which unit. */
      readonly meaning: string;
      readonly words?: readonly string[];
    }
  | {
      readonly kind: "stage";
      readonly label: string;
      readonly reach: number;
      readonly cost: number;
      readonly meaning: string;
    }
  | { readonly kind: "picture"; readonly rows: number }
  | { readonly kind: "gap" };

/** The plan as a sheet: four columns, label, value, second value, meaning. */
export interface PlanModel {
  readonly rows: readonly (readonly (PlanCell | undefined)[])[];
  /** In the order of the rows. The scores' own name stands first. */
  readonly names: readonly PlanName[];
  readonly merged: readonly Area[];
  /** Heights in points, where a text needs more than one line. */
  readonly heights: ReadonlyMap<number, number>;
  readonly widths: readonly number[];
  readonly choices: readonly { readonly area: Area; readonly words: readonly string[] }[];
  /** Where the picture belongs: from its first row to its last. */
  /** Rows that begin a new page. */
  readonly breaksBefore: readonly number[];
  readonly picture: { readonly top: number; readonly bottom: number } | undefined;
}

export interface PlanName {
  readonly name: string;
  /** On the sheet of the plan, or with a sheet of its own in front. */
  readonly area: Area;
  /** True where the user may put in another value. */
  readonly input: boolean;
}
