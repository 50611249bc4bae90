import type { ReferenceFunction } from "../reference-function";

export const PlatinumMolybdenum: ReferenceFunction = {
  designation: "PtMo5/PtMo0.1",
  otherNames: ["Pt5Mo/Pt0.1Mo"],
  conductors: "Pt-5%Mo / Pt-0.1%Mo",
  scale: "ITS-90",
  standard: "astmE1751",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 491,
      coefficients: [
        0,
        1.0501456e-2,
        2.8410937e-5,
        -4.3368594e-8,
        1.058577e-10,
        -2.384895e-13,
        3.3574252e-16,
        -2.0186476e-19,
      ],
    },
    {
      from: 491,
      to: 1600,
      coefficients: [
        6.8354086,
        -4.8776479e-2,
        2.4913353e-4,
        -4.9920472e-7,
        6.4615219e-10,
        -5.3071212e-13,
        2.6865173e-16,
        -7.6717268e-20,
        9.4670862e-24,
      ],
    },
  ],
};
