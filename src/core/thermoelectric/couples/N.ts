import type { ReferenceFunction } from "../reference-function";

export const N: ReferenceFunction = {
  designation: "N",
  otherNames: [],
  conductors: "Ni-Cr-Si / Ni-Si",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  note: "The sensitivity of the published function steps from 26.159 to 25.929 µV/°C at 0 °C.",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -270,
      to: 0,
      coefficients: [
        0,
        2.6159105962e-2,
        1.0957484228e-5,
        -9.3841111554e-8,
        -4.6412039759e-11,
        -2.6303357716e-12,
        -2.2653438003e-14,
        -7.6089300791e-17,
        -9.3419667835e-20,
      ],
    },
    {
      from: 0,
      to: 1300,
      coefficients: [
        0,
        2.5929394601e-2,
        1.571014188e-5,
        4.3825627237e-8,
        -2.5261169794e-10,
        6.4311819339e-13,
        -1.0063471519e-15,
        9.9745338992e-19,
        -6.0863245607e-22,
        2.0849229339e-25,
        -3.0682196151e-29,
      ],
    },
  ],
};
