import { de } from "./de";
import { en, type Texts } from "./en";

/** Every language that the pane speaks. */
export const languages: Readonly<Record<string, Texts>> = { en, de };
