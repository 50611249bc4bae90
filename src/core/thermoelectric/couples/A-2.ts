import type { ReferenceFunction } from "../reference-function";

export const A2: ReferenceFunction = {
  designation: "A-2",
  otherNames: ["W5Re/W20Re A-2", "A2"],
  conductors: "W-5%Re / W-20%Re (2nd curve)",
  scale: "ITS-90",
  standard: "gost8585",
  publication: "gost8585",
  evidence: "three copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 1800,
      coefficients: [
        -1.0850558e-4,
        1.1642292e-2,
        2.1280289e-5,
        -4.4258402e-8,
        5.5652058e-11,
        -4.380131e-14,
        2.022839e-17,
        -4.9354041e-21,
        4.8119846e-25,
      ],
    },
  ],
};
