import { de } from "./de";
import { en, type Texts } from "./en";

/** Every language that the pane speaks. */
export const languages: Readonly<Record<string, Texts>> = { en, de };

/** The kept language, else the first of the user's own that the pane speaks, else English. */
export function languageFor(kept: unknown, preferred: readonly string[]): string {
  const wanted = [...(typeof kept === "string" ? [kept] : []), ...preferred];
  return wanted.map((tag) => tag.slice(0, 2).toLowerCase()).find((code) => code in languages) ?? "en";
}
