/** The words of the pictures below the answer: does the shape fit, and what would more scores buy. */
export const enPictures = {
  fitHeading: "Does the shape fit?",
  fitTitle: (heading: string) => `Scores against the curve: ${heading}`,
  fitAll: (confidence: string) =>
    `Every score lies where the curve expects it: none is outside the band that holds each with ${confidence} confidence.`,
  fitOutside: (outside: string, drawn: string, confidence: string) =>
    `${outside} of the ${drawn} scores drawn lie outside the band that holds each with ${confidence} confidence (hollow points). What counts most is the end where the cutoff stands.`,
  fitExpected: "standard deviations from the middle",
  fitScore: "score",
  fitTableExpected: "Expected at",
  fitTableScore: "Score",
  fitTableLow: "Band from",
  fitTableHigh: "Band to",
  outliersNone: "No score stands out from this shape (generalised ESD test, 5%).",
  outliers: (count: string, places: string) =>
    `${count === "1" ? "One score stands" : `${count} scores stand`} out from this shape: ${places} (generalised ESD test, 5%).`,
  outliersAdvice:
    "See how such a score came about before anything else: it may be a slip of the keyboard, the wrong shape, or the best entry of all. With fewer than 25 scores the test is rough.",
  ranking: "Shapes, best first",
  rankingShape: "Shape",
  rankingDifference: "AICc difference",
  rankingFit: "Anderson-Darling p",
  rankingNote:
    "A difference below 2 tells two shapes hardly apart. Choosing by these scores makes the limits too narrow; a shape known from before does not. The bounds of logit are those typed above.",

  moreHeading: "What would more scores buy?",
  moreTitle: "Share that the mark really lets through, by count of scores",
  moreSentence: (count: string, low: string, high: string, more: string, moreLow: string, moreHigh: string) =>
    `With ${count} scores the mark really lets through ${low} to ${high} of all entries; with ${more} it would be ${moreLow} to ${moreHigh}.`,
  moreNow: (count: string) => `now ${count}`,
  moreThen: (count: string) => `with ${count}`,
  moreCount: "scores",
  moreShare: "share let through",
  moreLowest: "Lowest share",
  moreHighest: "Highest share",
} as const;
