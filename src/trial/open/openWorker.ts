import { replaceBook } from "../../hosts/trial/keptBook";
import { UnusableFile } from "../../hosts/file/unusableFile";
import type { OpenAnswer, OpenRequest } from "./openProtocol";
import { readFile, type OpenedFile } from "./readFile";

/* The entry of the background that reads files and keeps them in the browser, so that the page never stands still: see openProtocol.ts. */

let opened: OpenedFile | undefined;

async function answerTo(request: OpenRequest): Promise<OpenAnswer> {
  if (request.kind === "take") {
    const kept = opened !== undefined && (await replaceBook(opened.book));
    return kept ? { kind: "taken", settings: opened!.settings } : { kind: "notKept" };
  }
  try {
    opened = await readFile(new Uint8Array(await request.file.arrayBuffer()), request.name, request.functions);
    return { kind: "read", summary: opened.summary };
  } catch (failure) {
    if (failure instanceof UnusableFile) return { kind: "refused", message: failure.message };
    return { kind: "refused", message: `The file can't be read here (${(failure as Error).message}).` };
  }
}

self.onmessage = (event: MessageEvent<OpenRequest>) =>
  void answerTo(event.data).then((answer) => self.postMessage(answer));
