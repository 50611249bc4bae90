/**
 * Printed values that we do not follow, each with the value that is right and why. A workbook that was checked against
 * one of them will differ from ours, and should.
 */
import { tolerance } from "../../src/core/conformity";
import { platinumResistance } from "../../src/core/junction";
import { coverageFactor } from "../../src/core/uncertainty";
import { TEMPERATURE } from "../../src/functions";
import { meanKineticOfExample, publishedMeanKinetic } from "./lethality";
import { platinumTable } from "./platinum";
import type { PublishedValue } from "./published-value";
import { pairsForVolts } from "./wiring";

export interface Misprint extends PublishedValue {
  /** `published` is what is right; this is what the other print says. */
  readonly published: number;
  readonly misprinted: number;
  readonly where: string;
  readonly why: string;
}

/** The scale before, IPTS-68 (one page, checked against its coefficients from memory). */
// biome-ignore format: one row a line
const superseded: readonly (readonly [t: number, resistance: number])[] = [
  [-200, 18.53],
  [-100, 60.2],
  [100, 138.5],
  [200, 175.84],
  [400, 247.06],
  [600, 313.65],
];

/** Ours would not pass for the misprinted value: it is farther from it than half a unit of its last digit. */
export const differs = ({ misprinted, decimals = 0, ours }: Misprint): boolean =>
  Math.abs((ours() as number) - misprinted) > 0.5 * 10 ** -decimals;

const limitAt = (type: string, name: string, t: number) => (): unknown => tolerance(type, name, t);

export const misprints: readonly Misprint[] = [
  ...superseded.map(([t, misprinted]) => ({
    what: `platinum sensor, R0 = 100 Ω, ${t} °C`,
    unit: "Ω",
    misprinted,
    where: "tables of IPTS-68",
    published: platinumTable.find(([printed]) => printed === t)?.[1] as number,
    decimals: 2,
    why: "superseded by IEC 60751:2008 on ITS-90",
    ours: () => platinumResistance(t, 100),
  })),
  {
    what: "type S, 5.975 mV, reference junction at 50 °C",
    unit: "°C",
    misprinted: 721.37,
    where: "the posted answer of a textbook problem",
    published: 699.87,
    decimals: 2,
    why: "it adds 50 °C to the temperature, where 0.299 mV belong to the EMF",
    ours: () => TEMPERATURE([[5.975]], [["S"]], [[50]])[0]?.[0],
  },
  {
    what: "pairs of type K that give 1.5 V between 70 °F and 700 °C",
    unit: "pairs",
    misprinted: 53,
    where: "a textbook problem, which prints 52.93",
    published: 54,
    decimals: 0,
    why: "by its rounded 29.14 − 0.8 mV; 53.03 are needed",
    ours: pairsForVolts,
  },
  ...["R", "S"].map((type) => ({
    what: `type ${type}, class 1, 1100 °C`,
    unit: "± °C",
    misprinted: 1.3,
    where: "some copies of the tolerance table",
    published: 1,
    decimals: 1,
    why: "the limit rises from 1100 °C, not from 1000 °C",
    ours: limitAt(type, "1", 1100),
  })),
  {
    what: "type K, ASTM standard, −200 °C",
    unit: "± °C",
    misprinted: 2.2,
    where: "copies that print 1 % below 0 °C, 2.2 °C at least",
    published: 4,
    decimals: 1,
    why: "it is 2 % below 0 °C",
    ours: limitAt("K", "standard", -200),
  },
  {
    what: "type C, ASTM standard, 100 °C",
    unit: "± °C",
    misprinted: 1,
    where: "copies that print 1 % alone",
    published: 4.4,
    decimals: 1,
    why: "the limit is 4.4 °C at least",
    ours: limitAt("C", "standard", 100),
  },
  {
    what: "coverage factor, ν = 35, 90 %",
    unit: "",
    misprinted: 1.7,
    where: "GUM table G.2, as one copy reports it",
    published: 1.69,
    decimals: 2,
    why: "t is 1.690",
    ours: () => coverageFactor(35, 0.9),
  },
  {
    what: `mean kinetic temperature of ${publishedMeanKinetic.temperatures.join(", ")} °C`,
    unit: "°C",
    misprinted: publishedMeanKinetic.arithmetic,
    where: "a page that calls the plain mean by this name",
    published: 25.03,
    decimals: 2,
    why: "warm readings weigh more",
    ours: meanKineticOfExample,
  },
];
