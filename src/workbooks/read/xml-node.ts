import { unescapedText } from "../xml";

/** What the reader needs of a parsed document: the browser's own or a library's. */
export interface XmlNode {
  readonly nodeType: number;
  readonly localName?: string | null;
  readonly textContent: string | null;
  readonly firstChild: XmlNode | null;
  readonly nextSibling: XmlNode | null;
  getAttribute?(name: string): string | null;
}

/** Gives the root element of a well-formed text, and throws at any other. */
export type ParseXml = (text: string) => XmlNode;

/** Child elements, of one name or all. The prefix plays no part: some programs write one, some none. */
export function* children(parent: XmlNode | undefined, name?: string): Generator<XmlNode> {
  for (let node = parent?.firstChild ?? null; node; node = node.nextSibling) {
    if (node.nodeType === 1 && (name === undefined || node.localName === name)) yield node;
  }
}

/** The element reached by going down by these names, the first of each. */
export function down(parent: XmlNode | undefined, ...names: string[]): XmlNode | undefined {
  let node = parent;
  for (const name of names) node = children(node, name).next().value ?? undefined;
  return node;
}

export const attribute = (node: XmlNode | undefined, name: string): string | undefined =>
  node?.getAttribute?.(name) ?? undefined;

/** A whole number from an attribute, or what stands for it. */
export function count(node: XmlNode | undefined, name: string, otherwise: number): number {
  const written = attribute(node, name);
  return written !== undefined && /^\d+$/.test(written) ? Number(written) : otherwise;
}

/** Attributes that are true when they say so; of elements also when they are there and say nothing. */
export const isOn = (written: string | undefined): boolean => written === "1" || written === "true";

/** A text with its runs joined; the reading aid for Asian scripts beside it is not part of it. */
export function textOf(node: XmlNode | undefined): string {
  let text = "";
  for (const child of children(node)) {
    if (child.localName === "t") text += child.textContent ?? "";
    else if (child.localName === "r") text += textOfRun(child);
  }
  return unescapedText(text);
}

const textOfRun = (run: XmlNode): string => down(run, "t")?.textContent ?? "";
