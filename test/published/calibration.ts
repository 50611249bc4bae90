/** JCGM 100:2008 (GUM) H.3: the correction of a thermometer, b(t) = y1 + y2 (t − 20 °C), fitted to eleven readings. */
import { type DeviationFunction, fitDeviation } from "../../src/core/calibration";
import type { PublishedSet } from "./published-value";

// biome-ignore format: one row a line
const readings: readonly (readonly [t: number, correction: number])[] = [
  [21.521, -0.171],
  [22.012, -0.169],
  [22.512, -0.166],
  [23.003, -0.159],
  [23.507, -0.164],
  [23.999, -0.165],
  [24.513, -0.156],
  [25.002, -0.157],
  [25.503, -0.159],
  [26.01, -0.161],
  [26.511, -0.16],
];

const fitted = (): DeviationFunction =>
  fitDeviation(
    readings.map(([t]) => t - 20),
    readings.map(([, correction]) => correction),
    1,
  ) as DeviationFunction;

const coefficient = (i: number): number => fitted().coefficients[i] as number;
const u = (i: number): number => (fitted().uncertainties as readonly number[])[i] as number;
const covariance = (): number => (fitted().covariance as readonly (readonly number[])[])[0]?.[1] as number;

export const calibrationSets: readonly PublishedSet[] = [
  {
    source: "JCGM 100:2008 (GUM), H.3: a thermometer's correction as a straight line in t − 20 °C",
    origin: "print",
    compared: "the line, its uncertainty and what it predicts, fitted anew to the printed readings",
    values: [
      { what: "intercept y1", unit: "°C", published: -0.1712, decimals: 4, ours: () => coefficient(0) },
      { what: "slope y2", unit: "", published: 0.00218, decimals: 5, ours: () => coefficient(1) },
      { what: "u(y1)", unit: "°C", published: 0.0029, decimals: 4, ours: () => u(0) },
      { what: "u(y2)", unit: "", published: 0.00067, decimals: 5, ours: () => u(1) },
      {
        what: "r(y1, y2)",
        unit: "",
        published: -0.93,
        decimals: 3,
        ours: () => covariance() / (u(0) * u(1)),
      },
      { what: "scatter s", unit: "°C", published: 0.0035, decimals: 4, ours: () => fitted().residualSd },
      { what: "degrees of freedom", unit: "", published: 9, decimals: 0, ours: () => fitted().dof },
      {
        what: "b(30 °C)",
        unit: "°C",
        published: -0.1494,
        decimals: 4,
        ours: () => coefficient(0) + 10 * coefficient(1),
      },
      {
        what: "u(b(30 °C)), by the covariance",
        unit: "°C",
        published: 0.0041,
        decimals: 4,
        ours: () => Math.sqrt(u(0) ** 2 + 2 * 10 * covariance() + 100 * u(1) ** 2),
      },
    ],
  },
];
