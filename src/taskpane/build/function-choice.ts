import type { Catalogue } from "../../catalogue/catalogue";
import { make } from "../dom";

/** Every function by family, and a first entry for none. */
export function functionChoice({ categories, functions }: Catalogue, id: string): HTMLSelectElement {
  const choice = make(
    "select",
    { id, class: "field", name: "function" },
    make("option", { value: "" }, "Choose a function…"),
  );
  for (const { name } of categories) {
    const own = functions.filter(({ category }) => category === name);
    if (own.length === 0) continue;
    choice.append(
      make("optgroup", { label: name }, ...own.map((each) => make("option", { value: each.id }, each.id))),
    );
  }
  return choice;
}

/** What a formula does where results cannot spill. */
export const oldExcelNote = () =>
  make(
    "p",
    { class: "hint" },
    "This Excel has no dynamic arrays: one formula fills one cell. Write one formula in each row, or select the cells first and end a formula with Ctrl+Shift+Enter.",
  );
