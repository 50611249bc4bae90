/** The lines of a budget as people type them. */
import { type BudgetLine, noAnswer, wrongKind } from "../../core";
import { type RecordOf, records } from "../arguments";
import { degreesOfFreedom } from "../kinds/degrees-of-freedom";
import { distribution } from "../kinds/distribution";
import { type Kind, shown } from "../kinds/kind";
import { name } from "../kinds/name";
import { number } from "../kinds/numbers";

/** A half-width is often typed with its ±, which makes it a text. */
const halfWidth: Kind<number> = {
  name: number.name,
  read: (cell, label, unit) =>
    typeof cell === "string" && /^\s*(±|\+\s*\/?\s*[-−])/.test(cell)
      ? wrongKind`${label}: "${shown(cell.trim())}" is text, type the number without ±`
      : number.read(cell, label, unit),
};

/** Read by the core, whose refusal then names the row. */
const distributionWord: Kind<string> = {
  ...distribution,
  read: (cell, label) => (cell === 0 ? noAnswer`${label}: 0 or an empty cell` : String(cell)),
};

const fields = {
  name: { words: "name", kind: name, optional: true },
  value: { words: "value", kind: halfWidth, optional: false },
  distribution: { words: "distribution", kind: distributionWord, optional: false },
  divisor: { words: "divisor", kind: number, optional: true },
  sensitivity: { words: "sensitivity", kind: number, optional: true },
  dof: { words: "degrees of freedom", kind: degreesOfFreedom, optional: true },
} as const;

export const lines = records(fields);

export type TypedLine = RecordOf<typeof fields>;

/** The core's lines; each keeps the row that it was typed in. */
export const budgetLines = (typed: readonly (TypedLine | undefined)[]): BudgetLine[] =>
  typed.flatMap((line, index) =>
    // A name of 0 is an empty cell.
    line === undefined ? [] : [{ ...line, name: String(line.name || ""), row: index + 1 }],
  );
