// The manifest as a tree of elements: the XML parser's document without what the checks never look at.

import { DOMParser, type Element as XmlElement } from "@xmldom/xmldom";

export interface Element {
  /** Without prefix, as the rules speak of it. */
  name: string;
  attributes: Record<string, string>;
  text: string;
  children: Element[];
  line: number;
}

/** Parses the file; throws with the parser's words when it is not well-formed XML. */
export function parse(xml: string): Element {
  const parser = new DOMParser({
    onError: (level, message) => {
      if (level !== "warning") throw new Error(`not well-formed XML: ${message.split("\n")[0]}`);
    },
  });
  const root = parser.parseFromString(xml, "text/xml").documentElement;
  if (root === null) throw new Error("not well-formed XML: no element");
  return simplified(root);
}

function simplified(element: XmlElement): Element {
  const attributes: Record<string, string> = {};
  for (const attribute of Array.from(element.attributes)) attributes[attribute.name] = attribute.value;
  const children: Element[] = [];
  for (let child = element.firstChild; child; child = child.nextSibling) {
    if (child.nodeType === child.ELEMENT_NODE) children.push(simplified(child as XmlElement));
  }
  return {
    name: element.localName ?? element.nodeName,
    attributes,
    text: children.length ? "" : (element.textContent ?? "").trim(),
    children,
    line: element.lineNumber ?? 0,
  };
}

/** The element itself and everything below it, in the order of the file. */
export function everything(element: Element): Element[] {
  return [element, ...element.children.flatMap(everything)];
}

export function allNamed(root: Element, name: string): Element[] {
  return everything(root).filter((element) => element.name === name);
}

/** The element reached by going down by these names, the first of each. */
export function at(root: Element, ...names: string[]): Element | undefined {
  let element: Element | undefined = root;
  for (const name of names) element = element?.children.find((child) => child.name === name);
  return element;
}
