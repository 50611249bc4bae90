import { functionInPage } from "../live/functions-in-page";
import { Trouble } from "../workbook/trouble";

/**
 * The only functions that the pane knows by name: those that its pictures are drawn with. A test holds the names and
 * the order of the arguments to the catalogue.
 */
export const DRAWN = {
  EMF: ["temperature", "type"],
  SEEBECK: ["temperature", "type"],
  TOLERANCE: ["temperature", "type", "toleranceClass", "expressedIn"],
  TYPEINFO: ["type", "metric"],
  SOAK: ["times", "readings", "setpoint", "tolerance", "corrections", "maxGap", "timeUnit", "metric"],
} as const;

/** The names that the readings of a survey go by in the functions that take them. */
export const SURVEY_ARGUMENTS = ["times", "readings", "setpoint", "tolerance", "corrections"] as const;

export type Given = readonly (readonly unknown[])[] | number | string | null;

/** A column of results as numbers; null where the function gives an error, a text or a blank. */
export function column(id: keyof typeof DRAWN, ...given: Given[]): (number | null)[] {
  return called(id, ...given).map(([value]) => (typeof value === "number" ? value : null));
}

/** One result as it comes. */
export const single = (id: keyof typeof DRAWN, ...given: Given[]): unknown => called(id, ...given)[0]?.[0];

function called(id: keyof typeof DRAWN, ...given: Given[]): unknown[][] {
  const own = functionInPage(id);
  if (!own) throw new Trouble("The functions did not load with this page. Reload it.");
  const matrices = given.map((each) => (each === null || Array.isArray(each) ? each : [[each]]));
  return own(...matrices) as unknown[][];
}
