import type { ReferenceFunction } from "../reference-function";

export const J: ReferenceFunction = {
  designation: "J",
  otherNames: [],
  conductors: "Fe / Cu-Ni",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -210,
      to: 760,
      coefficients: [
        0,
        5.0381187815e-2,
        3.047583693e-5,
        -8.568106572e-8,
        1.3228195295e-10,
        -1.7052958337e-13,
        2.0948090697e-16,
        -1.2538395336e-19,
        1.5631725697e-23,
      ],
    },
    {
      from: 760,
      to: 1200,
      coefficients: [
        2.9645625681e2,
        -1.4976127786,
        3.1787103924e-3,
        -3.1847686701e-6,
        1.5720819004e-9,
        -3.0691369056e-13,
      ],
    },
  ],
};
