import type { ReferenceFunction } from "../reference-function";

export const IridiumRhodiumIridium: ReferenceFunction = {
  designation: "IrRh40/Ir",
  otherNames: ["Ir40Rh/Ir"],
  conductors: "Ir-40%Rh / Ir",
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
        3.0870016e-3,
        6.9649773e-6,
        -7.8890504e-9,
        2.7700591e-12,
        2.6762413e-14,
        -1.041804e-16,
        1.5270867e-19,
        -7.9634082e-23,
      ],
    },
    {
      from: 630.615,
      to: 2110,
      coefficients: [
        -9.6839082e-2,
        3.6588615e-3,
        5.7455189e-6,
        -6.0547943e-9,
        2.7235393e-12,
        -5.1797037e-16,
        3.0821886e-20,
      ],
    },
  ],
};
