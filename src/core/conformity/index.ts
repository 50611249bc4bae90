/** Tolerance and conformity: limits, decision rules and what they say of an error. */
export { acceptanceLimit } from "./acceptance";
export { cableDesignations, cableToleranceDegrees, cableToleranceUv } from "./cable-tolerance";
export { cableClassNames } from "./cables/cable-table";
export { type Check, type CheckRow, checkTable } from "./check-table";
export { type ClassStandard, classMet, classStandards } from "./class-met";
export { conformityProbability, largestPassRisk } from "./conformity-probability";
export { type DecisionRule, decisionRule, guardedAcceptance, simpleAcceptance } from "./decision-rule";
export { enScore } from "./en-score";
export type { LowerLimit } from "./limits";
export { type Statement, statement } from "./statement";
export { tolerance, toleranceClass, toleranceClassesOf, toleranceUv } from "./tolerance";
export { ToleranceClass } from "./tolerance-class";
export { type ToleranceClassName, toleranceClassNames } from "./tolerance-table";
export { type Verdict, verdict } from "./verdict";
