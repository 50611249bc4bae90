/** The clerk's table: every couple of a lot at every point, against its limit. */
import { degreesApart, noAnswer, type Refusal, wrongKind } from "../errors";
import { finite } from "../numeric/finite";
import { refusedUnlessPositive } from "../numeric/positive";
import type { DecisionRule } from "./decision-rule";
import { ToleranceClass } from "./tolerance-class";
import { type Verdict, verdict } from "./verdict";

export interface Check {
  /** Reference temperatures in °C, one a point; NaN where one is missing. */
  readonly references: ArrayLike<number>;
  /** A column per couple, in °C, one reading a point; NaN where none was taken. */
  readonly readings: readonly ArrayLike<number>[];
  /** Where the limits come from: a tolerance class, one ± limit in °C for all points, or one a point. */
  readonly limits: ToleranceClass | number | ArrayLike<number>;
  /** Expanded uncertainty in °C, for all points or one a point. */
  readonly uncertainty?: number | ArrayLike<number>;
  readonly rule?: DecisionRule;
  /** One a couple; 1, 2, 3 … when left out. */
  readonly names?: readonly string[];
}

/** "" where nothing was given, a refusal where no valid answer exists. */
export interface CheckRow {
  readonly couple: string;
  /** °C */
  readonly reference: number | "";
  readonly reading: number | "";
  /** Reading − reference, °C. */
  readonly error: number | "" | Refusal;
  /** ± °C */
  readonly limit: number | "" | Refusal;
  /** |error| / limit */
  readonly used: number | "" | Refusal;
  readonly verdict: Verdict | "" | Refusal;
}

/**
 * One row a reading, couple after couple. A reference temperature outside the class spoils its
 * own rows only. Refused as a whole: columns of different lengths (wrong kind), and no points.
 */
export function checkTable(check: Check): CheckRow[] | Refusal {
  const refused = misshapen(check);
  if (refused !== undefined) return refused;
  const rows: CheckRow[] = [];
  for (const [couple, column] of check.readings.entries()) {
    for (let point = 0; point < column.length; point++) rows.push(checkRow(check, column, couple, point));
  }
  return rows;
}

function misshapen({ references, readings, limits, uncertainty, names }: Check): Refusal | undefined {
  const points = references.length;
  if (points === 0 || readings.length === 0) return noAnswer`no readings to check`;
  for (const column of readings) {
    if (column.length !== points) {
      return wrongKind`rows of readings: ${column.length} for ${points} reference temperatures`;
    }
  }
  if (!(limits instanceof ToleranceClass) && typeof limits !== "number" && limits.length !== points) {
    return wrongKind`limits: ${limits.length} for ${points} reference temperatures`;
  }
  if (typeof uncertainty === "object" && uncertainty.length !== points) {
    return wrongKind`expanded uncertainties: ${uncertainty.length} for ${points} reference temperatures`;
  }
  if (names !== undefined && names.length !== readings.length) {
    return wrongKind`names: ${names.length} for ${readings.length} couples`;
  }
  return undefined;
}

function checkRow(check: Check, column: ArrayLike<number>, couple: number, point: number): CheckRow {
  const { references, limits, uncertainty, names } = check;
  const reference = references[point] as number;
  const reading = column[point] as number;
  const noReading = Number.isNaN(reading);
  const noReference = Number.isNaN(reference);
  const limit = noReference ? unreferenced(noReading) : limitAt(limits, reference, point);
  const error = noReading ? "" : noReference ? unreferenced(false) : finite(reading - reference, "error");
  const judged = typeof error === "number" && typeof limit === "number";
  const u = typeof uncertainty === "object" ? (uncertainty[point] as number) : uncertainty;
  const spoilt = typeof error === "number" ? (limit as "" | Refusal) : error;
  return {
    couple: names?.[couple] ?? String(couple + 1),
    reference: noReference ? "" : reference,
    reading: noReading ? "" : reading,
    error,
    limit,
    used: judged ? finite(Math.abs(error) / limit, "used share") : spoilt,
    verdict: judged ? verdictAt(error, limit, u, check.rule) : spoilt,
  };
}

/** What stands where a reference temperature is missing: nothing, unless there is a reading beside it. */
const unreferenced = (noReading: boolean): "" | Refusal =>
  noReading ? "" : noAnswer`reference temperature missing`;

/** As `verdict`, but an uncertainty is refused in the unit of the call. */
function verdictAt(
  error: number,
  limit: number,
  uncertainty: number | undefined,
  rule: DecisionRule | undefined,
): Verdict | Refusal {
  const refused =
    uncertainty === undefined
      ? undefined
      : refusedUnlessPositive(uncertainty, "expanded uncertainty", degreesApart);
  return refused ?? verdict(error, limit, uncertainty, rule);
}

function limitAt(limits: Check["limits"], reference: number, point: number): number | Refusal {
  if (limits instanceof ToleranceClass) return limits.limit(reference);
  const limit = typeof limits === "object" ? (limits[point] as number) : limits;
  return refusedUnlessPositive(limit, "limit", degreesApart) ?? limit;
}
