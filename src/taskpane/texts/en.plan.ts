/** The words of the plan on a sheet of its own. */
export const enPlan = {
  planHeading: "The whole plan on a sheet",
  planWhy:
    "Inputs, live formulas for the whole job, assumptions, cautions and sources on one sheet, ready to print. Written again it is brought up to date; what you added or changed stays.",
  planWrite: "Write the plan",
  planWorking: "Writing …",
  planDone: (sheet: string) =>
    `The plan stands on the sheet “${sheet}”. Framed cells are inputs: look at each, above all where it says “assumed”.`,
  planUpdated: (sheet: string) => `The plan on the sheet “${sheet}” is up to date.`,
  planLeft: (labels: string) => `Left as you changed it: ${labels}.`,
  planTaken: (names: string) =>
    `Nothing was written: this workbook uses the names ${names} for something else. Rename or delete them (in Excel: Formulas, Name Manager), then write the plan again.`,
  planGo: "Go there",
} as const;
