import type { Catalogue, CatalogueFunction } from "../../catalogue/catalogue";
import { freshId, make } from "../dom";
import { recentIds } from "./recent";
import { searcher } from "./search";

/**
 * The list of functions with its search field, after the combobox pattern: the keyboard stays in the field, the
 * arrows move through the list, Enter opens. Without a query: used last, then the families.
 */
export class FindView {
  readonly element = make("div", { class: "find" });
  readonly #catalogue: Catalogue;
  readonly #open: (found: CatalogueFunction) => void;
  readonly #search: (query: string) => CatalogueFunction[];
  readonly #input: HTMLInputElement;
  readonly #list: HTMLElement;
  readonly #count = make("p", { class: "count", role: "status" });
  #current = -1;

  constructor(catalogue: Catalogue, open: (found: CatalogueFunction) => void) {
    this.#catalogue = catalogue;
    this.#open = open;
    this.#search = searcher(catalogue);
    const listId = freshId("list");
    const inputId = freshId("search");
    this.#input = make("input", {
      id: inputId,
      class: "field search",
      type: "text",
      role: "combobox",
      autocomplete: "off",
      spellcheck: "false",
      placeholder: "cold junction, guard band, F0 …",
      "aria-controls": listId,
      "aria-expanded": "true",
      "aria-autocomplete": "list",
    });
    this.#list = make("div", { id: listId, class: "results", role: "listbox", "aria-label": "Functions" });
    this.#input.addEventListener("input", () => this.refresh());
    this.#input.addEventListener("keydown", (event) => this.#onKey(event));
    this.#list.addEventListener("click", (event) => {
      const option = (event.target as Element).closest<HTMLElement>("[role=option]");
      const found = this.#catalogue.functions.find(({ id }) => id === option?.dataset.id);
      if (found) this.#open(found);
    });
    this.element.append(
      make("label", { for: inputId, class: "label" }, "What do you want to do?"),
      this.#input,
      this.#count,
      this.#list,
    );
    this.refresh();
  }

  focus(): void {
    this.#input.focus();
    this.#input.select();
  }

  /** Marks the function whose page is open, for the list that stands beside it. */
  mark(id: string | undefined): void {
    for (const option of this.#options()) option.classList.toggle("open", option.dataset.id === id);
  }

  refresh(): void {
    const query = this.#input.value;
    const found = this.#search(query);
    this.#list.replaceChildren(...(query.trim() === "" ? this.#families() : this.#found(found)));
    this.#count.textContent =
      query.trim() === ""
        ? ""
        : found.length === 0
          ? "Nothing found. Try one word of the job."
          : `${found.length} found`;
    this.#moveTo(query.trim() === "" ? -1 : 0);
  }

  #families(): HTMLElement[] {
    const { categories, functions } = this.#catalogue;
    const recent = recentIds().flatMap((id) => functions.find((each) => each.id === id) ?? []);
    const groups = recent.length > 0 ? [this.#group("Used last", "", recent)] : [];
    for (const { name, sentence } of categories) {
      const own = functions.filter(({ category }) => category === name);
      if (own.length > 0) groups.push(this.#group(name, sentence, own));
    }
    return groups;
  }

  #found(found: readonly CatalogueFunction[]): HTMLElement[] {
    return found.length === 0
      ? []
      : [make("div", { role: "group", "aria-label": "Found" }, ...found.map((each) => this.#option(each)))];
  }

  #group(name: string, sentence: string, functions: readonly CatalogueFunction[]): HTMLElement {
    const id = freshId("family");
    return make(
      "div",
      { role: "group", class: "family", "aria-labelledby": id },
      make("div", { id, class: "family-name", role: "presentation" }, name),
      ...(sentence ? [make("div", { class: "family-sentence", role: "presentation" }, sentence)] : []),
      ...functions.map((each) => this.#option(each)),
    );
  }

  #option({ id, description }: CatalogueFunction): HTMLElement {
    return make(
      "div",
      { role: "option", id: freshId("option"), class: "option", "data-id": id, "aria-selected": "false" },
      make("code", { class: "option-name" }, id),
      make("span", { class: "option-words" }, ` ${description}`),
    );
  }

  #onKey(event: KeyboardEvent): void {
    const options = this.#options();
    if (event.key === "ArrowDown") this.#moveTo(Math.min(this.#current + 1, options.length - 1));
    else if (event.key === "ArrowUp") this.#moveTo(Math.max(this.#current - 1, 0));
    else if (event.key === "Enter") options[Math.max(this.#current, 0)]?.click();
    else if (event.key === "Escape" && this.#input.value !== "") {
      this.#input.value = "";
      this.refresh();
    } else return;
    event.preventDefault();
  }

  #options(): HTMLElement[] {
    return [...this.#list.querySelectorAll<HTMLElement>("[role=option]")];
  }

  #moveTo(index: number): void {
    const options = this.#options();
    options[this.#current]?.setAttribute("aria-selected", "false");
    for (const each of options) each.setAttribute("aria-selected", "false");
    this.#current = Math.min(index, options.length - 1);
    const option = options[this.#current];
    if (option) {
      option.setAttribute("aria-selected", "true");
      this.#input.setAttribute("aria-activedescendant", option.id);
      option.scrollIntoView?.({ block: "nearest" });
    } else this.#input.removeAttribute("aria-activedescendant");
  }
}
