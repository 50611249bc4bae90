import type { ReferenceFunction } from "../reference-function";

export const ChromelGoldIron: ReferenceFunction = {
  designation: "NiCr/AuFe0.07",
  otherNames: ["KP/AuFe0.07", "Chromel/AuFe0.07"],
  conductors: "Ni-Cr / Au-0.07at%Fe",
  scale: "stated as ITS-90; equals the pre-ITS-90 table",
  standard: "astmE1751",
  publication: "astmE1751",
  evidence: "two copies agree; numerically the older table, from before ITS-90, to 0.1 µV",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -273,
      to: 7,
      coefficients: [
        0,
        2.2272367466e-2,
        3.6406179664e-6,
        -1.5967928202e-7,
        -4.5260169888e-9,
        4.0432555769e-11,
        4.9063035769e-12,
        1.2272348484e-13,
        1.6829773697e-15,
        1.4636450149e-17,
        8.4287909747e-20,
        3.2146639387e-22,
        7.8225430483e-25,
        1.1010930596e-27,
        6.826366158e-31,
      ],
    },
  ],
};
