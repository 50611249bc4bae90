/** Values by which a reference function is known beside its table. */
import { type Thermocouple, thermocouple } from "../../src/core";
import type { PublishedSet } from "./published-value";

const b = thermocouple("B") as Thermocouple;

/** Where the Seebeck coefficient of type B passes through zero, by halving 0 to 40 °C. */
function minimumOfB(): number {
  let [low, high] = [0, 40];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (b.seebeck(middle) < 0) low = middle;
    else high = middle;
  }
  return low;
}

export const landmarkSets: readonly PublishedSet[] = [
  {
    source: "IEC 60584-1, type B near room temperature",
    origin: "memory",
    compared: "its zero crossing and its minimum",
    values: [
      { what: "EMF is 0 again at", unit: "°C", published: 42.1, decimals: 1, ours: () => b.uniqueFrom },
      { what: "EMF is least at", unit: "°C", published: 21, decimals: 1, ours: minimumOfB },
      {
        what: "least EMF",
        unit: "µV",
        published: -2.58,
        decimals: 2,
        ours: () => 1000 * b.emf(minimumOfB()),
      },
    ],
  },
  {
    source: "GOST R 8.585-2001 A-1, constant of type A",
    origin: "print",
    compared: "EMF at 0 °C",
    values: [
      {
        what: "A at 0 °C",
        unit: "mV",
        published: 7.1564735e-4,
        decimals: 11,
        tolerance: 1e-18,
        ours: () => thermocouple("A")?.emf(0),
      },
    ],
  },
];
