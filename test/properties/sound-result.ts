/** What every result must be, whatever was asked: a rectangle of numbers, texts and errors that say why. */

/** Words that come from a value which nobody looked at. */
const UNREAD = /\bNaN\b|\bInfinity\b|\bundefined\b|\bnull\b|\[object|function ?\(/;

/** Codes and texts of whatever stands in the arguments, however deep. */
function collect(given: unknown, codes: Set<string>, texts: Set<string>, depth = 0): void {
  if (typeof given === "string") texts.add(given);
  if (typeof given !== "object" || given === null || depth > 3) return;
  const { code, basicType, basicValue } = given as Record<string, unknown>;
  if (typeof code === "string") codes.add(code);
  if (basicType === "Error" && typeof basicValue === "string") codes.add(basicValue);
  for (const part of Array.isArray(given) ? given : [basicValue]) collect(part, codes, texts, depth + 1);
}

/** What is wrong with a result; undefined when nothing is. */
export function unsound(result: unknown, given: readonly unknown[]): string | undefined {
  if (!Array.isArray(result) || result.length === 0) return "no rows";
  const width = (result[0] as unknown[]).length;
  if (!(width > 0)) return "an empty row";
  const codes = new Set<string>();
  const texts = new Set<string>();
  collect([...given], codes, texts);
  for (const [index, row] of result.entries()) {
    if (!Array.isArray(row) || row.length !== width) return `row ${index} is ragged`;
    for (let column = 0; column < width; column++) {
      const wrong = unsoundCell(row[column], codes, texts);
      if (wrong !== undefined) return `row ${index}, column ${column}: ${wrong}`;
    }
  }
  return undefined;
}

function unsoundCell(cell: unknown, codes: Set<string>, texts: Set<string>): string | undefined {
  if (typeof cell === "string") {
    if (cell.length > 32767) return "a text too long for a cell";
    return UNREAD.test(cell) && !texts.has(cell) ? `the text ${cell.slice(0, 200)}` : undefined;
  }
  if (typeof cell === "number") return Number.isFinite(cell) ? undefined : String(cell);
  if (!(cell instanceof CustomFunctions.Error)) return `a ${typeof cell}`;
  const { code, message } = cell;
  if (message === undefined || message === "") {
    // Only an error that came in may go out without a word.
    return codes.has(code) ? undefined : `${code} without a message`;
  }
  if (message.length > 400) return `a message of ${message.length} characters`;
  // What a cell itself said may be quoted.
  let own = message.replaceAll(/"[^"]*"?/g, "");
  for (const text of texts) if (UNREAD.test(text)) own = own.replaceAll(text.trim(), "");
  return UNREAD.test(own) ? `the message: ${message}` : undefined;
}
