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
} as const satisfies Record<string, Publication>;

export type PublicationId = keyof typeof published;

export const publications: Readonly<Record<PublicationId, Publication>> = published;
