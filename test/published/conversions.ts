/** Worked conversions from print. Where a published answer came from rounded table values, its tolerance says so. */
import { EMF, TEMPERATURE } from "../../src/functions";
import type { PublishedSet } from "./published-value";

const textbook =
  "T. R. Kuphaldt, Lessons In Industrial Instrumentation, thermocouple exercises (open textbook)";

/** Type K: EMF in mV, terminals and answer in °F, the answer to 1 °F. */
// biome-ignore format: one row a line
const textbookTemperatures: readonly (readonly [emf: number, reference: number, answer: number])[] = [
  [2.55, 84, 195],
  [18.83, 84, 904],
];

/** Temperature and terminals in the unit, EMF in mV. */
// biome-ignore format: one row a line
const textbookEmfs: readonly (readonly [
  type: string, t: number, reference: number, unit: string, emf: number, tolerance: number,
])[] = [
  ["B", 589, 70, "F", 0.463, 0.0006],
  // The book subtracts two rounded table values here: 1 µV.
  ["B", 821, 73, "F", 0.953, 0.0011],
  ["B", 1524, 105, "F", 3.378, 0.0006],
  ["B", 1922, 135, "F", 5.294, 0.0006],
  ["E", 233, 25, "C", 14.395, 0.0006],
];

/** A sensor maker's technical page: EMF in mV at 350 °C. */
// biome-ignore format: one row a line
const makersPage: readonly (readonly [type: string, emf: number])[] = [
  ["J", 19.09],
  ["N", 11.136],
  ["R", 2.896],
  ["S", 2.786],
  ["T", 17.819],
];

/** EMF in mV of type S at fixed points of ITS-90 (IEC 60584-1:2013 and calibration guides, from memory). */
// biome-ignore format: one row a line
const fixedPoints: readonly (readonly [name: string, t: number, emf: number])[] = [
  ["zinc", 419.527, 3.4469],
  ["aluminium", 660.323, 5.8601],
  ["silver", 961.78, 9.1484],
  ["copper", 1084.62, 10.5748],
];

const first = (cells: unknown[][]): unknown => cells[0]?.[0];
const one = (value: unknown): unknown[][] => [[value]];

export const conversionSets: readonly PublishedSet[] = [
  {
    source: textbook,
    origin: "print",
    compared: "temperature and EMF; the book works with rounded table values",
    values: [
      ...textbookTemperatures.map(([emf, reference, published]) => ({
        what: `K: ${emf} mV, terminals at ${reference} °F`,
        unit: "°F",
        published,
        decimals: 0,
        ours: () => first(TEMPERATURE(one(emf), one("K"), one(reference), one("F"))),
      })),
      ...textbookEmfs.map(([type, t, reference, unit, published, tolerance]) => ({
        what: `${type}: ${t} °${unit}, terminals at ${reference} °${unit}`,
        unit: "mV",
        published,
        decimals: 3,
        tolerance,
        ours: () => first(EMF(one(t), one(type), one(reference), one(unit))),
      })),
    ],
  },
  {
    source: "a sensor maker's technical page",
    origin: "print",
    compared: "EMF at 350 °C, reference junction at 0 °C",
    values: makersPage.map(([type, published]) => ({
      what: `${type} at 350 °C`,
      unit: "mV",
      published,
      decimals: 3,
      ours: () => first(EMF(one(350), one(type))),
    })),
  },
  {
    source: "a textbook problem on linear interpolation",
    origin: "print",
    compared: "EMF; a straight line between table values 10 °C apart is off by up to 0.3 µV there",
    values: [
      {
        what: "K at 112 °C",
        unit: "mV",
        published: 4.5912,
        decimals: 4,
        tolerance: 0.0003,
        ours: () => first(EMF(one(112), one("K"))),
      },
    ],
  },
  {
    source: "type S at fixed points of ITS-90 (IEC 60584-1:2013 and calibration guides)",
    origin: "memory",
    compared: "EMF, reference junction at 0 °C",
    values: fixedPoints.map(([name, t, published]) => ({
      what: `S at the ${name} point, ${t} °C`,
      unit: "mV",
      published,
      decimals: 4,
      ours: () => first(EMF(one(t), one("S"))),
    })),
  },
];
