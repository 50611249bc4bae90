/** What the page says, section by section, before it becomes Markdown or HTML: the parts that it is made of. */
export interface Column {
  readonly name: string;
  /** Numbers stand right-aligned, a verdict is coloured. */
  readonly kind: "text" | "figure" | "verdict";
}

export interface Table {
  readonly columns: readonly Column[];
  readonly rows: readonly (readonly string[])[];
  /** Beside the rows: where on the page the first cell leads. */
  readonly links?: readonly string[];
}

export interface Section {
  readonly id: string;
  readonly level: 2 | 3;
  readonly title: string;
  readonly text: readonly string[];
  readonly plots?: "residuals" | "bands" | "digits";
  readonly table?: Table;
}

export const AGREES = "agrees";
export const FALLS_SHORT = "FALLS SHORT";

export const verdict = (holds: boolean): string => (holds ? AGREES : FALLS_SHORT);

export const text = (name: string): Column => ({ name, kind: "text" });
export const figure = (name: string): Column => ({ name, kind: "figure" });
export const verdictColumn: Column = { name: "verdict", kind: "verdict" };
