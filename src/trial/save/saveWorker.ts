import { writeXlsx } from "../../hosts/file/writeXlsx";
import { bookToWrite } from "./bookToWrite";
import type { SaveAnswer, SaveRequest } from "./saveProtocol";

/* The entry of the background that writes files: see saveProtocol.ts. */

function answerTo(request: SaveRequest): SaveAnswer {
  try {
    return { kind: "written", bytes: writeXlsx(bookToWrite(request)) as Uint8Array<ArrayBuffer> };
  } catch (failure) {
    return { kind: "failed", message: (failure as Error).message };
  }
}

self.onmessage = (event: MessageEvent<SaveRequest>) => {
  const answer = answerTo(event.data);
  self.postMessage(answer, { transfer: answer.kind === "written" ? [answer.bytes.buffer] : [] });
};
