import type { enPane } from "./en.pane";
import type { Translated } from "./translated";

export const dePane: Translated<typeof enPane> = {
  languageName: "Deutsch",
  percentGap: "\u00a0",
  jumpTo: "Gehe zu",
  language: "Sprache",
  quoted: (text) => `„${text}“`,
  listAnd: (before, last) => `${before} und ${last}`,
  listMore: (shown, more) => `${shown} und ${more} weitere`,

  scoresHeading: "Werte",
  noColumn: "Wählen Sie im Blatt eine Spalte mit Punktwerten; die Überschrift darf dabei sein.",
  noNumbers: (address) => `In ${address} steht keine Zahl. Wählen Sie im Blatt eine Spalte mit Punktwerten.`,
  stillShowing: (selected, address) =>
    `In ${selected} steht keine Spalte mit Werten, deshalb bleibt es bei ${address}.`,
  takeColumn: (letters) => `Die ganze Spalte ${letters} nehmen`,
  columnWithHeading: (heading, address) => `„${heading}“, ${address}`,
  whichColumn: "Welche Spalte",
  scoresCounted: (count) => `${count} Werte`,
  oneScore: "1 Wert",
  noBlanks: "keine leeren Zellen",
  oneBlank: (where) => `1 leere Zelle übergangen (${where})`,
  blanksSkipped: (count, where) => `${count} leere Zellen übergangen (${where})`,
  blanksInExcel:
    "Manche Ausgaben von Excel übergeben leere Zellen als 0. Was diese tut, sagt =WEIR.BLANK_CHECK auf eine leere Zelle.",
  offendersOne:
    "1 Zelle enthält keinen Wert. Berichtigen oder leeren Sie sie: eine Schwelle über nur einen Teil der Einträge sähe aus wie eine über alle.",
  offendersMany: (count) =>
    `${count} Zellen enthalten keinen Wert. Berichtigen oder leeren Sie sie: eine Schwelle über nur einen Teil der Einträge sähe aus wie eine über alle.`,
  holdsText: (shown) => `enthält den Text „${shown}“`,
  holdsNumberAsText: (shown) => `enthält „${shown}“ als Text: die Zahl neu eintippen`,
  holdsFlag: (shown) => `enthält ${shown}`,
  holdsError: (code) => `enthält den Fehler ${code}`,
  moreOffenders: (count) => `und ${count} weitere`,
  inventedTry: "Mit erfundenen Werten ausprobieren, auf einem eigenen Blatt",
  inventedSheet: "Erfundene Werte",
  inventedHeading: "Wert (erfunden)",
  holdColumn: "Bei dieser Spalte bleiben",
  reading: "Wird gelesen …",
  readFailed: (message) => `Das Blatt konnte nicht gelesen werden: ${message}`,

  problemEmpty: "Geben Sie einen Wert ein.",
  problemNoNumber: (typed) => `„${typed}“ ist keine Zahl. Geben Sie sie in Ziffern ein.`,
  problemPercent: (typed, meant) => `${typed} wäre mehr als 100 %. Ist ${meant} gemeint?`,
  problemNotBetween: "Der Wert muss zwischen 0 % und 100 % liegen, beide ausgeschlossen.",
  problemNotWhole: "Hier wird eine ganze Zahl gebraucht.",
  problemTooSmall: (least) => `Der Wert muss mindestens ${least} sein.`,
  problemNotPositive: "Der Wert muss größer als 0 sein.",
};
