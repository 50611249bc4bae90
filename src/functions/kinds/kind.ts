/**
 * A kind of argument: how one cell is read, and what the catalogue says of it. Kinds
 * are the only place where cells are coerced; a function's body sees clean values.
 */
import { type Refusal, type TemperatureUnit, wrongKind } from "../../core";
import type { Present } from "../cell";

export interface Kind<T> {
  /** For the catalogue: "EMF", "temperature", "option", … */
  readonly name: string;
  /** The unit in which a sheet gives it, for the catalogue. */
  readonly unit?: string;
  /** The words that an option takes, for the catalogue and for messages. */
  readonly options?: readonly string[];
  /** Reads one cell that is neither blank nor an error. `label` is the argument's name in words. */
  read(cell: Present, label: string, unit: TemperatureUnit): T | Refusal;
}

/** From the sheet's unit to the core's: (value − zero) · factor. */
export interface Scale {
  readonly zero: number;
  readonly factor: number;
}

/** A kind whose cells are numbers; a column of them can be read in one sweep. */
export interface NumberKind extends Kind<number> {
  scale(unit: TemperatureUnit): Scale;
}

export const isNumberKind = (kind: Kind<unknown>): kind is NumberKind => "scale" in kind;

/** Long cell texts are cut in messages. */
const shown = (text: string): string => (text.length > 24 ? `${text.slice(0, 23)}…` : text);

/** Rule 5: numbers only. Text that looks like a number has been read as thousands before. */
export function readNumber(cell: Present, label: string): number | Refusal {
  if (typeof cell === "number") {
    return Number.isFinite(cell) ? cell : wrongKind`${label}: not a finite number`;
  }
  if (typeof cell === "boolean") return wrongKind`${label}: ${cell ? "TRUE" : "FALSE"}, not a number`;
  return wrongKind`${label}: "${shown(cell)}" is text, not a number`;
}

/** A number that is taken as it stands. */
export function plainNumber(name: string, unit?: string): NumberKind {
  return {
    name,
    ...(unit === undefined ? {} : { unit }),
    scale: () => ({ zero: 0, factor: 1 }),
    read: readNumber,
  };
}

/** One of a few words, in upper or lower case. */
export function choice<const T extends string>(options: readonly T[]): Kind<T> {
  return {
    name: "option",
    options,
    read(cell, label) {
      const wanted = String(cell).trim().toLowerCase();
      const found = options.find((option) => option.toLowerCase() === wanted);
      return found ?? wrongKind`${label}: "${shown(String(cell))}" is none of ${options.join(", ")}`;
    },
  };
}

export { shown };
