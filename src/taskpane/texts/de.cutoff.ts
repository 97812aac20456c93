import type { enCutoff } from "./en.cutoff";
import type { Translated } from "./translated";

export const deCutoff: Translated<typeof enCutoff> = {
  cutoffHeading: "Schwelle",
  fraction: "Anteil, der passiert",
  fractionHint: (example, other) => `etwa ${example} oder ${other}`,
  confidence: "Konfidenz",
  better: "Besser ist",
  betterHigh: "höher",
  betterLow: "niedriger",
  shape: "Form der Werte",
  shapeNormal: "normal",
  shapeLognormal: "lognormal",
  shapeLogit: "logit",
  shapeBoxcox: "boxcox",
  aboutNormal: "Normal: die Werte streuen nach beiden Seiten gleich.",
  aboutLognormal: "Lognormal: ein langes oberes Ende, wie bei Preisen; alle Werte über 0.",
  aboutLogit: "Logit: die Werte drängen sich an einer Grenze; alle liegen zwischen beiden.",
  aboutBoxcox: "Boxcox: eine Potenz der Werte, an sie angepasst; alle über 0.",
  shapeLow: "Kleinster möglicher",
  shapeHigh: "Größter möglicher",
  shapeFitted:
    "Die Potenz ist an eben diese Werte angepasst, deshalb sind die Grenzen etwas zu eng: solche von 95 % halten bei 20 bis 60 Werten in etwa 88 bis 93 % der Stichproben.",
  shapeChosen:
    "Wurde die Form nach diesen Werten gewählt, sind die Grenzen etwas zu eng. Genau sind sie für eine Form, die vorher feststand.",

  takeHigh: (mark) => `Nehmen ab ${mark}`,
  takeLow: (mark) => `Nehmen bis ${mark}`,
  trustLimits: (cutoff, confidence, lower, upper, count) =>
    `Die Schwelle ist als ${cutoff} berechnet. Mit ${confidence} Konfidenz liegt die wahre zwischen ${lower} und ${upper}: mehr sagen ${count} Werte nicht.`,
  trustPassing: (fraction, low, high) =>
    `Gemeint sind ${fraction}; in Wirklichkeit passieren vielleicht nur ${low}, vielleicht aber auch ${high} aller Einträge.`,
  trustFit: (p) =>
    `Die Werte sehen nicht nach dieser Form aus (Anderson-Darling p = ${p}): versuchen Sie eine andere, oder nehmen Sie die Schwelle nach Rang, die keine voraussetzt.`,
  trustRank: (cutoff, lower, upper) =>
    `Nach Rang steht sie bei ${cutoff}; untere Grenze ${lower}, obere Grenze ${upper}.`,
  passingNow: (passing, count) => `Von den bisher ${count} Werten erreichen ${passing} sie.`,
  passingNowOne: (count) => `Von den bisher ${count} Werten erreicht 1 sie.`,
  looksAhead: (half, most) =>
    `Rechnen Sie mit ${half} weiteren Einträgen, bis die Aussicht auf einen, der sie erreicht, gleich groß ist wie die auf keinen, und mit ${most} für eine Aussicht von 90 %.`,
  people:
    "Geht es um Menschen, Kredite oder Ausschreibungen, ist diese Zahl keine Entscheidung. Sie kann Gruppen ungleich treffen; örtliches Recht und anerkannte Fachpraxis gehen vor.",

  threeHeading: "Drei Schwellen, drei Zusagen",
  threeKind: "Schwelle",
  threeMark: "Marke",
  threePromise: "Was sie zusagt",
  plain: "einfache",
  plainPromise: (fraction) =>
    `die beste Schätzung für die obersten ${fraction}; lässt bei fast der Hälfte aller Stichproben mehr durch`,
  safe: "sichere",
  safePromise: (fraction, confidence) =>
    `mit ${confidence} Konfidenz erreichen sie höchstens ${fraction} aller Einträge`,
  next: "für den nächsten",
  nextPromise: (fraction) =>
    `der nächste Eintrag erreicht sie mit einer Wahrscheinlichkeit von genau ${fraction}, im Mittel über Stichproben, nicht für diese eine allein`,
  noAnswer: "keine",

  reportHeading: "Der ganze Bericht",
  reportItem: "Was",
  reportValue: "Wert",
  refused: "Noch keine Schwelle",
  adviceScores: "Nötig sind mindestens zwei verschiedene Werte. Je mehr, desto verlässlicher die Schwelle.",
  adviceCells: "Berichtigen Sie die unter Werte genannten Zellen, oder wählen Sie eine Spalte ohne solche.",
  adviceShape: "Wählen Sie eine andere Form: in dieser haben manche der Werte keinen Platz.",
  adviceFraction: "Berichtigen Sie oben Anteil oder Konfidenz.",
  missingFunction: (name) => `WEIR.${name} gehört nicht zu diesem Stand.`,

  pictureTitle: (heading) => `Werte und Schwelle: ${heading}`,
  pictureSentence: (count, low, high, middle) =>
    `${count} Werte von ${low} bis ${high}, die Hälfte davon über ${middle}.`,
  pictureAllAlike: (count, value) => `${count} Werte, alle ${value}.`,
  pictureMark: (mark, lower, upper) => `Die Schwelle steht bei ${mark}, ihre Grenzen bei ${lower} und ${upper}.`,
  pictureCutoff: (mark) => `Schwelle ${mark}`,
  pictureLimits: (lower, upper) => `Grenzen ${lower} bis ${upper}`,
  pictureCount: "wie viele Einträge",
  pictureScore: "Wert",
  pictureTable: "Das Bild als Tabelle",
  tableFrom: "Von",
  tableBelow: "Bis unter",
  tableEntries: "Einträge",
  saveSvg: "Als SVG sichern",
  savePng: "Als PNG sichern",
  putPicture: "Ins Blatt setzen",
  pictureDone: (address) => `Das Bild steht bei ${address}.`,

  formulaHeading: "Ins Blatt",
  formulaWhat: "Was",
  putReport: "der ganze Bericht (14 × 2 Zellen)",
  putCutoff: "die Schwelle",
  putLimits: "die Schwelle und ihre Grenzen (3 × 2)",
  putSafe: "die sichere Schwelle",
  putNext: "die Schwelle für den nächsten Eintrag",
  putRank: "die Schwelle nach Rang (4 × 2)",
  formulaShown: "Formel",
  copy: "Kopieren",
  copied: "Kopiert.",
  targetCell: "Zelle",
  useSelected: (address) => `Die gewählte Zelle ${address} nehmen`,
  putIn: "Eintragen",
  putDone: (address) => `Die Formel steht in ${address}.`,
  targetMissing: "Nennen Sie die Zelle, etwa H2.",
  targetBad: (typed) => `„${typed}“ ist keine Adresse einer einzelnen Zelle wie H2.`,
  targetNoSheet: (sheet) => `Es gibt kein Blatt „${sheet}“.`,
  targetEdge: "Das Ergebnis reichte über den Rand des Blatts. Wählen Sie eine Zelle weiter oben oder weiter links.",
  targetInside: "Diese Zelle gehört zu den Werten: die Formel läse sich selbst.",
  targetTaken: (address, shown) => `${address} enthält ${shown}. Soll das ersetzt werden?`,
  targetNoRoom: (area, first, shown) =>
    `Das Ergebnis braucht die Zellen ${area}, und ${first} enthält ${shown}: es erschiene #SPILL! (#ÜBERLAUF!). Wählen Sie eine andere Zelle.`,
  replace: "Ersetzen",
  keep: "So lassen",
  writeFailed: (message) => `Das konnte nicht geschrieben werden: ${message}`,
};
