import "./trial.css";
import { setUpFrame, showFailure } from "./frame";

setUpFrame();
// The sheet is most of the code: the frame stands before it is read.
import("./openTrial")
  .then(({ openTrial }) => openTrial())
  .catch((failure: unknown) => {
    console.error(failure);
    showFailure("The sheet can’t be opened. “Start over” discards what was kept of it in this browser.");
  });
