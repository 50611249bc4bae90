/** One call of a cellwise function: its arguments, and the result of any one cell. */
import { Refusal, type TemperatureUnit } from "../../core";
import {
  type Argument,
  type Arguments,
  inWords,
  isLeftOut,
  readGiven,
  unitOfCall,
  type Values,
} from "../arguments";
import { type CellError, error, type Reading, readCell } from "../cell";
import { failure } from "../failure";
import { isNumberKind, type Scale } from "../kinds/kind";
import { asMatrix, cellAt, columnsOf, type Matrix, OUTSIDE, rowsOf } from "../matrix";
import type { ResultKind } from "../results";
import type { CallValues, Cellwise } from "./spec";

/** No spreadsheet takes more cells than this from one formula; refusing beats running out of memory. */
const MOST_CELLS = 20_000_000;

export type Cell = number | string | CellError;

/** An argument that came as a cell or a range. */
interface Ranged {
  readonly name: string;
  readonly label: string;
  readonly argument: Argument<unknown>;
  readonly matrix: Matrix;
  /** For numbers: from the sheet to core units. */
  readonly scale: Scale | undefined;
  /** The last word that was read, whose meaning `values` still holds: a column of types or classes rarely changes. */
  lastRead: unknown;
}

export class Call<A extends Arguments, P> {
  readonly unit: TemperatureUnit;
  /** What is wrong with the call as a whole. */
  readonly fault: CellError | undefined;
  /** The arguments that came as cells or ranges, in declared order. */
  readonly ranged: Ranged[] = [];
  /** What `cell` sees: filled anew for each cell, allocated once. */
  readonly values: Record<string, unknown> = {};
  readonly rows: number = 0;
  readonly columns: number = 0;
  /** How the numbers of this call are written. */
  readonly result: ResultKind;
  private readonly prepared: P | undefined;
  private readonly place = { row: 0, column: 0 };

  constructor(
    private readonly spec: Cellwise<A, P>,
    given: Readonly<Record<string, unknown>>,
  ) {
    const unit = unitOfCall(spec.arguments, given);
    this.unit = unit as TemperatureUnit;
    this.result = spec.result;
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
      return;
    }
    const held = this.values as unknown as CallValues<A>;
    if (spec.resultOf !== undefined) this.result = spec.resultOf(held);
    const prepared = spec.prepare?.(held);
    if (prepared instanceof Refusal) this.fault = failure(prepared, this.unit);
    else this.prepared = prepared;
  }

  /** One cell; the good one is tested first, whatever else is left to `careful`. */
  cell(row: number, column: number): Cell {
    const { values } = this;
    for (const ranged of this.ranged) {
      const raw = cellAt(ranged.matrix, row, column);
      if (ranged.scale !== undefined && Number.isFinite(raw)) {
        values[ranged.name] = ((raw as number) - ranged.scale.zero) * ranged.scale.factor;
      } else if (raw === undefined || raw !== ranged.lastRead) {
        return this.careful(row, column);
      }
    }
    return this.answer(row, column);
  }

  private take(name: string, argument: Argument<unknown>, given: unknown): CellError | undefined {
    if (argument.shape === "each" && !isLeftOut(given)) {
      const matrix = asMatrix(given);
      const label = inWords(name);
      if (columnsOf(matrix) === 0) return error("#VALUE!", `${label}: the range is empty`);
      const scale = isNumberKind(argument.kind) ? argument.kind.scale(this.unit) : undefined;
      this.ranged.push({ name, label, argument, matrix, scale, lastRead: undefined });
      return undefined;
    }
    const value = readGiven(name, argument, given, this.unit);
    if (value instanceof CustomFunctions.Error) return value;
    this.values[name] = value;
    return undefined;
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
    if ((readings[0] as Reading).kind === "blank") return "";
    for (const [index, ranged] of this.ranged.entries()) {
      const reading = readings[index] as Reading;
      if (reading.kind !== "present") {
        if (ranged.argument.blankIsNotGiven !== true) return error("#N/A", `${ranged.label} missing`);
        this.values[ranged.name] = undefined;
        ranged.lastRead = undefined;
        continue;
      }
      const value = ranged.argument.kind.read(reading.value, ranged.label, this.unit);
      if (value instanceof Refusal) return failure(value, this.unit);
      this.values[ranged.name] = value;
      ranged.lastRead = reading.value;
    }
    return this.answer(row, column);
  }

  private answer(row: number, column: number): Cell {
    this.place.row = row;
    this.place.column = column;
    const result = this.spec.cell(this.values as Values<A>, this.prepared as P, this.place);
    if (result instanceof Refusal) return failure(result, this.unit);
    return typeof result === "number" ? this.result.write(result, this.unit) : result;
  }
}
