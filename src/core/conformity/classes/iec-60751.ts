import type { ToleranceTable } from "../tolerance-table";

/** ±(c + k·|t|); ranges of wire-wound sensors. */
export const iec60751: ToleranceTable = {
  standard: "iec60751",
  clause: "tolerance classes for thermometers",
  // biome-ignore format: one part a line
  sensors: {
    Pt: {
      evidence: "limits: five copies agree; ranges: two copies agree",
      classes: {
        AA: [{ from: -50, to: 250, constant: 0.1, proportion: 0.0017, beyond: 0 }],
        A: [{ from: -100, to: 450, constant: 0.15, proportion: 0.002, beyond: 0 }],
        B: [{ from: -196, to: 600, constant: 0.3, proportion: 0.005, beyond: 0 }],
        C: [{ from: -196, to: 600, constant: 0.6, proportion: 0.01, beyond: 0 }],
      },
    },
  },
};
