/**
 * Refusals: what a routine returns instead of a number when there is no valid
 * answer. They are values, not exceptions: in a column of a million readings a
 * bad one is ordinary. A message keeps its temperatures as numbers until it is
 * printed, so that a sheet in °F is refused in °F.
 */
import { celsius, fromCelsius, type TemperatureUnit } from "./units";

/**
 * `wrong kind`: text where a number belongs, an unknown type, class or option (`#VALUE!`).
 * `no answer`: the right kind of argument for which no valid answer exists (`#N/A`).
 */
export type RefusalKind = "wrong kind" | "no answer";

/** A number in a message that knows how to print itself in the unit of the call. */
export interface Quantity {
  print(unit: TemperatureUnit): string;
}

/** Six significant digits: enough to see by how much a limit was passed, short enough to read. */
const shortly = (value: number): string =>
  Number.isFinite(value) ? String(Number(value.toPrecision(6))) : beyond(value);

/** What only numbers that no instrument gives can come to. */
function beyond(value: number): string {
  if (Number.isNaN(value)) return "(not a number)";
  return value > 0 ? "over 1.8E+308" : "under -1.8E+308";
}

/** Rows are counted in whole numbers, and named to the last digit. */
const counted = (value: number): string => (Number.isInteger(value) ? String(value) : shortly(value));

/** A temperature held in °C. */
export const degrees = (value: number): Quantity => ({
  print: (unit) => `${shortly(fromCelsius(value, unit))} ${unit.label}`,
});

/** A temperature difference held in °C: only the size of the degree counts. */
export const degreesApart = (value: number): Quantity => ({
  print: (unit) => `${shortly(value / unit.degree)} ${unit.label}`,
});

/** A number with a unit that is the same in every call: Ω, µV, min, … */
export const measured = (value: number, unit: string): Quantity => ({
  print: () => `${shortly(value)} ${unit}`,
});

/** An EMF in mV, to the tenth of a microvolt. */
export const millivolts = (value: number): Quantity => ({
  print: () => `${Number.isFinite(value) ? String(Number(value.toFixed(4))) : beyond(value)} mV`,
});

type Part = string | Quantity;

export class Refusal {
  constructor(
    readonly kind: RefusalKind,
    private readonly parts: readonly Part[],
  ) {}

  message(unit: TemperatureUnit = celsius): string {
    return this.parts.map((part) => (typeof part === "string" ? part : part.print(unit))).join("");
  }

  /** The same refusal with more words after it. */
  and(strings: TemplateStringsArray, ...values: readonly Printable[]): Refusal {
    return new Refusal(this.kind, [...this.parts, ...parts(strings, values)]);
  }
}

type Printable = string | number | Quantity;

function parts(strings: TemplateStringsArray, values: readonly Printable[]): Part[] {
  return strings.flatMap((text, index) => {
    const value = values[index];
    if (value === undefined) return [text];
    return [text, typeof value === "number" ? counted(value) : value];
  });
}

const template =
  (kind: RefusalKind) =>
  (strings: TemplateStringsArray, ...values: readonly Printable[]): Refusal =>
    new Refusal(kind, parts(strings, values));

/** Tagged template for a `#VALUE!` message. */
export const wrongKind = template("wrong kind");

/** Tagged template for a `#N/A` message. */
export const noAnswer = template("no answer");
