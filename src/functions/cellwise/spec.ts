/** How a cellwise function is declared. */
import type { Refusal } from "../../core";
import type { Argument, Arguments, Values } from "../arguments";
import type { ResultKind } from "../results";

export interface Cellwise<A extends Arguments> {
  readonly arguments: A;
  readonly result: ResultKind;
  /** The result of one cell, in core units. */
  cell(values: Values<A>, place: Place): number | string | Refusal;
  /**
   * The same for `count` cells in which only numbers vary: writes each result into
   * `answers`, NaN where `cell` would refuse.
   */
  column?(values: Values<A>, columns: NumberColumns<A>, answers: Float64Array, count: number): void;
}

/** Where in the result a cell stands, from 0. */
export interface Place {
  readonly row: number;
  readonly column: number;
}

/** The numbers of each argument that is taken cell by cell, in core units. */
export type NumberColumns<A extends Arguments> = {
  readonly [K in keyof A as A[K] extends Argument<number, "each"> ? K : never]: Float64Array;
};
