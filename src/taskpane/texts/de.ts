import { deCutoff } from "./de.cutoff";
import { deFunctions } from "./de.functions";
import { dePane } from "./de.pane";
import { dePictures } from "./de.pictures";
import { dePlan } from "./de.plan";
import { deProof } from "./de.proof";
import { deSearch } from "./de.search";
import { deUse } from "./de.use";
import { deWatch } from "./de.watch";
import type { Texts } from "./en";

export const de: Texts = {
  ...dePane,
  ...deCutoff,
  ...dePictures,
  ...deSearch,
  ...deFunctions,
  ...deUse,
  ...deWatch,
  ...dePlan,
  ...deProof,
};
