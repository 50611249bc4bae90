import type { ReferenceFunction } from "../reference-function";

export const GoldPlatinum: ReferenceFunction = {
  designation: "Au/Pt",
  otherNames: [],
  conductors: "Au / Pt",
  scale: "ITS-90",
  standard: "iec62460",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 1000,
      coefficients: [
        0,
        6.03619861e-3,
        1.93672974e-5,
        -2.22998614e-8,
        3.28711859e-11,
        -4.24206193e-14,
        4.56927038e-17,
        -3.39430259e-20,
        1.4298159e-23,
        -2.51672787e-27,
      ],
    },
  ],
};
