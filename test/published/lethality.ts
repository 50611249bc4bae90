/**
 * Lethality and mean kinetic temperature, as printed. `tolerance` is half a unit of the last printed digit.
 */
export interface PublishedLethality {
  readonly source: string;
  readonly rows: readonly {
    readonly minutes: number;
    /** °C, steady */
    readonly temperature: number;
    readonly reference: number;
    readonly z: number;
    readonly f: number;
    readonly tolerance: number;
  }[];
}

// biome-ignore format: one row a line
export const publishedLethality: readonly PublishedLethality[] = [
  {
    source: "worked examples of F0 in print, reference 121 °C",
    rows: [
      { minutes: 15, temperature: 121, reference: 121, z: 10, f: 15, tolerance: 0.5 },
      { minutes: 15, temperature: 111, reference: 121, z: 10, f: 1.5, tolerance: 0.05 },
      { minutes: 15, temperature: 124, reference: 121, z: 10, f: 29.93, tolerance: 0.005 },
    ],
  },
  {
    source: "the same loads by the reference 121.11 °C (250 °F), which is in print too; values recomputed",
    rows: [
      { minutes: 15, temperature: 121, reference: 121.11, z: 10, f: 14.625, tolerance: 0.0005 },
      { minutes: 15, temperature: 124, reference: 121.11, z: 10, f: 29.18, tolerance: 0.005 },
    ],
  },
  {
    source: "pasteurisation units, t·10^((T − 60)/7); value recomputed",
    rows: [{ minutes: 10, temperature: 65, reference: 60, z: 7, f: 51.79, tolerance: 0.005 }],
  },
  {
    source: "pasteurisation units, t·1.393^(T − 60), which is z = 1/lg 1.393 = 6.9468; value recomputed",
    rows: [{ minutes: 10, temperature: 65, reference: 60, z: 1 / Math.log10(1.393), f: 52.45, tolerance: 0.005 }],
  },
];

/** ΔH = 83.144 kJ/mol, ΔH/R = 10 000 K (found in print and from memory); the result recomputed by the printed formula. */
export const publishedMeanKinetic = {
  temperatures: [20, 22, 25, 30],
  meanKinetic: 25.0317,
  arithmetic: 24.25,
  tolerance: 0.00005,
};
