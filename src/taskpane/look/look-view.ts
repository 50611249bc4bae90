import type { Catalogue } from "../../catalogue/catalogue";
import { freshId, make } from "../dom";
import type { Pane } from "../pane";
import { curves, type Quantity } from "./curves";
import { DRAWN } from "./drawn-functions";
import type { DrawnFigure } from "./figure";
import { PictureCard } from "./picture-card";
import { SurveyPart } from "./survey-part";

/** The letter types, which most people choose among; the rest are in the list as well. */
const FIRST_SHOWN = 10;

/** Pictures of the reference functions and of a survey. */
export class LookView {
  readonly element = make("div", { class: "look" });
  readonly #types: HTMLInputElement[];
  readonly #quantity: HTMLSelectElement;
  readonly #class: HTMLSelectElement;
  readonly #card: PictureCard;
  readonly #survey: SurveyPart;

  constructor(catalogue: Catalogue, pane: Pane) {
    this.#card = new PictureCard(pane);
    const types = optionsOf(catalogue, "TYPEINFO", DRAWN.TYPEINFO[0]);
    this.#types = types.map((type) =>
      make("input", { type: "checkbox", id: freshId("type"), value: type, checked: type === "K" }),
    );
    const boxes = this.#types.map((box) =>
      make("div", { class: "tick" }, box, make("label", { for: box.id }, box.value)),
    );
    this.#quantity = choice("quantity", [
      ["EMF", "EMF"],
      ["sensitivity", "Sensitivity"],
      ["tolerance", "Tolerance"],
    ]);
    this.#class = choice("class", [
      ["", "none"],
      ...optionsOf(catalogue, "TOLERANCE", DRAWN.TOLERANCE[2]).map((each): [string, string] => [each, each]),
    ]);
    this.#class.value = "2";
    const draw = () => void pane.attempt(() => this.#draw());
    for (const control of [...this.#types, this.#quantity, this.#class])
      control.addEventListener("change", draw);
    this.#survey = new SurveyPart(catalogue, pane);
    this.element.append(
      make("h2", { tabindex: "-1" }, "Pictures"),
      make("h3", {}, "Reference functions"),
      make(
        "fieldset",
        { class: "plain types" },
        make("legend", {}, "Types"),
        ...boxes.slice(0, FIRST_SHOWN),
        make("details", {}, make("summary", {}, "Further couples"), ...boxes.slice(FIRST_SHOWN)),
      ),
      make(
        "div",
        { class: "pair" },
        labelled("Over temperature", this.#quantity),
        labelled("Tolerance class", this.#class),
      ),
      this.#card.element,
      this.#survey.element,
    );
  }

  /** What is drawn, the survey first. */
  get drawn(): readonly DrawnFigure[] {
    const [survey, functions] = [this.#survey.figure, this.#card.figure];
    return [
      ...(survey ? [{ figure: survey, ofSheet: true }] : []),
      ...(functions ? [{ figure: functions, ofSheet: false }] : []),
    ];
  }

  async opened(): Promise<void> {
    await this.#draw();
  }

  focus(): void {
    this.#types.find(({ checked }) => checked)?.focus();
  }

  async #draw(): Promise<void> {
    const types = this.#types.filter(({ checked }) => checked).map(({ value }) => value);
    if (types.length === 0) return this.#card.hide();
    const quantity = this.#quantity.value as Quantity;
    await this.#card.show(curves({ types, quantity, toleranceClass: this.#class.value }));
  }
}

const optionsOf = ({ functions }: Catalogue, id: keyof typeof DRAWN, parameter: string): readonly string[] =>
  functions.find((each) => each.id === id)?.parameters.find(({ name }) => name === parameter)?.options ?? [];

function choice(name: string, options: readonly (readonly [string, string])[]): HTMLSelectElement {
  return make(
    "select",
    { class: "field", id: freshId(name), name },
    ...options.map(([value, words]) => make("option", { value }, words)),
  );
}

const labelled = (words: string, control: HTMLElement): HTMLElement =>
  make("div", {}, make("label", { for: control.id }, words), control);
