import { freshId, make } from "../dom";

/** A choice of yes or no, with a sentence that says what it is for. */
export class Tick {
  readonly element: HTMLElement;
  readonly #box = make("input", { type: "checkbox", id: freshId("tick") });

  constructor(words: string, hint: string, onChange: () => void) {
    this.#box.addEventListener("change", onChange);
    const label = make("label", { for: this.#box.id }, words, make("span", { class: "hint" }, hint));
    this.element = make("div", { class: "tick" }, this.#box, label);
  }

  get isSet(): boolean {
    return this.#box.checked;
  }

  set isSet(value: boolean) {
    this.#box.checked = value;
  }
}
