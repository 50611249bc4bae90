/** JCGM 106:2012: probabilities of conformity. */
import { conformityProbability } from "../../src/core/conformity";
import type { PublishedSet } from "./published-value";

/** JCGM 106:2012, table 1 (from memory): standard uncertainties inside a single limit, probability of conformity. */
// biome-ignore format: one row a line
const jcgmTable1: readonly (readonly [z: number, probability: number])[] = [
  [0.84, 0.8],
  [1.28, 0.9],
  [1.64, 0.95],
  [2.33, 0.99],
  [3.09, 0.999],
];

/** JCGM 106:2012: the value, its limits, its standard uncertainty; the probability as printed and with all digits. */
interface ConformityExample {
  readonly what: string;
  readonly value: number;
  readonly upper: number;
  readonly lower: number | "none";
  readonly u: number;
  readonly printed: number;
  readonly recomputed: number;
}

const conformityExamples: readonly ConformityExample[] = [
  {
    what: "7.3, breakdown voltage −5.47 V, u 0.05 V, −5.40 V at most",
    value: -5.47,
    upper: -5.4,
    lower: "none",
    u: 0.05,
    printed: 0.92,
    recomputed: 0.9192433407662289,
  },
  {
    // A lower limit alone is an upper one of the opposite sign.
    what: "7.3, burst pressure 509.7 kPa, u 8.6 kPa, 490 kPa at least",
    value: -509.7,
    upper: -490,
    lower: "none",
    u: 8.6,
    printed: 0.99,
    recomputed: 0.9890095473848222,
  },
  {
    what: "7.4, viscosity 13.6, u 1.8, 12.5 to 16.3",
    value: 13.6,
    upper: 16.3,
    lower: 12.5,
    u: 1.8,
    printed: 0.66,
    recomputed: 0.6626297864953077,
  },
];

const probability = ({ value, upper, u, lower }: ConformityExample): unknown =>
  conformityProbability(value, upper, u, lower);

export const conformitySets: readonly PublishedSet[] = [
  {
    source: "JCGM 106:2012, worked examples",
    origin: "memory",
    compared: "probability of conformity",
    values: conformityExamples.map((example) => ({
      what: example.what,
      unit: "",
      published: example.printed,
      decimals: 2,
      ours: () => probability(example),
    })),
  },
  {
    source: "JCGM 106:2012, the same examples with all digits (an independent library)",
    origin: "computed",
    compared: "probability of conformity, to 1E-10 of it",
    values: conformityExamples.map((example) => ({
      what: example.what,
      unit: "",
      published: example.recomputed,
      tolerance: 1e-10 * example.recomputed,
      ours: () => probability(example),
    })),
  },
  {
    source: "JCGM 106:2012, table 1",
    origin: "memory",
    compared:
      "probability of conformity so many standard uncertainties inside a single limit, printed to two decimals",
    values: jcgmTable1.map(([z, published]) => ({
      what: `z = ${z}`,
      unit: "",
      published,
      decimals: 3,
      tolerance: 0.0014,
      ours: () => conformityProbability(-z, 0, 1, "none"),
    })),
  },
];
