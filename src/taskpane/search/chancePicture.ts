import type { Point } from "../../plot/drawnLine";
import { hitChance } from "../../plot/hitChance";
import type { PaneContext } from "../context";
import type { CutoffAnswer } from "../cutoff/answerCutoff";
import { figure, table } from "../dom/table";
import type { DrawnPicture } from "../picture/pictureFigure";
import { isRefusal, type SearchAnswer } from "./answerSearch";
import { estimatedChance, knownChance } from "./chancePoints";
import type { SearchQuestion } from "./searchQuestion";

const MOST_LOOKS = 20_000;

/** The chance of what is sought by look; undefined where the looks to plan for are refused or beyond drawing. */
export function chancePicture(
  { texts, numbers, call }: PaneContext,
  fraction: number,
  question: SearchQuestion,
  cutoff: CutoffAnswer | undefined,
  answer: SearchAnswer,
): DrawnPicture | undefined {
  const { looksHalf, looksMost, estimated } = answer;
  if (isRefusal(looksHalf) || isRefusal(looksMost) || looksMost > MOST_LOOKS) return undefined;
  const most = Math.max(Math.ceil(Math.max(looksMost, looksHalf) * 1.35), 4);
  const known = knownChance(call, fraction, question.hits, most);
  const chance = estimated ? estimatedChance(call, cutoff!.report!.count, fraction, most) : known;
  if (!chance.every(([, up]) => Number.isFinite(up))) return undefined;
  const asked = numbers.exactPercent(question.chance);
  const half = numbers.count(looksHalf);
  const at = (looks: number, up: number) => ({
    looks,
    chance: up,
    words: texts.chancePoint(numbers.exactPercent(up), numbers.count(looks)),
  });
  const words = {
    title: question.hits === 1 ? texts.chanceTitle : texts.chanceTitleHits(numbers.count(question.hits)),
    description: texts.chanceSentence(half, numbers.count(looksMost), asked),
    looks: texts.chanceLooks,
    chance: texts.chanceUp,
    estimated: texts.chanceEstimated,
    known: texts.chanceKnown,
  };
  const points = [at(looksHalf, 0.5), ...(question.chance === 0.5 ? [] : [at(looksMost, question.chance)])];
  return {
    model: (size) => hitChance({ chance, known: estimated ? known : undefined, points, words, style: numbers }, size),
    table: () => {
      const rows = chance
        .filter((_, index) => index % 4 === 0 || index === chance.length - 1)
        .map(([looks, up]: Point) => {
          const exact = known.find(([other]) => other === looks)![1];
          const cells = [figure(numbers.count(looks)), figure(numbers.percent(up))];
          return estimated ? [...cells, figure(numbers.percent(exact))] : cells;
        });
      const headings = [texts.chanceTableLooks, texts.chanceTableChance];
      return table(words.title, estimated ? [...headings, texts.chanceTableKnown] : headings, rows);
    },
    fileName: words.title,
  };
}
