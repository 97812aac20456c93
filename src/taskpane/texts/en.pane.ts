/** The words of the pane around its parts, and of the column that it works on. */
export const enPane = {
  languageName: "English",
  percentGap: "",
  // The pane as a whole
  jumpTo: "Go to",
  language: "Language",
  quoted: (text: string) => `“${text}”`,
  listAnd: (before: string, last: string) => `${before} and ${last}`,
  listMore: (shown: string, more: string) => `${shown} and ${more} more`,

  // The column
  scoresHeading: "Scores",
  noColumn: "Select a column of scores in the sheet: the heading may be part of it.",
  noNumbers: (address: string) => `There is no number in ${address}. Select a column of scores in the sheet.`,
  stillShowing: (selected: string, address: string) =>
    `${selected} holds no column of scores, so this stays with ${address}.`,
  takeColumn: (letters: string) => `Take the whole column ${letters}`,
  columnWithHeading: (heading: string, address: string) => `“${heading}”, ${address}`,
  whichColumn: "Which column",
  scoresCounted: (count: string) => `${count} scores`,
  oneScore: "1 score",
  noBlanks: "no blanks",
  oneBlank: (where: string) => `1 blank skipped (${where})`,
  blanksSkipped: (count: string, where: string) => `${count} blanks skipped (${where})`,
  blanksInExcel:
    "Some builds of Excel hand blank cells to functions as 0. What this one does, =WEIR.BLANK_CHECK of an empty cell tells.",
  offendersOne:
    "1 cell is no score. Correct it or clear it, since a cutoff over only part of the entries would look like one over all:",
  offendersMany: (count: string) =>
    `${count} cells are no scores. Correct them or clear them, since a cutoff over only part of the entries would look like one over all:`,
  holdsText: (shown: string) => `holds the text “${shown}”`,
  holdsNumberAsText: (shown: string) => `holds “${shown}” as text: type the number anew`,
  holdsFlag: (shown: string) => `holds ${shown}`,
  holdsError: (code: string) => `holds the error ${code}`,
  moreOffenders: (count: string) => `and ${count} more`,
  inventedTry: "Try it with invented scores, on a sheet of their own",
  inventedSheet: "Invented scores",
  inventedHeading: "score (invented)",
  holdColumn: "Hold on to this column",
  reading: "Reading…",
  readFailed: (message: string) => `The sheet could not be read: ${message}`,

  // What was typed
  problemEmpty: "Type a value.",
  problemNoNumber: (typed: string) => `“${typed}” is no number. Type it in digits.`,
  problemPercent: (typed: string, meant: string) => `${typed} would be more than 100%. Did you mean ${meant}?`,
  problemNotBetween: "It must lie between 0% and 100%, neither included.",
  problemNotWhole: "A whole number is needed here.",
  problemTooSmall: (least: string) => `It must be at least ${least}.`,
  problemNotPositive: "It must be more than 0.",
} as const;
