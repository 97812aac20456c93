import type { FileSummary, OpenAnswer, OpenRequest } from "./openProtocol";

/** A file that was read in the background and waits there. */
export interface WaitingFile {
  readonly summary: FileSummary;
  /** Puts it in the place of the kept workbook, and gives its settings; undefined where the browser keeps nothing. */
  take(): Promise<Readonly<Record<string, unknown>> | undefined>;
  drop(): void;
}

/** A file that can't be opened; `message` says why, in a whole sentence. */
export class RefusedFile extends Error {
  override readonly name = "RefusedFile";
}

/** Reads a file in a background of its own; ending `signal` ends that, whatever it is at. */
export async function readInBackground(
  file: File,
  functions: readonly string[],
  signal: AbortSignal,
): Promise<WaitingFile> {
  const worker = new Worker(new URL("./openWorker.ts", import.meta.url));
  const ask = (request: OpenRequest) =>
    new Promise<OpenAnswer>((resolve, reject) => {
      signal.addEventListener("abort", () => reject(new RefusedFile("cancelled")));
      worker.onmessage = (event: MessageEvent<OpenAnswer>) => resolve(event.data);
      worker.onerror = (event) => reject(new RefusedFile(event.message || "The reader could not be loaded."));
      worker.postMessage(request);
    });
  signal.addEventListener("abort", () => worker.terminate());
  const answer = await ask({ kind: "read", file, name: file.name, functions });
  if (answer.kind !== "read") {
    worker.terminate();
    throw new RefusedFile(answer.kind === "refused" ? answer.message : "");
  }
  return {
    summary: answer.summary,
    async take() {
      const taken = await ask({ kind: "take" });
      worker.terminate();
      return taken.kind === "taken" ? taken.settings : undefined;
    },
    drop: () => worker.terminate(),
  };
}
