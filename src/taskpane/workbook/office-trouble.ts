import { Trouble } from "./trouble";

/** Excel's codes for what keeps an add-in from working, as sentences: what, and what to do. */
const SENTENCES: Readonly<Record<string, string>> = {
  InvalidOperationInCellEditMode: "A cell is being edited. Press Enter or Esc in the sheet, then try again.",
  AccessDenied: "The sheet is protected. Unprotect it, or choose another place.",
  InvalidSelection: "Select one range of cells first.",
  InvalidReference: "That is not the address of cells in this workbook.",
  InvalidArgument: "Excel did not take this. Check the addresses and the formula.",
  ItemNotFound: "There is no such sheet or range any more.",
  ItemAlreadyExists: "A sheet of that name exists already.",
  InsertDeleteConflict: "Excel could not change cells there.",
  RequestAborted: "Excel stopped the request. Try again.",
  ResponsePayloadSizeLimitExceeded: "That is more than Excel hands over at once. Select fewer cells.",
  RequestPayloadSizeLimitExceeded: "That is more than Excel takes at once. Write it in parts.",
  PartialArrayUpdate: "Part of an array cannot be changed. Choose another place.",
  SpillRangeConflict: "Results already spill there. Choose another place.",
};

const UNKNOWN = "Excel could not do this now. Finish what is open in it, then try again.";

export function excelTrouble(failure: unknown): Trouble {
  const code =
    typeof failure === "object" && failure !== null ? String((failure as { code?: unknown }).code) : "";
  return new Trouble(Object.hasOwn(SENTENCES, code) ? SENTENCES[code] : UNKNOWN);
}
