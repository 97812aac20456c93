import { forgetBook } from "../hosts/trial/keptBook";
import { forgetSettings } from "../hosts/trial/keptSettings";

function part<Kind extends HTMLElement>(id: string): Kind {
  return document.getElementById(id) as Kind;
}

/** The frame around sheet and pane: starting over, and on a narrow screen which of the two is shown. */
export function setUpFrame(): void {
  const ask = part<HTMLElement>("sure");
  const startOver = part<HTMLButtonElement>("start-over");
  const asking = (open: boolean): void => {
    ask.hidden = !open;
    startOver.hidden = open;
    (open ? part<HTMLButtonElement>("go-on") : startOver).focus();
  };
  startOver.addEventListener("click", () => asking(true));
  part("go-on").addEventListener("click", () => asking(false));
  part("discard").addEventListener("click", () => {
    forgetSettings();
    void forgetBook().finally(() => location.reload());
  });

  const choices = [...document.querySelectorAll<HTMLButtonElement>("[data-shows]")];
  for (const choice of choices)
    choice.addEventListener("click", () => {
      document.body.dataset["show"] = choice.dataset["shows"];
      for (const one of choices) one.setAttribute("aria-pressed", String(one === choice));
    });
}

/** Shows what is wrong instead of the sheet that can't be opened. */
export function showFailure(sentence: string): void {
  const opening = document.getElementById("opening");
  if (opening) opening.textContent = sentence;
  else part("cell").lastElementChild!.textContent = sentence;
}
