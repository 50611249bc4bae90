import { columnName, parseCell } from "../sheets";
import { formulaWords } from "./formula-words";

const lastRow = 1_048_576;
const lastColumn = 16_384;

/**
 * A formula as it reads some rows further down and columns further right: workbook files hold a formula that was
 * filled down once, with the cells that share it.
 */
export function shifted(formula: string, down: number, across: number): string {
  return formulaWords(formula)
    .reduce<string[]>(
      (runs, { kind, word }) => {
        // Signs and names of one address stand together again: "$A$1" is four words.
        if (kind === "text" || kind === "sheet") runs.push(word, "");
        else runs[runs.length - 1] += word;
        return runs;
      },
      [""],
    )
    .map((run) =>
      /^["']/.test(run) ? run : run.replace(addresses, (address) => moved(address, down, across)),
    )
    .join("");
}

const addresses = /(?<![\w.$\\])\$?[A-Z]{1,3}\$?[1-9]\d{0,6}(?![\w.(!\\])/gi;

function moved(address: string, down: number, across: number): string {
  const [, columnFixed, , rowFixed] = /^(\$?)([A-Z]+)(\$?)/i.exec(address)!;
  const cell = parseCell(address);
  const row = cell.row + (rowFixed ? 0 : down);
  const column = cell.column + (columnFixed ? 0 : across);
  if (row < 0 || column < 0 || row >= lastRow || column >= lastColumn) return "#REF!";
  return `${columnFixed}${columnName(column)}${rowFixed}${row + 1}`;
}
