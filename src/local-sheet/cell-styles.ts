import { BooleanNumber, HorizontalAlign, type IStyleData, VerticalAlign, WrapStrategy } from "@univerjs/core";
import { type CellRole, type FormatName, numberFormats, tones } from "../sheets";

/** Colours of look.md for light paper; in the dark the engine turns them over itself. */
const ink = { rgb: `#${tones.ink}` };
const muted = { rgb: `#${tones.muted}` };
const slate = { rgb: `#${tones.slate}` };

/** So that a text does not touch the number to its left. */
const textPadding = { l: 8 };

/** Styles by a name that says all of them: cells hold the name alone, so a long column costs one style. */
export type CellStyles = Record<string, IStyleData>;

const bold = { bl: BooleanNumber.TRUE, cl: ink };

const roles: Record<CellRole, IStyleData> = {
  title: { ...bold, fs: 14 },
  note: { cl: muted },
  heading: bold,
  label: { cl: ink },
  header: bold,
  input: { cl: slate },
  result: { cl: ink },
  verdict: bold,
  example: { cl: ink },
};

/** These stand at the left edge, where a line of them begins. */
const unpadded: ReadonlySet<CellRole> = new Set(["title", "note", "heading"]);

export const styleName = (role: CellRole, format: FormatName = "general"): string => `${role} ${format}`;

/** Numbers to the right, so that their decimal marks stand under one another; texts to the left. */
export function cellStyle(role: CellRole, format: FormatName = "general"): IStyleData {
  const pattern = numberFormats[format];
  return {
    ...roles[role],
    ...(format === "paragraph" ? { tb: WrapStrategy.WRAP, vt: VerticalAlign.TOP } : {}),
    ...(format === "text" || format === "paragraph"
      ? { ht: HorizontalAlign.LEFT, ...(unpadded.has(role) ? {} : { pd: textPadding }) }
      : { ht: HorizontalAlign.RIGHT }),
    ...(pattern === "General" || role === "header" ? {} : { n: { pattern } }),
  };
}
