import { BooleanNumber, HorizontalAlign, type IStyleData } from "@univerjs/core";
import type { NewSheet, SheetColumn } from "./workbook";

/** Colours of look.md for light paper; in the dark the engine turns them over itself. */
const ink = { rgb: "#24262b" };
const muted = { rgb: "#5e625f" };
const slate = { rgb: "#2f5d73" };

/** So that a text does not touch the number to its left. */
const textPadding = { l: 8 };

/** Styles by a name that says all of them: cells hold the name alone, so a long column costs one style. */
export type CellStyles = Record<string, IStyleData>;

export const headStyles = {
  title: { bl: BooleanNumber.TRUE, fs: 14, cl: ink, ht: HorizontalAlign.LEFT },
  note: { cl: muted, ht: HorizontalAlign.LEFT },
  header: { bl: BooleanNumber.TRUE, cl: ink, ht: HorizontalAlign.RIGHT },
  "text header": { bl: BooleanNumber.TRUE, cl: ink, ht: HorizontalAlign.LEFT, pd: textPadding },
} satisfies CellStyles;

/** The style of a cell above the readings. */
export function headStyle(sheet: NewSheet, row: number, column: SheetColumn | undefined): string {
  const notes = sheet.noteRows ?? 0;
  if (row < notes) return row === 0 && sheet.hasTitle ? "title" : "note";
  return column?.numberFormat ? "header" : "text header";
}

export const bodyStyleName = ({ role = "input", numberFormat = "text" }: SheetColumn): string =>
  `${role} ${numberFormat}`;

/** Numbers to the right, so that their decimal marks stand under one another; texts to the left. */
export function bodyStyle({ role = "input", numberFormat }: SheetColumn): IStyleData {
  return {
    cl: role === "input" ? slate : ink,
    ...(numberFormat ? { ht: HorizontalAlign.RIGHT } : { ht: HorizontalAlign.LEFT, pd: textPadding }),
    ...(numberFormat && numberFormat !== "General" ? { n: { pattern: numberFormat } } : {}),
  };
}
