import type { enWatch } from "./en.watch";
import type { Translated } from "./translated";

export const deWatch: Translated<typeof enWatch> = {
  watchHeading: "Im Lauf der Zeit",
  driftAbout: "Hält die späteren Werte, in der Reihenfolge des Blattes, gegen die ersten: ist die Kurve noch dieselbe?",
  driftFirst: "Wie viele als die ersten gelten",
  driftFirstHint: (usual) => `Leer gelassen: ${usual}.`,
  driftFew: "Braucht mindestens vier Werte und keine Zelle, die keiner ist.",
  driftTitle: (heading) => (heading === "" ? "Werte im Lauf der Zeit" : `Werte im Lauf der Zeit: ${heading}`),
  driftOrder: "Nummer des Wertes",
  driftNone: (count) =>
    `Keine Verschiebung: der geglättete Verlauf der ${count} späteren Werte bleibt in seinen Grenzen.`,
  driftUp: (at) =>
    `Die Werte haben sich nach oben verschoben: bei Wert ${at} verlässt ihr geglätteter Verlauf die Grenzen.`,
  driftDown: (at) =>
    `Die Werte haben sich nach unten verschoben: bei Wert ${at} verlässt ihr geglätteter Verlauf die Grenzen.`,
  driftShift: (by, higher, later, first, p) =>
    `Im Mittel liegen die ${later} späteren Werte um ${by} ${higher ? "höher" : "niedriger"} als die ersten ${first} (Welch p = ${p}).`,
  driftNote:
    "Jeder neue Wert zählt ein Fünftel; die Grenzen sind drei Standardfehler weit. Die ersten Werte gelten als bekannt: aus 60 gelernt, sind Fehlalarme etwa 1,6-mal so häufig, aus 30 doppelt.",
  driftNumber: "Nummer",
  driftSmoothed: "Geglättet",
  driftLower: "Untere Grenze",
  driftUpper: "Obere Grenze",
  driftState: "Stand",
  driftInside: "innerhalb",
  driftOutside: "außerhalb",

  tryHeading: "Die Suche ausprobieren",
  tryAbout: (count, fraction) =>
    `Spielt das Ganze viele Male mit erfundenen normalen Werten: aus ${count} lernen, die Schwelle für die obersten ${fraction} setzen, suchen, bis der erste Eintrag sie erreicht.`,
  tryLearn: "Sichtungen zum Lernen",
  tryMethod: "Schwelle",
  tryRuns: "Durchläufe",
  trySeed: "Startzahl",
  trySeedHint: "dieselbe spielt dieselben Durchläufe",
  tryMost: "Sichtungen, nach denen ein Durchlauf aufgibt",
  tryStart: "Starten",
  tryCancel: "Abbrechen",
  tryProgress: (played, runs) => `${played} von ${runs} Durchläufen gespielt`,
  tryCancelled: "Abgebrochen.",
  tryFailed: (message) => `Das Ausprobieren ist gescheitert: ${message}`,
  tryResult: (median, ninetieth) =>
    `Die Hälfte der Durchläufe endete nach höchstens ${median} Sichtungen, neun von zehn nach höchstens ${ninetieth}.`,
  tryAverage: "Mittlere Sichtungen",
  tryMedian: "Median der Sichtungen",
  tryNinetieth: "90. Perzentil der Sichtungen",
  tryNotTop: "Erster Treffer gehört nicht zu den obersten",
  tryNothing: "Nichts gefunden",
  tryLowest: "Kleinster Anteil, der passiert (5. Perzentil)",
  tryHighest: "Größter Anteil, der passiert (95. Perzentil)",
  tryTable: "Was die Durchläufe ergaben",
  tryNote: "Das Mittel hängt davon ab, wann ein Durchlauf aufgibt: lesen Sie den Median.",
};
