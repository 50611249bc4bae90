import { type CellRole, type FormatName, numberFormats, tones } from "../../sheets";
import type { CellLook } from "../content";

const { ink, muted, slate } = tones;

const bold = { bold: true, colour: ink };

const roles: Record<CellRole, CellLook> = {
  title: { ...bold, size: 14 },
  note: { colour: muted },
  heading: bold,
  label: { colour: ink },
  header: bold,
  input: { colour: slate },
  result: { colour: ink },
  verdict: bold,
  example: { colour: ink },
};

/** These stand at the left edge, where a line of them begins. */
const unindented: ReadonlySet<CellRole> = new Set(["title", "note", "heading"]);

/** Numbers to the right, so that their decimal marks stand under one another; texts to the left. */
export function plannedLook(role: CellRole, format: FormatName = "general"): CellLook {
  const pattern = numberFormats[format];
  const isText = format === "text" || format === "paragraph";
  return {
    ...roles[role],
    align: isText ? "left" : "right",
    ...(isText && !unindented.has(role) ? { indented: true } : {}),
    ...(format === "paragraph" ? { wrapped: true } : {}),
    ...(pattern === "General" || role === "header" ? {} : { pattern }),
  };
}
