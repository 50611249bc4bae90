import type { Catalogue } from "../catalogue/catalogue";
import type { CellValue, NewSheet } from "./workbook";

/** One line for each example that answers in one cell and reads no other: a place to change numbers and see. */
export function trySheet(catalogue: Catalogue): NewSheet {
  const rows: (CellValue | null)[][] = [
    ["Try it"],
    [
      "Examples of the functions, one in each row. Change a formula in column B, or type =BEAD. in an empty cell.",
    ],
    ["Function", "Result", null, "Formula"],
  ];
  const formulas: Record<string, string> = {};
  for (const { id, examples } of catalogue.functions) {
    const example = examples.find(({ formula, result }) => isOneNumber(result) && !readsCells(formula));
    if (!example) continue;
    rows.push([id, null, null, example.formula]);
    formulas[`B${rows.length}`] = example.formula;
  }
  return {
    name: "Try it",
    rows,
    formulas,
    columns: [
      { width: 152 },
      { width: 112, numberFormat: "General", role: "result" },
      { width: 16 },
      { width: 420 },
    ],
    headerRows: 3,
    noteRows: 2,
    hasTitle: true,
  };
}

const isOneNumber = (result: string) => /^[-−]?\d+(\.\d+)?$/.test(result.trim());

const readsCells = (formula: string) => /\$?[A-Z]{1,3}\$?\d+/.test(formula.replace(/"[^"]*"/g, ""));
