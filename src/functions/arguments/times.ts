/** The time column of a log. */
import { Refusal, wrongKind } from "../../core";
import { readCell } from "../cell";
import { time } from "../kinds/numbers";
import { columnsOf } from "../matrix";
import type { Argument } from "./argument";

export interface Times {
  /** As they stand in the sheet, NaN where blank, up to the last one: blank rows below it are no part of the log. */
  readonly inSheet: Float64Array;
  /** Rows of the range, those below the last time included. */
  readonly rows: number;
}

export const times: Argument<Times, "column", false> = {
  shape: "column",
  kind: time,
  optional: false,
  read(given, label, unit) {
    if (columnsOf(given) !== 1) return wrongKind`${label}: one column, not ${columnsOf(given)}`;
    const inSheet = new Float64Array(given.length);
    let count = 0;
    for (let row = 0; row < given.length; row++) {
      const cell = (given[row] as readonly unknown[])[0];
      if (Number.isFinite(cell)) {
        inSheet[row] = cell as number;
        count = row + 1;
        continue;
      }
      inSheet[row] = Number.NaN;
      const reading = readCell(cell);
      if (reading.kind === "error") return reading.error;
      if (reading.kind === "blank") continue;
      const value = time.read(reading.value, `${label}, row ${row + 1}`, unit);
      if (value instanceof Refusal) return value;
      inSheet[row] = value;
      count = row + 1;
    }
    return { inSheet: inSheet.subarray(0, count), rows: given.length };
  },
};
