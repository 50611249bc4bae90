/** Functions that work down each column of a block of readings and give back a block of the same shape. */
import { noAnswer, Refusal } from "../core";
import type { Arguments, Readings, Values } from "./arguments";
import type { Declaration, WorksheetFunction } from "./declaration";
import type { ResultKind } from "./results";
import { type Entry, whole, written } from "./whole";

/** One answer per reading, NaN where there is none; a log may end above the block's last row. */
type Answers = Float64Array | readonly string[];

interface Columnwise<A extends Arguments> extends Declaration {
  readonly arguments: A;
  readonly result: ResultKind;
  /** The block that the answers stand for. */
  block(values: Values<A>): Readings;
  /** One column of answers per column of the block. */
  answers(values: Values<A>): readonly (Answers | Refusal)[] | Refusal;
  /** Why a good reading may have no answer. */
  readonly unanswered?: Refusal;
}

const timeMissing = noAnswer`time missing`;

export function columnwise<const A extends Arguments>(
  worksheetFunction: WorksheetFunction,
  spec: Columnwise<A>,
) {
  return whole(worksheetFunction, {
    arguments: spec.arguments,
    result: spec.result,
    cells(values, unit) {
      const block = spec.block(values);
      const columns = spec.answers(values);
      if (columns instanceof Refusal) return columns;
      const refused = columns.find((column) => column instanceof Refusal);
      if (refused instanceof Refusal) return refused;
      const rows: Entry[][] = [];
      for (let row = 0; row < block.rows; row++) {
        const cells: Entry[] = [];
        for (let column = 0; column < columns.length; column++) {
          const answer = (columns[column] as Answers)[row];
          if (answer === undefined || Number.isNaN(answer)) {
            const why = answer === undefined ? timeMissing : (spec.unanswered ?? timeMissing);
            cells.push(block.fault(row, column) ?? why);
          } else cells.push(written(answer, spec.result, unit));
        }
        rows.push(cells);
      }
      return rows;
    },
  });
}
