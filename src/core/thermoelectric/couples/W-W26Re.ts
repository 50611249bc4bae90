import type { ReferenceFunction } from "../reference-function";

export const TungstenTungsten26Rhenium: ReferenceFunction = {
  designation: "W/W26Re",
  otherNames: ["G"],
  conductors: "W / W-26%Re",
  scale: "ITS-90",
  standard: "astmE1751",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 630.615,
      coefficients: [
        0,
        1.2792201e-3,
        2.1634754e-5,
        -1.1393234e-8,
        4.3850022e-12,
        -1.7089202e-15,
      ],
    },
    {
      from: 630.615,
      to: 2315,
      coefficients: [
        -1.1064412,
        9.4962455e-3,
        -3.6467516e-6,
        3.114133e-8,
        -3.8615222e-11,
        2.4455012e-14,
        -8.9888053e-18,
        1.8120237e-21,
        -1.5534591e-25,
      ],
    },
  ],
};
