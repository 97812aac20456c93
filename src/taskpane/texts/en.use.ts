/** The words of what is done with the mark: verdicts, fixed marks, groups. */
export const enUse = {
  useHeading: "Use",
  useWaits: "Once there is a cutoff, it can be used here.",

  verdictHeading: "A verdict for every entry",
  verdictCounts: (clears: string, close: string, short: string) =>
    `Clears: ${clears}. Too close to call: ${close}. Falls short: ${short}.`,
  verdictWhere:
    "An entry clears where it lies beyond the far limit and falls short before the near one; between the two these scores can't tell.",
  verdictCaution:
    "A verdict sorts out what to look at closely: it takes and refuses nobody. “Too close to call” is for people to settle.",
  verdictColumn: "verdict",
  verdictWrite: "Write the verdicts into the next free column",
  verdictDone: (area: string) => `The verdicts stand in ${area}.`,
  verdictNoColumn: "There is no free column near the scores. Put the formula into a cell of your own choice.",

  markHeading: "Fix the mark",
  markWhy:
    "A cutoff moves with every new score. A fixed mark is written down as a constant, with its count, date and reason, and stays.",
  markKind: "Which cutoff",
  markReason: "Reason",
  markReasonHint: "who agreed on it, and why now",
  markReasonMissing: "Say why: whoever has to defend the mark later will need it.",
  markHigh: (mark: string) => `${mark} or more`,
  markLow: (mark: string) => `${mark} or less`,
  markProposal: (mark: string, count: string) =>
    `It would be: ${mark}, on the grid of the scores, from ${count} of them. It goes on the sheet “Fixed marks”.`,
  markProposalExact: (mark: string, count: string) =>
    `It would be: ${mark}, as computed from ${count} scores. It goes on the sheet “Fixed marks”.`,
  markOnGrid: "On the grid of the scores: a mark that a score can have",
  markTies: (count: string, mark: string) =>
    `${count} entries score exactly ${mark}: they pass together, so the share may be missed by that many.`,
  markWrite: "Write it down",
  markDone: (where: string) => `It stands in ${where}.`,
  markFixed: (mark: string, date: string, count: string) => `Fixed on ${date} from ${count} scores: ${mark}.`,
  markStays: (count: string) => `The ${count} scores of today give the same.`,
  markMoves: (count: string, now: string, by: string, higher: boolean) =>
    `The ${count} scores of today would set it at ${now}, ${by} ${higher ? "higher" : "lower"}. It stays until you write down another.`,
  markUnknown: "The scores of today give no mark.",
  markHistory: "Fixed marks of this column, newest first",
  markDate: "Written on",
  markMark: "Mark",
  markScores: "Scores",

  groupsHeading: "Pass rates of groups",
  groupsPick: "Column that names the groups",
  groupsPickHint: "Any cell or part of the column will do: its rows beside the scores are read.",
  groupsOneColumn: "Give one column, such as B2:B61.",
  groupsTooMany: (groups: string, entries: string) =>
    `That column names ${groups} groups for ${entries} entries: rather the entries themselves. Choose a column in which one word stands for many.`,
  groupsNone: "No group passes at less than four fifths of the highest rate.",
  groupsBelow: (names: string, one: boolean) =>
    `${names} ${one ? "passes" : "pass"} at less than four fifths of the highest rate: look into why before the mark is used.`,
  groupsNote: (rate: string) =>
    `Four fifths (${rate}) is a rule for looking closer (29 CFR 1607.4 D), no proof either way: with two equal groups of 20 the ratio falls below it nearly half the time. Entries without a score count in no group.`,
  groupsTitle: "Pass rates of groups",
  groupsLine: "four fifths of the highest",
  groupsRate: (name: string, rate: string) => `${name}: ${rate}`,
  groupsGroup: "Group",
  groupsAssessed: "Assessed",
  groupsPassed: "Passed",
  groupsShare: "Rate",
  groupsRatio: "To highest",
  groupsP: "p, Holm-adjusted",
} as const;
