import { aggregate } from "./aggregate";
import { arithmetic } from "./arithmetic";
import { conditional } from "./conditional";
import { counts } from "./counts";
import { date } from "./date";
import { distribution } from "./distribution";
import { logic } from "./logic";
import { lookup } from "./lookup";
import type { Native } from "./native";
import { order } from "./order";
import { pairs } from "./pairs";
import { shape } from "./shape";
import { sorting } from "./sorting";
import { statistics } from "./statistics";
import { text } from "./text";

/** Every function of the host that the evaluator knows. What is not here is not known: it is never guessed at. */
export const natives: ReadonlyMap<string, Native> = new Map(
  [
    aggregate,
    arithmetic,
    conditional,
    counts,
    date,
    distribution,
    logic,
    lookup,
    order,
    pairs,
    shape,
    sorting,
    statistics,
    text,
  ].flatMap((table) => Object.entries(table)),
);
