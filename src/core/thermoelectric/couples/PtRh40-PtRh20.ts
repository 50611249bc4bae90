import type { ReferenceFunction } from "../reference-function";

export const PlatinumRhodium40To20: ReferenceFunction = {
  designation: "PtRh40/PtRh20",
  otherNames: ["Pt40Rh/Pt20Rh"],
  conductors: "Pt-40%Rh / Pt-20%Rh",
  scale: "ITS-90",
  standard: "astmE1751",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 951.7,
      coefficients: [
        0,
        3.6246289e-4,
        3.936032e-7,
        4.2594137e-10,
        1.0382985e-12,
        -1.5406939e-15,
        1.0033974e-18,
        -2.849716e-22,
      ],
    },
    {
      from: 951.7,
      to: 1888,
      coefficients: [
        -9.1201877e-1,
        3.5246931e-3,
        -3.9077442e-6,
        3.6728697e-9,
        -1.082471e-12,
        1.151628e-16,
        -1.261964e-20,
      ],
    },
  ],
};
