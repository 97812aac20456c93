type Attribute = string | number | boolean | undefined | ((event: any) => void);
export type Child = Node | string | undefined | false;

/** An element with attributes (a function is a listener, true an empty attribute, false and undefined none) and children. */
export function element<Tag extends keyof HTMLElementTagNameMap>(
  tag: Tag,
  attributes: Readonly<Record<string, Attribute>> = {},
  ...children: readonly Child[]
): HTMLElementTagNameMap[Tag] {
  const made = document.createElement(tag);
  for (const [name, value] of Object.entries(attributes)) {
    if (typeof value === "function") made.addEventListener(name, value);
    else if (value === true) made.setAttribute(name, "");
    else if (value !== undefined && value !== false) made.setAttribute(name, String(value));
  }
  fill(made, ...children);
  return made;
}

/** Puts new children in the place of the old ones. */
export function fill(parent: Element, ...children: readonly Child[]): void {
  parent.replaceChildren(...children.filter((child): child is Node | string => child !== undefined && child !== false));
}

let given = 0;

/** An id that no other element of the page has. */
export function newId(word: string): string {
  return `weirmark-${word}-${++given}`;
}
