import { DomainError, NoAnswerError } from "../core/domain";
import type { Sample } from "../core/sample/sample";
import type { Range } from "./cell";
import { numberCells } from "./numberCells";
import { sampleOf } from "./sampleMemo";

export interface Scores {
  readonly sample: Sample;
  readonly blanks: number;
}

/**
 * The scores of a range: numbers, blanks skipped. Fewer than `least` is no answer yet (the sheet is still being filled); scores that
 * are all alike are refused unless `spread` is "any".
 */
export function readScores(argument: string, range: Range, least = 2, spread: "needed" | "any" = "needed"): Scores {
  const { values, blanks } = numberCells(argument, range);
  if (values.length < least) {
    const { length } = values;
    const have = length === 0 ? "there are none yet" : `there ${length === 1 ? "is" : "are"} only ${length} so far`;
    throw new NoAnswerError(
      argument,
      `${argument} needs at least ${least} numbers, and ${have}: score more entries or take a longer range.`,
    );
  }
  const sample = sampleOf(values);
  if (spread === "needed" && values.every((value) => value === values[0])) {
    throw new DomainError(
      argument,
      values[0],
      "numbers that differ from one another",
      `all ${values.length} are ${values[0]}`,
    );
  }
  return { sample, blanks };
}
