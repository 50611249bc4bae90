/**
 * What a row of each function may cost, in evaluations of a reference function: about twice what it was measured to
 * cost. A family's functions share a limit; what costs more by its nature is named.
 */
import type { CatalogueFunction } from "../../src/catalogue/catalogue";

const PER_ROW: Readonly<Record<string, number>> = {
  Convert: 25,
  Compensate: 30,
  Correct: 40,
  Judge: 35,
  Weigh: 35,
  Screen: 50,
  Survey: 35,
};

const DEARER: Readonly<Record<string, number>> = {
  // A certificate of so many points is read, put in order and judged whole before the first reading.
  CORRECTION: 80,
  CORRECTED: 100,
  CORRECTIONU: 70,
  // In twice the working precision, point by point.
  CALFIT: 200,
  // A row of the result has a dozen cells.
  CALDRIFT: 150,
  CHECKTABLE: 90,
  // A quantile of Student's distribution in every row.
  COVERAGE: 150,
  // A line is a record of six fields, each of a kind of its own.
  BUDGET: 200,
  // Rounded as decimal text.
  REPORTVALUE: 150,
  // A fit of the whole rest of the record at each of a hundred places.
  TIMECONSTANT: 1500,
};

/** The whole call, where single cells are all that a function takes. */
const ONE_CALL: Readonly<Record<string, number>> = {
  EMFTABLE: 250,
  TYPEINFO: 100,
  DIAGNOSE: 2000,
  STATEMENT: 300,
  // Of 100 000 trials.
  SIMULATEU: 1_200_000,
  WORKING: 300,
  PROVENANCE: 50,
};

/** Nothing is allowed to a function that nobody gave a limit. */
export const limitOf = ({ id, category }: CatalogueFunction, grows: boolean): number =>
  (grows ? (DEARER[id] ?? PER_ROW[category]) : ONE_CALL[id]) ?? 0;

/**
 * A row among a million, to a row among a thousand. What leaves the processor's caches, and a result that must be
 * collected, makes linear work 2 to 5 times as dear; work that grows with the square of the rows, 1000 times.
 */
export const GROWTH = 12;
