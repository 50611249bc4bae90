/** Logged records: put in order, screened, and what a sensor's own speed makes of them. */
export { type Despiker, despiker } from "./despike";
export { type Flag, type Flagger, type FlagLimits, flagger } from "./flags";
export { rampRate } from "./ramp-rate";
export { type StepResponse, timeConstant } from "./time-constant";
export { type TimeGrid, timeGrid } from "./time-grid";
export { type Timeline, timeline } from "./timeline";
export { unlag } from "./unlag";
