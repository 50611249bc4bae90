import { classMet, classStandards, noAnswer, Refusal, wrongKind } from "../../core";
import { gappedColumn, once, orElse, unit as unitOption } from "../arguments";
import { choice } from "../kinds/kind";
import { designationOf, sensor } from "../kinds/sensor";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { wordResult } from "../results";
import { whole } from "../whole";

/**
 * The tightest tolerance class that covers every temperature of a calibration and whose limits no error exceeds.
 * @customfunction CLASSMET
 * @category Judge
 * @param temperatures True temperatures of the points, in a row or column. Points that are blank here and in the errors are passed over.
 * @param errors Error (reading less true temperature) at each point.
 * @param type Thermocouple type: B C E J K N R S T A; or Pt for a platinum resistance sensor.
 * @param [standard] IEC (default) or ASTM.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns 1, 2 or 3; standard or special; for Pt AA, A, B or C; none when no class is met.
 * @definition Tightest by its limits at these points, not by its number: class 2 of type B is tighter than class 3. The uncertainty of the errors is not considered.
 * @definition An empty cell of a range reaches an add-in as 0: wrap both ranges, IF(ISBLANK(A2:A9),"",A2:A9).
 * @standard IEC 60584-1:2013; ASTM E230/E230M; IEC 60751:2008
 * @keywords class 1, class 2, special, grade, classify, sort
 * @related TOLERANCE, CHECKTABLE, VERDICT
 * @caution A class is a promise for the whole of its range; a few points are evidence for themselves only, and for new wire.
 * @example =BEAD.CLASSMET({100;400;900},{1.5;1.6;-3.6},"K") → 1
 * @example =BEAD.CLASSMET({100;400;900},{1.6;1.6;-3.6},"K","ASTM") → "standard"
 */
export function CLASSMET(
  temperatures: unknown[][],
  errors: unknown[][],
  type: unknown[][],
  standard?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return classmet({ temperatures, errors, type, standard, unit });
}

type Gapped = readonly (number | undefined)[];

/** The points that have both a temperature and an error; a point that has only one is refused. */
function points(temperatures: Gapped, errors: Gapped) {
  if (temperatures.length !== errors.length)
    return wrongKind`temperatures and errors differ in number, ${temperatures.length} and ${errors.length}`;
  const found: { t: number; error: number }[] = [];
  for (const [i, t] of temperatures.entries()) {
    const error = errors[i];
    if (t === undefined && error === undefined) continue;
    if (t === undefined) return noAnswer`point ${i + 1}: temperature missing`;
    if (error === undefined) return noAnswer`point ${i + 1}: error missing`;
    found.push({ t, error });
  }
  return found;
}

const classmet = whole(CLASSMET, {
  arguments: {
    temperatures: gappedColumn(temperature),
    errors: gappedColumn(temperatureDifference),
    type: once(sensor),
    standard: orElse(once(choice(classStandards)), "IEC", "IEC"),
    unit: unitOption,
  },
  result: wordResult,
  cells({ temperatures, errors, type, standard }) {
    const given = points(temperatures, errors);
    if (given instanceof Refusal) return given;
    const met = classMet(
      given.map(({ t }) => t),
      given.map(({ error }) => error),
      designationOf(type),
      standard,
    );
    if (met instanceof Refusal) return met;
    // As people type it: a number where the class has one.
    return [[/^\d$/.test(met) ? Number(met) : met]];
  },
});
