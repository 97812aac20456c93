import type { Cell } from "../../sheet/cell";
import type { Numbers } from "../numbers";
import type { Texts } from "../texts/en";
import type { CutoffAnswer, CutoffFigures, Refusal } from "./answerCutoff";

/** A mark as it is read: one digit finer than the scores. */
export function markText(value: number, { decimals, spread }: CutoffFigures, numbers: Numbers): string {
  const fine = decimals === undefined ? Math.min(Math.max(Math.ceil(3 - Math.log10(spread)), 0), 10) : decimals + 1;
  return numbers.number(value, fine);
}

/** "Take entries scoring 82.0 or more": the mark on the grid of the scores, which takes just the entries that the cutoff takes. */
export function takeSentence({ question, report }: CutoffAnswer, texts: Texts, numbers: Numbers): string {
  const { mark, decimals } = report!.spoken;
  const shown = numbers.number(mark, decimals);
  return question.better === "low" ? texts.takeLow(shown) : texts.takeHigh(shown);
}

/** How far to trust it, in sentences: what stands right under the mark. */
export function trustSentences({ question, report }: CutoffAnswer, texts: Texts, numbers: Numbers): string[] {
  const figures = report!;
  const { percent, exactPercent, count } = numbers;
  const mark = (value: number) => markText(value, figures, numbers);
  const all = count(figures.count);
  const sentences = [
    texts.trustLimits(
      mark(figures.cutoff),
      exactPercent(question.confidence),
      mark(figures.lower),
      mark(figures.upper),
      all,
    ),
    texts.trustPassing(
      exactPercent(question.fraction),
      percent(figures.lowestPassing),
      percent(figures.highestPassing),
    ),
    figures.passing === 1 ? texts.passingNowOne(all) : texts.passingNow(count(figures.passing), all),
  ];
  if (figures.looksHalf !== undefined && figures.looksMost !== undefined)
    sentences.push(texts.looksAhead(count(figures.looksHalf), count(figures.looksMost)));
  return sentences;
}

/** What to beware of: a shape that doesn't fit, or one that was chosen by the scores themselves. */
export function shapeWarnings({ question, report }: CutoffAnswer, texts: Texts, numbers: Numbers): string[] {
  const { fitP, rank } = report!;
  const warnings: string[] = [];
  if (rank) {
    const limit = (cell: Cell) => (typeof cell === "number" ? markText(cell, report!, numbers) : texts.noAnswer);
    const byRank = texts.trustRank(markText(rank.cutoff, report!, numbers), limit(rank.lower), limit(rank.upper));
    warnings.push(`${texts.trustFit(numbers.telling(fitP!))} ${byRank}`);
  }
  if (question.shape === "boxcox") warnings.push(texts.shapeFitted);
  else if (question.shape !== "normal") warnings.push(texts.shapeChosen);
  return warnings;
}

/** What to do about a refusal: judged by the argument that its message begins with. */
export function refusalAdvice({ name, message }: Refusal, offenders: boolean, texts: Texts): string {
  if (message === "") return texts.missingFunction(name);
  if (offenders) return texts.adviceCells;
  if (/^(fraction|confidence)\b/.test(message)) return texts.adviceFraction;
  if (/\bshape\b|logarithm|lognormal|logit|boxcox/i.test(message)) return texts.adviceShape;
  return texts.adviceScores;
}
