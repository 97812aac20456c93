/*
 * The page of the add-in in Excel. It shares its thread with the cell functions, so nothing of the pane is loaded before somebody looks at it:
 * the first formula must not wait for it.
 */
const HOST_PATIENCE_MS = 10_000;

const room = document.getElementById("pane")!;

function say(words: string): void {
  room.replaceChildren(Object.assign(document.createElement("p"), { textContent: words }));
}

/** The host's answer, or undefined where none comes: with its script blocked, onReady stays silent for ever. */
async function hostAnswer(): Promise<{ host: unknown } | undefined> {
  if (typeof Office === "undefined") return undefined;
  return Promise.race([
    Office.onReady(),
    new Promise<undefined>((resolve) => setTimeout(resolve, HOST_PATIENCE_MS, undefined)),
  ]);
}

/** Resolves once the page can be seen: in a shared runtime it may run unseen for as long as only formulas are computed. */
function seen(): Promise<void> {
  if (document.visibilityState === "visible") return Promise.resolve();
  return new Promise((resolve) => {
    const look = () => {
      if (document.visibilityState !== "visible") return;
      document.removeEventListener("visibilitychange", look);
      resolve();
    };
    document.addEventListener("visibilitychange", look);
  });
}

async function open(): Promise<void> {
  const answer = await hostAnswer();
  if (!answer) return say("Excel does not answer. Close this pane and open it again, or restart Excel.");
  if (answer.host !== Office.HostType.Excel)
    return say("This page belongs into Excel. Outside of it, the trial page shows the same pane beside a sheet.");
  await seen();
  const [{ mountPane }, { excelPort }] = await Promise.all([import("./pane"), import("../hosts/excel/port")]);
  room.replaceChildren();
  mountPane(room, await excelPort());
}

open().catch((failure: unknown) => {
  console.error(failure);
  say("The pane can't be opened. Close it and open it again.");
});
