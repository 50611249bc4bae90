/**
 * Tails and quantiles computed with 40 digits of working precision by an independent library (mpmath), and the first
 * numbers of the generator behind SIMULATEU.
 */
import { normalAbove, normalTwoSided } from "../../src/core/numeric/normal";
import { studentTwoSided } from "../../src/core/numeric/student";
import { stateFromSeed, xoshiro128 } from "../../src/core/numeric/xoshiro128";
import type { PublishedSet } from "./published-value";

/** Two-sided quantiles of Student's t. */
// biome-ignore format: one row a line
const studentQuantiles: readonly (readonly [dof: number, inside: number, t: number])[] = [
  [3, 0.5, 0.7648923284043453],
  [3, 0.9973, 9.218701822037348],
  [5, 0.95, 2.5705818356363155],
  [7, 0.9973, 4.529910402646552],
  [16, 0.95, 2.1199052992212546],
  [19, 1 - 2 ** -20, 7.093074914451616],
  [30, 0.5, 0.6827556933212926],
  [50, 0.95, 2.008559112100761],
  [101, 0.9973, 3.0759534494488396],
  [400, 0.5, 0.6751035842407485],
  [400, 1 - 2 ** -20, 4.978655987055913],
  [999, 0.95, 1.96234146113345],
  [999, 1 - 2 ** -20, 4.9318178053383255],
  [1000, 0.5, 0.6747351646070094],
  [1000, 0.9973, 3.007494111288684],
  [1000, 1 - 2 ** -20, 4.9317867831743785],
  [20000, 0.95, 1.9600826051581353],
];

/** 1 − Φ(z). */
// biome-ignore format: one row a line
export const normalTails: readonly (readonly [z: number, above: number])[] = [
  [-8, 0.9999999999999993],
  [-1, 0.8413447460685429],
  [0, 0.5],
  [0.5, 0.3085375387259869],
  [1, 0.15865525393145705],
  [1.96, 0.024997895148220435],
  [2, 0.02275013194817921],
  [2.5, 0.006209665325776135],
  [2.6, 0.00466118802371875],
  [3, 0.0013498980316300946],
  [5, 2.866515718791939e-7],
  [8, 6.220960574271784e-16],
  [12, 1.776482112077679e-33],
  [20, 2.7536241186062337e-89],
  [37, 5.725571222524577e-300],
];

/** Two-sided quantiles of the normal distribution. */
// biome-ignore format: one row a line
const normalQuantiles: readonly (readonly [inside: number, z: number])[] = [
  [0.5, 0.6744897501960817],
  [0.9, 1.6448536269514726],
  [0.95, 1.9599639845400543],
  [0.99, 2.575829303548901],
  [0.9973, 2.999976992703393],
];

/** The first numbers of xoshiro128** from the state 1, 2, 3, 4. */
// biome-ignore format: as printed
const vector: readonly number[] = [
  11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
];

const hexadecimal = (words: Iterable<number>): string =>
  [...words].map((word) => (word >>> 0).toString(16).toUpperCase()).join(" ");

type Row = readonly [what: string, published: number, ours: () => number];

/** Agreement is a share of the value. */
const computed = (source: string, compared: string, share: number, rows: readonly Row[]): PublishedSet => ({
  source: `${source} (an independent library, 40 digits)`,
  origin: "computed",
  compared: `${compared}, to ${String(share).replace("e", "E")} of it`,
  values: rows.map(([what, published, ours]) => ({
    what,
    unit: "",
    published,
    tolerance: share * published,
    ours,
  })),
});

export const distributionSets: readonly PublishedSet[] = [
  computed(
    "Student's t distribution",
    "two-sided quantile",
    1e-12,
    studentQuantiles.map(([dof, inside, t]) => [
      `ν = ${dof}, ${inside === 1 - 2 ** -20 ? "1 − 2^−20" : inside} inside`,
      t,
      () => studentTwoSided(inside, dof),
    ]),
  ),
  computed(
    "the normal distribution, upper tail",
    "1 − Φ(z)",
    1e-13,
    normalTails.map(([z, above]) => [`z = ${z}`, above, () => normalAbove(z)]),
  ),
  computed(
    "the normal distribution, two-sided quantiles",
    "quantile",
    1e-13,
    normalQuantiles.map(([inside, z]) => [`${inside} inside`, z, () => normalTwoSided(inside)]),
  ),
  {
    source: "xoshiro128**, its authors' program from the state 1, 2, 3, 4 (rand_xoshiro test vector)",
    origin: "print",
    compared: "the first ten numbers",
    values: vector.map((published, i) => ({
      what: `number ${i + 1}`,
      unit: "",
      published,
      decimals: 0,
      tolerance: 0,
      ours: () => Array.from({ length: i + 1 }, xoshiro128([1, 2, 3, 4]))[i],
    })),
  },
  {
    source: "SplitMix64, which seeds it",
    origin: "memory",
    compared: "first two words for seed 0, low half first",
    values: [
      {
        what: "E220A8397B1DCDAF, 6E789E6AA1B965F4",
        unit: "",
        published: "7B1DCDAF E220A839 A1B965F4 6E789E6A",
        ours: () => hexadecimal(stateFromSeed(0)),
      },
    ],
  },
];
