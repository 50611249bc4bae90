import { coverageFactor, INFINITE_DOF } from "../../src/core/uncertainty";
import type { PublishedSet } from "./published-value";

/**
 * JCGM 100:2008, Table G.2: t_p(ν) from Student's t distribution for the fractions p in percent.
 * Each value to three decimals, from an independent statistics library (SciPy); the print has
 * them to two.
 */
const fractions: readonly number[] = [68.27, 90, 95, 95.45, 99, 99.73];

/** Infinite degrees of freedom are the last row. */
// biome-ignore format: one row a line
const tableG2: readonly (readonly [dof: number, ...values: number[]])[] = [
  [1, 1.837, 6.314, 12.706, 13.968, 63.657, 235.784],
  [2, 1.321, 2.92, 4.303, 4.527, 9.925, 19.206],
  [3, 1.197, 2.353, 3.182, 3.307, 5.841, 9.219],
  [4, 1.142, 2.132, 2.776, 2.869, 4.604, 6.62],
  [5, 1.111, 2.015, 2.571, 2.649, 4.032, 5.507],
  [6, 1.091, 1.943, 2.447, 2.517, 3.707, 4.904],
  [7, 1.077, 1.895, 2.365, 2.429, 3.499, 4.53],
  [8, 1.067, 1.86, 2.306, 2.366, 3.355, 4.277],
  [9, 1.059, 1.833, 2.262, 2.32, 3.25, 4.094],
  [10, 1.053, 1.812, 2.228, 2.284, 3.169, 3.957],
  [11, 1.048, 1.796, 2.201, 2.255, 3.106, 3.85],
  [12, 1.043, 1.782, 2.179, 2.231, 3.055, 3.764],
  [13, 1.04, 1.771, 2.16, 2.212, 3.012, 3.694],
  [14, 1.037, 1.761, 2.145, 2.195, 2.977, 3.636],
  [15, 1.034, 1.753, 2.131, 2.181, 2.947, 3.586],
  [16, 1.032, 1.746, 2.12, 2.169, 2.921, 3.544],
  [17, 1.03, 1.74, 2.11, 2.158, 2.898, 3.507],
  [18, 1.029, 1.734, 2.101, 2.149, 2.878, 3.475],
  [19, 1.027, 1.729, 2.093, 2.14, 2.861, 3.447],
  [20, 1.026, 1.725, 2.086, 2.133, 2.845, 3.422],
  [25, 1.02, 1.708, 2.06, 2.105, 2.787, 3.33],
  [30, 1.017, 1.697, 2.042, 2.087, 2.75, 3.27],
  [35, 1.015, 1.69, 2.03, 2.074, 2.724, 3.229],
  [40, 1.013, 1.684, 2.021, 2.064, 2.704, 3.199],
  [45, 1.011, 1.679, 2.014, 2.057, 2.69, 3.175],
  [50, 1.01, 1.676, 2.009, 2.051, 2.678, 3.157],
  [100, 1.005, 1.66, 1.984, 2.025, 2.626, 3.077],
  [Number.POSITIVE_INFINITY, 1.0, 1.645, 1.96, 2.0, 2.576, 3.0],
];

export const tableG2Sets: readonly PublishedSet[] = [
  {
    source: "JCGM 100:2008 (GUM), table G.2 to three decimals (an independent library; printed to two)",
    origin: "computed",
    compared: "coverage factor",
    values: tableG2.flatMap(([dof, ...factors]) =>
      factors.map((published, i) => {
        const fraction = fractions[i] as number;
        return {
          what: `ν = ${Number.isFinite(dof) ? dof : "∞"}, ${fraction} %`,
          unit: "",
          published,
          decimals: 3,
          ours: () => coverageFactor(Math.min(dof, INFINITE_DOF), fraction / 100),
        };
      }),
    ),
  },
];
