import { readSettings } from "../hosts/trial/keptSettings";
import { languageFor } from "../taskpane/texts/languageFor";
import { de } from "./texts/de";
import { en, type TrialTexts } from "./texts/en";

const languages: Readonly<Record<string, TrialTexts>> = { en, de };

/** The language of the frame: the pane's own choice, else the user's. */
export function frameLanguage(): string {
  return languageFor(readSettings()["language"], navigator.languages, Object.keys(languages));
}

export function frameTexts(): TrialTexts {
  return languages[frameLanguage()]!;
}

/** Puts the words of the frame in, once more when the pane's language changes. */
export function showFrameTexts(): void {
  const texts = frameTexts();
  document.documentElement.lang = frameLanguage();
  const put = (kind: "text" | "label", to: (place: HTMLElement, words: string) => void) => {
    for (const place of document.querySelectorAll<HTMLElement>(`[data-${kind}]`)) {
      const words = texts[place.dataset[kind] as keyof TrialTexts];
      if (typeof words === "string") to(place, words);
    }
  };
  put("text", (place, words) => (place.textContent = words));
  put("label", (place, words) => place.setAttribute("aria-label", words));
  const what = document.getElementById("what")!;
  const file = what.dataset["file"];
  if (file !== undefined) what.textContent = texts.own(file);
}

/** From now on a file of the user's own is in the sheet, and no longer what we invented. */
export function showOwnFile(name: string): void {
  document.getElementById("what")!.dataset["file"] = name;
  document.title = `${name} · Weirmark`;
  showFrameTexts();
}
