/** One cell for each point of a check, in a row or a column; a bad cell spoils its own point. */
import { noAnswer, type Refusal, wrongKind } from "../../core";
import type { Readings } from "../arguments";
import type { CellError } from "../cell";

export class Points {
  private constructor(
    /** In core units; NaN where a cell is blank or bad. */
    readonly values: Float64Array,
    /** Lies in one row. */
    readonly across: boolean,
    private readonly cells: Readings,
    /** What one of the cells is called. */
    private readonly words: string,
  ) {}

  static of(cells: Readings, words = cells.label): Points | Refusal {
    const { columns, rows, label } = cells;
    const [first] = columns;
    if (first !== undefined && columns.length === 1) return new Points(first, false, cells, words);
    if (rows === 1) {
      const across = Float64Array.from(columns, ([value]) => value as number);
      return new Points(across, true, cells, words);
    }
    return wrongKind`${label}: one row or one column, not ${rows} × ${columns.length}`;
  }

  /** What is wrong with the cell of a point; a single cell stands for all. A blank is something missing, unless nothing was measured. */
  fault(point: number, blankIs: "missing" | "blank" = "missing"): CellError | Refusal | "" | undefined {
    const at = this.values.length === 1 ? 0 : point;
    if (!Number.isNaN(this.values[at])) return undefined;
    const fault = this.across ? this.cells.fault(0, at) : this.cells.fault(at, 0);
    return fault === "" && blankIs === "missing" ? noAnswer`${this.words} missing` : fault;
  }

  /** For the core: one number for all points, or one each. */
  get forCore(): number | Float64Array {
    return this.values.length === 1 ? (this.values[0] as number) : this.values;
  }
}
