import type { SensorTolerances, ToleranceTable } from "../tolerance-table";

const FOUR_COPIES = "three makers' tables and memory agree (figures of IEC 60584-2, taken over)";
const FROM_MEMORY = "from memory";

const platinumRhodium: SensorTolerances = {
  evidence: FOUR_COPIES,
  note: "Some copies print the bend of class 1 at 1000 °C instead of 1100 °C.",
  // biome-ignore format: one part a line
  classes: {
    1: [{ from: 0, to: 1600, constant: 1, proportion: 0.003, beyond: 1100 }],
    2: [{ from: 0, to: 1600, constant: 1.5, proportion: 0.0025 }],
  },
};

/** New wire, commonly 0.13 mm to 3.2 mm, reference junction at 0 °C. */
export const iec60584_1: ToleranceTable = {
  standard: "iec60584_1",
  clause: "tolerance classes for thermocouples",
  // biome-ignore format: one part a line
  sensors: {
    B: {
      evidence: FOUR_COPIES,
      classes: {
        2: [{ from: 600, to: 1700, constant: 1.5, proportion: 0.0025 }],
        3: [{ from: 600, to: 1700, constant: 4, proportion: 0.005 }],
      },
    },
    C: {
      evidence: FROM_MEMORY,
      classes: {
        2: [{ from: 426, to: 2315, constant: 0, proportion: 0.01 }],
      },
    },
    E: {
      evidence: FOUR_COPIES,
      classes: {
        1: [{ from: -40, to: 800, constant: 1.5, proportion: 0.004 }],
        2: [{ from: -40, to: 900, constant: 2.5, proportion: 0.0075 }],
        3: [{ from: -200, to: 40, constant: 2.5, proportion: 0.015 }],
      },
    },
    J: {
      evidence: FOUR_COPIES,
      classes: {
        1: [{ from: -40, to: 750, constant: 1.5, proportion: 0.004 }],
        2: [{ from: -40, to: 750, constant: 2.5, proportion: 0.0075 }],
      },
    },
    K: {
      evidence: FOUR_COPIES,
      classes: {
        1: [{ from: -40, to: 1000, constant: 1.5, proportion: 0.004 }],
        2: [{ from: -40, to: 1200, constant: 2.5, proportion: 0.0075 }],
        3: [{ from: -200, to: 40, constant: 2.5, proportion: 0.015 }],
      },
    },
    N: {
      evidence: FOUR_COPIES,
      classes: {
        1: [{ from: -40, to: 1000, constant: 1.5, proportion: 0.004 }],
        2: [{ from: -40, to: 1200, constant: 2.5, proportion: 0.0075 }],
        3: [{ from: -200, to: 40, constant: 2.5, proportion: 0.015 }],
      },
    },
    R: platinumRhodium,
    S: platinumRhodium,
    T: {
      evidence: FOUR_COPIES,
      classes: {
        1: [{ from: -40, to: 350, constant: 0.5, proportion: 0.004 }],
        2: [{ from: -40, to: 350, constant: 1, proportion: 0.0075 }],
        3: [{ from: -200, to: 40, constant: 1, proportion: 0.015 }],
      },
    },
    A: {
      evidence: FROM_MEMORY,
      classes: {
        2: [{ from: 1000, to: 2500, constant: 0, proportion: 0.01 }],
      },
    },
  },
};
