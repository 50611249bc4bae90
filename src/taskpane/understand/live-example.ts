import type { CatalogueFunction, Example } from "../../catalogue/catalogue";
import { parseResult } from "../../catalogue/formula";
import { make } from "../dom";
import { findCall, parse } from "../formula/syntax";
import { evaluate, isFault, type LiveCell } from "../live/evaluate";
import { shownValue, unitInCall, withUnit } from "../live/show-value";

const MOST_ROWS = 6;

/** A documented example with what the function in this page makes of it now, to the digits that are printed. */
export function liveExample(found: CatalogueFunction, example: Example, namespace: string): HTMLElement {
  const result = make(
    "div",
    { class: "live-result" },
    make("span", { class: "gives" }, "gives "),
    example.result,
  );
  const given = findCall(example.formula, namespace)?.given ?? [];
  evaluate(example.formula, namespace).then(
    (cells) => {
      const decimals = parseResult(example.result).rows[0]?.[0]?.decimals;
      const shown = shownResult(found, given, cells, cells.length, decimals);
      result.replaceChildren(make("span", { class: "gives" }, "gives "), shown);
    },
    // Where the functions did not load the printed result stands.
    () => {},
  );
  return make("li", { class: "example" }, make("code", { class: "formula" }, example.formula), result);
}

/** A single value with its unit, or the first rows of a block as a table. */
export function shownResult(
  found: CatalogueFunction,
  given: readonly string[],
  cells: readonly (readonly LiveCell[])[],
  rowsInAll = cells.length,
  decimals?: number,
): HTMLElement {
  const single = cells.length === 1 && cells[0]?.length === 1 ? cells[0][0] : undefined;
  if (single !== undefined && rowsInAll === 1) return singleResult(found, given, single, decimals);
  const rows = cells
    .slice(0, MOST_ROWS)
    .map((row) => make("tr", {}, ...row.map((cell, column) => tableCell(found, cell, column, row.length))));
  const more = rowsInAll - rows.length;
  return make(
    "div",
    { class: "block-scroll", tabindex: "0", role: "region", "aria-label": "Result" },
    make("table", { class: "block" }, make("tbody", {}, ...rows)),
    ...(more > 0
      ? [make("p", { class: "more-rows" }, `and ${more} more ${more === 1 ? "row" : "rows"}`)]
      : []),
  );
}

function singleResult(
  found: CatalogueFunction,
  given: readonly string[],
  cell: LiveCell,
  decimals: number | undefined,
): HTMLElement {
  if (isFault(cell)) {
    return make("span", { class: "fault" }, make("strong", {}, cell.code), ` ${cell.message ?? ""}`);
  }
  const kind = kindInCall(found, given);
  const unit = typeof cell === "number" ? unitInCall(found, given, kind?.unit) : undefined;
  return make("strong", { class: "value" }, withUnit(shownValue(cell, kind?.kind, decimals), unit));
}

/** What a single value is: the only kind there is, or that of the metric which the call names. */
function kindInCall({ resultKinds, parameters }: CatalogueFunction, given: readonly string[]) {
  if (resultKinds.length === 1) return resultKinds[0];
  const index = parameters.findIndex(({ name }) => name === "metric" || name === "column");
  const named = parse(given[index] ?? "");
  return named.kind === "constant" ? resultKinds.find(({ name }) => name === named.value) : undefined;
}

function tableCell(
  { resultKinds }: CatalogueFunction,
  cell: LiveCell,
  column: number,
  columns: number,
): HTMLElement {
  const kind =
    resultKinds.length === 1
      ? resultKinds[0]
      : columns === resultKinds.length
        ? resultKinds[column]
        : undefined;
  const words = isFault(cell) && cell.message ? { title: cell.message } : {};
  const look = typeof cell === "number" ? "number" : isFault(cell) ? "fault" : "words";
  return make("td", { class: look, ...words }, shownValue(cell, kind?.kind));
}
