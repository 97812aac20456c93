import type { TrialTexts } from "./en";

function counted(one: string, many: string): (count: number) => string {
  return (count) => (count === 1 ? `1 ${one}` : `${count} ${many}`);
}

/** Die Worte der Seite um Blatt und Bereich. */
export const de: TrialTexts = {
  invented: "Ein Blatt zum Ausprobieren. Alle Namen und Zahlen sind erfunden.",
  own: (file) => `${file}, aus Ihren Dateien geöffnet. Nichts davon verlässt diesen Browser.`,
  kept: "Änderungen bleiben in diesem Browser.",
  notKept: "Dieser Browser behält keine Änderungen: Beim Neuladen sind sie fort.",
  notHere: "A1# und @A1 gehen in diesem Blatt nicht.",
  help: "Zellfunktionen",
  open: "Datei öffnen",
  save: "Als .xlsx speichern",
  startOver: "Von vorn anfangen",
  discardAsked: "Diese Mappe verwerfen und zur erfundenen zurückkehren?",
  discard: "Verwerfen",
  keep: "Behalten",
  show: "Anzeigen",
  sheet: "Blatt",
  pane: "Bereich",
  opening: "Das Blatt wird geöffnet …",
  selectedCells: (rows, columns) => `${rows} × ${columns} Zellen`,
  cannotOpen: "Das Blatt lässt sich nicht öffnen. „Von vorn anfangen“ verwirft, was dieser Browser davon behalten hat.",
  cannotShow: (file) => `${file} ist gelesen, aber das Blatt kann es nicht zeigen. Was vorher hier war, ist wieder da.`,

  notLoaded: "Ein Teil dieser Seite lässt sich nicht laden: Läuft ihr Server noch? Hier hat sich nichts geändert.",
  dropHere: "Eine .xlsx-, .csv- oder .tsv-Datei hier loslassen, um sie zu öffnen",
  oneFile: "Bitte eine Datei auf einmal: .xlsx, .csv oder .tsv.",
  reading: (file) => `${file} wird gelesen …`,
  cancel: "Abbrechen",
  close: "Schließen",
  refused: (file) => `${file} lässt sich nicht öffnen; die Mappe hier bleibt, wie sie war.`,
  noStore:
    "Dieser Browser behält nichts für diese Seite, und eine geöffnete Datei muss er behalten: Erlauben Sie der Seite, Daten zu speichern, was manche privaten Fenster nicht tun. Die Mappe hier bleibt, wie sie war.",
  found: (file, cells, sheets) => `${file}: ${cells} Zellen auf ${sheets === 1 ? "1 Blatt" : `${sheets} Blättern`}.`,
  replaces: "Sie tritt an die Stelle der Mappe hier. Speichern Sie die vorher, wenn Sie sie noch brauchen.",
  extras: (list) =>
    `Hier nicht gezeigt, und in einer von hier gespeicherten Kopie nicht enthalten: ${list}. Die Datei selbst bleibt, wie sie ist.`,
  frozen: (count, first) =>
    count === 1
      ? `Die Formel in ${first} kann dieses Blatt nicht berechnen: Es zeigt den Wert aus der Datei.`
      : `${count} Formeln kann dieses Blatt nicht berechnen (die erste in ${first}): Es zeigt die Werte aus der Datei.`,
  pinned: (count) =>
    `${count === 1 ? "1 Formel nennt" : `${count} Formeln nennen`} einen Überlaufbereich (A1#) oder einen Teil einer Tabelle: Hier stehen dafür feste Bereiche, die nicht mitwachsen.`,
  openIt: "Öffnen",
  keepThis: "Behalten, was hier ist",

  saving: (file) => `${file} wird geschrieben …`,
  saved: (file) => `${file} ist dem Browser übergeben, der die Datei zu den Downloads legt.`,
  notSaved: "Die Mappe ließ sich nicht schreiben; hier ist nichts von ihr verloren.",

  extra: {
    charts: counted("Diagramm", "Diagramme"),
    pictures: counted("Bild", "Bilder"),
    pivots: counted("Pivot-Tabelle", "Pivot-Tabellen"),
    notes: () => "Notizen an Zellen",
    controls: () => "Schaltflächen und eingebettete Dateien",
    otherWorkbooks: () => "Verknüpfungen mit anderen Mappen",
    conditions: () => "bedingte Formate",
    validations: () => "Eingaberegeln",
    links: () => "Hyperlinks",
    decoration: () => "einige Farben und Rahmen",
  },
};
