import type { Cell } from "../../sheet/cell";
import type { BookSheet } from "../../hosts/trial/book";
import { table } from "./answers";

/*
 * Invented: ten trial deliveries, each marked from 0 to 20 by three people; the last two were missed by one of them. Then what the kitchens
 * said of the same bidders after a school year, from 0 to 10.
 */
const RATINGS: readonly (readonly Cell[])[] = [
  ["Wendmoor", 14, 12, 15.5, 7.1],
  ["Corvrek", 12.5, 11, 13, 6.8],
  ["Rusktor", 13.5, 12.5, 14, 6.5],
  ["Venian", 16, 13, 17, 8.3],
  ["Quinmere", 15.5, 14.5, 16.5, 7.9],
  ["Haskmere", 14.5, 11.5, 14.5, 7.7],
  ["Zelltor", 16.5, 14, 17.5, 8.0],
  ["Isterador", 12, 9.5, 13.5, 6.1],
  ["Quintor", 15, null, 16, 7.4],
  ["Alnwick", null, 12, 14.5, 6.9],
];
const FIRST = 6;
const LAST = FIRST + RATINGS.length - 1;
const LAST_WHOLE = LAST - 2;

export const ratersSheet: BookSheet = {
  name: "Raters",
  columnWidths: [104, 64, 64, 64, 104, 120, 24, 370, 96, 96, 96],
  blocks: [
    { at: "A1", style: "title", cells: [["Three people mark the same deliveries"]] },
    {
      at: "A2",
      style: "note",
      cells: [
        [
          "Invented. Marks from 0 to 20. The second rater is the strictest; the last two deliveries were missed by one.",
        ],
      ],
    },
    {
      at: "A3",
      style: "caution",
      cells: [["Agreement makes raters neither fair nor right: it only says how much chance is in a mark."]],
    },
    {
      at: "A5",
      style: "heading",
      cells: [["Bidder", "Rater 1", "Rater 2", "Rater 3", "Panel score", "A year later"]],
    },
    { at: `A${FIRST}`, format: "0.0", cells: RATINGS.map((row) => row.slice(0, 4)) },
    {
      at: `E${FIRST}`,
      format: "0.00",
      cells: [[`=WEIR.PANEL_SCORE(B${FIRST}:D${LAST})`], ...RATINGS.slice(1).map(() => [null])],
    },
    { at: `F${FIRST}`, format: "0.0", cells: RATINGS.map((row) => row.slice(4)) },
    {
      at: `A${LAST + 2}`,
      style: "note",
      cells: [["The panel score takes the raters’ severity out: it does not matter who missed a delivery."]],
    },
    ...table("H5", "How far the raters agree", `=WEIR.SCORE_RELIABILITY(B${FIRST}:D${LAST_WHOLE})`, {
      rows: 6,
      columns: ["", "0.00", "0.00", "0.00"],
    }),
    { at: "H14", style: "heading", cells: [["What follows", null]] },
    {
      at: "H15",
      cells: [
        ["standard error of one mark of spread 1.6, severity taken out"],
        ["raters needed for a reliability of 0.95 then"],
      ],
    },
    { at: "I15", format: "0.00", cells: [["=WEIR.SCORE_ERROR_SD(1.6,I9)"]] },
    { at: "I16", cells: [["=WEIR.RATERS_NEEDED(I9,95%)"]] },
    ...table(
      "H18",
      "Do the panel scores foretell the year?",
      `=WEIR.SCORE_VALIDITY(E${FIRST}:E${LAST},F${FIRST}:F${LAST})`,
      { values: ["0", "0.00", "0.00", "0.00"] },
    ),
  ],
};
