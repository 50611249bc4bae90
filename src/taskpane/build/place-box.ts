import { button, freshId, make } from "../dom";
import { cellsInUse, PAST_THE_END, type ResultPlace } from "./place";
import type { Target } from "./target";

/** Where the formula goes: a field that may stay empty, and a sentence on what stands there. */
export class PlaceBox {
  readonly element: HTMLElement;
  readonly #input = make("input", {
    id: freshId("target"),
    class: "field",
    type: "text",
    autocomplete: "off",
    spellcheck: "false",
    name: "target",
  });
  readonly #words = make("p", { class: "place-words", role: "status" });

  constructor(onChange: () => void, onUseSelection: () => void) {
    this.#input.addEventListener("input", onChange);
    const pick = button("Use selection", onUseSelection);
    pick.setAttribute("aria-label", "Use selection for the place");
    this.element = make(
      "div",
      { class: "place" },
      make("label", { for: this.#input.id }, "Goes into"),
      make("div", { class: "control-row" }, this.#input, pick),
      this.#words,
    );
  }

  get typed(): string {
    return this.#input.value.trim();
  }

  set typed(address: string) {
    this.#input.value = address;
  }

  suggest({ cell, why }: Target): void {
    this.#input.placeholder = `${cell}, ${why}`;
  }

  /** `undefined`: the result would run past the end of the sheet. */
  show(place: ResultPlace | undefined): void {
    if (!place) {
      this.#say(PAST_THE_END, true);
      return;
    }
    const { area, shape, occupiedCount, hindrance } = place;
    const size = area.includes(":")
      ? `Fills ${area}, ${shape.rows} × ${shape.columns} cells`
      : `Fills ${area}`;
    if (hindrance) this.#say(`${size}. ${hindrance}`, true);
    else if (occupiedCount > 0) this.#say(`${size}. Not free: ${cellsInUse(occupiedCount)} there.`, true);
    else this.#say(`${size}; the space is free.`);
  }

  clear(): void {
    this.#say("");
  }

  #say(words: string, warns = false): void {
    this.#words.classList.toggle("warn", warns);
    // The same words again would be read out again.
    if (this.#words.textContent !== words) this.#words.textContent = words;
  }
}
