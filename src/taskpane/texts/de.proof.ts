import type { enProof } from "./en.proof";
import type { Translated } from "./translated";

export const deProof: Translated<typeof enProof> = {
  proofHeading: "Nachweis",
  proofAbout:
    "Rechnet jede Zelle, die eine dieser Funktionen aufruft, aus den Werten nach, auf denen sie beruht, und sucht, was daneben nicht stimmt: überschriebene Zahlen, zu kurze Bereiche, ausgeblendete Zeilen, gewanderte Schwellen.",
  checkAll: "Alle Aufrufe prüfen",
  checkAgain: "Alle Aufrufe erneut prüfen",
  checkReading: "Die Blätter werden gelesen …",
  checkProgress: (done, calls) => `${done} von ${calls} Aufrufen`,
  checkCancel: "Abbrechen",
  checkCancelled: "Abgebrochen: Diese Prüfung hat kein Ergebnis.",
  checkFailed: (message) => `Die Prüfung ist nicht gelungen: ${message}`,
  checkNoCalls: "Keine Zelle ruft eine dieser Funktionen auf, und auch sonst ist nichts aufgefallen.",
  checkCounts: (calls, agree, differ, unchecked) =>
    `${calls} ${calls === "1" ? "Aufruf" : "Aufrufe"}: ${agree} ${agree === "1" ? "stimmt" : "stimmen"}, ${differ} ${differ === "1" ? "weicht" : "weichen"} ab, ${unchecked} nicht prüfbar.`,
  checkOneNotice: "1 weitere Stelle zum Ansehen.",
  checkNotices: (count) => `${count} weitere Stellen zum Ansehen.`,
  checkedAt: (date, time, revision) => `Geprüft am ${date} um ${time}, mit Revision ${revision} der Zahlen.`,
  checkStale: "Seitdem haben sich Zellen geändert: prüfen Sie erneut.",
  onlyToLookAt: "Nur, was nicht übereinstimmt",
  showAllFound: (count) => `Alle ${count} zeigen`,
  jumpFailed: (address, message) => `${address} ließ sich nicht zeigen: ${message}`,

  foundAgrees: "stimmt",
  foundDiffers: "weicht ab",
  foundNotCheckable: "nicht prüfbar",
  foundTypedOver: "überschrieben",
  foundLeavesOut: "lässt Daten aus",
  foundSkipsRows: "überspringt Zeilen",
  foundOutOfLine: "Bereiche versetzt",
  foundTotal: "nimmt eine Summe mit",
  foundHidden: "ausgeblendete Zeilen",
  foundTwoWays: "auf zwei Arten gefragt",
  foundMarkMoved: "Schwelle gewandert",
  foundSecondOpinion: "Zweitmeinung weicht ab",

  reportLabel: "Ein Bericht dieser Prüfung, mit jedem Urteil:",
  reportPrint: "Zum Drucken (HTML)",
  reportBook: "Arbeitsmappe (.xlsx)",
  reportPlain: "CSV",
  reportName: (book, date) => (book === "" ? `Nachweis ${date}` : `Nachweis ${book} ${date}`),
  reportUnnamed: "die offene Arbeitsmappe",

  workingsHeading: "Rechenweg der gewählten Zelle",
  workingsSelect: "Wählen Sie eine Zelle, die eine dieser Funktionen aufruft.",
  workingsNone: (address) =>
    `Kein Aufruf in ${address} hat einen Rechenweg. Wählen Sie eine Zelle, die eine dieser Funktionen aufruft oder die ihr Ergebnis füllt.`,
  workingsOf: (address) => `So entsteht der Wert von ${address}:`,
  workingsShow: (address) => `Den Rechenweg von ${address} zeigen`,
  workingsFailed: (message) => `Der Rechenweg ließ sich nicht darlegen: ${message}`,
  workingsWhich: "Welcher Aufruf",
  workingsLong: (characters) => `Formel mit ${characters} Zeichen`,
  workingsAll: (count) => `Alle ${count} Schritte zeigen`,
  workingsNoFormula: "Keine Formel: Das Programm hat für diesen Schritt keine Funktion.",
  workingsWhere: "Erste Zelle der Tabelle",
  workingsWhereHint: "Etwa H2. Bleibt es leer: die nächsten freien Zellen rechts.",
  workingsWrite: "Den Rechenweg daneben schreiben",
  workingsNoRoom: (address) => `Rechts von ${address} sind nicht genug Zellen frei. Es wurde nichts geschrieben.`,
  workingsTaken: (cell, shown) =>
    `${cell} enthält ${shown} und wird nicht überschrieben. Wählen Sie eine andere Zelle.`,
  workingsInside: "Die Tabelle bedeckte den Aufruf selbst oder Zellen, die er liest. Wählen Sie eine andere Zelle.",
  workingsOtherSheet: (cell, sheet) =>
    `Die Formeln nennen Zellen so wie ${cell}: auf einem anderen Blatt als „${sheet}“ läsen sie andere Zellen.`,
  workingsDone: (area) => `Der Rechenweg steht in ${area}.`,
  workingsOneLive: "Seine eine Formel rechnet mit und ergibt den Wert daneben.",
  workingsLive: (count) => `Alle ${count} Formeln rechnen mit und ergeben die Werte daneben.`,
  workingsOff: (where) => `Achtung: Etwas anderes als der Wert des Schrittes ergibt sich in ${where}.`,
  workingsLacking: (where) => `Dieses Blatt kann die Formel nicht ausrechnen in ${where}.`,
  workingsTrial:
    "Das Probeblatt rechnet nicht jede Formel wie Excel: Speichern Sie die Mappe und sehen Sie sich diese dort an.",
};
