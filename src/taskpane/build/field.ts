import type { CatalogueParameter } from "../../catalogue/catalogue";
import { button, freshId, make } from "../dom";
import { fieldFault } from "../formula/arguments";

/** The field of one argument: its options as a list where it has some, and "Use selection" for everything. */
export class Field {
  readonly element: HTMLElement;
  readonly parameter: CatalogueParameter;
  readonly #control: HTMLInputElement | HTMLSelectElement;
  readonly #offer = make("div", { class: "offer" });
  readonly #fault = make("p", { class: "field-fault", role: "alert" });

  constructor(
    parameter: CatalogueParameter,
    onChange: () => void,
    onUseSelection: ((field: Field) => void) | undefined,
  ) {
    this.parameter = parameter;
    const id = freshId("argument");
    const hintId = freshId("hint");
    this.#control = control(parameter, id, hintId);
    this.#control.addEventListener("input", () => {
      this.#fault.textContent = "";
      onChange();
    });
    this.#control.addEventListener("change", () => this.#showFault());
    const { name, unit, optional, description } = parameter;
    const label = make(
      "label",
      { for: id },
      name,
      make(
        "span",
        { class: "facts" },
        [unit ?? "", optional ? "may be left out" : ""]
          .filter(Boolean)
          .map((each) => ` · ${each}`)
          .join(""),
      ),
    );
    const pick = onUseSelection && button("Use selection", () => onUseSelection(this));
    pick?.setAttribute("aria-label", `Use selection for ${name}`);
    this.element = make(
      "div",
      { class: "argument" },
      label,
      make("div", { class: "control-row" }, this.#control, ...(pick ? [pick] : [])),
      this.#offer,
      this.#fault,
      make("p", { class: "hint", id: hintId }, description),
    );
  }

  get text(): string {
    return this.#control.value;
  }

  /** An address or an expression joins the options of a list. */
  set text(text: string) {
    if (
      this.#control instanceof HTMLSelectElement &&
      ![...this.#control.options].some(({ value }) => value === text)
    ) {
      this.#control.append(make("option", { value: text }, text));
    }
    this.#control.value = text;
    this.#fault.textContent = "";
  }

  get fault(): string | undefined {
    return fieldFault(this.text, this.parameter);
  }

  /** Something more that can be done with what was picked; nothing where there are no words. */
  offer(words: string | undefined, onTake: () => void): void {
    const take = () => {
      this.#offer.replaceChildren();
      onTake();
    };
    this.#offer.replaceChildren(...(words === undefined ? [] : [button(words, take, "quiet")]));
  }

  focus(): void {
    this.#control.focus();
  }

  #showFault(): void {
    this.#fault.textContent = this.text.trim() === "" ? "" : (this.fault ?? "");
  }
}

function control({ name, options, optional, default: usual }: CatalogueParameter, id: string, hint: string) {
  const attributes = { id, class: "field", name, "aria-describedby": hint };
  if (!options || options.length === 0) {
    return make("input", { ...attributes, type: "text", autocomplete: "off", spellcheck: "false" });
  }
  const none = optional ? (usual ? `left out: ${usual}` : "left out") : "Choose…";
  const select = make("select", attributes, make("option", { value: "" }, none));
  for (const option of options) select.append(make("option", { value: option }, option));
  return select;
}
