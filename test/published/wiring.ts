/** Wiring faults, compensations and thermopiles from print. */
import { type Thermocouple, thermocouple } from "../../src/core";
import { differential, rereferenced, unreversed } from "../../src/core/junction";
import type { PublishedSet } from "./published-value";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;

const [e, k, s, t] = [couple("E"), couple("K"), couple("S"), couple("T")];

const fahrenheit = (value: number): number => (value - 32) / 1.8;

/** What the crossed extension makes of 500 °C by the printed 2456 µV. */
const crossed = (): number => e.temperature(e.emf(500) - 2.456);

/** Pairs of type K that give 1.5 V between 70 °F and 700 °C: with one fewer it would have to be hotter. */
export function pairsForVolts(): number {
  const base = fahrenheit(70);
  let pairs = 1;
  while (!(base + (differential(1500, k, base, pairs) as number) < 700)) pairs++;
  return pairs;
}

/** Pairs of type T at 200 °F with which 4 µV are worth less than 0.05 °F. */
function pairsForResolution(): number {
  let pairs = 1;
  while (!((differential(0.004, t, fahrenheit(200), pairs) as number) * 1.8 < 0.05)) pairs++;
  return pairs;
}

export const wiringSets: readonly PublishedSet[] = [
  {
    source:
      "a sensor maker's FAQ page: type E, extension crossed from a terminal box at 40 °C to a receiver at 20 °C",
    origin: "print",
    compared: "the EMFs and the error that the page works out, and the temperature that UNREVERSE gives back",
    values: [
      { what: "E at 40 °C", unit: "µV", published: 2420, decimals: 0, ours: () => 1000 * e.emf(40) },
      { what: "E at 20 °C", unit: "µV", published: 1192, decimals: 0, ours: () => 1000 * e.emf(20) },
      {
        what: "error of the reading at about 500 °C, 2456 µV",
        unit: "°C",
        published: -30,
        decimals: 0,
        ours: () => crossed() - 500,
      },
      {
        what: "that reading put right; two printed EMFs, each rounded to 1 µV, over 81 µV/°C",
        unit: "°C",
        published: 500,
        decimals: 0,
        tolerance: 0.02,
        ours: () => unreversed(crossed(), e, "both", 20, 40),
      },
    ],
  },
  {
    source: "a textbook problem: type S, 5.975 mV, reference junction at 50 °C",
    origin: "print",
    compared: "temperature, from rounded table values",
    values: [
      {
        what: "with the junction taken for 0 °C",
        unit: "°C",
        published: 671.37,
        decimals: 2,
        tolerance: 0.05,
        ours: () => s.temperature(5.975),
      },
    ],
  },
  {
    source: "the same problem put right by EMF: 5.975 + 0.299 mV (recomputed)",
    origin: "computed",
    compared: "temperature; the answer in print is wrong, see the misprints",
    values: [
      {
        what: "REREFERENCE from 0 °C to 50 °C",
        unit: "°C",
        published: 699.8745,
        decimals: 4,
        ours: () => rereferenced(s.temperature(5.975), s, 0, 50),
      },
    ],
  },
  {
    source: "textbook problems on thermopiles (recomputed)",
    origin: "computed",
    compared: "the smallest whole number of pairs",
    values: [
      {
        what: "type K, 1.5 V between 70 °F and 700 °C: 53.03 are needed",
        unit: "pairs",
        published: 54,
        decimals: 0,
        ours: pairsForVolts,
      },
      {
        what: "type T at 200 °F, 4 µV for less than 0.05 °F: 3.10 are needed",
        unit: "pairs",
        published: 4,
        decimals: 0,
        ours: pairsForResolution,
      },
    ],
  },
];
