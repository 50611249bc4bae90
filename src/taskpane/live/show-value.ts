import type { CatalogueFunction } from "../../catalogue/catalogue";
import { parse } from "../formula/syntax";
import { isFault, type LiveCell } from "./evaluate";

/** The number formats of a sheet by kind of quantity: finer than any thermocouple, and well inside a column. */
const FORMATS: Readonly<Record<string, string>> = {
  temperature: "0.00",
  "temperature difference": "0.00",
  EMF: "0.0000",
  "EMF deviation": "0.0",
  "Seebeck coefficient": "0.000",
  resistance: "0.000",
  rate: "0.00",
  drift: "0.00",
  duration: "0.00",
  "time constant": "0.0",
  share: "0.0%",
  time: "yyyy-mm-dd hh:mm:ss",
  date: "yyyy-mm-dd",
};

const GENERAL = "General";

/** Serials below this are hours, minutes or seconds of a log, not days since 1900. */
const FIRST_DATE = 20_000;

/**
 * The number formats of a result, cell by cell: by the kinds of its columns where it is a whole table, else by the
 * one kind it has. Headers and texts stay as they are.
 */
export function formatsOf(
  { resultKinds }: CatalogueFunction,
  result: readonly (readonly LiveCell[])[],
): string[][] {
  return result.map((row) =>
    row.map((cell, column) => {
      if (typeof cell !== "number") return GENERAL;
      const kind =
        resultKinds.length === 1
          ? resultKinds[0]
          : resultKinds.length === row.length
            ? resultKinds[column]
            : undefined;
      const format = kind && FORMATS[kind.kind];
      if (format?.startsWith("yyyy") && cell < FIRST_DATE) return GENERAL;
      return format ?? GENERAL;
    }),
  );
}

/** A value as the pane prints it: in tabular figures, with as many digits as its kind deserves. */
export function shownValue(cell: LiveCell, kind = "number", digits?: number): string {
  if (isFault(cell)) return cell.code;
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (typeof cell === "string") return cell;
  const format = FORMATS[kind];
  if (format?.startsWith("yyyy") && cell >= FIRST_DATE) return serialText(cell, format.length > 10);
  if (format === "0.0%") return `${(cell * 100).toFixed(1)} %`;
  const decimals =
    digits !== undefined
      ? digits
      : format?.startsWith("0")
        ? (/\.(0+)/.exec(format)?.[1]?.length ?? 0)
        : undefined;
  return (decimals === undefined ? String(Number(cell.toPrecision(6))) : cell.toFixed(decimals)).replace(
    "-",
    "−",
  );
}

/** With a thin space and its unit. */
export const withUnit = (shown: string, unit: string | undefined): string =>
  unit ? `${shown}\u2009${unit}` : shown;

/** The unit of a result: the degrees are those that the call asks for. */
export function unitInCall(
  { parameters }: CatalogueFunction,
  given: readonly string[],
  unit: string | undefined,
): string | undefined {
  const asked = parse(given[parameters.findIndex(({ name }) => name === "unit")] ?? "");
  if (asked.kind !== "constant") return unit;
  return unit?.replaceAll("°C", DEGREES[String(asked.value).toUpperCase()] ?? "°C");
}

const DEGREES: Readonly<Record<string, string>> = { F: "°F", K: "K", R: "°R" };

export function serialText(serial: number, withTime: boolean): string {
  const text = new Date(Math.round((serial - 25_569) * 86_400) * 1000).toISOString();
  return withTime ? `${text.slice(0, 10)} ${text.slice(11, 19)}` : text.slice(0, 10);
}
