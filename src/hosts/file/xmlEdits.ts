import { SaxesParser } from "saxes";
import type { Attributes } from "./readXml";

/** One element as it stands in the text of a part: from where to where its first tag goes. */
export interface OpenTag {
  readonly name: string;
  /** With its prefix, as written. */
  readonly rawName: string;
  readonly attributes: Attributes;
  readonly depth: number;
  readonly start: number;
  readonly end: number;
}

export interface Edit {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

/**
 * Walks the text of a part and tells of every tag with its place, so that a piece can be exchanged and all the rest stay byte for byte.
 * `close` gets the first tag, the place where the closing tag begins (that of the first where there is none) and where it ends.
 */
export function walkXml(
  xml: string,
  open: (tag: OpenTag) => void,
  close: (tag: OpenTag, start: number, end: number) => void,
): void {
  const parser = new SaxesParser({ position: true });
  const stack: OpenTag[] = [];
  parser.on("opentag", ({ name, attributes }) => {
    const end = parser.position;
    const tag = {
      name: name.slice(name.indexOf(":") + 1),
      rawName: name,
      attributes: attributes as Attributes,
      depth: stack.length,
      start: xml.lastIndexOf("<", end - 1),
      end,
    };
    stack.push(tag);
    open(tag);
  });
  parser.on("closetag", ({ isSelfClosing }) => {
    const tag = stack.pop()!;
    const end = parser.position;
    close(tag, isSelfClosing ? tag.start : xml.lastIndexOf("<", end - 1), end);
  });
  parser.write(xml).close();
}

/** The text with its edits made; they must not overlap. */
export function edited(xml: string, edits: readonly Edit[]): string {
  let text = "";
  let at = 0;
  for (const { start, end, text: fresh } of [...edits].sort((a, b) => a.start - b.start)) {
    text += xml.slice(at, start) + fresh;
    at = end;
  }
  return text + xml.slice(at);
}

/** An edit that puts `inside` before the closing tag of the outermost element, also where that is written as one tag. */
export function appendToRoot(xml: string, inside: string): Edit {
  let edit: Edit | undefined;
  walkXml(
    xml,
    () => undefined,
    (tag, start, end) => {
      if (tag.depth > 0) return;
      const selfClosed = start === tag.start;
      edit = selfClosed
        ? { start: tag.end - 2, end, text: `>${inside}</${tag.rawName}>` }
        : { start, end: start, text: inside };
    },
  );
  return edit!;
}
