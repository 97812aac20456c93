/** The words of the cutoff: the question, the answer, how far to trust it, and its way into a cell. */
export const enCutoff = {
  cutoffHeading: "Cutoff",
  fraction: "Share to take",
  fractionHint: (example: string, other: string) => `such as ${example} or ${other}`,
  confidence: "Confidence",
  better: "Better is",
  betterHigh: "higher",
  betterLow: "lower",
  shape: "Shape of the scores",
  shapeNormal: "normal",
  shapeLognormal: "lognormal",
  shapeLogit: "logit",
  shapeBoxcox: "boxcox",
  aboutNormal: "Normal: scores spread alike to both sides.",
  aboutLognormal: "Lognormal: a long upper end, as prices have it; all scores above 0.",
  aboutLogit: "Logit: scores crowd towards a bound; all lie between the two.",
  aboutBoxcox: "Boxcox: a power of the scores, fitted to them; all above 0.",
  shapeLow: "Lowest possible",
  shapeHigh: "Highest possible",
  shapeFitted:
    "The power is fitted to these very scores, so the limits are somewhat too narrow: limits of 95% hold for about 88 to 93% of samples of 20 to 60 scores.",
  shapeChosen:
    "If you chose the shape by looking at these scores, the limits are somewhat too narrow. They are exact for a shape fixed beforehand.",

  takeHigh: (mark: string) => `Take entries scoring ${mark} or more`,
  takeLow: (mark: string) => `Take entries scoring ${mark} or less`,
  trustLimits: (cutoff: string, confidence: string, lower: string, upper: string, count: string) =>
    `The cutoff is computed as ${cutoff}. With ${confidence} confidence the true one lies between ${lower} and ${upper}: ${count} scores tell no more than that.`,
  trustPassing: (fraction: string, low: string, high: string) =>
    `Meant to take ${fraction}, it may really let through anything from ${low} to ${high} of all entries.`,
  trustFit: (p: string) =>
    `The scores don't look like this shape (Anderson-Darling p = ${p}): try another, or take the cutoff by rank, which assumes none.`,
  trustRank: (cutoff: string, lower: string, upper: string) =>
    `By rank it stands at ${cutoff}; lower limit ${lower}, upper limit ${upper}.`,
  passingNow: (passing: string, count: string) => `Of the ${count} scores so far, ${passing} clear it.`,
  passingNowOne: (count: string) => `Of the ${count} scores so far, 1 clears it.`,
  looksAhead: (half: string, most: string) =>
    `Expect to look at ${half} more entries for an even chance of one that clears it, at ${most} for a 90% chance.`,
  people:
    "Where the entries are people, loans or tenders, this number is no decision. It can hit groups unequally, and local law and licensed practice come first.",

  threeHeading: "Three cutoffs, three promises",
  threeKind: "Cutoff",
  threeMark: "Mark",
  threePromise: "What it promises",
  plain: "plain",
  plainPromise: (fraction: string) =>
    `the best estimate of the top ${fraction}; lets through more than that in nearly half of all samples`,
  safe: "safe",
  safePromise: (fraction: string, confidence: string) =>
    `with ${confidence} confidence, no more than ${fraction} of all entries clear it`,
  next: "next-score",
  nextPromise: (fraction: string) =>
    `the next entry clears it with a chance of exactly ${fraction}, on average over samples, not for this one alone`,
  noAnswer: "none",

  reportHeading: "The whole report",
  reportItem: "What",
  reportValue: "Value",
  refused: "No cutoff yet",
  adviceScores: "Give at least two scores that differ. The more there are, the more the mark can be trusted.",
  adviceCells: "Correct the cells listed under Scores, or select a column without them.",
  adviceShape: "Choose another shape: this one can't hold some of the scores.",
  adviceFraction: "Correct the share or the confidence above.",
  missingFunction: (name: string) => `WEIR.${name} is not part of this build.`,

  pictureTitle: (heading: string) => `Scores and cutoff: ${heading}`,
  pictureSentence: (count: string, low: string, high: string, middle: string) =>
    `${count} scores from ${low} to ${high}, half of them above ${middle}.`,
  pictureAllAlike: (count: string, value: string) => `${count} scores, all of them ${value}.`,
  pictureMark: (mark: string, lower: string, upper: string) =>
    `The cutoff stands at ${mark}, its limits at ${lower} and ${upper}.`,
  pictureCutoff: (mark: string) => `cutoff ${mark}`,
  pictureLimits: (lower: string, upper: string) => `limits ${lower} to ${upper}`,
  pictureCount: "how many entries",
  pictureScore: "score",
  pictureTable: "The picture as a table",
  tableFrom: "From",
  tableBelow: "To below",
  tableEntries: "Entries",
  saveSvg: "Save as SVG",
  savePng: "Save as PNG",
  putPicture: "Put into the sheet",
  pictureDone: (address: string) => `The picture stands at ${address}.`,

  formulaHeading: "Into the sheet",
  formulaWhat: "What to put",
  putReport: "the whole report (14 × 2 cells)",
  putCutoff: "the cutoff",
  putLimits: "the cutoff and its limits (3 × 2)",
  putSafe: "the safe cutoff",
  putNext: "the next-score cutoff",
  putRank: "the cutoff by rank (4 × 2)",
  formulaShown: "Formula",
  copy: "Copy",
  copied: "Copied.",
  targetCell: "Cell",
  useSelected: (address: string) => `Use the selected cell ${address}`,
  putIn: "Put it in",
  putDone: (address: string) => `The formula stands in ${address}.`,
  targetMissing: "Say which cell, such as H2.",
  targetBad: (typed: string) => `“${typed}” is no address of one cell, such as H2.`,
  targetNoSheet: (sheet: string) => `There is no sheet “${sheet}”.`,
  targetEdge: "The result would reach over the edge of the sheet. Choose a cell further up or to the left.",
  targetInside: "That cell belongs to the scores: the formula would read itself.",
  targetTaken: (address: string, shown: string) => `${address} holds ${shown}. Shall it be replaced?`,
  targetNoRoom: (area: string, first: string, shown: string) =>
    `The result needs the cells ${area}, and ${first} holds ${shown}: it would show #SPILL!. Choose another cell.`,
  replace: "Replace it",
  keep: "Leave it",
  writeFailed: (message: string) => `It could not be written: ${message}`,
} as const;
