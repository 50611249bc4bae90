type Attributes = Record<string, string | boolean | undefined>;

/** An element with text, never markup: what a catalogue, a sheet or a file holds is shown as it is. */
export function make<Tag extends keyof HTMLElementTagNameMap>(
  tag: Tag,
  attributes: Attributes = {},
  ...children: (Node | string)[]
): HTMLElementTagNameMap[Tag] {
  const element = document.createElement(tag);
  for (const [name, value] of Object.entries(attributes)) {
    if (typeof value === "boolean") element.toggleAttribute(name, value);
    else if (value !== undefined) element.setAttribute(name, value);
  }
  element.append(...children);
  return element;
}

export function button(words: string, onClick: () => void, look = ""): HTMLButtonElement {
  const element = make("button", { type: "button", class: `button ${look}`.trim() }, words);
  element.addEventListener("click", onClick);
  return element;
}

let ids = 0;

/** An id that no other element of the page has: the pane may stand beside a grid that has ids of its own. */
export const freshId = (name: string): string => `pane-${name}-${++ids}`;
