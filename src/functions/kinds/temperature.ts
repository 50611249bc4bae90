/** Temperatures, temperature differences and the unit that a call gives them in. */
import { Refusal, type TemperatureUnit, temperatureUnits, toCelsius, wrongKind } from "../../core";
import { type Kind, type NumberKind, readNumber, shown } from "./kind";

/** A temperature in the call's unit; °C inside. */
export const temperature: NumberKind = {
  name: "temperature",
  unit: "°C",
  scale: (unit) => ({ zero: unit.atZeroCelsius, factor: unit.degree }),
  read(cell, label, unit) {
    const value = readNumber(cell, label);
    return value instanceof Refusal ? value : toCelsius(value, unit);
  },
};

/** A temperature difference: only the size of the degree counts. */
export const temperatureDifference: NumberKind = {
  name: "temperature difference",
  unit: "°C",
  scale: (unit) => ({ zero: 0, factor: unit.degree }),
  read(cell, label, unit) {
    const value = readNumber(cell, label);
    return value instanceof Refusal ? value : value * unit.degree;
  },
};

/** C, F, K or R, for every temperature of a call. */
export const temperatureUnit: Kind<TemperatureUnit> = {
  name: "option",
  options: temperatureUnits.map(({ symbol }) => symbol),
  read(cell, label) {
    const wanted = String(cell).trim().toUpperCase();
    return (
      temperatureUnits.find(({ symbol }) => symbol === wanted) ??
      wrongKind`${label}: "${shown(String(cell))}" is none of ${temperatureUnits.map(({ symbol }) => symbol).join(", ")}`
    );
  },
};
