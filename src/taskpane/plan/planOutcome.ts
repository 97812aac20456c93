/** What was done. */
export interface PlanOutcome {
  readonly sheet: string;
  /** True where a plan was there and was brought up to date. */
  readonly updated: boolean;
  /** Inputs that the user changed on the sheet, which were left alone, by their labels. */
  readonly left: readonly string[];
  /** Where a picture belongs, where the host draws no chart of its own. */
  readonly picture?: string;
}
