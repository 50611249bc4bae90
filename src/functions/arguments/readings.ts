/** A block of logged readings, a column per sensor, in which one bad cell spoils one cell. */
import { noAnswer, Refusal, type TemperatureUnit } from "../../core";
import { type CellError, readCell } from "../cell";
import type { NumberKind } from "../kinds/kind";
import { columnsOf, type Matrix } from "../matrix";
import type { Argument } from "./argument";

/** No thermometer reads so much, and squares of it would leave the range of numbers. */
const BEYOND_ANY_READING = 1e100;

const isReading = (cell: unknown): cell is number =>
  typeof cell === "number" && Math.abs(cell) < BEYOND_ANY_READING;

export class Readings {
  constructor(
    /** In core units, one column per sensor; NaN where a reading is missing. */
    readonly columns: readonly Float64Array[],
    readonly label: string,
    private readonly cells: Matrix,
    private readonly kind: NumberKind,
    private readonly unit: TemperatureUnit,
  ) {}

  get rows(): number {
    return this.cells.length;
  }

  private cell(row: number, column: number): unknown {
    return (this.cells[row] as readonly unknown[])[column];
  }

  /** Whether a row holds a reading that cannot be an empty cell: those are 0 on the desktop. */
  isRead(row: number): boolean {
    return this.columns.some((column, at) => !Number.isNaN(column[row]) && this.cell(row, at) !== 0);
  }

  /** What stands in the result of a cell that is no reading; undefined when it is one. */
  fault(row: number, column: number): "" | CellError | Refusal | undefined {
    const reading = readCell(this.cell(row, column));
    if (reading.kind === "blank") return "";
    if (reading.kind === "error") return reading.error;
    const read = this.kind.read(reading.value, this.label, this.unit);
    if (read instanceof Refusal) return read;
    const { value } = reading;
    return isReading(value) ? undefined : noAnswer`${this.label}: ${String(value)} is no reading`;
  }
}

/** A rectangle of readings; blank, text, boolean and error cells are missing readings. */
export const readings = (kind: NumberKind): Argument<Readings, "block", false> => ({
  shape: "block",
  kind,
  optional: false,
  read(given, label, unit) {
    const { zero, factor } = kind.scale(unit);
    const columns = Array.from({ length: columnsOf(given) }, () => new Float64Array(given.length));
    for (let row = 0; row < given.length; row++) {
      const cells = given[row] as readonly unknown[];
      for (let column = 0; column < columns.length; column++) {
        const cell = cells[column];
        (columns[column] as Float64Array)[row] = isReading(cell) ? (cell - zero) * factor : Number.NaN;
      }
    }
    return new Readings(columns, label, given, kind, unit);
  },
});
