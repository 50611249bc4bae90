/**
 * Temperature units. Everything inside `core` is in degrees Celsius; the other
 * units exist only at the edge, and each is one record: a switch of unit pairs
 * would state the same fact four times.
 */
export interface TemperatureUnit {
  /** As typed in a cell. */
  readonly symbol: "C" | "F" | "K" | "R";
  /** As printed after a number. */
  readonly label: string;
  /** Size of this unit's degree, in °C. */
  readonly degree: number;
  /** What a thermometer in this unit shows at 0 °C (exact by definition). */
  readonly atZeroCelsius: number;
}

export const celsius: TemperatureUnit = { symbol: "C", label: "°C", degree: 1, atZeroCelsius: 0 };
const fahrenheit: TemperatureUnit = { symbol: "F", label: "°F", degree: 5 / 9, atZeroCelsius: 32 };
const kelvin: TemperatureUnit = { symbol: "K", label: "K", degree: 1, atZeroCelsius: 273.15 };
const rankine: TemperatureUnit = { symbol: "R", label: "°R", degree: 5 / 9, atZeroCelsius: 491.67 };

export const temperatureUnits: readonly TemperatureUnit[] = [celsius, fahrenheit, kelvin, rankine];

/** A temperature given in `unit`, in °C. */
export const toCelsius = (value: number, unit: TemperatureUnit): number =>
  (value - unit.atZeroCelsius) * unit.degree;

/** A temperature in °C, in `unit`. */
export const fromCelsius = (value: number, unit: TemperatureUnit): number =>
  value / unit.degree + unit.atZeroCelsius;
