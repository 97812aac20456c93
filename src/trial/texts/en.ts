import type { Extra } from "../../hosts/file/notShown";

function counted(one: string, many: string): (count: number) => string {
  return (count) => (count === 1 ? `1 ${one}` : `${count} ${many}`);
}

/** The words of the page around sheet and pane. */
export const en = {
  // The frame
  invented: "A sheet to try it in. All names and numbers are invented.",
  own: (file: string) => `${file}, opened from your files. Nothing of it leaves this browser.`,
  kept: "Changes stay in this browser.",
  notKept: "This browser keeps no changes: a reload loses them.",
  notHere: "A1# and @A1 don’t work in this sheet.",
  help: "Cell functions",
  open: "Open a file",
  save: "Save as .xlsx",
  startOver: "Start over",
  discardAsked: "Discard this workbook and go back to the invented one?",
  discard: "Discard",
  keep: "Keep it",
  show: "Show",
  sheet: "Sheet",
  pane: "Pane",
  opening: "Opening the sheet …",
  selectedCells: (rows: number, columns: number) => `${rows} × ${columns} cells`,
  cannotOpen: "The sheet can’t be opened. “Start over” discards what was kept of it in this browser.",
  cannotShow: (file: string) => `${file} was read, but the sheet can’t show it. What was here before is back.`,

  // Opening a file
  notLoaded: "A part of this page can’t be fetched: is its server still running? Nothing here has changed.",
  dropHere: "Drop a .xlsx, .csv or .tsv file to open it here",
  oneFile: "One file at a time, please: a .xlsx, .csv or .tsv file.",
  reading: (file: string) => `Reading ${file} …`,
  cancel: "Cancel",
  close: "Close",
  refused: (file: string) => `${file} can’t be opened; the workbook here stays as it was.`,
  noStore:
    "This browser keeps nothing for this page, and an opened file must be kept: allow the page to store data, as some private windows don’t. The workbook here stays as it was.",
  found: (file: string, cells: string, sheets: number) =>
    `${file}: ${cells} cells on ${sheets === 1 ? "1 sheet" : `${sheets} sheets`}.`,
  replaces: "It takes the place of the workbook here. Save that first if you still need it.",
  extras: (list: string) =>
    `Not shown here, and missing in a copy saved from here: ${list}. The file itself stays as it is.`,
  frozen: (count: number, first: string) =>
    count === 1
      ? `The formula in ${first} can’t be computed in this sheet: it shows the value that the file holds.`
      : `${count} formulas can’t be computed in this sheet (the first in ${first}): it shows the values that the file holds.`,
  pinned: (count: number) =>
    `${count === 1 ? "1 formula names" : `${count} formulas name`} a spilled range (A1#) or a part of a table: here they stand as plain ranges, which don’t grow.`,
  openIt: "Open it",
  keepThis: "Keep what is here",

  // Saving
  saving: (file: string) => `Writing ${file} …`,
  saved: (file: string) => `${file} is handed to your browser, which puts it where downloads go.`,
  notSaved: "The workbook could not be written; nothing of it is lost here.",

  // What a file may hold that is not shown
  extra: {
    charts: counted("chart", "charts"),
    pictures: counted("picture", "pictures"),
    pivots: counted("pivot table", "pivot tables"),
    notes: () => "notes on cells",
    controls: () => "buttons and embedded files",
    otherWorkbooks: () => "links to other workbooks",
    conditions: () => "conditional formats",
    validations: () => "rules for what may be typed",
    links: () => "hyperlinks",
    decoration: () => "some colours and borders",
  } satisfies Record<Extra, (count: number) => string>,
} as const;

export type TrialTexts = {
  readonly [Key in keyof typeof en]: (typeof en)[Key] extends (...given: infer Given) => string
    ? (...given: Given) => string
    : (typeof en)[Key] extends string
      ? string
      : Readonly<Record<Extra, (count: number) => string>>;
};
