import { SaxesParser } from "saxes";

export interface Element {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: Element[];
  text: string;
}

/** The tree of an XML text; throws where it is not well-formed. */
export function parseXml(text: string): Element {
  const root: Element = { name: "", attributes: {}, children: [], text: "" };
  const open = [root];
  const parser = new SaxesParser();
  parser.on("error", (error) => {
    throw error;
  });
  parser.on("opentag", ({ name, attributes }) => {
    const element: Element = { name, attributes: attributes as Record<string, string>, children: [], text: "" };
    open[open.length - 1]!.children.push(element);
    open.push(element);
  });
  parser.on("text", (part) => (open[open.length - 1]!.text += part));
  parser.on("closetag", () => void open.pop());
  parser.write(text).close();
  return root.children[0]!;
}

/** All elements of that name below (and with) `element`. */
export function elementsNamed(element: Element, name: string): Element[] {
  return [
    ...(element.name === name ? [element] : []),
    ...element.children.flatMap((child) => elementsNamed(child, name)),
  ];
}

export function allElements(element: Element): Element[] {
  return [element, ...element.children.flatMap(allElements)];
}
