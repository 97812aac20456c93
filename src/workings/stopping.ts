import { MOST_LOOKS } from "../core/method/mostLooks";
import { reserveSchedule } from "../core/method/reserveSchedule";
import { reserveScore } from "../core/method/reserveScore";
import { readBetter, readCount, readNotNegative, readNumber, readPositive } from "../sheet/readArgument";
import { literal } from "./native";
import { Steps, type Step } from "./steps";
import { addTable } from "./tableSteps";
import type { WorkingsCall } from "./workingsCall";

const DEGROOT = "DeGroot 1970, ch. 13: stopping and one more look come to the same";
const MOSER = "Moser 1956; Guttman 1960: backwards from the last look";

/** E[(Z − u)⁺] of a standard normal Z: what one more look brings beyond u, in standard deviations. */
function gainNative(u: string): string {
  return `LET(u,${u},NORM.S.DIST(u,FALSE)-u*NORM.S.DIST(-u,TRUE))`;
}

export function RESERVE_SCORE(call: WorkingsCall): readonly Step[] {
  const better = readBetter(call.cell("better"));
  const { standardReserve, standardGain, score } = reserveScore(
    readNumber("mean", call.cell("mean")),
    readPositive("sd", call.cell("sd")),
    readNotNegative("look_cost", call.cell("look_cost")),
    readPositive("discount", call.cell("discount"), 1),
    better,
  );
  const [mean, sd, cost] = [call.text("mean"), call.text("sd"), call.text("look_cost")];
  const answer = literal(score);
  const [u, sign] = better === "low" ? [`(${mean}-${answer})/${sd}`, "-"] : [`(${answer}-${mean})/${sd}`, "+"];
  const left = `${call.text("discount", "1")}*(${answer}${sign}(${sd}*${gainNative(u)}-${cost}))-${answer}`;
  return new Steps()
    .add("reserve in standard deviations beyond the mean", standardReserve, u)
    .add(
      "what one more look brings beyond it, in standard deviations",
      standardGain,
      gainNative(u),
      "Raiffa & Schlaifer 1961",
    )
    .add("check: discount × (reserve, better by gain less cost) less the reserve, must be 0", 0, left, DEGROOT)
    .add("reserve score", score, "", DEGROOT).rows;
}

export function RESERVE_SCHEDULE(call: WorkingsCall): readonly Step[] {
  const better = readBetter(call.cell("better"));
  const looks = readCount("looks", call.cell("looks"), 1, MOST_LOOKS);
  const schedule = reserveSchedule(
    readNumber("mean", call.cell("mean")),
    readPositive("sd", call.cell("sd")),
    looks,
    readNotNegative("look_cost", call.cell("look_cost"), 0),
    call.isGiven("fallback") ? readNumber("fallback", call.cell("fallback")) : undefined,
    better,
  );
  const low = better === "low";
  const [mean, sd, cost] = [call.text("mean"), call.text("sd"), call.text("look_cost", "0")];
  const fallback = call.text("fallback");
  const beyond = (mark: string) => (low ? `(${mean}-${mark})/${sd}` : `(${mark}-${mean})/${sd}`);
  // What going on brings with `left` looks left, from the mark of that row; none left, the fallback.
  const expected = (left: number): string => {
    if (left === 0) return fallback;
    const { mark } = schedule[looks - left]!;
    const paid = low ? `+${cost}` : `-${cost}`;
    if (mark === undefined) return `${mean}${paid}`;
    const held = left === 1 ? fallback : literal(mark);
    const taken = `${held}${low ? "-" : "+"}${sd}*${gainNative(beyond(held))}${paid}`;
    return fallback === "" ? taken : `${low ? "MIN" : "MAX"}(${fallback},${taken})`;
  };
  const headings = [
    "looks left",
    low ? "highest score to accept" : "lowest score to accept",
    "expected result",
    "chance this look is accepted",
  ];
  return addTable(new Steps(), headings, looks, (index) => {
    const { looksLeft, mark, expectedResult, acceptChance } = schedule[index]!;
    const chance = mark === undefined ? "1" : `NORM.S.DIST(-${beyond(literal(mark))},TRUE)`;
    return {
      name: `${looksLeft} left`,
      cells: [
        [looksLeft],
        mark === undefined ? ["", "", "the last look must be taken"] : [mark, expected(looksLeft - 1), MOSER],
        [expectedResult, expected(looksLeft), MOSER],
        [acceptChance, chance],
      ],
    };
  }).rows;
}
