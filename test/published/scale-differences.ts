import { toIts90 } from "../../src/core";
import type { PublishedSet } from "./published-value";

/**
 * t90 − t68 over t90, °C, as printed to 1 mK in a handbook table; the fit of the
 * published polynomial to it is stated as 1.5 mK below 0 °C and 1 mK above.
 */
// biome-ignore format: one row a line
const printedDifferences: readonly (readonly [t90: number, difference: number])[] = [
  [-180, 0.008],
  [-170, 0.01],
  [-160, 0.012],
  [-150, 0.013],
  [-140, 0.014],
  [-130, 0.014],
  [-120, 0.014],
  [-110, 0.013],
  [-100, 0.013],
  [-90, 0.012],
  [-80, 0.012],
  [-70, 0.011],
  [-60, 0.01],
  [-50, 0.009],
  [-40, 0.008],
  [-30, 0.006],
  [-20, 0.004],
  [-10, 0.002],
  [0, 0.0],
  [10, -0.002],
  [20, -0.005],
  [30, -0.007],
  [40, -0.01],
  [50, -0.013],
  [60, -0.016],
  [70, -0.018],
  [80, -0.021],
  [90, -0.024],
  [100, -0.026],
  [110, -0.028],
  [120, -0.03],
  [130, -0.032],
  [140, -0.034],
  [150, -0.036],
  [160, -0.037],
  [170, -0.038],
  [180, -0.039],
  [190, -0.039],
  [200, -0.04],
  [210, -0.04],
  [220, -0.04],
  [230, -0.04],
  [240, -0.04],
  [250, -0.04],
  [260, -0.04],
];

/** Printed values above the gold point, to 10 mK (a handbook). */
const printedRadiationDifferences: readonly (readonly [t90: number, difference: number])[] = [
  [1500, -0.44],
  [2000, -0.72],
  [2500, -1.07],
];

/** t90 − t68 where t90 is what the printed difference makes of it. */
const differenceAt = (t90: number, printed: number): number => {
  const t68 = t90 - printed;
  const found = toIts90(t68);
  return typeof found === "number" ? found - t68 : Number.NaN;
};

export const scaleSets: readonly PublishedSet[] = [
  {
    source: "ITS-90 less IPTS-68, a handbook's table",
    origin: "print",
    compared:
      "t90 − t68: 1.5 mK below 0 °C and 1 mK above for the stated fit, 0.5 mK for the rounding of the table",
    values: printedDifferences.map(([t90, published]) => ({
      what: `${t90} °C`,
      unit: "°C",
      published,
      decimals: 3,
      tolerance: (t90 < 0 ? 0.0015 : 0.001) + 0.0005,
      ours: () => differenceAt(t90, published),
    })),
  },
  {
    source: "ITS-90 less IPTS-68 above the gold point, a handbook",
    origin: "print",
    compared: "t90 − t68, printed to 10 mK: half of that, and 1 mK for the fit",
    values: printedRadiationDifferences.map(([t90, published]) => ({
      what: `${t90} °C`,
      unit: "°C",
      published,
      decimals: 2,
      tolerance: 0.006,
      ours: () => differenceAt(t90, published),
    })),
  },
  {
    source: "definitions of IPTS-68 and ITS-90",
    origin: "print",
    compared: "the gold point of the one scale on the other",
    values: [
      {
        what: "t68 = 1064.43 °C",
        unit: "°C",
        published: 1064.18,
        decimals: 2,
        tolerance: 0.0005,
        ours: () => toIts90(1064.43),
      },
    ],
  },
];
