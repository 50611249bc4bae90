import type { ReferenceFunction } from "../reference-function";

export const K: ReferenceFunction = {
  designation: "K",
  otherNames: [],
  conductors: "Ni-Cr / Ni-Al",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  note: "IEC 60584-1:2013 gives type K up to 1300 °C; the published function itself goes to 1372 °C.",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -270,
      to: 0,
      coefficients: [
        0,
        3.9450128025e-2,
        2.3622373598e-5,
        -3.2858906784e-7,
        -4.9904828777e-9,
        -6.7509059173e-11,
        -5.7410327428e-13,
        -3.1088872894e-15,
        -1.0451609365e-17,
        -1.9889266878e-20,
        -1.6322697486e-23,
      ],
    },
    {
      from: 0,
      to: 1372,
      coefficients: [
        -1.7600413686e-2,
        3.8921204975e-2,
        1.8558770032e-5,
        -9.9457592874e-8,
        3.1840945719e-10,
        -5.6072844889e-13,
        5.6075059059e-16,
        -3.2020720003e-19,
        9.7151147152e-23,
        -1.2104721275e-26,
      ],
      // a0·exp(a1·(t − a2)²), the term that only type K has
      exponential: { a0: 0.1185976, a1: -1.183432e-4, a2: 126.9686 },
    },
  ],
};
