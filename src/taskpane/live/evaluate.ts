import type { Constant, Expression } from "../formula/syntax";
import { parse } from "../formula/syntax";
import type { CellValue } from "../workbook/workbook";
import { functionInPage } from "./functions-in-page";

/** An error value of a cell, with the sentence behind it where the function gave one. */
export interface CellFault {
  readonly code: string;
  readonly message: string | undefined;
}

export type LiveCell = Constant | CellFault;

/** Thrown for what only the sheet itself can calculate. */
export class OnlyTheSheet extends Error {}

export const isFault = (cell: LiveCell | undefined): cell is CellFault => typeof cell === "object";

/** Gives the values of a range; it may hand over fewer rows where only the first are wanted. */
export type ReadRange = (address: string) => Promise<CellValue[][]>;

const noRanges: ReadRange = () => Promise.reject(new OnlyTheSheet("a range"));

/** Calculates one call of our functions by the functions in this page. */
export async function evaluate(
  call: string,
  namespace: string,
  readRange: ReadRange = noRanges,
): Promise<LiveCell[][]> {
  const result = await calculated(parse(call.replace(/^=/, "")), namespace, readRange);
  return result.map((row) => row.map(toLiveCell));
}

async function calculated(
  expression: Expression,
  namespace: string,
  readRange: ReadRange,
): Promise<unknown[][]> {
  if (expression.kind === "constant") return [[expression.value]];
  if (expression.kind === "array") return expression.rows;
  if (expression.kind === "range")
    return (await readRange(expression.address)).map((row) => row.map(fromCell));
  if (expression.kind === "other") throw new OnlyTheSheet("an expression");
  const kept = keptBlanks(expression);
  if (kept) return calculated(kept, namespace, readRange);
  const [own, id = ""] = expression.name.split(".");
  const implementation = own === namespace ? functionInPage(id) : undefined;
  if (!implementation) throw new OnlyTheSheet(expression.name);
  const given: (unknown[][] | null)[] = [];
  for (const each of expression.given) given.push(each && (await calculated(each, namespace, readRange)));
  const result = implementation(...given);
  return Array.isArray(result) ? (result as unknown[][]) : [[result]];
}

/** `IF(ISBLANK(range),"",range)`: an empty cell is "" already when the pane reads it. */
function keptBlanks(expression: Expression & { kind: "call" }): Expression | undefined {
  const [test, empty, value] = expression.given;
  if (expression.name !== "IF" || test?.kind !== "call" || test.name !== "ISBLANK") return undefined;
  if (empty?.kind !== "constant" || empty.value !== "" || value?.kind !== "range") return undefined;
  const [tested] = test.given;
  return tested?.kind === "range" && tested.address === value.address ? value : undefined;
}

const ERROR = /^#(N\/A|VALUE!|REF!|DIV\/0!|NUM!|NAME\?|NULL!|SPILL!|CALC!|BUSY!)$/;

/** Errors reach the pane by their code alone, and the functions in the form of Excel's own. */
const fromCell = (value: CellValue): unknown =>
  typeof value === "string" && ERROR.test(value) ? { code: value } : value;

function toLiveCell(value: unknown): LiveCell {
  if (typeof value === "number" || typeof value === "string" || typeof value === "boolean") return value;
  if (typeof value !== "object" || value === null) return "";
  const { code, message } = value as { code?: unknown; message?: unknown };
  return { code: String(code), message: typeof message === "string" ? message : undefined };
}
