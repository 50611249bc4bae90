/** JCGM 100:2008 (GUM) H.2: resistance and reactance from five observations of V, I and φ, which are correlated. */
import { combinedUncertainty, typeA } from "../../src/core/uncertainty";
import type { PublishedSet } from "./published-value";

/** From memory; they reproduce every printed value. V in V, I in mA, φ in rad. */
const V = [5.007, 4.994, 5.005, 4.99, 4.999];
const I = [19.663, 19.639, 19.64, 19.685, 19.678];
const PHI = [1.0456, 1.0438, 1.0468, 1.0428, 1.0433];

const sum = (numbers: readonly number[]): number => numbers.reduce((all, one) => all + one, 0);

/** Our functions take correlations as given: they are worked out here. */
function r(a: readonly number[], b: readonly number[]): number {
  const centred = (x: readonly number[]): number[] => x.map((one) => one - sum(x) / x.length);
  const product = (x: readonly number[], y: readonly number[]): number =>
    sum(x.map((one, i) => one * (y[i] as number)));
  const [ca, cb] = [centred(a), centred(b)];
  return product(ca, cb) / Math.sqrt(product(ca, ca) * product(cb, cb));
}

const ofReadings = (readings: readonly number[]) => typeA(readings) as { mean: number; u: number };
const [v, i, phi] = [ofReadings(V), ofReadings(I), ofReadings(PHI)];
const evaluated = [v, i, phi];
const correlations = [V, I, PHI].map((a) => [V, I, PHI].map((b) => (a === b ? 1 : r(a, b))));

/** Ohms: V over mA is a thousand of them. */
const z = (1000 * v.mean) / i.mean;
const [cos, sin] = [Math.cos(phi.mean), Math.sin(phi.mean)];

/** Of the first quantities, as many as there are sensitivities. */
const combined = (sensitivities: readonly number[]): unknown =>
  combinedUncertainty(
    evaluated.slice(0, sensitivities.length).map(({ u }) => u),
    sensitivities,
    correlations.slice(0, sensitivities.length).map((row) => row.slice(0, sensitivities.length)),
  );

/** [name, printed value, recomputed u, printed u, sensitivities to V, I and φ, ours] */
const results: readonly (readonly [
  name: string,
  printed: number,
  decimals: number,
  recomputed: number,
  printedU: number,
  sensitivities: readonly number[],
  ours: number,
])[] = [
  ["R", 127.732, 3, 0.07107, 0.071, [z / v.mean, -z / i.mean].map((c) => c * cos).concat(-z * sin), z * cos],
  ["X", 219.847, 3, 0.29558, 0.295, [z / v.mean, -z / i.mean].map((c) => c * sin).concat(z * cos), z * sin],
  ["Z", 254.26, 2, 0.23634, 0.236, [z / v.mean, -z / i.mean], z],
];

const quantity = (what: string, unit: string, published: number, decimals: number, ours: () => unknown) => ({
  what,
  unit,
  published,
  decimals,
  ours,
});

export const gumH2Sets: readonly PublishedSet[] = [
  {
    source: "JCGM 100:2008 (GUM), H.2, resistance and reactance of a circuit element",
    origin: "memory",
    compared:
      "means, standard uncertainties and results; u of the results to 0.0006 Ω, since the GUM goes on with rounded inputs",
    values: [
      quantity("mean of V", "V", 4.999, 4, () => v.mean),
      quantity("mean of I", "mA", 19.661, 4, () => i.mean),
      quantity("mean of φ", "rad", 1.04446, 5, () => phi.mean),
      quantity("u(V)", "V", 0.0032, 4, () => v.u),
      quantity("u(I)", "mA", 0.0095, 4, () => i.u),
      quantity("u(φ)", "rad", 0.00075, 5, () => phi.u),
      ...results.flatMap(([name, published, decimals, , printedU, sensitivities, ours]) => [
        quantity(name, "Ω", published, decimals, () => ours),
        { ...quantity(`u(${name})`, "Ω", printedU, 3, () => combined(sensitivities)), tolerance: 0.0006 },
      ]),
    ],
  },
  {
    source: "JCGM 100:2008 (GUM), H.2 with more digits (recomputed)",
    origin: "computed",
    compared: "standard uncertainty of the results",
    values: results.map(([name, , , recomputed, , sensitivities]) =>
      quantity(`u(${name})`, "Ω", recomputed, 5, () => combined(sensitivities)),
    ),
  },
];

/** Printed correlations of the readings: they hold the readings, which are from memory, not our functions. */
export const printedCorrelations: readonly (readonly [pair: string, printed: number, found: number])[] = [
  ["V and I", -0.36, r(V, I)],
  ["V and φ", 0.86, r(V, PHI)],
  ["I and φ", -0.65, r(I, PHI)],
];
