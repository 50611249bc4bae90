export {
  type CellLook,
  isError,
  type PaneReference,
  type StoredCell,
  type StoredError,
  type StoredSheet,
  type StoredValue,
  type StoredWorkbook,
} from "./content";
export { aboutName, aboutSheet } from "./planned/about";
export { plannedLook } from "./planned/looks";
export { type Results, storedSheet } from "./planned/sheet";
export { type ReadWorkbook, readWorkbook } from "./read";
export type { ParseXml, XmlNode } from "./read/xml-node";
export { fromStored, toStored } from "./stored-formula";
export { writeWorkbook } from "./write";
