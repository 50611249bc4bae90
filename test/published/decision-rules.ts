/** Specific risks and probabilities of conformity. */

/** ILAC-G8:09/2019: 1 − Φ(r·k), one-sided, recomputed with 40 digits by an independent library (mpmath). */
// biome-ignore format: one row a line
export const recomputedRisks: readonly (readonly [rule: string, k: number, risk: number])[] = [
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

/** JCGM 106:2012, table 1 (from memory): standard uncertainties inside a single limit, probability of conformity. */
// biome-ignore format: one row a line
export const jcgmTable1: readonly (readonly [z: number, probability: number])[] = [
  [0.84, 0.8],
  [1.28, 0.9],
  [1.64, 0.95],
  [2.33, 0.99],
  [3.09, 0.999],
];
