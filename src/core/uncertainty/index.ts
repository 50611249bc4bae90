/** Measurement uncertainty by the GUM: evaluate, combine, expand, simulate, report. */
export { type Budget, type BudgetLine, type BudgetRow, budget } from "./budget";
export { combinedUncertainty } from "./combine";
export { coverageFactor, TWO_SIGMA } from "./coverage";
export {
  type Distribution,
  distribution,
  distributions,
  divisorOf,
  standardUncertainty,
} from "./distribution";
export { effectiveDof, INFINITE_DOF } from "./effective-dof";
export { reportValue } from "./report-value";
export { DEFAULT_TRIALS, type Simulation, type SimulationInput, simulateTemperature } from "./simulate";
export { temperatureUncertainty } from "./temperature-uncertainty";
export { type TypeA, typeA } from "./type-a";
