import { BooleanNumber, HorizontalAlign, type IStyleData, type Nullable, WrapStrategy } from "@univerjs/core";
import type { CellLook } from "../../workbooks";

/** What a file keeps of a cell's look in the grid. */
export function storedLook(style: Nullable<IStyleData>, spilled?: Nullable<IStyleData>): CellLook {
  const pattern = style?.n?.pattern ?? spilled?.n?.pattern;
  const align = alignments.get(style?.ht ?? HorizontalAlign.UNSPECIFIED);
  const colour = hex(style?.cl?.rgb);
  return {
    ...(pattern && pattern !== "General" ? { pattern } : {}),
    ...(style?.bl === BooleanNumber.TRUE ? { bold: true } : {}),
    ...(style?.fs && style.fs !== 11 ? { size: style.fs } : {}),
    ...(colour ? { colour } : {}),
    ...(align ? { align } : {}),
    ...(style?.pd?.l ? { indented: true } : {}),
    ...(style?.tb === WrapStrategy.WRAP ? { wrapped: true } : {}),
  };
}

const alignments = new Map<HorizontalAlign, "left" | "center" | "right">([
  [HorizontalAlign.LEFT, "left"],
  [HorizontalAlign.CENTER, "center"],
  [HorizontalAlign.RIGHT, "right"],
]);

/** "#2F5D73" and "rgb(47,93,115)" as "2f5d73". */
function hex(colour: Nullable<string>): string | undefined {
  const written = /^#([0-9a-f]{6})$/i.exec(colour ?? "")?.[1];
  if (written) return written.toLowerCase();
  const parts = /^rgba?\((\d+),\s*(\d+),\s*(\d+)/.exec(colour ?? "")?.slice(1, 4);
  return parts?.map((part) => Number(part).toString(16).padStart(2, "0")).join("");
}
