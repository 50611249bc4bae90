import type { ReferenceFunction } from "../reference-function";

export const T: ReferenceFunction = {
  designation: "T",
  otherNames: [],
  conductors: "Cu / Cu-Ni",
  scale: "ITS-90",
  standard: "iec60584_1",
  publication: "nistMonograph175",
  evidence: "four copies agree",
  // biome-ignore format: one coefficient a line, as printed, ascending powers of t in °C, E in mV
  segments: [
    {
      from: -270,
      to: 0,
      coefficients: [
        0,
        3.8748106364e-2,
        4.4194434347e-5,
        1.1844323105e-7,
        2.0032973554e-8,
        9.0138019559e-10,
        2.2651156593e-11,
        3.6071154205e-13,
        3.8493939883e-15,
        2.8213521925e-17,
        1.4251594779e-19,
        4.8768662286e-22,
        1.079553927e-24,
        1.3945027062e-27,
        7.9795153927e-31,
      ],
    },
    {
      from: 0,
      to: 400,
      coefficients: [
        0,
        3.8748106364e-2,
        3.329222788e-5,
        2.0618243404e-7,
        -2.1882256846e-9,
        1.0996880928e-11,
        -3.0815758772e-14,
        4.547913529e-17,
        -2.7512901673e-20,
      ],
    },
  ],
};
