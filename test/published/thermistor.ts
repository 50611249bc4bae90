import { type Thermistor, thermistor } from "../../src/core/junction";
import type { PublishedSet } from "./published-value";

/** A data logger's manual: table of a 10 kΩ thermistor, and the coefficients that read it. */
const manualCoefficients = [1.129241e-3, 2.341077e-4, 8.775468e-8];

// biome-ignore format: one row a line
const manualTable: readonly (readonly [t: number, resistance: number])[] = [
  [-40, 336103.2],
  [-35, 242430.2],
  [-30, 176804.8],
  [-25, 130307.6],
  [-20, 97006.9],
  [-15, 72911.1],
  [-10, 55303.9],
  [-5, 42316.7],
  [0, 32650.9],
  [1, 31030.8],
];

const sensor = thermistor(manualCoefficients) as Thermistor;

export const thermistorSets: readonly PublishedSet[] = [
  {
    source: "a data logger's manual, 10 kΩ thermistor",
    origin: "print",
    compared: "temperature from the printed resistance, by the printed coefficients, to 0.005 °C",
    values: manualTable.map(([published, ohms]) => ({
      what: `${ohms} Ω`,
      unit: "°C",
      published,
      decimals: 2,
      ours: () => sensor.temperature(ohms),
    })),
  },
];
