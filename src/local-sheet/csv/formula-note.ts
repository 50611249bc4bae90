import type { Catalogue } from "../../catalogue/catalogue";
import { make } from "../../taskpane/dom";
import { addressOn, parseCell } from "../address";
import type { Workbook } from "../workbook";
import type { Log } from "./read-log";
import { type Suggestion, suggest } from "./suggest";
import { rowsThatFit } from "./to-sheet";
import { counted } from "./words";

/**
 * The formula for the log just opened. The type is asked for, never guessed: a wrong type gives temperatures that
 * look right.
 */
export function formulaNote(
  workbook: Workbook,
  catalogue: Catalogue,
  sheet: string,
  log: Log,
  firstRow: number,
  onInserted: () => void,
): HTMLElement {
  const suggestion = suggest(log, firstRow, rowsThatFit(log));
  if (!suggestion) return noSuggestion();
  const formula = make("code", {}, suggestion.formula("type"));
  const insert = make(
    "button",
    { type: "button", class: "button primary", disabled: true },
    "Insert formula",
  );
  const type = typeChoice(catalogue);
  type.addEventListener("change", () => {
    formula.textContent = suggestion.formula(type.value || "type");
    insert.disabled = type.value === "";
  });
  insert.addEventListener("click", async () => {
    onInserted();
    await write(workbook, sheet, suggestion, type.value);
  });
  return make(
    "div",
    { class: "formula-note" },
    make("p", {}, `One formula in ${suggestion.cell} gives the temperatures of ${channels(suggestion)}:`),
    make("p", { class: "suggested" }, formula),
    make(
      "p",
      { class: "why" },
      "ISBLANK keeps empty cells blank: Excel hands them over as 0, a reading like any other.",
    ),
    make(
      "div",
      { class: "choices" },
      make("label", { class: "choice" }, make("span", {}, "Thermocouple type"), type),
      insert,
    ),
  );
}

const channels = ({ titles }: Suggestion) => counted(titles.length, "channel");

async function write(workbook: Workbook, sheet: string, suggestion: Suggestion, type: string): Promise<void> {
  const cell = addressOn(sheet, suggestion.cell);
  const { row } = parseCell(suggestion.cell);
  // The header's row is the one above the first reading, which in A1 style has the number of `row`.
  if (row > 0) {
    await workbook.setHeader(
      addressOn(sheet, suggestion.cell.replace(/\d+$/, String(row))),
      suggestion.titles,
    );
  }
  await workbook.setFormula(cell, suggestion.formula(type));
  await workbook.select(cell);
}

function noSuggestion(): HTMLElement {
  return make(
    "p",
    {},
    "No formula is suggested: the header names no mV columns with a terminal temperature in °C. Type ",
    make("code", {}, "=BEAD."),
    " in a free cell, and wrap each column as ",
    make("code", {}, 'IF(ISBLANK(range),"",range)'),
    " so that empty cells stay blank.",
  );
}

/** The types that the catalogue names for this argument, with none chosen. */
function typeChoice(catalogue: Catalogue): HTMLSelectElement {
  const parameter = catalogue.functions
    .find((each) => each.id === "TEMPERATURE")
    ?.parameters.find((each) => each.name === "type");
  const select = make("select", { class: "field", name: "type" }, make("option", { value: "" }, "Choose…"));
  for (const option of parameter?.options ?? []) select.append(make("option", { value: option }, option));
  return select;
}
