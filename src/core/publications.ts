/** The standards and papers behind the numbers, each named once. */
export interface Publication {
  /** How it is cited in a cell or a table: designation and edition. */
  readonly citation: string;
  readonly title: string;
}

const published = {
  iec60584_1: {
    citation: "IEC 60584-1:2013",
    title: "Thermocouples – Part 1: EMF specifications and tolerances",
  },
  nistMonograph175: {
    citation: "NIST Monograph 175 (1993)",
    title:
      "Temperature-Electromotive Force Reference Functions and Tables for the Letter-Designated Thermocouple Types Based on the ITS-90 (also NIST Standard Reference Database 60)",
  },
  astmE230: {
    citation: "ASTM E230/E230M",
    title:
      "Standard Specification for Temperature-Electromotive Force (emf) Tables for Standardized Thermocouples",
  },
  astmE1751: {
    citation: "ASTM E1751 (2000)",
    title:
      "Standard Guide for Temperature Electromotive Force (emf) Tables for Non-Letter Designated Thermocouple Combinations",
  },
  gost8585: {
    citation: "GOST R 8.585-2001",
    title:
      "State system for ensuring the uniformity of measurements. Thermocouples. Nominal static characteristics of conversion",
  },
  iec62460: {
    citation: "IEC 62460:2008",
    title: "Temperature – Electromotive force (EMF) tables for pure-element thermocouple combinations",
  },
  its90: {
    citation: "ITS-90",
    title: "H. Preston-Thomas, The International Temperature Scale of 1990, Metrologia 27 (1990) 3–10",
  },
  rusby1991: {
    citation: "Rusby et al. (1991)",
    title:
      "R. L. Rusby et al., Thermodynamic basis of the ITS-90, Metrologia 28 (1991) 9–18: differences t90 − t68",
  },
  rusby1994: {
    citation: "Rusby, Hudson, Durieux (1994)",
    title: "Revised values for (t90 − t68) from 630 °C to 1064 °C, Metrologia 31 (1994) 149–153",
  },
  iec60584_3: {
    citation: "IEC 60584-3:2007",
    title: "Thermocouples – Part 3: Extension and compensating cables – Tolerances and identification system",
  },
  iec60751: {
    citation: "IEC 60751:2008",
    title: "Industrial platinum resistance thermometers and platinum temperature sensors",
  },
  jcgm100: {
    citation: "JCGM 100:2008 (GUM)",
    title: "Evaluation of measurement data – Guide to the expression of uncertainty in measurement",
  },
  jcgm101: {
    citation: "JCGM 101:2008",
    title:
      "Evaluation of measurement data – Supplement 1 to the GUM – Propagation of distributions using a Monte Carlo method",
  },
  jcgm106: {
    citation: "JCGM 106:2012",
    title: "Evaluation of measurement data – The role of measurement uncertainty in conformity assessment",
  },
  ilacG8: {
    citation: "ILAC-G8:09/2019",
    title: "Guidelines on Decision Rules and Statements of Conformity",
  },
  ea4_02: {
    citation: "EA-4/02 M:2013",
    title: "Evaluation of the Uncertainty of Measurement in Calibration",
  },
  iso17043: {
    citation: "ISO/IEC 17043:2010",
    title: "Conformity assessment – General requirements for proficiency testing",
  },
  steinhartHart1968: {
    citation: "Steinhart, Hart (1968)",
    title: "Calibration curves for thermistors, Deep-Sea Research 15 (1968) 497–503",
  },
  fritschCarlson1980: {
    citation: "Fritsch, Carlson (1980); Fritsch, Butland (1984)",
    title:
      "Monotone piecewise cubic interpolation, SIAM J. Numer. Anal. 17 (1980) 238–246; A method for constructing local monotone piecewise cubic interpolants, SIAM J. Sci. Stat. Comput. 5 (1984) 300–304",
  },
  // The next four from memory.
  ams2750: {
    citation: "SAE AMS2750",
    title: "Pyrometry (Aerospace Material Specification; latest revision known here: H, July 2024)",
  },
  hampel1974: {
    citation: "Hampel (1974)",
    title:
      "F. R. Hampel, The influence curve and its role in robust estimation, J. Amer. Statist. Assoc. 69 (1974) 383–393",
  },
  bigelow1920: {
    citation: "Bigelow et al. (1920)",
    title:
      "W. D. Bigelow, G. S. Bohart, A. C. Richardson, C. O. Ball, Heat penetration in processing canned foods, National Canners Association Bulletin 16-L (1920): the lethal rate and its integral",
  },
  haynes1971: {
    citation: "Haynes (1971)",
    title:
      "J. D. Haynes, Worldwide virtual temperatures for product stability testing, J. Pharm. Sci. 60 (1971) 927–929",
  },
} as const satisfies Record<string, Publication>;

export type PublicationId = keyof typeof published;

export const publications: Readonly<Record<PublicationId, Publication>> = published;
