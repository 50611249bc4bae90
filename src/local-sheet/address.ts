/** Addresses are the pane's matter as much as the grid's: written once, beside the interface they share. */
export {
  addressOn,
  columnName,
  LAST_COLUMN,
  LAST_ROW,
  parseAddress,
  parseCell,
} from "../taskpane/workbook/address";
