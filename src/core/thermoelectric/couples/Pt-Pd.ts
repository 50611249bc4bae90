import type { ReferenceFunction } from "../reference-function";

export const PlatinumPalladium: ReferenceFunction = {
  designation: "Pt/Pd",
  otherNames: [],
  conductors: "Pt / Pd",
  scale: "ITS-90",
  standard: "iec62460",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 660.323,
      coefficients: [
        0,
        5.296958e-3,
        4.610494e-6,
        -9.602271e-9,
        2.992243e-11,
        -2.012523e-14,
        -1.268514e-17,
        2.257823e-20,
        -8.510068e-24,
      ],
    },
    {
      from: 660.323,
      to: 1500,
      coefficients: [
        -4.977137e-1,
        1.0182545e-2,
        -1.5793515e-5,
        3.63617e-8,
        -2.6901509e-11,
        9.5627366e-15,
        -1.3570737e-18,
      ],
    },
  ],
};
