/** The readings of a lot of couples, and what a check makes of them where cells are bad. */
import { type CheckRow, noAnswer, type Refusal, wrongKind } from "../../core";
import type { Readings } from "../arguments";
import type { Entry } from "../whole";
import type { Points } from "./points";

/** A worksheet has no more rows than this, header included. */
const MOST_ROWS = 1_048_575;

/** A column per couple; a row per couple where the reference temperatures lie in a row. */
export class Lot {
  private constructor(
    readonly couples: readonly Float64Array[],
    private readonly readings: Readings,
    private readonly across: boolean,
  ) {}

  static of(readings: Readings, { across, values }: Points): Lot | Refusal {
    const { columns, rows } = readings;
    const count = rows * columns.length;
    if (count > MOST_ROWS) return noAnswer`table of ${String(count)} rows is longer than a worksheet`;
    if (!across) return new Lot(columns, readings, false);
    if (columns.length !== values.length)
      return wrongKind`columns of readings: ${columns.length} for ${values.length} reference temperatures in a row`;
    const couples = Array.from({ length: rows }, (_, row) =>
      Float64Array.from(columns, (column) => column[row] as number),
    );
    return new Lot(couples, readings, true);
  }

  /** "" where no reading was taken, what is wrong with its cell, or undefined where all is well. */
  fault(couple: number, point: number): Entry | undefined {
    if (!Number.isNaN(this.couples[couple]?.[point])) return undefined;
    return this.across ? this.readings.fault(couple, point) : this.readings.fault(point, couple);
  }
}

export interface GivenPoints {
  readonly reference: Points;
  readonly limits: Points | undefined;
  readonly uncertainty: Points | undefined;
}

type ShownRow = Readonly<Record<keyof CheckRow, Entry>>;

/** A row of the core's table with each bad cell's own fault in place of what the core made of a missing number. */
export function withFaults(
  row: CheckRow,
  couple: string | number,
  reading: Entry | undefined,
  point: number,
  given: GivenPoints,
): ShownRow {
  const reference = given.reference.fault(point, "blank");
  const notTaken = reading === "";
  const badReading = notTaken ? undefined : reading;
  const badReference = notTaken || reference === "" ? undefined : reference;
  const badLimit = given.limits?.fault(point, notTaken ? "blank" : "missing");
  const unmeasured = badReading ?? badReference;
  const unjudged = unmeasured ?? (typeof row.error === "number" ? badLimit : undefined);
  const badUncertainty =
    unjudged === undefined && typeof row.used === "number" ? given.uncertainty?.fault(point) : undefined;
  return {
    couple,
    reference: reference ?? row.reference,
    reading: badReading ?? row.reading,
    error: unmeasured ?? row.error,
    limit: badLimit ?? badReference ?? row.limit,
    used: unjudged ?? row.used,
    verdict: unjudged ?? badUncertainty ?? row.verdict,
  };
}
