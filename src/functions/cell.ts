/** What may stand in a cell that is handed to a function. */

/** Errors that a custom function is able to return. The others become `#VALUE!`. */
const RETURNABLE: ReadonlySet<string> = new Set(["#VALUE!", "#N/A", "#DIV/0!", "#NUM!", "#NULL!"]);

export type Present = number | string | boolean;
export type CellError = CustomFunctions.Error;

export type Reading =
  | { kind: "present"; value: Present }
  | { kind: "blank" }
  | { kind: "error"; error: CellError };

const blank: Reading = { kind: "blank" };

export const error = (code: "#VALUE!" | "#N/A", message: string): CellError =>
  new CustomFunctions.Error(code as CustomFunctions.ErrorCode, message);

/** Rule 3: an error passes through unchanged where the platform lets it. */
function passThrough(code: string, original: object): CellError {
  if (!RETURNABLE.has(code)) return error("#VALUE!", `input is ${code}`);
  return original instanceof CustomFunctions.Error
    ? original
    : new CustomFunctions.Error(code as CustomFunctions.ErrorCode);
}

/** Sorts a raw cell; unwraps a data-type object should one arrive. */
export function readCell(raw: unknown): Reading {
  if (raw === null || raw === undefined || raw === "") return blank;
  if (typeof raw === "number" || typeof raw === "string" || typeof raw === "boolean") {
    return { kind: "present", value: raw };
  }
  if (typeof raw !== "object") return { kind: "error", error: error("#VALUE!", "input is not a cell value") };
  const { code, basicType, basicValue } = raw as Record<"code" | "basicType" | "basicValue", unknown>;
  if (typeof code === "string") return { kind: "error", error: passThrough(code, raw) };
  if (basicType === "Error") return { kind: "error", error: passThrough(String(basicValue), raw) };
  if (typeof basicValue !== "object") return readCell(basicValue);
  return { kind: "error", error: error("#VALUE!", "input is not a cell value") };
}
