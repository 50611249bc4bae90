/**
 * Tolerance tables as makers print them: constant up to the breakpoint, proportional beyond it.
 * Breakpoints are printed to the degree, so the two forms differ there by up to 0.006 °C.
 */
export interface PrintedRow {
  readonly type: string;
  readonly name: string;
  readonly from: number;
  readonly to: number;
  /** ± °C, or a proportion of |t|. */
  readonly constant?: number;
  readonly proportion?: number;
}

/** The tables of IEC 60584-2:1982 with amendment 1, taken over by IEC 60584-1:2013 (three makers' tables). */
// biome-ignore format: one row a line
export const printedIec: readonly PrintedRow[] = [
  { type: "T", name: "1", from: -40, to: 125, constant: 0.5 },
  { type: "T", name: "1", from: 125, to: 350, proportion: 0.004 },
  { type: "T", name: "2", from: -40, to: 133, constant: 1 },
  { type: "T", name: "2", from: 133, to: 350, proportion: 0.0075 },
  { type: "T", name: "3", from: -67, to: 40, constant: 1 },
  { type: "T", name: "3", from: -200, to: -67, proportion: 0.015 },
  { type: "E", name: "1", from: -40, to: 375, constant: 1.5 },
  { type: "E", name: "1", from: 375, to: 800, proportion: 0.004 },
  { type: "E", name: "2", from: -40, to: 333, constant: 2.5 },
  { type: "E", name: "2", from: 333, to: 900, proportion: 0.0075 },
  { type: "E", name: "3", from: -167, to: 40, constant: 2.5 },
  { type: "E", name: "3", from: -200, to: -167, proportion: 0.015 },
  { type: "J", name: "1", from: -40, to: 375, constant: 1.5 },
  { type: "J", name: "1", from: 375, to: 750, proportion: 0.004 },
  { type: "J", name: "2", from: -40, to: 333, constant: 2.5 },
  { type: "J", name: "2", from: 333, to: 750, proportion: 0.0075 },
  { type: "K", name: "1", from: -40, to: 375, constant: 1.5 },
  { type: "K", name: "1", from: 375, to: 1000, proportion: 0.004 },
  { type: "K", name: "2", from: -40, to: 333, constant: 2.5 },
  { type: "K", name: "2", from: 333, to: 1200, proportion: 0.0075 },
  { type: "K", name: "3", from: -167, to: 40, constant: 2.5 },
  { type: "K", name: "3", from: -200, to: -167, proportion: 0.015 },
  { type: "N", name: "1", from: -40, to: 375, constant: 1.5 },
  { type: "N", name: "1", from: 375, to: 1000, proportion: 0.004 },
  { type: "N", name: "2", from: -40, to: 333, constant: 2.5 },
  { type: "N", name: "2", from: 333, to: 1200, proportion: 0.0075 },
  { type: "N", name: "3", from: -167, to: 40, constant: 2.5 },
  { type: "N", name: "3", from: -200, to: -167, proportion: 0.015 },
  { type: "R", name: "1", from: 0, to: 1100, constant: 1 },
  { type: "R", name: "2", from: 0, to: 600, constant: 1.5 },
  { type: "R", name: "2", from: 600, to: 1600, proportion: 0.0025 },
  { type: "S", name: "1", from: 0, to: 1100, constant: 1 },
  { type: "S", name: "2", from: 0, to: 600, constant: 1.5 },
  { type: "S", name: "2", from: 600, to: 1600, proportion: 0.0025 },
  { type: "B", name: "2", from: 600, to: 1700, proportion: 0.0025 },
  { type: "B", name: "3", from: 600, to: 800, constant: 4 },
  { type: "B", name: "3", from: 800, to: 1700, proportion: 0.005 },
];

/** The classes of the same standard that were not found in print. */
export const iecFromMemory: readonly PrintedRow[] = [
  { type: "C", name: "2", from: 426, to: 2315, proportion: 0.01 },
  { type: "A", name: "2", from: 1000, to: 2500, proportion: 0.01 },
];

/** Class 1 of types R and S above its constant part: 1 °C + 0.3 % of what exceeds 1100 °C. */
// biome-ignore format: one row a line
export const classOneOfPlatinum: readonly (readonly [t: number, limit: number])[] = [
  [1000, 1],
  [1100, 1],
  [1200, 1.3],
  [1600, 2.5],
];

/** ASTM E230/E230M: [type, class, t, ± °C] at both ends and beside the breakpoints (a summary sheet and four makers' tables). */
// biome-ignore format: one row a line
export const printedAstm: readonly (readonly [type: string, name: string, t: number, limit: number])[] = [
  ["T", "standard", 0, 1], ["T", "standard", 100, 1], ["T", "standard", 200, 1.5], ["T", "standard", 370, 2.775],
  ["T", "standard", -200, 3], ["T", "standard", -100, 1.5], ["T", "standard", -50, 1],
  ["T", "special", 0, 0.5], ["T", "special", 125, 0.5], ["T", "special", 370, 1.48],
  ["J", "standard", 0, 2.2], ["J", "standard", 293, 2.2], ["J", "standard", 760, 5.7],
  ["J", "special", 0, 1.1], ["J", "special", 275, 1.1], ["J", "special", 760, 3.04],
  ["E", "standard", 0, 1.7], ["E", "standard", 340, 1.7], ["E", "standard", 870, 4.35],
  ["E", "standard", -200, 2], ["E", "standard", -170, 1.7], ["E", "standard", -100, 1.7],
  ["E", "special", 0, 1], ["E", "special", 250, 1], ["E", "special", 870, 3.48],
  ["K", "standard", 0, 2.2], ["K", "standard", 293, 2.2], ["K", "standard", 400, 3], ["K", "standard", 1260, 9.45],
  ["K", "special", 0, 1.1], ["K", "special", 275, 1.1], ["K", "special", 1260, 5.04],
  ["N", "standard", 0, 2.2], ["N", "standard", 1260, 9.45],
  ["N", "special", 0, 1.1], ["N", "special", 1260, 5.04],
  ["R", "standard", 0, 1.5], ["R", "standard", 600, 1.5], ["R", "standard", 1480, 3.7],
  ["R", "special", 0, 0.6], ["R", "special", 600, 0.6], ["R", "special", 1480, 1.48],
  ["S", "standard", 0, 1.5], ["S", "standard", 1000, 2.5], ["S", "standard", 1480, 3.7],
  ["S", "special", 0, 0.6], ["S", "special", 1000, 1], ["S", "special", 1480, 1.48],
  ["B", "standard", 870, 4.35], ["B", "standard", 1700, 8.5],
  ["B", "special", 870, 2.175], ["B", "special", 1700, 4.25],
  ["C", "standard", 2315, 23.15],
  // 2 % below 0 °C, not 1 % as some copies print.
  ["K", "standard", -200, 4], ["K", "standard", -110, 2.2], ["K", "standard", -50, 2.2],
  // A floor of 4.4 °C, which some copies leave out.
  ["C", "standard", 100, 4.4], ["C", "standard", 440, 4.4], ["C", "standard", 441, 4.41],
];

/** The guide of the same standard for special limits below 0 °C (from memory). */
export const astmFromMemory: readonly (readonly [type: string, name: string, t: number, limit: number])[] = [
  ["T", "special", -100, 0.8],
  ["E", "special", -200, 1],
];

/** IEC 60751 tolerances in °C as tabulated by sensor makers (five copies). */
// biome-ignore format: one row a line
export const printedPlatinum: readonly (readonly [name: string, t: number, limit: number])[] = [
  ["A", -100, 0.35], ["A", 0, 0.15], ["A", 100, 0.35], ["A", 200, 0.55], ["A", 300, 0.75], ["A", 400, 0.95],
  ["B", -100, 0.8], ["B", 0, 0.3], ["B", 100, 0.8], ["B", 200, 1.3], ["B", 300, 1.8], ["B", 400, 2.3],
  ["B", 500, 2.8], ["B", 600, 3.3],
];

/** IEC 60751, wire-wound sensors: where a class holds, °C (two copies). */
// biome-ignore format: one row a line
export const printedPlatinumRanges: readonly (readonly [name: string, from: number, to: number])[] = [
  ["AA", -50, 250], ["A", -100, 450], ["B", -196, 600], ["C", -196, 600],
];

/** IEC 60584-3, extension and compensating cables (an instrument maker's manual, two further pages): [cable, class, µV, ± °C, measuring junction °C] */
// biome-ignore format: one row a line
export const printedIecCables: readonly (readonly [
  cable: string, name: string, uv: number, degrees: number, at: number,
])[] = [
  ["JX", "1", 85, 1.5, 500], ["JX", "2", 140, 2.5, 500],
  ["TX", "1", 30, 0.5, 300], ["TX", "2", 60, 1, 300],
  ["EX", "1", 120, 1.5, 500], ["EX", "2", 200, 2.5, 500],
  ["KX", "1", 60, 1.5, 900], ["KX", "2", 100, 2.5, 900],
  ["NX", "1", 60, 1.5, 900], ["NX", "2", 100, 2.5, 900],
  ["KCA", "2", 100, 2.5, 900], ["KCB", "2", 100, 2.5, 900], ["NC", "2", 100, 2.5, 900],
  ["RCA", "2", 30, 2.5, 1000], ["RCB", "2", 60, 5, 1000],
  ["SCA", "2", 30, 2.5, 1000], ["SCB", "2", 60, 5, 1000],
  ["BC", "2", 40, 3.5, 1400],
];

/** ASTM E230/E230M, extension wires, ± °C (three makers' tables). */
// biome-ignore format: one row a line
export const printedAstmCables: readonly (readonly [cable: string, standard: number, special: number])[] = [
  ["KX", 2.2, 1.1], ["JX", 2.2, 1.1], ["EX", 1.7, 1], ["TX", 1, 0.5], ["NX", 2.2, 1.1],
];

/** The same for cables specified in µV (from memory) with the degrees that makers print. */
// biome-ignore format: one row a line
export const printedAstmMicrovolts: readonly (readonly [cable: string, degrees: number, uv: number])[] = [
  ["SX", 5, 57], ["RX", 5, 57], ["BX", 3.7, 33], ["CX", 6.8, 110],
];
