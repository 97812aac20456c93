import type { enPlan } from "./en.plan";
import type { Translated } from "./translated";

export const dePlan: Translated<typeof enPlan> = {
  planHeading: "Der ganze Plan auf einem Blatt",
  planWhy:
    "Eingaben, lebende Formeln für die ganze Aufgabe, Annahmen, Vorbehalte und Quellen auf einem Blatt, fertig zum Drucken. Noch einmal geschrieben wird er auf den neuesten Stand gebracht; was Sie ergänzt oder geändert haben, bleibt. Beschriftungen sind englisch, damit die Mappe überall gleich aussieht.",
  planWrite: "Den Plan schreiben",
  planWorking: "Wird geschrieben …",
  planDone: (sheet) =>
    `Der Plan steht auf dem Blatt „${sheet}“. Gerahmte Zellen sind Eingaben: Sehen Sie jede an, vor allem, wo „Assumed“ (angenommen) steht.`,
  planUpdated: (sheet) => `Der Plan auf dem Blatt „${sheet}“ ist auf dem neuesten Stand.`,
  planLeft: (labels) => `So gelassen, wie Sie es geändert haben: ${labels}.`,
  planTaken: (names) =>
    `Nichts wurde geschrieben: Diese Mappe verwendet die Namen ${names} für etwas anderes. Benennen Sie sie um oder löschen Sie sie (in Excel: Formeln, Namens-Manager), und schreiben Sie den Plan dann noch einmal.`,
  planGo: "Dorthin",
};
