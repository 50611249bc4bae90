import type { ReferenceFunction } from "../reference-function";

export const CopperCopel: ReferenceFunction = {
  designation: "Cu/Copel",
  otherNames: ["MK", "M (GOST)"],
  conductors: "Cu / copel",
  scale: "ITS-90",
  standard: "gost8585",
  publication: "gost8585",
  evidence: "one copy; its end values −6.154 and 4.722 mV match the printed limits of the inverse",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -200,
      to: 100,
      coefficients: [
        2.445556e-6,
        4.2638917e-2,
        5.0348392e-5,
        -4.4974485e-8,
      ],
    },
  ],
};
