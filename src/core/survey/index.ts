/** Surveys of furnaces, ovens, chambers and sterilisers: soak, uniformity, lethality. */
export type { SurveyLog } from "./block";
export { type Envelope, envelope } from "./envelope";
export { furnaceClass } from "./furnace-class";
export { type FurnaceClass, furnaceClasses } from "./furnace-classes";
export {
  type Lethality,
  type LethalityMethod,
  type LethalityOf,
  type LethalitySettings,
  lethality,
} from "./lethality";
export { ACTIVATION_ENERGY, type MeanKinetic, meanKinetic } from "./mean-kinetic";
export { type SensorRow, surveyTable } from "./sensor-table";
export { type Soak, soak } from "./soak";
export { type SurveySummary, surveySummary } from "./summary";
export { type Survey, type SurveyQuestion, survey } from "./survey";
export { systemCheck } from "./system-check";
export { timeAbove } from "./time-above";
export type { Tolerance } from "./tolerance-band";
export { REQUIRED_MINUTES, type SurveyVerdict } from "./verdict";
