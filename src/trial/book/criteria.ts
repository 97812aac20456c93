import type { BookSheet } from "../../hosts/trial/book";
import { FIRST_BID } from "./bids";

const COUNT = 12;
const LAST = FIRST_BID + COUNT - 1;
const rows = Array.from({ length: COUNT }, (_, row) => FIRST_BID + row);

export const criteriaSheet: BookSheet = {
  name: "Criteria",
  columnWidths: [104, 72, 88, 64, 88, 24, 80, 80, 96, 96],
  frozenRows: 6,
  blocks: [
    { at: "A1", style: "title", cells: [["From criteria to one score"]] },
    {
      at: "A2",
      style: "note",
      cells: [
        ["The first twelve bids. Criteria on unlike scales reweight themselves; these four all run from 0 to 10."],
      ],
    },
    { at: "A3", cells: [["Weight", 30, 30, 20, 20]] },
    { at: "A4", cells: [["Minimum", 5, 5, null, null]] },
    {
      at: "A6",
      style: "heading",
      cells: [
        [
          "Bidder",
          "Hygiene",
          "Punctuality",
          "Fleet",
          "References",
          null,
          "Weighted",
          "Minimums",
          "Price points",
          "Sway, top 3",
        ],
      ],
    },
    {
      at: `A${FIRST_BID}`,
      cells: rows.map((row) => [`=Bids!B${row}`, ...["E", "F", "G", "H"].map((column) => `=Bids!${column}${row}`)]),
    },
    {
      at: `G${FIRST_BID}`,
      format: "0.00",
      cells: [[`=WEIR.WEIGHTED_SCORE(B${FIRST_BID}:E${LAST},B3:E3,B4:E4)`], ...rows.slice(1).map(() => [null])],
    },
    { at: `H${FIRST_BID}`, cells: [[`=WEIR.MINIMUMS_MET(B${FIRST_BID}:E${LAST},B4:E4)`]] },
    {
      at: `I${FIRST_BID}`,
      format: "0.0",
      cells: [[`=WEIR.PRICE_POINTS(Bids!D${FIRST_BID}:D${LAST},40)`], ...rows.slice(1).map(() => [null])],
    },
    {
      at: `J${FIRST_BID}`,
      format: "0%",
      cells: [[`=WEIR.WEIGHT_SWAY(B${FIRST_BID}:E${LAST},B3:E3,3)`], ...rows.slice(1).map(() => [null])],
    },
    {
      at: `A${LAST + 2}`,
      style: "note",
      cells: [["Price points hang on the lowest price: when one bid is dropped, others can change places."]],
    },
  ],
};
