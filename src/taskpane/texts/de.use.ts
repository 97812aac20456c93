import type { enUse } from "./en.use";
import type { Translated } from "./translated";

export const deUse: Translated<typeof enUse> = {
  useHeading: "Anwenden",
  useWaits: "Sobald es eine Schwelle gibt, lässt sie sich hier anwenden.",

  verdictHeading: "Ein Urteil für jeden Eintrag",
  verdictCounts: (clears, close, short) =>
    `Erreicht (clears): ${clears}. Zu knapp (too close to call): ${close}. Verfehlt (falls short): ${short}.`,
  verdictWhere:
    "Ein Eintrag erreicht die Schwelle jenseits der ferneren Grenze und verfehlt sie vor der näheren; dazwischen können diese Werte es nicht sagen.",
  verdictCaution:
    "Ein Urteil sortiert, was genau anzusehen ist: Es nimmt niemanden an und lehnt niemanden ab. „Zu knapp“ entscheiden Menschen.",
  verdictColumn: "Urteil",
  verdictWrite: "Die Urteile in die nächste freie Spalte schreiben",
  verdictDone: (area) => `Die Urteile stehen in ${area}.`,
  verdictNoColumn: "Neben den Werten ist keine Spalte frei. Setzen Sie die Formel in eine Zelle Ihrer Wahl.",

  markHeading: "Die Schwelle festschreiben",
  markWhy:
    "Eine Schwelle wandert mit jedem neuen Wert. Eine festgeschriebene steht als Konstante da, mit Anzahl, Datum und Grund, und bleibt.",
  markKind: "Welche Schwelle",
  markReason: "Grund",
  markReasonHint: "wer sie beschlossen hat, und warum jetzt",
  markReasonMissing: "Nennen Sie den Grund: wer die Schwelle später vertreten muss, wird ihn brauchen.",
  markHigh: (mark) => `ab ${mark}`,
  markLow: (mark) => `bis ${mark}`,
  markProposal: (mark, count) =>
    `Es wäre: ${mark}, auf dem Raster der Werte, aus ${count} davon. Das kommt auf das Blatt „Fixed marks“.`,
  markProposalExact: (mark, count) =>
    `Es wäre: ${mark}, wie aus ${count} Werten berechnet. Das kommt auf das Blatt „Fixed marks“.`,
  markOnGrid: "Auf dem Raster der Werte: eine Schwelle, die ein Wert treffen kann",
  markTies: (count, mark) =>
    `${count} Einträge haben genau ${mark}: Sie passieren gemeinsam, um so viele kann der Anteil verfehlt werden.`,
  markWrite: "Festschreiben",
  markDone: (where) => `Sie steht in ${where}.`,
  markFixed: (mark, date, count) => `Festgeschrieben am ${date} aus ${count} Werten: ${mark}.`,
  markStays: (count) => `Die ${count} Werte von heute ergeben dasselbe.`,
  markMoves: (count, now, by, higher) =>
    `Die ${count} Werte von heute ergäben ${now}, um ${by} ${higher ? "höher" : "niedriger"}. Es bleibt dabei, bis eine neue festgeschrieben wird.`,
  markUnknown: "Die Werte von heute ergeben keine Schwelle.",
  markHistory: "Festgeschriebene Schwellen dieser Spalte, die neueste zuerst",
  markDate: "Geschrieben am",
  markMark: "Schwelle",
  markScores: "Werte",

  groupsHeading: "Quoten der Gruppen",
  groupsPick: "Spalte, die die Gruppen nennt",
  groupsPickHint: "Irgendeine Zelle der Spalte genügt: gelesen werden die Zeilen neben den Werten.",
  groupsOneColumn: "Nennen Sie eine Spalte, etwa B2:B61.",
  groupsTooMany: (groups, entries) =>
    `Diese Spalte nennt ${groups} Gruppen für ${entries} Einträge, also eher die Einträge selbst. Wählen Sie eine, in der ein Wort für viele steht.`,
  groupsNone: "Keine Gruppe besteht zu weniger als vier Fünfteln der höchsten Quote.",
  groupsBelow: (names, one) =>
    `${names} ${one ? "besteht" : "bestehen"} zu weniger als vier Fünfteln der höchsten Quote: sehen Sie nach, woran das liegt, bevor die Schwelle gilt.`,
  groupsNote: (rate) =>
    `Vier Fünftel (${rate}) ist eine Regel für das Nachsehen (29 CFR 1607.4 D), kein Beweis in die eine oder andere Richtung: bei zwei gleichen Gruppen zu 20 fällt das Verhältnis fast jedes zweite Mal darunter. Einträge ohne Wert zählen in keiner Gruppe.`,
  groupsTitle: "Quoten der Gruppen",
  groupsLine: "vier Fünftel der höchsten",
  groupsRate: (name, rate) => `${name}: ${rate}`,
  groupsGroup: "Gruppe",
  groupsAssessed: "Bewertet",
  groupsPassed: "Bestanden",
  groupsShare: "Quote",
  groupsRatio: "Zur höchsten",
  groupsP: "p nach Holm",
};
