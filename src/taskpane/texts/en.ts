import { enCutoff } from "./en.cutoff";
import { enFunctions } from "./en.functions";
import { enPane } from "./en.pane";
import { enPictures } from "./en.pictures";
import { enSearch } from "./en.search";
import { enUse } from "./en.use";
import { enWatch } from "./en.watch";

export const en = { ...enPane, ...enCutoff, ...enPictures, ...enSearch, ...enFunctions, ...enUse, ...enWatch };

/** What every language has to say: the same keys, and the same things to put in. */
export type Texts = {
  readonly [Key in keyof typeof en]: (typeof en)[Key] extends (...given: infer Given) => string
    ? (...given: Given) => string
    : string;
};
