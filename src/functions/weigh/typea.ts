import { noAnswer, Refusal, typeA } from "../../core";
import { ifGiven, once, type Readings, readings as readingsOf } from "../arguments";
import { choice } from "../kinds/kind";
import { number } from "../kinds/numbers";
import { numberResult } from "../results";
import { metrics } from "../whole";

/**
 * Repeated readings of one quantity: mean, standard deviation, standard uncertainty of the mean and degrees of freedom.
 * @customfunction TYPEA
 * @category Weigh
 * @param readings The readings, any range. Blank and error cells are missing readings; a text is refused.
 * @param [metric] One value: mean, sd, u or dof.
 * @returns Rows of metric and value, or the one value asked for, in the unit of the readings.
 * @equation mean = Σx/n; sd = √(Σ(x − mean)²/(n − 1)); u = sd/√n
 * @definition dof: n − 1, which tells how many readings were counted.
 * @definition An empty cell of a range reaches an add-in as 0: wrap the range, IF(ISBLANK(A2:A21),"",A2:A21).
 * @assumes Readings that are independent of each other; those of a fast logger often are not.
 * @standard JCGM 100:2008, 4.2
 * @keywords repeatability, standard deviation, mean, average, repeated readings, type A
 * @related BUDGET, STANDARDU, COVERAGE
 * @example =BEAD.TYPEA({9;10;11},"u") → 0.577
 * @example =BEAD.TYPEA({9;10;11}) → {"metric","value";"mean",10;"sd",1;"u",0.577;"dof",2}
 */
export function TYPEA(readings: unknown[][], metric?: unknown[][]): unknown[][] {
  return typea({ readings, metric });
}

const typea = metrics(TYPEA, {
  arguments: {
    readings: readingsOf(number),
    metric: ifGiven(once(choice(["mean", "sd", "u", "dof"]))),
  },
  result: { mean: numberResult, sd: numberResult, u: numberResult, dof: numberResult },
  metrics({ readings }) {
    const taken = readingsTaken(readings);
    return taken instanceof Refusal ? taken : typeA(taken);
  },
});

/** All readings of the range. What is a text or no reading at all was meant to be one, and is not dropped. */
function readingsTaken(readings: Readings): Float64Array | Refusal {
  const { columns, rows } = readings;
  const taken = new Float64Array(rows * columns.length);
  let count = 0;
  for (const [at, column] of columns.entries()) {
    for (let row = 0; row < rows; row++) {
      const value = column[row] as number;
      if (!Number.isNaN(value)) {
        taken[count++] = value;
        continue;
      }
      const fault = readings.fault(row, at);
      if (fault instanceof Refusal)
        return columns.length === 1
          ? fault.and` (row ${row + 1})`
          : fault.and` (row ${row + 1}, column ${at + 1})`;
    }
  }
  return count === 0 ? noAnswer`no readings` : taken.subarray(0, count);
}
