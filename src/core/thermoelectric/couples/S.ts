import type { ReferenceFunction } from "../reference-function";

export const S: ReferenceFunction = {
  designation: "S",
  otherNames: [],
  conductors: "Pt-10%Rh / Pt",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -50,
      to: 1064.18,
      coefficients: [
        0,
        5.40313308631e-3,
        1.2593428974e-5,
        -2.32477968689e-8,
        3.22028823036e-11,
        -3.31465196389e-14,
        2.55744251786e-17,
        -1.25068871393e-20,
        2.71443176145e-24,
      ],
    },
    {
      from: 1064.18,
      to: 1664.5,
      coefficients: [
        1.32900444085,
        3.34509311344e-3,
        6.54805192818e-6,
        -1.64856259209e-9,
        1.29989605174e-14,
      ],
    },
    {
      from: 1664.5,
      to: 1768.1,
      coefficients: [
        1.46628232636e2,
        -2.58430516752e-1,
        1.63693574641e-4,
        -3.30439046987e-8,
        -9.43223690612e-15,
      ],
    },
  ],
};
