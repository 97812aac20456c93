import type { enPictures } from "./en.pictures";
import type { Translated } from "./translated";

export const dePictures: Translated<typeof enPictures> = {
  fitHeading: "Passt die Form?",
  fitTitle: (heading) => `Werte gegen die Kurve: ${heading}`,
  fitAll: (confidence) =>
    `Jeder Wert liegt, wo die Kurve ihn erwartet: keiner steht außerhalb des Bandes, das jeden mit ${confidence} Konfidenz hält.`,
  fitOutside: (outside, drawn, confidence) =>
    `${outside} der ${drawn} gezeichneten Werte liegen außerhalb des Bandes, das jeden mit ${confidence} Konfidenz hält (hohle Punkte). Am meisten zählt das Ende, an dem die Schwelle steht.`,
  fitExpected: "Standardabweichungen von der Mitte",
  fitScore: "Wert",
  fitTableExpected: "Erwartet bei",
  fitTableScore: "Wert",
  fitTableLow: "Band von",
  fitTableHigh: "Band bis",
  outliersNone: "Kein Wert fällt aus dieser Form heraus (verallgemeinerter ESD-Test, 5 %).",
  outliers: (count, places) =>
    `${count === "1" ? "Ein Wert fällt" : `${count} Werte fallen`} aus dieser Form heraus: ${places} (verallgemeinerter ESD-Test, 5 %).`,
  outliersAdvice:
    "Zuerst klären, wie ein solcher Wert zustande kam: Er kann ein Tippfehler sein, die falsche Form anzeigen oder der beste Eintrag von allen sein. Bei weniger als 25 Werten ist der Test grob.",
  ranking: "Formen, die beste zuerst",
  rankingShape: "Form",
  rankingDifference: "AICc-Abstand",
  rankingFit: "Anderson-Darling p",
  rankingNote:
    "Ein Abstand unter 2 unterscheidet zwei Formen kaum. Nach diesen Werten zu wählen macht die Grenzen zu eng; eine schon vorher bekannte Form nicht. Die Grenzen für logit sind die oben genannten.",

  moreHeading: "Was brächten mehr Werte?",
  moreTitle: "Anteil, der wirklich passiert, nach Zahl der Werte",
  moreSentence: (count, low, high, more, moreLow, moreHigh) =>
    `Bei ${count} Werten passieren in Wirklichkeit ${low} bis ${high} aller Einträge; bei ${more} wären es ${moreLow} bis ${moreHigh}.`,
  moreNow: (count) => `jetzt ${count}`,
  moreThen: (count) => `bei ${count}`,
  moreCount: "Werte",
  moreShare: "Anteil, der passiert",
  moreLowest: "Kleinster Anteil",
  moreHighest: "Größter Anteil",
};
