import type { BookSheet } from "../../hosts/trial/book";
import { SCORES } from "./bids";
import { answers, table } from "./answers";

// Invented: the scores of the weeks after the mark was set; the panel has become milder towards the end.
const RECENT = [61.5, 66, 58.5, 70, 63.5, 68, 72.5, 66.5, 74, 71, 69.5, 76.5, 73, 78, 75.5];
const LAST = 5 + RECENT.length;

export const watchSheet: BookSheet = {
  name: "Watch",
  columnWidths: [300, 88, 24, 110, 88, 88, 88, 64, 24, 220, 88],
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
    ...table("D4", "Have the scores drifted?", `=WEIR.DRIFT_FLAGS(A6:A${LAST},64,10)`),
    ...table("J4", "Against the bids before", `=WEIR.DRIFT_COMPARISON(${SCORES},A6:A${LAST})`),
  ],
};

export const proofSheet: BookSheet = {
  name: "Proof",
  columnWidths: [300, 88, 24, 230, 260, 140, 260, 260],
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
    ...table("A4", "2,000 trial runs: learn on 20, take 10 %", "=WEIR.SIMULATED_SEARCH(64,10,10%,20,,2000)"),
    ...answers(14, "This sheet", [
      ["what it does with a blank cell", "=WEIR.BLANK_CHECK(C1)"],
      ["revision of the numbers", '=WEIR.RELEASE("revision")'],
    ]),
    ...table("D4", "The plain mark, step by step", `=WEIR.WORKINGS("TOP_FRACTION_CUTOFF",${SCORES},10%)`),
  ],
};
