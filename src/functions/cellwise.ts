/**
 * Functions that work cell by cell: ranges broadcast as native array formulas do, and
 * a bad cell spoils its own result only (rules 1–6 of the contract).
 *
 * Where only numbers vary, a block of rows goes through the core's column routine at
 * once, and each cell that comes out as NaN (a blank, a text, an EMF out of range) is
 * then worked out by itself. Both ways give the same bits.
 */
import { Refusal, type TemperatureUnit } from "../core";
import {
  type Argument,
  type Arguments,
  type Given,
  inWords,
  isLeftOut,
  readOnce,
  unitOfCall,
  type Values,
} from "./arguments";
import { type CellError, error, type Reading, readCell } from "./cell";
import { declare, type WorksheetFunction } from "./declaration";
import { failure } from "./failure";
import { isNumberKind, type Scale } from "./kinds/kind";
import { asMatrix, cellAt, columnsOf, type Matrix, OUTSIDE, rowsOf } from "./matrix";
import type { ResultKind } from "./results";

type NumberColumns<A extends Arguments> = {
  readonly [K in keyof A as A[K] extends Argument<number, "each"> ? K : never]: Float64Array;
};

export interface Cellwise<A extends Arguments> {
  readonly arguments: A;
  readonly result: ResultKind;
  /** The result of one cell, in core units. */
  cell(values: Values<A>): number | string | Refusal;
  /**
   * The same for `count` cells in which only numbers vary: writes each result, NaN where
   * `cell` would refuse, over the column that it returns.
   */
  column?(values: Values<A>, columns: NumberColumns<A>, count: number): Float64Array;
}

/** Rows that go through a column routine at a time: few enough to stay in the processor's cache. */
const BLOCK = 2048;

/** No spreadsheet takes more cells than this from one formula; refusing beats running out of memory. */
const MOST_CELLS = 20_000_000;

type Cell = number | string | CellError;

/** An argument that came as a cell or a range. */
interface Ranged {
  readonly name: string;
  readonly argument: Argument<unknown>;
  readonly matrix: Matrix;
  /** For numbers: from the sheet to core units. */
  readonly scale: Scale | undefined;
  /** The last word that was read and what it meant: a column of types rarely changes. */
  lastRaw: unknown;
  lastValue: unknown;
}

export function cellwise<const A extends Arguments>(
  worksheetFunction: WorksheetFunction,
  spec: Cellwise<A>,
): (given: Given<A>) => Cell[][] {
  declare(worksheetFunction, spec);
  return (given) => new Call(spec, given as Readonly<Record<string, unknown>>).result();
}

/** One call of a cellwise function. */
class Call<A extends Arguments> {
  private readonly unit: TemperatureUnit;
  private readonly fault: CellError | undefined;
  /** The arguments that came as cells or ranges, in declared order. */
  private readonly ranged: Ranged[] = [];
  /** What `cell` sees: filled anew for each cell, allocated once. */
  private readonly values: Record<string, unknown> = {};
  private readonly rows: number = 0;
  private readonly columns: number = 0;

  constructor(
    private readonly spec: Cellwise<A>,
    given: Readonly<Record<string, unknown>>,
  ) {
    const unit = unitOfCall(spec.arguments, given);
    this.unit = unit as TemperatureUnit;
    if (unit instanceof CustomFunctions.Error) {
      this.fault = unit;
      return;
    }
    for (const [name, argument] of Object.entries(spec.arguments)) {
      const fault = this.take(name, argument, given[name]);
      if (fault !== undefined) {
        this.fault = fault;
        return;
      }
    }
    this.rows = Math.max(...this.ranged.map(({ matrix }) => rowsOf(matrix)));
    this.columns = Math.max(...this.ranged.map(({ matrix }) => columnsOf(matrix)));
    if (this.rows * this.columns > MOST_CELLS) {
      this.fault = error("#VALUE!", `a result of ${this.rows} × ${this.columns} cells is too large`);
    }
  }

  result(): Cell[][] {
    if (this.fault !== undefined) return [[this.fault]];
    if (this.spec.column !== undefined && this.onlyNumbersVary()) return this.byColumns();
    const result: Cell[][] = [];
    for (let row = 0; row < this.rows; row++) {
      const cells: Cell[] = [];
      for (let column = 0; column < this.columns; column++) cells.push(this.cell(row, column));
      result.push(cells);
    }
    return result;
  }

  private take(name: string, argument: Argument<unknown>, given: unknown): CellError | undefined {
    if (argument.shape === "each" && !isLeftOut(given)) {
      const matrix = asMatrix(given);
      if (rowsOf(matrix) === 0 || columnsOf(matrix) === 0)
        return error("#VALUE!", `${inWords(name)}: the range is empty`);
      const scale = isNumberKind(argument.kind) ? argument.kind.scale(this.unit) : undefined;
      this.ranged.push({ name, argument, matrix, scale, lastRaw: undefined, lastValue: undefined });
      return undefined;
    }
    const value = readOnce(name, argument, given, this.unit);
    if (value instanceof CustomFunctions.Error) return value;
    this.values[name] = value;
    return undefined;
  }

  /** One cell; the good one is tested first, whatever else is left to `careful`. */
  private cell(row: number, column: number): Cell {
    const { values } = this;
    for (const ranged of this.ranged) {
      const raw = cellAt(ranged.matrix, row, column);
      if (typeof raw === "number" && ranged.scale !== undefined && Number.isFinite(raw)) {
        values[ranged.name] = (raw - ranged.scale.zero) * ranged.scale.factor;
      } else if (raw === ranged.lastRaw && typeof raw === "string") {
        values[ranged.name] = ranged.lastValue;
      } else {
        return this.careful(row, column);
      }
    }
    return this.answer();
  }

  private careful(row: number, column: number): Cell {
    const readings: Reading[] = [];
    for (const { matrix } of this.ranged) {
      const raw = cellAt(matrix, row, column);
      if (raw === OUTSIDE) return error("#N/A", "no value here: the ranges differ in size");
      readings.push(readCell(raw));
    }
    for (const reading of readings) if (reading.kind === "error") return reading.error;
    // A blank reading gives a blank result; a blank beside a reading is something missing.
    if (readings[0]?.kind === "blank") return "";
    for (const [index, ranged] of this.ranged.entries()) {
      const reading = readings[index] as Reading;
      if (reading.kind !== "present") return error("#N/A", `${inWords(ranged.name)} missing`);
      const value = ranged.argument.kind.read(reading.value, inWords(ranged.name), this.unit);
      if (value instanceof Refusal) return failure(value, this.unit);
      if (ranged.scale === undefined) {
        ranged.lastRaw = reading.value;
        ranged.lastValue = value;
      }
      this.values[ranged.name] = value;
    }
    return this.answer();
  }

  private answer(): Cell {
    const result = this.spec.cell(this.values as Values<A>);
    if (result instanceof Refusal) return failure(result, this.unit);
    return typeof result === "number" ? this.spec.result.write(result, this.unit) : result;
  }

  /** For the column routine: every argument that is not a number is one good cell for the whole call. */
  private onlyNumbersVary(): boolean {
    for (const { name, argument, matrix, scale } of this.ranged) {
      if (scale !== undefined) continue;
      if (rowsOf(matrix) !== 1 || columnsOf(matrix) !== 1) return false;
      const reading = readCell(cellAt(matrix, 0, 0));
      if (reading.kind !== "present") return false;
      const value = argument.kind.read(reading.value, inWords(name), this.unit);
      if (value instanceof Refusal) return false;
      this.values[name] = value;
    }
    return true;
  }

  private byColumns(): Cell[][] {
    const fixed = { ...this.values } as Values<A>;
    const buffers: Record<string, Float64Array> = {};
    for (const [name, argument] of Object.entries(this.spec.arguments)) {
      if (argument.shape === "each" && isNumberKind(argument.kind)) {
        buffers[name] = new Float64Array(BLOCK).fill(Number(this.values[name]));
      }
    }
    const result: Cell[][] = new Array(this.rows);
    for (let top = 0; top < this.rows; top += BLOCK) {
      const count = Math.min(BLOCK, this.rows - top);
      for (let column = 0; column < this.columns; column++) {
        for (const { name, matrix, scale } of this.ranged) {
          if (scale !== undefined) fill(buffers[name] as Float64Array, matrix, top, count, column, scale);
        }
        const answers = this.spec.column?.(fixed, buffers as NumberColumns<A>, count) as Float64Array;
        this.writeColumn(result, answers, top, count, column);
      }
    }
    return result;
  }

  private writeColumn(
    result: Cell[][],
    answers: Float64Array,
    top: number,
    count: number,
    column: number,
  ): void {
    const { write } = this.spec.result;
    const inSheetUnits = write(0, this.unit) === 0 && write(1, this.unit) === 1;
    if (!inSheetUnits) for (let i = 0; i < count; i++) answers[i] = write(answers[i] as number, this.unit);
    if (column === 0) {
      // A row of one number is an array of numbers to the engine that runs this: half the memory.
      for (let i = 0; i < count; i++) {
        const answer = answers[i] as number;
        result[top + i] = Number.isNaN(answer) ? [this.cell(top + i, 0)] : [answer];
      }
      return;
    }
    for (let i = 0; i < count; i++) {
      const answer = answers[i] as number;
      (result[top + i] as Cell[]).push(Number.isNaN(answer) ? this.cell(top + i, column) : answer);
    }
  }
}

/** Copies numbers into the block, scaled to core units; whatever is not a number becomes NaN. */
function fill(
  buffer: Float64Array,
  matrix: Matrix,
  top: number,
  count: number,
  column: number,
  { zero, factor }: Scale,
): void {
  const at = columnsOf(matrix) === 1 ? 0 : column;
  if (rowsOf(matrix) === 1) {
    const cell = matrix[0]?.[at];
    buffer.fill(typeof cell === "number" ? cell : Number.NaN, 0, count);
  } else {
    for (let i = 0; i < count; i++) {
      const cell = matrix[top + i]?.[at];
      buffer[i] = typeof cell === "number" ? cell : Number.NaN;
    }
  }
  if (zero === 0 && factor === 1) return;
  for (let i = 0; i < count; i++) buffer[i] = ((buffer[i] as number) - zero) * factor;
}
