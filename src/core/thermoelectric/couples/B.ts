import type { ReferenceFunction } from "../reference-function";

export const B: ReferenceFunction = {
  designation: "B",
  otherNames: [],
  conductors: "Pt-30%Rh / Pt-6%Rh",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: 0,
      to: 630.615,
      coefficients: [
        0,
        -2.4650818346e-4,
        5.9040421171e-6,
        -1.3257931636e-9,
        1.5668291901e-12,
        -1.694452924e-15,
        6.2990347094e-19,
      ],
    },
    {
      from: 630.615,
      to: 1820,
      coefficients: [
        -3.8938168621,
        2.857174747e-2,
        -8.4885104785e-5,
        1.5785280164e-7,
        -1.6835344864e-10,
        1.1109794013e-13,
        -4.4515431033e-17,
        9.8975640821e-21,
        -9.3791330289e-25,
      ],
    },
  ],
};
