import type { Book } from "../hosts/trial/book";
import { applicantsSheet } from "./book/applicants";
import { bidsSheet, SCORES } from "./book/bids";
import { criteriaSheet } from "./book/criteria";
import { marksSheet, planSheet, riskSheet, searchSheet } from "./book/groups";
import { ratersSheet } from "./book/raters";
import { proofSheet, watchSheet } from "./book/watch";

/** The invented workbook of the trial sheet: two lists to try the pane on, then one area for each group of functions. */
export const exampleBook: Book = {
  name: "Weirmark trial (invented)",
  sheets: [
    bidsSheet,
    applicantsSheet,
    planSheet,
    marksSheet,
    searchSheet,
    riskSheet,
    criteriaSheet,
    ratersSheet,
    watchSheet,
    proofSheet,
  ],
};

/** What is selected when it is opened for the first time. */
export const firstColumn = SCORES;
