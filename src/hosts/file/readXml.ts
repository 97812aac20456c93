import { SaxesParser } from "saxes";
import { UnusableFile } from "./unusableFile";
import type { ZipArchive } from "./zipArchive";

export type Attributes = Readonly<Record<string, string>>;

/** What is told of a part while it is read. Names come without their prefix, which is free to choose. */
export interface XmlListener {
  open?(name: string, attributes: Attributes): void;
  close?(name: string): void;
  text?(text: string): void;
}

const DEEPEST = 64;

/**
 * Reads one part of the archive as XML, piece by piece; false where there is none. A document type is refused, since it is
 * good for nothing here but entities that multiply or fetch.
 */
export function readXml(archive: ZipArchive, part: string, listener: XmlListener): boolean {
  const parser = new SaxesParser({ position: false, fileName: undefined });
  const decoder = new TextDecoder("utf-8", { fatal: true });
  let depth = 0;
  parser.on("error", (failure) => {
    throw new UnusableFile(`The file is damaged: its part ${part} is not proper XML (${failure.message}).`);
  });
  parser.on("doctype", () => {
    throw new UnusableFile(`The file is refused: its part ${part} declares a document type, which no workbook needs.`);
  });
  parser.on("opentag", ({ name, attributes }) => {
    if (++depth > DEEPEST) throw new UnusableFile(`The file is refused: its part ${part} is nested too deep.`);
    listener.open?.(localName(name), attributes as Attributes);
  });
  parser.on("closetag", ({ name }) => {
    depth--;
    listener.close?.(localName(name));
  });
  if (listener.text) {
    parser.on("text", (text) => listener.text!(text));
    // The same in another spelling: a formula left out would be a call that nobody judges.
    parser.on("cdata", (text) => listener.text!(text));
  }
  const found = archive.unpack(part, (piece) => {
    parser.write(decode(decoder, piece, part));
  });
  if (found) parser.close();
  return found;
}

function decode(decoder: TextDecoder, piece: Uint8Array, part: string): string {
  try {
    return decoder.decode(piece, { stream: true });
  } catch {
    throw new UnusableFile(`The file is damaged: its part ${part} is not text in UTF-8.`);
  }
}

function localName(name: string): string {
  const colon = name.indexOf(":");
  return colon < 0 ? name : name.slice(colon + 1);
}
