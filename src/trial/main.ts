import "./trial.css";
import { returnToBookBefore } from "../hosts/trial/keptBook";
import { setUpFrame, showFailure } from "./frame";
import { frameTexts, showFrameTexts } from "./language";
import { openTrial } from "./openTrial";
import { sayAfterReload, saySaid } from "./saidBefore";

showFrameTexts();
setUpFrame();
saySaid();
openTrial().catch(async (failure: unknown) => {
  console.error(failure);
  const file = document.getElementById("what")!.dataset["file"] ?? "";
  // A file that was read and still can't be shown must not take the workbook before with it.
  if (await returnToBookBefore()) {
    sayAfterReload(frameTexts().cannotShow(file));
    location.reload();
  } else showFailure(frameTexts().cannotOpen);
});
