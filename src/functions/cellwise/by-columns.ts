/**
 * The quick way for long columns. Where only numbers vary, a block of rows goes through
 * the core's column routine at once, and each cell that comes out as NaN (a blank, a
 * text, an EMF out of range) is then worked out by itself. Both ways give the same bits.
 */
import { Refusal } from "../../core";
import type { Arguments, Values } from "../arguments";
import { readCell } from "../cell";
import { isNumberKind, type Scale } from "../kinds/kind";
import { cellAt, columnsOf, type Matrix, rowsOf } from "../matrix";
import type { Call, Cell } from "./call";
import type { Cellwise, NumberColumns } from "./spec";

/** Rows that go through a column routine at a time: few enough to stay in the processor's cache. */
const BLOCK = 2048;

/** Every argument that is not a number is one good cell for the whole call. Leaves its value in `call.values`. */
export function onlyNumbersVary<A extends Arguments, P>(call: Call<A, P>): boolean {
  for (const { name, label, argument, matrix, scale } of call.ranged) {
    if (scale !== undefined) continue;
    if (rowsOf(matrix) !== 1 || columnsOf(matrix) !== 1) return false;
    const reading = readCell(cellAt(matrix, 0, 0));
    if (reading.kind !== "present") return false;
    const value = argument.kind.read(reading.value, label, call.unit);
    if (value instanceof Refusal) return false;
    call.values[name] = value;
  }
  return true;
}

export function byColumns<A extends Arguments, P>(
  call: Call<A, P>,
  spec: Cellwise<A, P>,
  routine: NonNullable<Cellwise<A>["column"]>,
): Cell[][] {
  const fixed = { ...call.values } as Values<A>;
  const buffers: Record<string, Float64Array> = {};
  for (const [name, argument] of Object.entries(spec.arguments)) {
    if (argument.shape === "each" && isNumberKind(argument.kind)) {
      // What was left out stays as it is filled here; ranges are copied over it.
      buffers[name] = new Float64Array(BLOCK).fill(Number(call.values[name]));
    }
  }
  const answers = new Float64Array(BLOCK);
  // Made in full at once: a million rows that grow one by one cost a tenth more time.
  const result: Cell[][] = new Array(call.rows);
  for (let top = 0; top < call.rows; top += BLOCK) {
    const count = Math.min(BLOCK, call.rows - top);
    for (let column = 0; column < call.columns; column++) {
      for (const { name, matrix, scale } of call.ranged) {
        if (scale !== undefined) fill(buffers[name] as Float64Array, matrix, top, count, column, scale);
      }
      routine(fixed, buffers as NumberColumns<A>, answers, count);
      write(result, answers, call, top, count, column);
    }
  }
  return result;
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
    const cell = (matrix[0] as readonly unknown[])[at];
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

function write<A extends Arguments, P>(
  result: Cell[][],
  answers: Float64Array,
  call: Call<A, P>,
  top: number,
  count: number,
  column: number,
): void {
  const inSheetUnits = call.result.write(0, call.unit) === 0 && call.result.write(1, call.unit) === 1;
  if (!inSheetUnits) {
    for (let i = 0; i < count; i++) answers[i] = call.result.write(answers[i] as number, call.unit);
  }
  if (column === 0) {
    // A row of one number is an array of numbers to the engine that runs this: half the memory.
    for (let i = 0; i < count; i++) {
      const answer = answers[i] as number;
      result[top + i] = Number.isNaN(answer) ? [call.cell(top + i, 0)] : [answer];
    }
    return;
  }
  for (let i = 0; i < count; i++) {
    const answer = answers[i] as number;
    (result[top + i] as Cell[]).push(Number.isNaN(answer) ? call.cell(top + i, column) : answer);
  }
}
