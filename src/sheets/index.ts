export { cellName, columnName, parseCell } from "./address";
export { blankSafe, blankSafeNote } from "./blank-safe";
export { SheetDraft, type Spill, type Titles } from "./draft";
export { type FormatName, numberFormats } from "./formats";
export { filled, logRows } from "./log-rows";
export type {
  CellRole,
  CellValue,
  FilledSheet,
  LogExtract,
  PlannedCell,
  PlannedColumn,
  SheetPlan,
  WorkbookPlan,
} from "./plan";
export { tones } from "./tones";
