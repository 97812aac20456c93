import { enCutoff } from "./en.cutoff";
import { enFunctions } from "./en.functions";
import { enPane } from "./en.pane";
import { enPictures } from "./en.pictures";
import { enPlan } from "./en.plan";
import { enProof } from "./en.proof";
import { enSearch } from "./en.search";
import { enUse } from "./en.use";
import { enWatch } from "./en.watch";
import type { Translated } from "./translated";

export const en = {
  ...enPane,
  ...enCutoff,
  ...enPictures,
  ...enSearch,
  ...enFunctions,
  ...enUse,
  ...enWatch,
  ...enPlan,
  ...enProof,
};

export type Texts = Translated<typeof en>;
