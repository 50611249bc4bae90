/** Addresses are the pane's matter as much as the grid's: written once, beside the interface they share. */
export { addressOn, columnName, parseAddress, parseCell } from "../taskpane/workbook/address";
