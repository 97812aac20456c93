import type { BookSheet } from "../../hosts/trial/book";
import { answers, table } from "./answers";
import { PRICES, SCORES } from "./bids";

const ABOUT = "Invented figures. Change any of them: everything that depends on it follows.";

function sheet(name: string, title: string, columnWidths: readonly number[], blocks: BookSheet["blocks"]): BookSheet {
  return {
    name,
    columnWidths,
    blocks: [{ at: "A1", style: "title", cells: [[title]] }, { at: "A2", style: "note", cells: [[ABOUT]] }, ...blocks],
  };
}

/** How many of the prices are called outliers on the scale of a shape. */
function outliers(shape: string): string {
  return `=SUM(IF(WEIR.OUTLIER_FLAGS(${PRICES},,,"${shape}")=TRUE,1,0))`;
}

export const planSheet = sheet(
  "Plan",
  "How many to score first",
  [400, 72, 24, 190, 72, 24, 190, 96, 110, 190],
  [
    ...answers(4, "Bids to score …", [
      ["until the spread is known to 10 %, with 95 % confidence", "=WEIR.SAMPLES_FOR_SD_PRECISION(10%)"],
      ["until the variance is known to 25 %", "=WEIR.SAMPLES_FOR_VARIANCE_PRECISION(25%)"],
      ["until the standard error of the variance is 20 %", "=WEIR.SAMPLES_FOR_VARIANCE_STANDARD_ERROR(20%)"],
      ["until the mean is known to 3 points, with a spread of 10", "=WEIR.SAMPLES_FOR_MEAN_PRECISION(3,10)"],
      ["until a mark for 10 % lets through between 5 % and 18 %", "=WEIR.SAMPLES_FOR_CUTOFF_PRECISION(10%,5%,18%)"],
    ]),
    ...answers(11, "What 65 scores buy", [["the spread is known to", "=WEIR.SD_PRECISION(65)", "0.0%"]]),
    ...answers(15, "Prices that stand out", [
      ["taken as normal: a long tail looks like mistakes", outliers("normal")],
      ["taken as lognormal, as prices often are", outliers("lognormal")],
    ]),
    ...table("D4", "A mark for 10 % from 65 scores", "=WEIR.CUTOFF_PRECISION(65,10%)", { values: ["0.0%", "0.0%"] }),
    ...table("D9", "The bids’ scores", `=WEIR.SCORE_SUMMARY(${SCORES})`, {
      values: ["0", "0", "0.00", "0.00", "0.00", "0.0", "0.0", "0.0", "0.0", "0.0", "0.000", "0.000"],
    }),
    ...table("G4", "Are they normal?", `=WEIR.NORMALITY_CHECK(${SCORES})`, { values: ["0.0000", "0.000"] }),
    ...table("G9", "Their curve", `=WEIR.SCORE_CURVE(${SCORES})`, {
      values: ["", "0", "0.00", "0.00", "", "0.00", "0.00", "0.000", "0.000"],
    }),
    ...table("G20", "Which shape fits the prices best", `=WEIR.SHAPE_RANKING(${PRICES})`, {
      rows: 3,
      columns: ["", "0.0", "0.0", "0.000"],
    }),
  ],
);

export const marksSheet = sheet(
  "Marks",
  "Where the mark stands",
  [530, 72, 24, 130, 72],
  [
    ...answers(4, "Take the best 10 % of the bids", [
      [
        "the plain mark; in nearly half of all samples it lets through more",
        `=WEIR.TOP_FRACTION_CUTOFF(${SCORES},10%)`,
        "0.00",
      ],
      ["the safe mark: with 95 % confidence no more than 10 %", `=WEIR.SAFE_CUTOFF(${SCORES},10%)`, "0.00"],
      [
        "the mark that the next score clears with a chance of 10 %, on average",
        `=WEIR.NEXT_SCORE_CUTOFF(${SCORES},10%)`,
        "0.00",
      ],
      [
        "the price that the cheapest 10 % stay under, prices being lognormal",
        `=WEIR.TOP_FRACTION_CUTOFF(${PRICES},10%,"lognormal","low")`,
        "0.00",
      ],
      ["the same from a curve that is known: mean 64, spread 10", "=WEIR.CURVE_CUTOFF(64,10,10%)", "0.00"],
      [
        "confidence that a bid with 82 points lies beyond the true mark",
        `=WEIR.CLEARANCE_CONFIDENCE(82,${SCORES},10%)`,
        "0.0%",
      ],
      ["tolerance factor: 65 scores, 90 % covered, 95 % confidence", "=WEIR.TOLERANCE_FACTOR(65,90%)", "0.0000"],
    ]),
    ...table("D4", "Limits of the mark", `=WEIR.CUTOFF_LIMITS(${SCORES},10%)`, { values: ["0.00", "0.00", "0.00"] }),
    ...table("D9", "No curve assumed", `=WEIR.RANK_CUTOFF(${SCORES},10%)`, {
      values: ["0.00", "0.00", "0.00", "0.0%"],
    }),
  ],
);

export const searchSheet = sheet(
  "Search",
  "How long it takes, and when to stop",
  [400, 72, 24, 96, 160, 116, 160, 72, 24, 150, 150, 130],
  [
    ...answers(4, "One bid in ten is good enough", [
      ["bids to look at, on average, for 2 of them", "=WEIR.EXPECTED_TRIALS_TO_HIT(10%,2)"],
      ["bids to look at for a 95 % chance of at least 1", "=WEIR.TRIALS_FOR_HIT_CHANCE(10%,95%)"],
      ["chance of at least 1 among 12", "=WEIR.HIT_CHANCE(10%,12)", "0.0%"],
      ["40 bidders, 4 of them good: looks for a 95 % chance", "=WEIR.POOL_TRIALS_FOR_HIT_CHANCE(40,4,95%)"],
      ["weeks until 1 has come, 8 bids a week, 90 % chance", "=WEIR.SEARCH_DURATION(10%,8,90%)", "0.0"],
      ["budget for 1 hit: a quick look costs 1, a visit 6", "=WEIR.SEARCH_BUDGET(10%,{1,0.4},{1,6},90%)"],
    ]),
    ...table("D4", "The load of each stage", "=WEIR.STAGE_LOAD({1,0.4},{1,6},10%,20)"),
    ...answers(13, "When to stop; the curve is taken as known: mean 64, spread 10", [
      ["take the first score from, each look costing 0.5 points", "=WEIR.RESERVE_SCORE(64,10,0.5)", "0.00"],
      ["chance of taking the very best of 12, the curve known", "=WEIR.BEST_PICK_CHANCE(12)", "0.0%"],
    ]),
    ...table("D13", "Six looks left", "=WEIR.RESERVE_SCHEDULE(64,10,6,0.5)", {
      rows: 6,
      columns: ["", "0.00", "0.00", "0.0%"],
    }),
    ...table("J4", "The very best of eight", "=WEIR.BEST_PICK_SCHEDULE(8)", { rows: 8, columns: ["", "", "0.0%"] }),
    ...table("J15", "Only ranks are seen, 20 looks", "=WEIR.RANK_ONLY_PLAN(20)", { values: ["", "0.0%"] }),
  ],
);

export const riskSheet = sheet(
  "Risks",
  "What can go wrong",
  [450, 72, 24, 200, 72],
  [
    {
      at: "A3",
      style: "caution",
      cells: [
        ["Where a mark falls on people, these are figures to weigh with those who know the law, never the decision."],
      ],
    },
    ...answers(5, "A score is not the worth", [
      [
        "truly in the top 10 % of those passed, score and worth correlating 0.6",
        "=WEIR.TRUE_TOP_AMONG_PASSED(10%,10%,0.6)",
        "0.0%",
      ],
      ["mean worth of those passed, in standard units", "=WEIR.WORTH_AMONG_PASSED(10%,0.6)", "0.00"],
      ["standard error of a score with spread 10 and reliability 0.8", "=WEIR.SCORE_ERROR_SD(10,0.8)", "0.00"],
      ["chance that a bid scored 78 truly has 75", "=WEIR.CHANCE_TRUE_SCORE_CLEARS(78,75,4.5,64,9)", "0.0%"],
      ["mark with which at most 5 % of those passed are truly below 75", "=WEIR.GUARDED_CUTOFF(75,4.5,64,9)", "0.00"],
      ["raters needed for a reliability of 0.9, one alone having 0.6", "=WEIR.RATERS_NEEDED(0.6,0.9)"],
    ]),
    ...table("D5", "A plain mark for 10 % from 65 scores", "=WEIR.CUTOFF_ERROR_RATES(65,10%)", {
      values: ["0.0%", "0.0%", "0.0%"],
    }),
    ...table("D10", "9 of 60 passed here, 5 of 62 there", "=WEIR.PASS_RATE_RATIO(9,60,5,62)", {
      values: ["0.0%", "0.0%", "0.00", "", "0.000", "0.00", "0.00"],
    }),
  ],
);
