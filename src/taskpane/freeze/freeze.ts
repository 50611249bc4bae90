import type { Catalogue } from "../../catalogue/catalogue";
import type { FilledSheet } from "../../sheets";
import { addressOn, blockName, LAST_COLUMN, parseAddress, parseBlock } from "../workbook/address";
import { Trouble } from "../workbook/trouble";
import type { History } from "../workbook/undo";
import type { CellInput, CellValue, FormulaCell, Workbook, Writing } from "../workbook/workbook";
import { traceOf } from "./trace";

export type TracePlace = "beside" | "sheet";

const ERROR = /^#(N\/A|VALUE!|REF!|DIV\/0!|NUM!|NAME\?|NULL!|SPILL!|CALC!)$/;

/**
 * Puts values in place of a formula's whole result, with a trace of where they came from. Values and a trace beside
 * them are written in one go; gives back where the trace stands.
 */
export async function freeze(
  workbook: Workbook,
  history: History,
  catalogue: Catalogue,
  formula: FormulaCell,
  place: TracePlace,
): Promise<string> {
  const { sheet = "", range } = parseAddress(formula.range);
  const values = await workbook.getValues(formula.range);
  if (values.flat().some((value) => value === "#BUSY!" || value === "#GETTING_DATA")) {
    throw new Trouble("The sheet is still calculating. Freeze the result when it is done.");
  }
  const read = (address: string) =>
    workbook.getValues(address.includes("!") ? address : addressOn(sheet, address));
  const trace = await traceOf(catalogue, { formula, values, date: new Date(), read });
  const frozen: Writing = { range: formula.range, inputs: values.map((row) => row.map(asInput)) };
  const again: Writing = {
    range: formula.range,
    inputs: values.map((row, r) => row.map((_, c) => (r === 0 && c === 0 ? formula.formula : ""))),
  };
  if (place === "sheet") {
    const name = await workbook.addSheet(traceSheet(trace));
    try {
      await workbook.write([frozen]);
    } catch (failure) {
      // A trace of something that was not frozen would mislead.
      await workbook.removeSheet(name);
      throw failure;
    }
    history.add({
      sentence: `Froze ${range}`,
      takeBack: async () => {
        await workbook.select(formula.anchor);
        await workbook.write([again]);
        await workbook.removeSheet(name);
      },
    });
    return `on the sheet ${name}`;
  }
  const area = await besideArea(workbook, formula.range, trace.length);
  const written: Writing = { range: area, inputs: trace.map((line) => line.map(asText)), formats: "@" };
  await workbook.write([frozen, written]);
  history.add({
    sentence: `Froze ${range}`,
    takeBack: () =>
      workbook.write([
        again,
        { range: area, inputs: trace.map((line) => line.map(() => "")), formats: "General" },
      ]),
  });
  return `in ${parseAddress(area).range}`;
}

/** Free columns to the right of everything, at the height of the result. */
async function besideArea(workbook: Workbook, address: string, rows: number): Promise<string> {
  const { sheet = "", range } = parseAddress(address);
  const { row, lastColumn } = parseBlock(range);
  const used = await workbook.getUsedRange(address);
  const column = Math.max(lastColumn, used ? parseBlock(used).lastColumn : 0) + 2;
  if (column + 1 > LAST_COLUMN)
    throw new Trouble("There is no free column beside the result. Put the trace on a sheet of its own.");
  const area = addressOn(sheet, blockName({ row, column, lastRow: row + rows - 1, lastColumn: column + 1 }));
  const { occupiedCount, protected: isProtected } = await workbook.inspect(area);
  if (occupiedCount > 0 || isProtected)
    throw new Trouble("There is no room beside the result. Put the trace on a sheet of its own.");
  return area;
}

function traceSheet(trace: readonly [string, string][]): FilledSheet {
  return {
    name: "Frozen result",
    columns: [{ width: 232 }, { width: 640 }],
    frozenRows: 1,
    printOnePageWide: true,
    cells: [
      { row: 0, column: 0, value: "Trace of a frozen result", role: "title", format: "text" },
      ...trace.flatMap(([name, text], index) => [
        { row: index + 2, column: 0, value: name, role: "label", format: "text" } as const,
        { row: index + 2, column: 1, value: text, role: "example", format: "text" } as const,
      ]),
    ],
  };
}

/** Texts stay texts, whatever they look like; errors stay errors. */
const asInput = (value: CellValue): CellInput =>
  typeof value === "string" && value !== "" && !ERROR.test(value) ? asText(value) : value;

const asText = (text: string): string => (text === "" ? "" : `'${text}`);
