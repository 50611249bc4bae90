import type { SensorTolerances, ToleranceTable } from "../tolerance-table";

const FIVE_COPIES = "a summary of E230/E230M-12 and four makers' tables agree";
const A_GUIDE =
  "from memory: below 0 °C the standard offers special tolerances only as a guide for agreement between purchaser and supplier";

const platinumRhodium: SensorTolerances = {
  evidence: FIVE_COPIES,
  // biome-ignore format: one part a line
  classes: {
    standard: [{ from: 0, to: 1480, constant: 1.5, proportion: 0.0025 }],
    special: [{ from: 0, to: 1480, constant: 0.6, proportion: 0.001 }],
  },
};

/** Proportions apply to the temperature in °C; a tolerance in °F is 1.8 times that in °C. */
export const astmE230: ToleranceTable = {
  standard: "astmE230",
  clause: "tolerances on initial values of EMF versus temperature",
  // biome-ignore format: one part a line
  sensors: {
    B: {
      evidence: FIVE_COPIES,
      classes: {
        standard: [{ from: 870, to: 1700, constant: 0, proportion: 0.005 }],
        special: [{ from: 870, to: 1700, constant: 0, proportion: 0.0025 }],
      },
    },
    C: {
      evidence: FIVE_COPIES,
      note: "Some copies leave out the floor of 4.4 °C.",
      classes: {
        standard: [{ from: 0, to: 2315, constant: 4.4, proportion: 0.01 }],
      },
    },
    E: {
      evidence: FIVE_COPIES,
      note: "Mineral-insulated, metal-sheathed type E has wider standard tolerances: 2.2 °C or 0.75 %, and 2.2 °C or 2 % below 0 °C.",
      classes: {
        standard: [
          { from: -200, to: 0, constant: 1.7, proportion: 0.01 },
          { from: 0, to: 870, constant: 1.7, proportion: 0.005 },
        ],
        special: [
          { from: -200, to: 0, constant: 1, proportion: 0.005, evidence: A_GUIDE },
          { from: 0, to: 870, constant: 1, proportion: 0.004 },
        ],
      },
    },
    J: {
      evidence: FIVE_COPIES,
      classes: {
        standard: [{ from: 0, to: 760, constant: 2.2, proportion: 0.0075 }],
        special: [{ from: 0, to: 760, constant: 1.1, proportion: 0.004 }],
      },
    },
    K: {
      evidence: FIVE_COPIES,
      note: "Some copies print 1 % instead of 2 % below 0 °C.",
      classes: {
        standard: [
          { from: -200, to: 0, constant: 2.2, proportion: 0.02 },
          { from: 0, to: 1260, constant: 2.2, proportion: 0.0075 },
        ],
        special: [{ from: 0, to: 1260, constant: 1.1, proportion: 0.004 }],
      },
    },
    N: {
      evidence: FIVE_COPIES,
      classes: {
        standard: [{ from: 0, to: 1260, constant: 2.2, proportion: 0.0075 }],
        special: [{ from: 0, to: 1260, constant: 1.1, proportion: 0.004 }],
      },
    },
    R: platinumRhodium,
    S: platinumRhodium,
    T: {
      evidence: FIVE_COPIES,
      classes: {
        standard: [
          { from: -200, to: 0, constant: 1, proportion: 0.015 },
          { from: 0, to: 370, constant: 1, proportion: 0.0075 },
        ],
        special: [
          { from: -200, to: 0, constant: 0.5, proportion: 0.008, evidence: A_GUIDE },
          { from: 0, to: 370, constant: 0.5, proportion: 0.004 },
        ],
      },
    },
  },
};
