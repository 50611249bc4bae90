/** JCGM 100:2008 (GUM) H.1: calibration of an end gauge. Inputs found in libraries' documentation. */
import {
  type Budget,
  budget,
  combinedUncertainty,
  effectiveDof,
  standardUncertainty,
} from "../../src/core/uncertainty";
import type { PublishedSet } from "./published-value";

/** H.1.6: readings, random and systematic part of the comparator, nm and degrees of freedom. */
const difference = { u: [5.8, 3.9, 6.7], dof: [24, 5, 8] };

const dofOfDifference = (): number => effectiveDof(difference.u, difference.dof) as number;

/** Sensitivities: l_S·θ̄ and l_S·α_S in nm, with θ = 0.1 °C and α_S = 11.5E-6 /°C. */
const LENGTH = 50000623;

const gauge = (): Budget =>
  budget(
    [
      { name: "standard", value: 25, distribution: "standard", dof: 18 },
      { name: "difference", value: 9.7, distribution: "standard", dof: 25.6 },
      { name: "expansion", value: 1e-6, distribution: "rectangular", sensitivity: 0.1 * LENGTH, dof: 50 },
      {
        name: "temperature",
        value: 0.05,
        distribution: "rectangular",
        sensitivity: 1.15e-5 * LENGTH,
        dof: 2,
      },
    ],
    0.99,
  ) as Budget;

const contribution = (row: number) => (): unknown => gauge().rows[row]?.contribution;

export const gumH1Sets: readonly PublishedSet[] = [
  {
    source: "JCGM 100:2008 (GUM), H.1, end-gauge calibration",
    origin: "print",
    compared:
      "contributions to the uncertainty of the length, their combination, and an arcsine distribution",
    values: [
      { what: "standard", unit: "nm", published: 25, decimals: 0, ours: contribution(0) },
      { what: "difference", unit: "nm", published: 9.7, decimals: 1, ours: contribution(1) },
      {
        what: "difference of expansion coefficients",
        unit: "nm",
        published: 2.9,
        decimals: 1,
        ours: contribution(2),
      },
      { what: "difference of temperatures", unit: "nm", published: 16.6, decimals: 1, ours: contribution(3) },
      { what: "combined", unit: "nm", published: 32, decimals: 0, ours: () => gauge().combined },
      {
        what: "cyclic temperature, half-width 0.5 °C, arcsine: u",
        unit: "°C",
        published: 0.35,
        decimals: 2,
        tolerance: 0.005,
        ours: () => standardUncertainty(0.5, "u-shaped"),
      },
    ],
  },
  {
    source: "JCGM 100:2008 (GUM), H.1: degrees of freedom and expansion",
    origin: "memory",
    compared: "values that the GUM works out with inputs rounded on the way, which is allowed for",
    values: [
      {
        what: "u of the difference, from three parts",
        unit: "nm",
        published: 9.7,
        decimals: 1,
        ours: () => combinedUncertainty(difference.u),
      },
      {
        what: "degrees of freedom of the difference, with u rounded to 9.7 nm as in print",
        unit: "",
        published: 25.6,
        decimals: 1,
        ours: () => dofOfDifference() * (9.7 / Math.hypot(...difference.u)) ** 4,
      },
      {
        what: "effective degrees of freedom",
        unit: "",
        published: 16.7,
        decimals: 1,
        tolerance: 0.1,
        ours: () => gauge().dof,
      },
      {
        what: "t99 with 16 degrees of freedom",
        unit: "",
        published: 2.92,
        decimals: 2,
        ours: () => gauge().k,
      },
      { what: "U99", unit: "nm", published: 93, decimals: 0, tolerance: 1, ours: () => gauge().expanded },
    ],
  },
  {
    source: "JCGM 100:2008 (GUM), H.1 without rounding on the way (recomputed)",
    origin: "computed",
    compared: "degrees of freedom",
    values: [
      {
        what: "the difference of the gauges",
        unit: "",
        published: 25.4,
        decimals: 1,
        ours: dofOfDifference,
      },
    ],
  },
];
