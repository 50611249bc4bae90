import { make } from "../../taskpane/dom";
import type { LogFormat } from "./sniff";

const delimiterNames = [
  [";", "Semicolon ;"],
  [",", "Comma ,"],
  ["\t", "Tab"],
  ["|", "Bar |"],
] as const;

const decimalNames = [
  [".", "Point 21.5"],
  [",", "Comma 21,5"],
] as const;

const dateNames = [
  ["ymd", "Year, month, day"],
  ["dmy", "Day, month, year"],
  ["mdy", "Month, day, year"],
  ["none", "Left as text"],
] as const;

/** What was detected, each open to change; calls back with the whole format after a change. */
export function formatControls(format: LogFormat, onChange: (format: LogFormat) => void): HTMLElement {
  const current = { ...format };
  const choice = <Key extends "delimiter" | "decimal" | "dates">(
    key: Key,
    words: string,
    options: readonly (readonly [LogFormat[Key], string])[],
  ) => {
    const select = make("select", { class: "field", name: key });
    for (const [value, name] of options) {
      select.append(make("option", { value, selected: value === format[key] }, name));
    }
    select.addEventListener("change", () => {
      current[key] = select.value as LogFormat[Key];
      onChange({ ...current });
    });
    return make("label", { class: "choice" }, make("span", {}, words), select);
  };
  const header = make("input", { type: "checkbox", name: "hasHeader", checked: format.hasHeader });
  header.addEventListener("change", () => {
    current.hasHeader = header.checked;
    onChange({ ...current });
  });
  return make(
    "div",
    { class: "choices" },
    choice("delimiter", "Column separator", delimiterNames),
    choice("decimal", "Decimal mark", decimalNames),
    choice("dates", "Dates", dateNames),
    make("label", { class: "choice tick" }, header, make("span", {}, "The first row is the header")),
  );
}
