/** Decision rules and their specific risks. */
import { acceptanceLimit, type DecisionRule, decisionRule, largestPassRisk } from "../../src/core/conformity";
import type { PublishedSet } from "./published-value";

/** ILAC-G8:09/2019, table 1: the specific risk stays below so many percent. */
// biome-ignore format: one row a line
const statedRisks: readonly (readonly [rule: string, percent: number])[] = [
  ["simple", 50],
  ["guarded 0.83", 5],
  ["guarded", 2.5],
  ["guarded 1.5", 0.16],
  ["guarded 3", 0.0001],
];

/** A tolerance of ±1 with U = 0.2, as printed with the acceptance limits that each guard band leaves. */
// biome-ignore format: one row a line
const guardBands: readonly (readonly [rule: string, accepted: number, decimals: number])[] = [
  ["guarded", 0.8, 1],
  ["guarded 1.5", 0.7, 1],
  ["guarded 0.83", 0.834, 3],
  ["guarded 3", 0.4, 1],
];

/** ILAC-G8:09/2019: 1 − Φ(r·k), one-sided, recomputed with 40 digits by an independent library (mpmath). */
// biome-ignore format: one row a line
const recomputedRisks: readonly (readonly [rule: string, k: number, risk: number])[] = [
  ["simple", 2, 0.5],
  ["guarded 0.83", 2, 0.048457226266722886],
  ["guarded", 2, 0.02275013194817921],
  ["guarded 1.5", 2, 0.0013498980316301035],
  ["guarded 2", 2, 3.167124183311998e-5],
  ["guarded 3", 2, 9.865876450376981e-10],
  ["guarded 0.83", 1.96, 0.05188979082465306],
  ["guarded", 1.96, 0.024997895148220373],
  ["guarded 1.5", 1.96, 0.0016410612341570818],
  ["guarded 3", 1.96, 2.051332410772596e-9],
];

const rule = (name: string): DecisionRule => decisionRule(name) as DecisionRule;

export const decisionSets: readonly PublishedSet[] = [
  {
    source: "ILAC-G8:09/2019, table 1, specific risk of a wrong Pass",
    origin: "memory",
    compared: "risk at the acceptance limit where the tolerance is wide against U, k = 2, as a bound",
    values: statedRisks.map(([name, percent]) => ({
      what: `rule "${name}"`,
      unit: "%",
      published: percent,
      tolerance: 1e-9,
      atMost: true,
      ours: () => 100 * (largestPassRisk(1000, 1, rule(name), 2) as number),
    })),
  },
  {
    source: "ILAC-G8:09/2019, arithmetic of guard bands",
    origin: "print",
    compared: "± acceptance limit",
    values: [
      ...guardBands.map(([name, published, decimals]) => ({
        what: `tolerance ±1, U = 0.2, rule "${name}"`,
        unit: "",
        published,
        decimals,
        tolerance: 1e-12,
        ours: () => acceptanceLimit(1, 0.2, rule(name)),
      })),
      {
        what: "tolerance ±0.5 Ω, guard band 20 % of it",
        unit: "Ω",
        published: 0.4,
        decimals: 1,
        tolerance: 1e-12,
        ours: () => acceptanceLimit(0.5, 0.1),
      },
    ],
  },
  {
    source: "ILAC-G8:09/2019, the same risks with all digits (an independent library, 40 digits)",
    origin: "computed",
    compared: "probability of a wrong Pass at a single acceptance limit, to 1E-10 of it",
    values: recomputedRisks.map(([name, k, published]) => ({
      what: `rule "${name}", k = ${k}`,
      unit: "",
      published,
      tolerance: 1e-10 * published,
      ours: () => largestPassRisk(1000, 1, rule(name), k, "none"),
    })),
  },
];
