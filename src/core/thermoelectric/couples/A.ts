import type { ReferenceFunction } from "../reference-function";

export const A: ReferenceFunction = {
  designation: "A",
  otherNames: ["A-1"],
  conductors: "W-5%Re / W-20%Re",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "iec60584_1",
  evidence:
    "eight copies of GOST R 8.585-2001 A-1 agree; that IEC 60584-1:2013 type A is the same function is from memory",
  note: "The published function gives 0.72 µV at 0 °C, not zero.",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 2500,
      coefficients: [
        7.1564735e-4,
        1.1951905e-2,
        1.6672625e-5,
        -2.8287807e-8,
        2.8397839e-11,
        -1.8505007e-14,
        7.3632123e-18,
        -1.6148878e-21,
        1.4901679e-25,
      ],
    },
  ],
};
