/** The printed tolerances beside ours. */
import {
  cableToleranceDegrees,
  cableToleranceUv,
  ToleranceClass,
  tolerance,
  toleranceClass,
} from "../../src/core/conformity";
import type { PublishedSet, PublishedValue } from "./published-value";
import {
  astmFromMemory,
  classOneOfPlatinum,
  iecFromMemory,
  type PrintedRow,
  printedAstm,
  printedAstmCables,
  printedAstmMicrovolts,
  printedIec,
  printedIecCables,
  printedPlatinum,
  printedPlatinumRanges,
} from "./tolerances";

/** Limits are exact but for the last bits of a product. */
const EXACT = 1e-9;

const limit = (type: string, name: string, t: number, published: number): PublishedValue => ({
  what: `${type}, class ${name}, ${t} °C`,
  unit: "± °C",
  published,
  decimals: 3,
  tolerance: EXACT,
  ours: () => tolerance(type, name, t),
});

/** At both ends of a printed line and in its middle. Breakpoints are printed to 1 °C, so that ends differ a little. */
const line = ({ type, name, from, to, constant, proportion }: PrintedRow): PublishedValue[] =>
  [from, (from + to) / 2, to].map((t) => ({
    ...limit(type, name, t, constant ?? (proportion as number) * Math.abs(t)),
    ...(t === from || t === to ? { tolerance: 0.006 } : {}),
  }));

const degreesOfCable = (cable: string, name: string, published: number): PublishedValue => ({
  what: `${cable}, class ${name}`,
  unit: "± °C",
  published,
  decimals: 1,
  tolerance: EXACT,
  ours: () => cableToleranceDegrees(cable, name),
});

const uvOfCable = (cable: string, name: string, published: number): PublishedValue => ({
  what: `${cable}, class ${name}`,
  unit: "± µV",
  published,
  decimals: 0,
  tolerance: EXACT,
  ours: () => cableToleranceUv(cable, name),
});

/** An end of the range in which a class of the platinum sensor holds. */
const end = (name: string, which: "from" | "to", published: number): PublishedValue => ({
  what: `class ${name} holds ${which}`,
  unit: "°C",
  published,
  decimals: 0,
  tolerance: EXACT,
  ours: () => {
    const found = toleranceClass("Pt", name);
    return found instanceof ToleranceClass ? found[which] : found;
  },
});

export const toleranceSets: readonly PublishedSet[] = [
  {
    source: "IEC 60584-1:2013, tolerance classes (three makers' tables)",
    origin: "print",
    compared:
      "limit at both ends of each printed line and in its middle; breakpoints are printed to 1 °C, where the two lines differ by up to 0.006 °C",
    values: printedIec.flatMap(line),
  },
  {
    source: "IEC 60584-1:2013, tolerance classes of types C and A",
    origin: "memory",
    compared: "limit at both ends of each line and in its middle",
    values: iecFromMemory.flatMap(line),
  },
  {
    source: "IEC 60584-1:2013, class 1 of types R and S, which rises by 0.3 % from 1100 °C",
    origin: "print",
    compared: "limit",
    values: ["R", "S"].flatMap((type) =>
      classOneOfPlatinum.map(([t, published]) => limit(type, "1", t, published)),
    ),
  },
  {
    source: "ASTM E230/E230M, tolerances on initial values (a summary sheet and four makers' tables)",
    origin: "print",
    compared: "limit",
    values: printedAstm.map((row) => limit(...row)),
  },
  {
    source: "ASTM E230/E230M, guide for special limits below 0 °C",
    origin: "memory",
    compared: "limit",
    values: astmFromMemory.map((row) => limit(...row)),
  },
  {
    source: "IEC 60751:2008, tolerances of sensors (five copies)",
    origin: "print",
    compared: "limit",
    values: printedPlatinum.map(([name, t, published]) => ({
      ...limit("Pt", name, t, published),
      decimals: 2,
    })),
  },
  {
    source: "IEC 60751:2008, ranges of the classes of wire-wound sensors (two copies)",
    origin: "print",
    compared: "both ends of the range",
    values: printedPlatinumRanges.flatMap(([name, from, to]) => [
      end(name, "from", from),
      end(name, "to", to),
    ]),
  },
  {
    source:
      "IEC 60584-3, extension and compensating cables (an instrument maker's manual, two further pages)",
    origin: "print",
    compared: "limit in µV, and in degrees at the measuring junction's temperature that the standard names",
    values: printedIecCables.flatMap(([cable, name, uv, degrees]) => [
      uvOfCable(cable, name, uv),
      degreesOfCable(cable, name, degrees),
    ]),
  },
  {
    source: "ASTM E230/E230M, extension and compensating cables (three makers' tables)",
    origin: "print",
    compared: "limit in degrees",
    values: [
      ...printedAstmCables.flatMap(([cable, standard, special]) => [
        degreesOfCable(cable, "standard", standard),
        degreesOfCable(cable, "special", special),
      ]),
      ...printedAstmMicrovolts.map(([cable, degrees]) => degreesOfCable(cable, "standard", degrees)),
    ],
  },
  {
    source: "ASTM E230/E230M, compensating cables",
    origin: "memory",
    compared: "limit in µV",
    values: printedAstmMicrovolts.map(([cable, , uv]) => uvOfCable(cable, "standard", uv)),
  },
];
