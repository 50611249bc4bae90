import type { Traits } from "../workbook/workbook";

/**
 * A formula with the separators of a workbook whose decimal mark is a comma, as it would be typed there. Names of
 * the sheet's own functions stay English: the sheet translates them when it shows the formula.
 */
export function localForm(formula: string, { decimal, list }: Pick<Traits, "decimal" | "list">): string {
  if (decimal === "." && list === ",") return formula;
  return formula.replace(PIECE, (piece, quoted: string | undefined, braces: string | undefined) => {
    if (quoted !== undefined) return quoted;
    if (braces !== undefined) return braces.replace(PIECE_OF_ARRAY, (part) => arrayPiece(part, decimal));
    return piece === "," ? list : piece.replace(".", decimal);
  });
}

/** Quoted texts and sheet names, array constants, numbers with a point, commas. */
const PIECE = /("(?:[^"]|"")*"|'(?:[^']|'')*')|(\{[^}]*\})|(?<![A-Z0-9_.])\d+\.\d+|,/gi;
const PIECE_OF_ARRAY = /"(?:[^"]|"")*"|\d+\.\d+|,/g;

function arrayPiece(part: string, decimal: string): string {
  if (part.startsWith('"')) return part;
  // Beside a decimal comma the columns of an array constant are parted by a backslash.
  return part === "," ? (decimal === "," ? "\\" : ",") : part.replace(".", decimal);
}
