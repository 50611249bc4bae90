/** JCGM 100:2008 (GUM): 4.4.3, G.4.1, and the prediction of H.3. Inputs found in libraries' documentation. */
import {
  combinedUncertainty,
  coverageFactor,
  effectiveDof,
  type TypeA,
  typeA,
} from "../../src/core/uncertainty";
import type { PublishedSet } from "./published-value";

/** H.3 at 30 °C, 10 °C from where the line is anchored; all digits recomputed. */
const line = { u: [0.00287759784, 0.00066793877], sensitivities: [undefined, 10], r: -0.9304296 };

/** G.4.1, a product of three quantities: relative uncertainties in percent. */
const product = { u: [0.25, 0.57, 0.82], dof: [9, 4, 14] };

const uOfProduct = (): number => combinedUncertainty(product.u) as number;
const dofOfProduct = (): number => effectiveDof(product.u, product.dof) as number;

/** 4.4.3, twenty readings of a temperature in °C. */
// biome-ignore format: as printed, bin after bin
const twenty = [
  96.9, 98.18, 98.25, 98.61, 99.03, 99.49, 99.56, 99.74, 99.89, 100.07, 100.33, 100.42,
  100.68, 100.95, 101.11, 101.2, 101.57, 101.84, 102.36, 102.72,
];

const ofTwenty = (): TypeA => typeA(twenty) as TypeA;

export const gumSets: readonly PublishedSet[] = [
  {
    source: "JCGM 100:2008 (GUM), H.3: the correction predicted at 30 °C from its printed summary",
    origin: "print",
    compared: "standard uncertainty",
    values: [
      {
        what: "with r = −0.930",
        unit: "°C",
        published: 0.0041,
        decimals: 4,
        ours: () =>
          combinedUncertainty(line.u, line.sensitivities, [
            [1, line.r],
            [line.r, 1],
          ]),
      },
    ],
  },
  {
    source: "JCGM 100:2008 (GUM), H.3 with all digits (recomputed)",
    origin: "computed",
    compared: "standard uncertainty",
    values: [
      {
        what: "b(30 °C) with r = −0.9304296",
        unit: "°C",
        published: 0.00413859575,
        decimals: 11,
        tolerance: 1e-9,
        ours: () =>
          combinedUncertainty(line.u, line.sensitivities, [
            [1, line.r],
            [line.r, 1],
          ]),
      },
      {
        what: "b(30 °C) as if they were not correlated",
        unit: "°C",
        published: 0.00727,
        decimals: 5,
        ours: () => combinedUncertainty(line.u, line.sensitivities),
      },
    ],
  },
  {
    source: "JCGM 100:2008 (GUM), G.4.1, a product of three quantities",
    origin: "memory",
    compared: "relative uncertainties in percent; the GUM goes on with its rounded 1.03 %",
    values: [
      { what: "combined", unit: "%", published: 1.03, decimals: 2, ours: uOfProduct },
      { what: "effective degrees of freedom", unit: "", published: 19, decimals: 1, ours: dofOfProduct },
      {
        what: "t95, degrees of freedom from the rounded 1.03 %",
        unit: "",
        published: 2.09,
        decimals: 2,
        ours: () => coverageFactor(dofOfProduct() * (1.03 / uOfProduct()) ** 4, 0.95),
      },
      {
        what: "U95",
        unit: "%",
        published: 2.2,
        decimals: 1,
        ours: () => (coverageFactor(dofOfProduct(), 0.95) as number) * uOfProduct(),
      },
    ],
  },
  {
    source: "JCGM 100:2008 (GUM), 4.4.3, twenty readings of a temperature",
    origin: "memory",
    compared: "type A evaluation",
    values: [
      { what: "mean", unit: "°C", published: 100.145, decimals: 3, ours: () => ofTwenty().mean },
      { what: "standard deviation", unit: "°C", published: 1.489, decimals: 3, ours: () => ofTwenty().sd },
      { what: "u of the mean", unit: "°C", published: 0.333, decimals: 3, ours: () => ofTwenty().u },
    ],
  },
];
