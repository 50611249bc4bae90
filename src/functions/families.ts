/** The families by which the functions are grouped everywhere: the job, in a sentence. */
export interface Family {
  readonly name: string;
  readonly sentence: string;
}

export const families: readonly Family[] = [
  { name: "Convert", sentence: "EMF to temperature and back, by the published reference functions." },
  {
    name: "Compensate",
    sentence:
      "The reference junction measured by another sensor, a wrong setting, a crossed or wrong pair: put right.",
  },
  { name: "Correct", sentence: "Calibration certificates, deviation functions and drift." },
  { name: "Judge", sentence: "Tolerance classes, decision rules, and what may be stated of conformity." },
  { name: "Weigh", sentence: "Uncertainty by the GUM: evaluate, combine, expand, simulate, report." },
  {
    name: "Screen",
    sentence: "A raw log put in order, its bad readings named, rates and sensor lag worked out.",
  },
  {
    name: "Survey",
    sentence: "Soak, uniformity and lethality from the log of a furnace, oven, chamber or steriliser.",
  },
  { name: "Record", sentence: "What stands behind a calculated cell." },
];
