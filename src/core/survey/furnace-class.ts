/** The furnace class that a deviation meets. */
import { degreesApart, noAnswer, type Refusal } from "../errors";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { celsius, type TemperatureUnit } from "../units";
import { furnaceClasses } from "./furnace-classes";

/** The standard's row in degrees of this size. */
const rowOf = (unit: TemperatureUnit): "celsius" | "fahrenheit" =>
  unit.degree === 1 ? "celsius" : "fahrenheit";

/**
 * Tightest class of SAE AMS2750 whose uniformity limit a deviation from the set point (°C, either sign) does not
 * exceed, from the standard's °C row, or its °F row where the call's `unit` is °F or °R. At the limit passes. Refused:
 * a deviation beyond the last class.
 */
export function furnaceClass(deviation: number, unit: TemperatureUnit = celsius): number | Refusal {
  const size = toNinthDecimal(Math.abs(deviation) / unit.degree);
  const row = rowOf(unit);
  const met = furnaceClasses.find((each) => size <= each[row]);
  if (met !== undefined) return met.class;
  const last = furnaceClasses[furnaceClasses.length - 1]!;
  return noAnswer`deviation ${degreesApart(Math.abs(deviation))} exceeds class ${last.class}: ± ${degreesApart(last[row] * unit.degree)}`;
}
