import { platinumResistance } from "../../src/core/junction";
import type { PublishedSet } from "./published-value";

/**
 * IEC 60751:2008, table of resistance over temperature for R0 = 100 Ω, to 0.01 Ω; three
 * printed copies agree.
 */
// biome-ignore format: one row a line
export const platinumTable: readonly (readonly [t: number, resistance: number])[] = [
  [-200, 18.52],
  [-190, 22.83],
  [-180, 27.1],
  [-170, 31.34],
  [-160, 35.54],
  [-150, 39.72],
  [-140, 43.88],
  [-130, 48],
  [-120, 52.11],
  [-110, 56.19],
  [-100, 60.26],
  [-90, 64.3],
  [-80, 68.33],
  [-70, 72.33],
  [-60, 76.33],
  [-50, 80.31],
  [-40, 84.27],
  [-30, 88.22],
  [-20, 92.16],
  [-10, 96.09],
  [0, 100],
  [10, 103.9],
  [20, 107.79],
  [30, 111.67],
  [40, 115.54],
  [50, 119.4],
  [60, 123.24],
  [70, 127.08],
  [80, 130.9],
  [90, 134.71],
  [100, 138.51],
  [110, 142.29],
  [120, 146.07],
  [130, 149.83],
  [140, 153.58],
  [150, 157.33],
  [160, 161.05],
  [170, 164.77],
  [180, 168.48],
  [190, 172.17],
  [200, 175.86],
  [250, 194.1],
  [300, 212.05],
  [350, 229.72],
  [400, 247.09],
  [450, 264.18],
  [500, 280.98],
  [550, 297.49],
  [600, 313.71],
  [650, 329.64],
  [850, 390.48],
];

export const platinumSets: readonly PublishedSet[] = [
  {
    source: "IEC 60751:2008, R0 = 100 Ω (three copies)",
    origin: "print",
    compared: "resistance over temperature",
    values: platinumTable.map(([t, published]) => ({
      what: `${t} °C`,
      unit: "Ω",
      published,
      decimals: 2,
      ours: () => platinumResistance(t, 100),
    })),
  },
  {
    source: "IEC 60751:2008, R(100 °C), whence α = 3.85055E-3 /°C",
    origin: "memory",
    compared: "resistance for R0 = 100 Ω",
    values: [
      {
        what: "100 °C",
        unit: "Ω",
        published: 138.5055,
        decimals: 4,
        ours: () => platinumResistance(100, 100),
      },
    ],
  },
];
