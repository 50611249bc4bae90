import type { CatalogueFunction } from "../../catalogue/catalogue";
import { make } from "../dom";
import { shownResult } from "../understand/live-example";
import type { Preview } from "./preview";

/** The formula as it will be written, and below it what it gives or what is still wrong. */
export class Outcome {
  readonly element = make("section", { class: "outcome", "aria-label": "Preview", "aria-live": "polite" });

  /** `local` is the formula as this workbook's language has it. */
  showFormula(formula: string, local: string, below: HTMLElement): void {
    const typed = make("p", { class: "hint" }, "Typed by hand in this workbook: ", make("code", {}, local));
    this.element.replaceChildren(
      make("code", { class: "formula" }, formula),
      ...(local === formula ? [] : [typed]),
      below,
    );
  }
}

export const hint = (words: string) => make("p", { class: "hint" }, words);
export const fault = (words: string) => make("p", { class: "fault" }, words);

/** What the call gives; without a preview, only the sheet can tell. */
export const gives = (found: CatalogueFunction, given: readonly string[], shown: Preview | undefined) =>
  shown
    ? make(
        "div",
        { class: "live-result" },
        make("span", { class: "gives" }, "gives "),
        shownResult(found, given, shown.cells, shown.shape.rows),
      )
    : hint("What this gives can only be seen in the sheet.");
