import type { Catalogue } from "../catalogue/catalogue";
import { cellName, SheetDraft, type SheetPlan } from "../sheets";

const firstLine = 3;

/** One line for each example that answers in one cell and reads no other: a place to change numbers and see. */
export function trySheet(catalogue: Catalogue): SheetPlan {
  const columns = [
    { width: 152, format: "text" },
    { width: 112, format: "general", role: "result" },
    { width: 16 },
    { width: 420, format: "text" },
  ] as const;
  const sheet = new SheetDraft("Try it", columns, firstLine)
    .title("Try it")
    .notes(
      "A2",
      "Examples of the functions, one in each row. Change a formula in column B, or type =BEAD. in an empty cell.",
    )
    .headers("A3", [
      ["Function", "text"],
      ["Result", "general"],
    ])
    .headers("D3", [["Formula", "text"]]);
  let row = firstLine;
  for (const { id, examples } of catalogue.functions) {
    const example = examples.find(({ formula, result }) => isOneNumber(result) && !readsCells(formula));
    if (!example) continue;
    sheet
      .labels(cellName(row, 0), id)
      .result(cellName(row, 1), example.formula, "general")
      .examples(cellName(row, 3), example.formula);
    row++;
  }
  return sheet.plan();
}

const isOneNumber = (result: string) => /^[-−]?\d+(\.\d+)?$/.test(result.trim());

const readsCells = (formula: string) => /\$?[A-Z]{1,3}\$?\d+/.test(formula.replace(/"[^"]*"/g, ""));
