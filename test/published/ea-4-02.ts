/** EA-4/02 M:2013, supplement 1, example S5: calibration of a type N thermocouple at 1000 °C. */
import type { BudgetLine } from "../../src/core/uncertainty";

/** C_S, C_S/C_S0 confirmed in copies; C_X and C_X0 from memory, reproduced to 14 digits by the published totals. */
const C_S = 0.077;
const C_X = 0.026;
const C_X0 = 0.039;

/** [line, printed standard uncertainty, printed contribution] */
export const furnace: readonly (readonly [BudgetLine, number, number])[] = [
  [{ name: "temperature of reference thermometers", value: 0.1, distribution: "standard", dof: 9 }, 0.1, 0.1],
  [{ name: "voltmeter calibration", value: 2, distribution: "normal", sensitivity: C_S }, 1, 0.077],
  [{ name: "voltmeter resolution", value: 0.5, distribution: "rectangular", sensitivity: C_S }, 0.29, 0.022],
  [{ name: "reversing switch", value: 2, distribution: "Rectangular", sensitivity: C_S }, 1.15, 0.089],
  [{ name: "reference point", value: 0.1, distribution: "rectangular", sensitivity: -0.407 }, 0.058, 0.024],
  [{ name: "reference thermocouples", value: 0.3, distribution: "NORMAL", divisor: 2 }, 0.15, 0.15],
  [{ name: "drift of references", value: 0.3, distribution: "rectangular" }, 0.173, 0.173],
  [{ name: "furnace non-uniformity", value: 1, distribution: "rectangular" }, 0.577, 0.577],
];

export const emf: readonly (readonly [BudgetLine, number, number])[] = [
  [{ name: "voltmeter indication", value: 1.6, distribution: "standard", dof: 9 }, 1.6, 1.6],
  [{ name: "voltmeter calibration", value: 2, distribution: "normal" }, 1, 1],
  [{ name: "voltmeter resolution", value: 0.5, distribution: "rectangular" }, 0.29, 0.29],
  [{ name: "reversing switch", value: 2, distribution: "rectangular" }, 1.15, 1.15],
  [{ name: "compensating cables", value: 5, distribution: "rectangular" }, 2.9, 2.9],
  // Printed as 24.5, where 0.641 × 38.5 is 24.7.
  [{ name: "furnace", value: 0.641, distribution: "standard", sensitivity: 1 / C_X, dof: 50 }, 0.641, 24.65],
  [{ name: "reference point", value: 0.1, distribution: "rectangular", sensitivity: -1 / C_X0 }, 0.058, 1.48],
];
