import type { SheetPlan } from "../plan";

/** A sheet ready for one job, with example data that goes by one button. */
export interface Job {
  readonly name: string;
  /** What it does, for the one who chooses. */
  readonly sentence: string;
  readonly sheet: SheetPlan;
  /** The ranges that hold example data and the line that says so. */
  readonly examples: readonly string[];
}

/** Stands in A2 of each sheet until the examples are removed. */
export const EXAMPLE_LINE =
  "EXAMPLE DATA, invented, in the cells with slate text. Remove it with the button in the pane, then put in your own.";
