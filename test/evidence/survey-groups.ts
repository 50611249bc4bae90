/** Lethality, mean kinetic temperature and furnace classes. */
import { Refusal, type TemperatureUnit, temperatureUnits } from "../../src/core";
import { timeGrid } from "../../src/core/log";
import { furnaceClass, lethality, meanKinetic } from "../../src/core/survey";
import { publishedLethality, publishedMeanKinetic } from "../published/lethality";
import { uniformityByClass } from "../published/survey";
import { type Group, row } from "./group";

function given<T>(value: T | Refusal): T {
  if (value instanceof Refusal) throw new Error(value.message());
  return value;
}

const unit = (symbol: string): TemperatureUnit =>
  temperatureUnits.find((one) => one.symbol === symbol) as TemperatureUnit;

/** A steady load, a scan a minute. */
function f(minutes: number, temperature: number, reference: number, z: number): number {
  const times = Float64Array.from({ length: minutes + 1 }, (_, i) => i);
  const settings = given(lethality({ reference, z, method: "trapezoid" }));
  return given(
    settings(
      given(timeGrid(times)),
      times.map(() => temperature),
    ),
  ).f;
}

const { temperatures, meanKinetic: printedMean, tolerance } = publishedMeanKinetic;

export const surveyGroups: readonly Group[] = [
  ...publishedLethality.map(
    ({ source, rows }): Group => ({
      source,
      compared: "F in minutes",
      rows: rows.map(({ minutes, temperature, reference, z, f: printed, tolerance: allowed }) =>
        row(
          `${minutes} min at ${temperature} °C, reference ${reference} °C, z ${Number(z.toFixed(4))} °C`,
          printed,
          f(minutes, temperature, reference, z),
          3,
          allowed,
        ),
      ),
    }),
  ),
  {
    source: "mean kinetic temperature, ΔH = 83.144 kJ/mol (recomputed by the printed formula)",
    compared: "°C",
    rows: [
      row(
        temperatures.join(", "),
        printedMean,
        given(given(meanKinetic())(Float64Array.from(temperatures))),
        4,
        tolerance,
      ),
    ],
  },
  {
    source: "SAE AMS2750, uniformity by furnace class (in print and from memory)",
    compared: "class at its limit",
    rows: uniformityByClass.flatMap(([which, fahrenheit, celsius]) => [
      row(`± ${fahrenheit} °F`, which, furnaceClass(fahrenheit * unit("F").degree, unit("F")), 0),
      row(`± ${celsius} °C`, which, furnaceClass(celsius, unit("C")), 0),
    ]),
  },
];
