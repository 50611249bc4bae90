import type { ReferenceFunction } from "../reference-function";

export const R: ReferenceFunction = {
  designation: "R",
  otherNames: [],
  conductors: "Pt-13%Rh / Pt",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -50,
      to: 1064.18,
      coefficients: [
        0,
        5.28961729765e-3,
        1.39166589782e-5,
        -2.38855693017e-8,
        3.56916001063e-11,
        -4.62347666298e-14,
        5.00777441034e-17,
        -3.73105886191e-20,
        1.57716482367e-23,
        -2.81038625251e-27,
      ],
    },
    {
      from: 1064.18,
      to: 1664.5,
      coefficients: [
        2.95157925316,
        -2.52061251332e-3,
        1.59564501865e-5,
        -7.64085947576e-9,
        2.05305291024e-12,
        -2.93359668173e-16,
      ],
    },
    {
      from: 1664.5,
      to: 1768.1,
      coefficients: [
        1.52232118209e2,
        -2.68819888545e-1,
        1.71280280471e-4,
        -3.45895706453e-8,
        -9.34633971046e-15,
      ],
    },
  ],
};
