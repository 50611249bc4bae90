import type { ReferenceFunction } from "../reference-function";

export const A3: ReferenceFunction = {
  designation: "A-3",
  otherNames: ["W5Re/W20Re A-3", "A3"],
  conductors: "W-5%Re / W-20%Re (3rd curve)",
  scale: "ITS-90",
  standard: "gost8585",
  publication: "gost8585",
  evidence: "seven copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 1800,
      coefficients: [
        -1.0649133e-4,
        1.1686475e-2,
        1.8022157e-5,
        -3.3436998e-8,
        3.7081688e-11,
        -2.5748444e-14,
        1.0301893e-17,
        -2.0735944e-21,
        1.467845e-25,
      ],
    },
  ],
};
