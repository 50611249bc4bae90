/** How a cellwise function is declared. */
import type { Refusal } from "../../core";
import type { Argument, Arguments, Values } from "../arguments";
import type { ResultKind } from "../results";

export interface Cellwise<A extends Arguments, P = undefined> {
  readonly arguments: A;
  readonly result: ResultKind;
  /** Where an option changes what comes back: the kind of this call's result. */
  resultOf?(values: CallValues<A>): ResultKind;
  /** What is worked out once per call, from the arguments that hold for all of it. */
  prepare?(values: CallValues<A>): P | Refusal;
  /** The result of one cell, in core units. */
  cell(values: Values<A>, prepared: P, place: Place): number | string | Refusal;
  /**
   * The same for `count` cells in which only numbers vary: writes each result into
   * `answers`, NaN where `cell` would refuse.
   */
  column?(values: Values<A>, columns: NumberColumns<A>, answers: Float64Array, count: number): void;
}

/** The arguments that hold for the whole call. */
export type CallValues<A extends Arguments> = {
  readonly [K in keyof A as A[K] extends Argument<unknown, "each"> ? never : K]: Values<A>[K];
};

/** Where in the result a cell stands, from 0. */
export interface Place {
  readonly row: number;
  readonly column: number;
}

/** The numbers of each argument that is taken cell by cell, in core units. */
export type NumberColumns<A extends Arguments> = {
  readonly [K in keyof A as A[K] extends Argument<number, "each"> ? K : never]: Float64Array;
};
