/** Lethality and mean kinetic temperature, as printed. */
import { Refusal } from "../../src/core";
import { timeGrid } from "../../src/core/log";
import { type LethalityMethod, lethality, meanKinetic } from "../../src/core/survey";
import type { Origin, PublishedSet } from "./published-value";

export interface PublishedLethality {
  readonly source: string;
  readonly origin: Origin;
  readonly rows: readonly {
    readonly minutes: number;
    /** °C, steady */
    readonly temperature: number;
    readonly reference: number;
    readonly z: number;
    readonly f: number;
    /** As printed. */
    readonly decimals: number;
  }[];
}

// biome-ignore format: one row a line
export const publishedLethality: readonly PublishedLethality[] = [
  {
    source: "worked examples of F0 in print, reference 121 °C",
    origin: "print",
    rows: [
      { minutes: 15, temperature: 121, reference: 121, z: 10, f: 15, decimals: 0 },
      { minutes: 15, temperature: 111, reference: 121, z: 10, f: 1.5, decimals: 1 },
      { minutes: 15, temperature: 124, reference: 121, z: 10, f: 29.93, decimals: 2 },
    ],
  },
  {
    source: "the same loads by the reference 121.11 °C (250 °F), which is in print too; values recomputed",
    origin: "computed",
    rows: [
      { minutes: 15, temperature: 121, reference: 121.11, z: 10, f: 14.625, decimals: 3 },
      { minutes: 15, temperature: 124, reference: 121.11, z: 10, f: 29.18, decimals: 2 },
    ],
  },
  {
    source: "pasteurisation units, t·10^((T − 60)/7); value recomputed",
    origin: "computed",
    rows: [{ minutes: 10, temperature: 65, reference: 60, z: 7, f: 51.79, decimals: 2 }],
  },
  {
    source: "pasteurisation units, t·1.393^(T − 60), which is z = 1/lg 1.393 = 6.9468; value recomputed",
    origin: "computed",
    rows: [{ minutes: 10, temperature: 65, reference: 60, z: 1 / Math.log10(1.393), f: 52.45, decimals: 2 }],
  },
];

/** ΔH = 83.144 kJ/mol, ΔH/R = 10 000 K (found in print and from memory); the result recomputed by the printed formula. */
export const publishedMeanKinetic = {
  temperatures: [20, 22, 25, 30],
  meanKinetic: 25.0317,
  /** The plain mean, which a page in print calls by the same name. */
  arithmetic: 24.25,
};

/** The result of a call that must not be refused. */
export function given<T>(value: T | Refusal): T {
  if (value instanceof Refusal) throw new Error(value.message());
  return value;
}

/** F of a steady load, a scan a minute. */
export function fOfSteadyLoad(
  minutes: number,
  temperature: number,
  reference: number,
  z: number,
  method: LethalityMethod = "straight",
): number {
  const times = Float64Array.from({ length: minutes + 1 }, (_, i) => i);
  const settings = given(lethality({ reference, z, method }));
  return given(
    settings(
      given(timeGrid(times)),
      times.map(() => temperature),
    ),
  ).f;
}

export const meanKineticOfExample = (): number =>
  given(given(meanKinetic())(Float64Array.from(publishedMeanKinetic.temperatures)));

export const lethalitySets: readonly PublishedSet[] = [
  ...publishedLethality.map(
    ({ source, origin, rows }): PublishedSet => ({
      source,
      origin,
      compared: "F value of a steady load",
      values: rows.map(({ minutes, temperature, reference, z, f, decimals }) => ({
        what: `${minutes} min at ${temperature} °C, reference ${reference} °C, z ${Number(z.toFixed(4))} °C`,
        unit: "min",
        published: f,
        decimals,
        ours: () => fOfSteadyLoad(minutes, temperature, reference, z),
      })),
    }),
  ),
  {
    source: "mean kinetic temperature, ΔH = 83.144 kJ/mol (recomputed by the printed formula)",
    origin: "computed",
    compared: "mean kinetic temperature of four readings",
    values: [
      {
        what: `${publishedMeanKinetic.temperatures.join(", ")} °C`,
        unit: "°C",
        published: publishedMeanKinetic.meanKinetic,
        decimals: 4,
        ours: meanKineticOfExample,
      },
    ],
  },
];
