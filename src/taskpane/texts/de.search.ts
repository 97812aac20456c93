import type { enSearch } from "./en.search";
import type { Translated } from "./translated";

export const deSearch: Translated<typeof enSearch> = {
  searchHeading: "Suche",
  searchAim: (fraction) => `Nach Einträgen der obersten ${fraction}, dem Anteil, der unter Schwelle steht.`,
  hits: "Gesuchte Treffer",
  searchChance: "Gewünschte Sicherheit",
  arrivals: "Einträge je Zeitraum",
  arrivalsHint: "wenn es auf die Zeit ankommt; ein Zeitraum ist ein Tag, eine Woche …",
  stages: "Stufen der Prüfung eines Eintrags",
  stagesHint: "Die erste erreicht jeder. Kosten in beliebiger Einheit: Geld, Stunden.",
  stageReach: (number) => `Anteil, der Stufe ${number} erreicht`,
  stageCost: (number) => `Kosten der Stufe ${number}`,
  addStage: "Stufe hinzufügen",
  removeStage: "Letzte wegnehmen",

  searchLooks: (looks, chance) => `Planen Sie ${looks} Sichtungen: das reicht zu ${chance}`,
  searchEstimated: (count, half) =>
    `Dabei ist berücksichtigt, dass die Schwelle nur eine Schätzung aus ${count} Werten ist. Für halbe Sicherheit braucht es ${half}.`,
  searchKnown: (expected, half) =>
    `Im Mittel ${expected}, für halbe Sicherheit ${half}, wenn die Schwelle genau bekannt ist. Eine geschätzte verlangt mehr.`,
  searchAverage: (expected) => `Bei genau bekannter Schwelle wären es im Mittel ${expected}.`,
  searchBudget: (budget, chance) =>
    `Bei genau bekannter Schwelle reicht ein Budget von ${budget} für die Suche zu ${chance}; die Sichtungen, aus denen sie gelernt wird, kommen hinzu.`,
  searchPeriods: (periods, chance) =>
    `Bei genau bekannter Schwelle dauert sie zu ${chance} höchstens ${periods} Zeiträume.`,
  loadHeading: "Aufwand und Kosten im Mittel",
  loadAll: "alle Stufen",
  loadStage: "Stufe",
  loadLearning: "Beim Lernen",
  loadSearching: "Beim Suchen",
  loadTotal: "Zusammen",
  loadCost: "Kosten",
  loadNote: (count) => `Gelernt wird aus den ${count} Werten der Spalte. Ohne Spalte wird nichts gelernt.`,

  chanceTitle: "Aussicht auf einen Treffer nach Sichtungen",
  chanceTitleHits: (hits) => `Aussicht auf ${hits} Treffer nach Sichtungen`,
  chanceSentence: (half, most, chance) =>
    `Die Aussicht steigt bei ${half} Sichtungen auf die Hälfte und bei ${most} auf ${chance}.`,
  chanceLooks: "Sichtungen",
  chanceUp: "Aussicht",
  chanceEstimated: "Schwelle geschätzt",
  chanceKnown: "Schwelle bekannt",
  chancePoint: (chance, looks) => `${chance} bei ${looks}`,
  chanceTableLooks: "Sichtungen",
  chanceTableChance: "Aussicht",
  chanceTableKnown: "Wäre die Schwelle bekannt",

  reserveHeading: "Wann aufhören",
  reserveNeeds: "Braucht eine Spalte mit Werten der Form normal.",
  lookCost: "Kosten einer Sichtung, in Punkten",
  looksLeft: "Höchstens noch möglich",
  reserveHigh: (reserve) => `Den ersten Eintrag ab ${reserve} annehmen.`,
  reserveLow: (reserve) => `Den ersten Eintrag bis ${reserve} annehmen.`,
  reserveWhy:
    "Darunter bringt Weitersuchen mehr, als es kostet, darüber weniger. Die Kurve gilt dabei als bekannt: mit einer geschätzten verspricht das etwas zu viel.",
  scheduleHeading: "Die Schwelle, wenn die Sichtungen ausgehen",
  scheduleLooks: "Noch möglich",
  scheduleAccept: "Annehmen ab",
  scheduleAcceptLow: "Annehmen bis",
  scheduleExpected: "Erwartetes Ergebnis",
  scheduleChance: "Aussicht, dass diese angenommen wird",
  scheduleLast: "jeden",

  putLooks: "die Zahl der Sichtungen",
  putLooksExact: "die Zahl der Sichtungen bei genau bekannter Schwelle",
  putLoad: "Aufwand und Kosten je Stufe",
  putBudget: "das Budget",
  putPeriods: "die Zeiträume",
  putReserve: "der Wert, ab dem anzunehmen ist",
  putSchedule: "der Plan der Schwellen",
};
