/** SAE AMS2750: uniformity by furnace class, in °F and in °C, and a worked example. */
import { type TemperatureUnit, temperatureUnits } from "../../src/core";
import { furnaceClass } from "../../src/core/survey";
import type { PublishedSet } from "./published-value";

/**
 * Class, ± °F, ± °C. Written down from copies in print and from memory; the two are not told apart row by row.
 */
export const uniformityByClass: readonly (readonly [
  furnaceClass: number,
  fahrenheit: number,
  celsius: number,
])[] = [
  [1, 5, 3],
  [2, 10, 6],
  [3, 15, 8],
  [4, 20, 10],
  [5, 25, 14],
  [6, 50, 28],
];

/** Found in print: set 1900 °F, survey 1887 to 1913 °F, that is ± 13 °F: class 3. */
export const workedClass = { setpoint: 1900, lowest: 1887, highest: 1913, furnaceClass: 3 };

export const inUnit = (symbol: string): TemperatureUnit =>
  temperatureUnits.find((unit) => unit.symbol === symbol) as TemperatureUnit;

const [C, F] = [inUnit("C"), inUnit("F")];

export const surveySets: readonly PublishedSet[] = [
  {
    source: "SAE AMS2750, uniformity by furnace class (in print and from memory, not told apart)",
    origin: "memory",
    compared: "the class that a deviation at its limit still meets",
    values: uniformityByClass.flatMap(([published, fahrenheit, celsius]) => [
      {
        what: `± ${fahrenheit} °F`,
        unit: "class",
        published,
        decimals: 0,
        tolerance: 0,
        ours: () => furnaceClass(fahrenheit * F.degree, F),
      },
      {
        what: `± ${celsius} °C`,
        unit: "class",
        published,
        decimals: 0,
        tolerance: 0,
        ours: () => furnaceClass(celsius, C),
      },
    ]),
  },
  {
    source: "SAE AMS2750, a worked example of a furnace survey",
    origin: "print",
    compared: "the class that it meets",
    values: [
      {
        what: `set ${workedClass.setpoint} °F, survey ${workedClass.lowest} to ${workedClass.highest} °F`,
        unit: "class",
        published: workedClass.furnaceClass,
        decimals: 0,
        tolerance: 0,
        ours: () => furnaceClass((workedClass.highest - workedClass.setpoint) * F.degree, F),
      },
    ],
  },
];
