import type { ReferenceFunction } from "../reference-function";

export const PalladiumPlatinumGold: ReferenceFunction = {
  designation: "PdPtAu/AuPd",
  otherNames: ["55Pd31Pt14Au/65Au35Pd"],
  conductors: "55Pd31Pt14Au / 65Au35Pd",
  scale: "ITS-90",
  standard: "astmE1751",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 746.6,
      coefficients: [
        0,
        2.9819716e-2,
        3.5175152e-5,
        -3.4878428e-8,
        1.4851327e-11,
        -3.6375467e-15,
      ],
    },
    {
      from: 746.6,
      to: 1395,
      coefficients: [
        -8.9621838,
        8.53772e-2,
        -1.0570233e-4,
        1.5424937e-7,
        -1.2855115e-10,
        5.443876e-14,
        -9.3211269e-18,
      ],
    },
  ],
};
