import type { BookSheet } from "../../hosts/trial/book";
import { SCORES } from "./bids";
import { answers, table } from "./answers";

// Invented: the scores of the weeks after the mark was set; the panel has become milder towards the end.
const RECENT = [61.5, 66, 58.5, 70, 63.5, 68, 72.5, 66.5, 74, 71, 76, 73.5, 79, 77.5, 80];
const LAST = 5 + RECENT.length;

export const watchSheet: BookSheet = {
  name: "Watch",
  columnWidths: [220, 24, 24, 110, 88, 88, 88, 64, 24, 220, 88],
  blocks: [
    { at: "A1", style: "title", cells: [["While it runs"]] },
    {
      at: "A2",
      style: "note",
      cells: [
        [
          "Invented. Mean and spread are taken as known; learnt from 60 scores, false alarms are about 1.6 times as frequent.",
        ],
      ],
    },
    { at: "A5", style: "heading", cells: [["Scores since the mark was set"]] },
    { at: "A6", cells: RECENT.map((score) => [score]) },
    ...table("D4", "Have the scores drifted?", `=WEIR.DRIFT_FLAGS(A6:A${LAST},64,10)`, {
      rows: RECENT.length,
      columns: ["", "0.00", "0.00", "0.00"],
    }),
    ...table("J4", "Against the bids before", `=WEIR.DRIFT_COMPARISON(${SCORES},A6:A${LAST})`, {
      values: ["0.00", "0.00", "0.000", "0.00", "0.000", "0.000", "0.000"],
    }),
  ],
};

export const proofSheet: BookSheet = {
  name: "Proof",
  columnWidths: [270, 160, 24, 40, 330, 90, 300, 300],
  blocks: [
    { at: "A1", style: "title", cells: [["Trying it out, and proving it"]] },
    {
      at: "A2",
      style: "note",
      cells: [
        [
          "Invented. The average of a trial run hinges on the most looks allowed when few were learnt from: read the median.",
        ],
      ],
    },
    ...table("A4", "2,000 trial runs: learn on 20, take 10 %", "=WEIR.SIMULATED_SEARCH(64,10,10%,20,,2000)", {
      values: ["0.0", "0", "0", "0.0%", "0.0%", "0.0%", "0.0%"],
    }),
    ...answers(14, "This sheet", [
      ["what it does with a blank cell", "=WEIR.BLANK_CHECK(C1)"],
      ["revision of the numbers", '=WEIR.RELEASE("revision")'],
    ]),
    ...table("D4", "The plain mark, step by step", `=WEIR.WORKINGS("TOP_FRACTION_CUTOFF",${SCORES},10%)`),
  ],
};
