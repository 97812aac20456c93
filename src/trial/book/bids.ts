import type { Cell } from "../../sheet/cell";
import type { BookSheet } from "../../hosts/trial/book";

/*
 * Invented: a tender of school kitchens for chilled delivery. Number, bidder, week of arrival, price for a delivery day, four marks of
 * the panel from 0 to 10, score. Five bids have arrived but aren't scored yet, two were withdrawn.
 */
// prettier-ignore
const BIDS: readonly (readonly Cell[])[] = [
  [1, "Wendmoor", 1, 611.5, 7.5, 8.0, 8.0, 7.0, 77.0],
  [2, "Corvrek", 1, 560.0, 8.5, 7.5, 6.5, 6.5, 73.2],
  [3, "Quintor", 1, 677.5, 9.0, 6.5, 8.0, 7.5, 74.1],
  [4, "Istermere", 1, 720.5, 4.5, 5.0, 5.5, 5.5, 52.8],
  [5, "Haskbrick", 1, 633.5, 4.5, 5.5, 7.0, 6.0, 56.6],
  [6, "Wendling", 1, 944.0, 3.5, 5.0, 7.0, 6.0, 50.7],
  [7, "Zellmere", 1, 730.5, 4.5, 4.0, 5.5, 4.5, 43.7],
  [8, "Rusktor", 1, 604.0, 7.5, 6.5, 8.5, 8.0, 76.9],
  [9, "Venvane", 2, 431.5, 5.5, 6.5, 8.0, 4.5, 66.6],
  [10, "Venian", 2, 633.0, 8.5, 8.5, 9.0, 5.0, 79.1],
  [11, "Quinmere", 2, 630.0, 8.5, 8.5, 8.5, 6.5, 81.3],
  [12, "Nimmoor", 2, 698.0, 5.5, 7.0, 4.5, 7.5, 63.1],
  [13, "Wendsten", 2, 742.0, 5.5, 6.0, 8.5, 6.5, 65.3],
  [14, "Haskmere", 2, 554.0, 9.5, 5.5, 7.0, 9.0, 75.5],
  [15, "Ruskmoor", 2, 697.5, 6.5, 6.5, 9.0, 7.5, 72.7],
  [16, "Belian", 2, 951.0, 5.5, 7.5, 8.0, 6.5, 65.5],
  [17, "Alnwick", 3, 714.5, 6.5, 7.5, 7.5, 9.5, 79.4],
  [18, "Corvbrick", 3, 628.5, 6.5, 7.5, 5.0, 7.5, null],
  [19, "Orbelin", 3, 708.0, 3.0, 5.5, 5.0, 6.0, 46.1],
  [20, "Pellador", 3, 651.5, 8.0, 7.5, 6.0, 6.0, 66.0],
  [21, "Umbermere", 3, 533.5, 6.5, 7.0, 6.5, 5.0, 63.4],
  [22, "Zelltor", 3, 819.5, 9.0, 7.0, 7.5, 8.5, 83.1],
  [23, "Umberling", 3, 696.0, 2.5, 5.5, 3.5, 5.0, 43.2],
  [24, "Yartor", 3, 798.0, 6.0, 8.0, 7.0, 8.5, 70.6],
  [25, "Kessdale", 4, 685.5, 6.5, 4.0, 6.5, 9.0, 65.2],
  [26, "Wendbrick", 4, 611.5, 7.5, 6.5, 7.5, 9.0, 72.6],
  [27, "Corvtor", 4, 662.5, 4.0, 5.5, 8.0, 5.0, 56.8],
  [28, "Tavling", 4, 542.0, 5.5, 4.0, 8.0, 5.5, 54.5],
  [29, "Belrek", 4, 1144.5, 7.0, 7.5, 7.0, 5.0, 68.8],
  [30, "Tavdale", 4, 513.5, 7.5, 7.0, 7.5, 7.5, 73.6],
  [31, "Venock", 4, 677.5, 4.0, 5.0, 4.0, 6.5, 45.2],
  [32, "Sorvling", 4, 699.0, 7.0, 6.5, 6.5, 7.0, 69.3],
  [33, "Pellvane", 5, 582.5, 4.5, 6.0, 7.0, 6.5, 57.8],
  [34, "Drodale", 5, 527.5, 6.5, 7.0, 4.5, 5.5, 63.1],
  [35, "Zellbrick", 5, 692.5, 4.5, 7.0, 6.0, 6.5, 59.8],
  [36, "Corvvane", 5, 619.0, 6.5, 5.0, 6.0, 6.0, 55.6],
  [37, "Alnelin", 5, 575.5, 4.5, 6.0, 5.5, 3.0, 50.1],
  [38, "Meldale", 5, 709.5, 6.5, 6.0, 8.0, 7.0, 67.1],
  [39, "Istervane", 5, 646.0, 5.5, 5.5, 6.0, 5.0, 56.9],
  [40, "Kessmere", 5, 719.5, 3.5, 6.5, 7.5, 5.5, 55.4],
  [41, "Corvsten", 6, null, 9.0, 7.5, 7.0, 6.0, null],
  [42, "Lorvane", 6, 594.5, 5.5, 7.0, 3.0, 6.0, 56.5],
  [43, "Pellian", 6, 633.0, 6.5, 7.5, 5.5, 7.5, 68.5],
  [44, "Alnsten", 6, 653.0, 4.5, 4.5, 5.0, 7.5, 51.7],
  [45, "Ruskling", 6, 694.5, 6.5, 7.0, 5.5, 6.0, 63.0],
  [46, "Sorvsten", 6, 681.0, 8.0, 8.0, 7.0, 5.5, 70.2],
  [47, "Haskvane", 6, 603.0, 5.5, 5.5, 7.5, 6.0, 62.7],
  [48, "Lorock", 6, 518.5, 5.0, 8.5, 5.5, 5.5, 63.8],
  [49, "Orbador", 7, 782.0, 7.5, 6.5, 6.0, 6.0, 66.2],
  [50, "Tullwick", 7, 959.0, 7.5, 7.0, 8.0, 7.0, 73.3],
  [51, "Fensten", 7, 698.5, 6.5, 6.5, 6.0, 7.0, 66.4],
  [52, "Zellian", 7, 774.0, 5.0, 7.0, 4.5, 7.5, 60.0],
  [53, "Umberbrick", 7, 835.5, 5.5, 5.0, 7.5, 7.5, 61.7],
  [54, "Wendian", 7, 849.5, 4.5, 6.5, 7.5, 6.5, 60.0],
  [55, "Yarrek", 7, 575.0, 5.5, 4.0, 6.5, 5.5, 51.1],
  [56, "Haskwick", 7, 737.0, 7.0, 8.5, 9.0, 6.5, 81.6],
  [57, "Alntor", 8, 682.0, 6.5, 5.5, 4.0, 6.0, 57.3],
  [58, "Fenling", 8, 695.0, 6.5, 6.0, 6.5, 5.5, 60.5],
  [59, "Belador", 8, 976.0, 8.5, 7.0, 8.5, 6.5, 79.6],
  [60, "Ruskelin", 8, 666.0, 6.0, 7.5, 5.5, 5.0, 64.4],
  [61, "Tavador", 8, 596.0, 6.5, 8.5, 9.5, 8.0, 76.7],
  [62, "Belvane", 8, 721.0, 8.5, 6.0, 5.0, 5.5, 62.2],
  [63, "Isterador", 8, 813.0, 8.0, 7.5, 8.5, 8.0, 81.0],
  [64, "Nimador", 8, 769.5, 6.0, 4.5, 6.5, 5.5, 55.2],
  [65, "Umbermoor", 9, 500.0, 7.5, 6.0, 6.0, 6.0, 66.1],
  [66, "Umberelin", 9, 537.5, 4.0, 5.0, 7.0, 5.0, 46.9],
  [67, "Tulldale", 9, 600.0, 4.0, 4.5, 7.0, 6.5, 51.2],
  [68, "Melvane", 9, 632.0, null, null, null, null, null],
  [69, "Melmere", 9, 464.0, null, null, null, null, null],
  [70, "Yarador", 9, 701.5, null, null, null, null, null],
  [71, "Orbwick", 9, 793.5, null, null, null, null, null],
  [72, "Zellador", 9, 1087.0, null, null, null, null, null],
];

export const FIRST_BID = 7;
export const LAST_BID = FIRST_BID + BIDS.length - 1;
/** The score column and the price column, as the other sheets name them. */
export const SCORES = `Bids!I${FIRST_BID}:I${LAST_BID}`;
export const PRICES = `Bids!D${FIRST_BID}:D${LAST_BID}`;

const own = (column: string) => `${column}${FIRST_BID}:${column}${LAST_BID}`;

export const bidsSheet: BookSheet = {
  name: "Bids",
  columnWidths: [40, 104, 50, 88, 68, 92, 52, 88, 56, 124, 24, 216, 72],
  frozenRows: 6,
  blocks: [
    { at: "A1", style: "title", cells: [["Bids for chilled delivery to school kitchens"]] },
    {
      at: "A2",
      style: "note",
      cells: [["Invented. Bids arrive over nine weeks; the panel scores each as it comes, from 0 to 100."]],
    },
    {
      at: "A3",
      style: "caution",
      cells: [
        [
          "The mark sorts out what to look at closely. It awards nothing: the tender’s own rules and the law come first.",
        ],
      ],
    },
    { at: "L4", cells: [["Fraction of bids to take", null]] },
    { at: "M4", format: "0%", cells: [[0.1]] },
    {
      at: "A6",
      style: "heading",
      cells: [
        ["No.", "Bidder", "Week", "Price a day", "Hygiene", "Punctuality", "Fleet", "References", "Score", "Verdict"],
      ],
    },
    { at: "L6", style: "heading", cells: [["The mark, and how far to trust it", null]] },
    { at: `A${FIRST_BID}`, cells: BIDS.map((row) => row.slice(0, 3)) },
    { at: `D${FIRST_BID}`, format: "#,##0.00", cells: BIDS.map((row) => row.slice(3, 4)) },
    { at: `E${FIRST_BID}`, format: "0.0", cells: BIDS.map((row) => row.slice(4)) },
    { at: `J${FIRST_BID}`, cells: [[`=WEIR.CUTOFF_VERDICT(${own("I")},M13,M14)`]] },
    { at: "L7", cells: [[`=WEIR.CUTOFF_REPORT(${own("I")},M4)`]] },
    // Empty, but formatted: the report spills into them.
    { at: "M9", format: "0.00", cells: [[null], [null]] },
    { at: "M11", format: "0.000", cells: [[null]] },
    { at: "M12", format: "0.00", cells: [[null], [null], [null], [null]] },
    { at: "M17", format: "0.0%", cells: [[null], [null]] },
  ],
};
