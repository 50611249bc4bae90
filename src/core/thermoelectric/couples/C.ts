import type { ReferenceFunction } from "../reference-function";

export const C: ReferenceFunction = {
  designation: "C",
  otherNames: [],
  conductors: "W-5%Re / W-26%Re",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "iec60584_1",
  evidence:
    "one printed copy of the coefficients; the break point 630.615 °C is from memory (that copy prints 783 °C, where the two segments differ by 49 µV; at 630.615 °C they meet within 0.00014 µV)",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 630.615,
      coefficients: [
        0,
        1.3406032e-2,
        1.1924992e-5,
        -7.9806354e-9,
        -5.0787515e-12,
        1.3164197e-14,
        -7.9197332e-18,
      ],
    },
    {
      from: 630.615,
      to: 2315,
      coefficients: [
        4.0528823e-1,
        1.1509355e-2,
        1.5696453e-5,
        -1.3704412e-8,
        5.2290873e-12,
        -9.2082758e-16,
        4.5245112e-20,
      ],
    },
  ],
};
