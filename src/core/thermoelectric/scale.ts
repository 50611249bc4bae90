/**
 * From IPTS-68 to ITS-90: t90 − t68 as a function of t90.
 *
 * Up to 630.6 °C: Rusby et al., Metrologia 28 (1991); from there to the gold
 * point: Rusby, Hudson and Durieux, Metrologia 31 (1994), which replaced the
 * values printed with the ITS-90 in 1990; above the gold point the ratio of the
 * radiation scales (that form is from memory; the printed values −0.44, −0.72 and
 * −1.07 °C at 1500, 2000 and 2500 °C agree with it).
 */
import { degrees, noAnswer, type Refusal } from "../errors";
import { polynomial } from "../numeric/polynomial";

/** Range of t90 in °C, and t90 − t68 in it. */
interface Difference {
  readonly from: number;
  readonly to: number;
  readonly at: (t90: number) => number;
}

// biome-ignore format: as printed, ascending powers of t90/630
const UP_TO_ANTIMONY = [
  0,
  -0.148759,
  -0.267408,
  1.08076,
  1.269056,
  -4.089591,
  -1.871251,
  7.438081,
  -3.536296,
];

// biome-ignore format: as printed, ascending powers of t90
const UP_TO_GOLD = [
  78.687209,
  -0.47135991,
  1.0954715e-3,
  -1.2357884e-6,
  6.7736583e-10,
  -1.4458081e-13,
];

const differences: readonly Difference[] = [
  { from: -200, to: 630.6, at: (t90) => polynomial(UP_TO_ANTIMONY, t90 / 630) },
  { from: 630.6, to: 1064.18, at: (t90) => polynomial(UP_TO_GOLD, t90) },
  { from: 1064.18, to: 4000, at: (t90) => -0.25 * ((t90 + 273.15) / 1337.33) ** 2 },
];

/** Solves t90 = t68 + d(t90); d is so flat that each round gains two digits or more. */
function solve(difference: Difference, t68: number): number {
  let t90 = t68;
  for (let i = 0; i < 50; i++) {
    const next = t68 + difference.at(t90);
    if (next === t90) break;
    t90 = next;
  }
  return t90;
}

/** A temperature on IPTS-68, °C, on ITS-90, °C. The three pieces meet within 1 mK; a t68 between two of them gives the join. */
export function toIts90(t68: number): number | Refusal {
  const lowest = differences[0] as Difference;
  const highest = differences[differences.length - 1] as Difference;
  const from = lowest.from - lowest.at(lowest.from);
  const to = highest.to - highest.at(highest.to);
  if (!(t68 >= from && t68 <= to)) {
    return noAnswer`temperature ${degrees(t68)} is outside the range of the IPTS-68 differences, ${degrees(from)} to ${degrees(to)}`;
  }
  for (const difference of differences) {
    if (t68 > difference.to - difference.at(difference.to)) continue;
    return Math.max(solve(difference, t68), difference.from);
  }
  return highest.to;
}
