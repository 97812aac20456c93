import "./trial.css";
import { setUpFrame, showFailure } from "./frame";
import { openTrial } from "./openTrial";

setUpFrame();
openTrial().catch((failure: unknown) => {
  console.error(failure);
  showFailure("The sheet can’t be opened. “Start over” discards what was kept of it in this browser.");
});
