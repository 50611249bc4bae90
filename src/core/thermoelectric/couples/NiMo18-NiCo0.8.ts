import type { ReferenceFunction } from "../reference-function";

export const NickelMolybdenumNickelCobalt: ReferenceFunction = {
  designation: "NiMo18/NiCo0.8",
  otherNames: ["Ni18Mo/Ni0.8Co"],
  conductors: "Ni-18%Mo / Ni-0.8%Co",
  scale: "ITS-90",
  standard: "astmE1751",
  publication: "astmE1751",
  evidence: "two copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -50,
      to: 370.8,
      coefficients: [
        0,
        3.690092195e-2,
        4.408522682e-5,
        -3.142898226e-8,
        -1.02521613e-10,
        1.846977453e-13,
        -9.738054601e-17,
        -3.3943879e-19,
      ],
    },
    {
      from: 370.8,
      to: 1410,
      coefficients: [
        -1.145582129e1,
        2.059913943e-1,
        -8.846963426e-4,
        2.650568429e-6,
        -4.958763813e-9,
        6.145877457e-12,
        -5.041679909e-15,
        2.627522669e-18,
        -7.864442961e-22,
        1.027600874e-25,
      ],
    },
  ],
};
