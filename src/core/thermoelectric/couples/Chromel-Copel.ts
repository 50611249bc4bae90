import type { ReferenceFunction } from "../reference-function";

export const ChromelCopel: ReferenceFunction = {
  designation: "Chromel/Copel",
  otherNames: ["XK", "L (GOST)"],
  conductors: "chromel / copel (Ni-Cr / Cu-Ni)",
  scale: "ITS-90",
  standard: "gost8585",
  publication: "gost8585",
  evidence: "nine copies, two of which carry a misprinted digit in the seventh coefficient below 0 °C",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -200,
      to: 0,
      coefficients: [
        -5.8952244e-5,
        6.3391502e-2,
        6.7592964e-5,
        2.0672566e-7,
        5.5720884e-9,
        5.713386e-11,
        3.2995593e-13,
        9.923242e-16,
        1.2079584e-18,
      ],
    },
    {
      from: 0,
      to: 800,
      coefficients: [
        -1.8656953e-5,
        6.3310975e-2,
        6.0153091e-5,
        -8.0073134e-8,
        9.6946071e-11,
        -3.6047289e-14,
        -2.4694775e-16,
        4.2880341e-19,
        -2.0725297e-22,
      ],
    },
  ],
};
