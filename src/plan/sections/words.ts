import { NUMBER_FORMATS } from "../../sheet/cellLook";
import type { PlanLine, PlanQuestion } from "../planModel";
import { daySerial } from "./settle";
import { result } from "./result";

const ASSUMPTIONS = [
  "The scores are a random sample of the entries that will come, and independent of one another. Entries scored first because they looked best are not.",
  "They are normal on the scale of the shape, which was fixed before the scores were looked at.",
  "Entries come one after another, each a hit with the same chance. Reach and cost of the stages are taken as known.",
  "The usual values marked “assumed” are no advice: put in your own.",
];
const CAUTIONS = [
  "The number is no decision. A person decides, and answers for it.",
  "Groups can be hit unequally: compare their pass rates before the mark is used (WEIR.GROUP_PASS_RATES, WEIR.PASS_RATE_RATIO).",
  "Local law and licensed practice come first, in hiring, in lending, in tenders.",
];
const SOURCES = [
  "Scores first: Greenwood & Sandomire 1950; Owen 1968. Curve: Royston 1995; D’Agostino & Stephens 1986; Rosner 1983; Burnham & Anderson 2002.",
  "Cutoffs and their limits: Owen 1968; Whitmore 1986; without a curve Hyndman & Fan 1996, David & Nagaraja 2003. Errors of the mark: Owen 1968.",
  "Search: Wilks 1941; Geisser 1993; time Ross 2014; cost Wald 1944, Panjer 1981. Reserve: DeGroot 1970; Moser 1956, Guttman 1960.",
];

/** What must be said beside the numbers. */
export function words({ day }: PlanQuestion): PlanLine[] {
  const wrapped = (text: string): PlanLine => ({ kind: "wrapped", text });
  return [
    { kind: "section", text: "What it rests on" },
    ...ASSUMPTIONS.map(wrapped),
    { kind: "section", text: "Cautions" },
    ...CAUTIONS.map((text): PlanLine => ({ kind: "caution", text })),
    { kind: "section", text: "Sources" },
    ...SOURCES.map(wrapped),
    { kind: "section", text: "Written by" },
    result(
      "version",
      "Release",
      'WEIR.RELEASE("version")',
      undefined,
      "Weirmark, the release that works these cells out.",
    ),
    result(
      "revision",
      "Revision of the numbers",
      'WEIR.RELEASE("revision")',
      "0",
      "Raised whenever any result changes beyond its stated accuracy.",
    ),
    {
      kind: "input",
      name: "weir_written",
      label: "Plan written on",
      cell: { value: daySerial(day), format: NUMBER_FORMATS.date },
      meaning: "A constant, set when the plan is written or written again.",
    },
  ];
}
