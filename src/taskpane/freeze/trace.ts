import type { Catalogue } from "../../catalogue/catalogue";
import { readDraft } from "../build/draft";
import { rangeOf } from "../formula/shape";
import { findCall } from "../formula/syntax";
import { localTime } from "../live/local-time";
import { shownValue } from "../live/show-value";
import { columnsOf, parseAddress, parseBlock, rowsOf } from "../workbook/address";
import type { CellValue, FormulaCell } from "../workbook/workbook";

export interface TraceInput {
  readonly formula: FormulaCell;
  readonly values: readonly (readonly CellValue[])[];
  readonly date: Date;
  /** Gives the values of a range, for the summary of an argument. */
  readonly read: (address: string) => Promise<readonly (readonly CellValue[])[]>;
}

/** What a frozen result came from, line by line: name and text. */
export async function traceOf(
  catalogue: Catalogue,
  { formula, date, read }: TraceInput,
): Promise<[string, string][]> {
  const { sheet = "", range } = parseAddress(formula.range);
  const block = parseBlock(range);
  const own = functionsIn(formula.formula, catalogue);
  const standards = [...new Set(own.flatMap(({ standards }) => standards))];
  return [
    ["Frozen result", `${range} of the sheet ${sheet}, ${rowsOf(block)} × ${columnsOf(block)} cells`],
    ["Frozen at", `${localTime(date)}, by the clock of this machine`],
    ["Formula", formula.formula],
    ...(await argumentLines(catalogue, formula, read)),
    ["Functions", own.map(({ id }) => `${catalogue.namespace}.${id}`).join(", ")],
    ["Version", `Beadline ${catalogue.version}`],
    ...standards.map((standard, index): [string, string] => [index === 0 ? "Publications" : "", standard]),
    ["Note", "Values, no longer calculated: they do not follow a change of the readings."],
  ];
}

/** Every function of ours in a formula, nested ones too. */
function functionsIn(formula: string, { namespace, functions }: Catalogue) {
  const found = [...formula.matchAll(new RegExp(`\\b${namespace}\\.([A-Z0-9]+)\\(`, "gi"))].map(([, id]) =>
    id!.toUpperCase(),
  );
  return functions.filter(({ id }) => found.includes(id));
}

async function argumentLines(
  catalogue: Catalogue,
  { formula, anchor }: FormulaCell,
  read: TraceInput["read"],
): Promise<[string, string][]> {
  const draft = readDraft(formula, catalogue);
  const call = findCall(formula, catalogue.namespace);
  if (!draft || !call) return [];
  const { sheet = "" } = parseAddress(anchor);
  const lines: [string, string][] = [];
  for (const [index, parameter] of draft.found.parameters.entries()) {
    const argument = call.given[index] ?? "";
    if (argument === "") {
      if (parameter.default) lines.push([`Argument ${parameter.name}`, `left out: ${parameter.default}`]);
      continue;
    }
    const range = rangeOf(argument);
    const words =
      range === undefined
        ? argument
        : `${range} of the sheet ${parseAddress(range).sheet ?? sheet}: ${summary(await read(range), range, parameter.kind)}`;
    lines.push([`Argument ${parameter.name}`, words]);
  }
  return lines;
}

/** "7990 numbers from 0.046 to 48.2, 10 empty" */
export function summary(values: readonly (readonly CellValue[])[], address: string, kind: string): string {
  const block = parseBlock(parseAddress(address).range);
  // A sheet may hand over the rows that it has; those beyond are empty.
  const size = rowsOf(block) * columnsOf(block);
  const all = values.flat();
  if (size === 1) return all[0] === undefined || all[0] === "" ? "empty" : shown(all[0], kind);
  let [numbers, texts, low, high] = [0, 0, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (const value of all) {
    if (typeof value === "number") {
      numbers++;
      low = Math.min(low, value);
      high = Math.max(high, value);
    } else if (value !== "") texts++;
  }
  const empty = size - numbers - texts;
  return [
    numbers > 0 ? `${numbers} numbers from ${shown(low, kind)} to ${shown(high, kind)}` : "",
    texts > 0 ? `${texts} texts or errors` : "",
    empty > 0 ? `${empty} empty` : "",
  ]
    .filter(Boolean)
    .join(", ");
}

const shown = (value: CellValue, kind: string): string =>
  typeof value === "number" && (kind === "time" || kind === "date") ? shownValue(value, kind) : String(value);
