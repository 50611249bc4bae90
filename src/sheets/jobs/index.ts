import { correctALog } from "./correct-a-log";
import type { Job } from "./job";
import { surveySummary } from "./survey-summary";
import { toleranceCheck } from "./tolerance-check";
import { uncertaintyBudget } from "./uncertainty-budget";

export type { Job };

/** The sheets that the pane starts, in the order of the work. */
export const JOBS: readonly Job[] = [correctALog, toleranceCheck, uncertaintyBudget, surveySummary];
