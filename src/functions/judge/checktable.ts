import { checkTable, noAnswer, Refusal, toleranceClass as toleranceClassOf, wrongKind } from "../../core";
import {
  gappedColumn,
  ifGiven,
  once,
  onceOrBlank,
  readings as readingsOf,
  unit as unitOption,
} from "../arguments";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { name } from "../kinds/name";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { toleranceClass } from "../kinds/tolerance-class";
import { differenceResult, shareResult, temperatureResult, wordResult } from "../results";
import { table } from "../whole";
import { Lot, withFaults } from "./lot";
import { ruleIfSaid } from "./options";
import { Points } from "./points";

/**
 * The table of a tolerance check: every couple of a lot at every reference temperature, with error, limit, used share
 * of the limit and verdict.
 * @customfunction CHECKTABLE
 * @category Judge
 * @param reference Reference temperatures, in a column (or a row; then the readings have one row per couple).
 * @param readings Readings, one column per couple. A blank cell: not taken. A text or an error spoils its own row only.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param toleranceClass 1, 2 or 3 (IEC 60584-1), standard or special (ASTM E230); "" where limits are given.
 * @param [expandedUncertainty] Expanded uncertainty U of the errors: one cell, or one per reference temperature.
 * @param [rule] simple (default without U), guarded (default with U), conditional; guarded 0.83 and the like for another multiple of U.
 * @param [names] Names of the couples, in a row or column; 1, 2, 3 … when left out.
 * @param [limits] Limits ± in place of the class, as a drawing sets them: one cell, or one per reference temperature.
 * @param [column] One column without its header: couple, reference, reading, error, limit, used or verdict.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of couple, reference, reading, error, limit, used and verdict, couple after couple.
 * @equation error = reading − reference; used = |error| / limit
 * @definition At the limit passes; both are rounded to 1E-9 before they are compared. Rules: see VERDICT.
 * @definition An empty cell of a range reaches an add-in as 0: wrap the readings, IF(ISBLANK(B2:I6),"",B2:I6).
 * @standard IEC 60584-1:2013; ASTM E230/E230M; ILAC-G8:09/2019
 * @keywords tolerance check, batch, lot, incoming inspection, pass fail, calibration table
 * @related TOLERANCE, VERDICT, CLASSMET, STATEMENT
 * @caution A Pass says that these readings lay within their limits when they were taken. It does not release a sensor for an alarm, a trip or another safety duty: that takes the plant's own procedure.
 * @example =BEAD.CHECKTABLE({400;900},{401.2,400.5;903.7,902},"K",1,,,,,"verdict") → {"Pass";"Fail";"Pass";"Pass"}
 */
export function CHECKTABLE(
  reference: unknown[][],
  readings: unknown[][],
  type: unknown[][],
  toleranceClass: unknown[][],
  expandedUncertainty?: unknown[][],
  rule?: unknown[][],
  names?: unknown[][],
  limits?: unknown[][],
  column?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return checktable({
    reference,
    readings,
    type,
    toleranceClass,
    expandedUncertainty,
    rule,
    names,
    limits,
    column,
    unit,
  });
}

const checktable = table(CHECKTABLE, {
  arguments: {
    reference: readingsOf(temperature),
    readings: readingsOf(temperature),
    type: once(couple),
    // A blank class is refused below, unless limits stand in its place.
    toleranceClass: onceOrBlank(toleranceClass),
    expandedUncertainty: ifGiven(readingsOf(temperatureDifference)),
    rule: ruleIfSaid,
    names: ifGiven(gappedColumn(name)),
    limits: ifGiven(readingsOf(temperatureDifference)),
    column: ifGiven(once(choice(["couple", "reference", "reading", "error", "limit", "used", "verdict"]))),
    unit: unitOption,
  },
  result: {
    couple: wordResult,
    reference: temperatureResult,
    reading: temperatureResult,
    error: differenceResult,
    limit: differenceResult,
    used: shareResult,
    verdict: wordResult,
  },
  rows({ type, toleranceClass, rule, names, readings, ...cells }) {
    const reference = Points.of(cells.reference);
    if (reference instanceof Refusal) return reference;
    const lot = Lot.of(readings, reference);
    if (lot instanceof Refusal) return lot;
    const limits = cells.limits && Points.of(cells.limits, "limit");
    if (limits instanceof Refusal) return limits;
    const uncertainty = cells.expandedUncertainty && Points.of(cells.expandedUncertainty);
    if (uncertainty instanceof Refusal) return uncertainty;
    if (rule !== undefined && rule.kind !== "simple" && uncertainty === undefined)
      return noAnswer`rule ${rule.kind} needs the expanded uncertainty`;
    const source = limits === undefined ? classOf(type.designation, toleranceClass) : limits.forCore;
    if (source instanceof Refusal) return source;
    const rows = checkTable({
      references: reference.values,
      readings: lot.couples,
      limits: source,
      ...(uncertainty && { uncertainty: uncertainty.forCore }),
      ...(rule && { rule }),
      ...(names && { names: names.map((one) => String(one ?? "")) }),
    });
    if (rows instanceof Refusal) return rows;
    const given = { reference, limits, uncertainty };
    const points = reference.values.length;
    return rows.map((row, i) => {
      const couple = Math.floor(i / points);
      const point = i % points;
      const shown = names === undefined ? couple + 1 : (names[couple] ?? "");
      return withFaults(row, shown, lot.fault(couple, point), point, given);
    });
  },
});

function classOf(designation: string, className: string | undefined) {
  return className === undefined
    ? wrongKind`tolerance class: the cell is blank, and no limits are given`
    : toleranceClassOf(designation, className);
}
