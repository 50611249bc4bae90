/** Declared arguments: a kind of cell, the shape of what is taken, and what stands in when it is left out. */
import type { Refusal, TemperatureUnit } from "../../core";
import type { CellError } from "../cell";
import type { Kind } from "../kinds/kind";
import type { Matrix } from "../matrix";

/**
 * `each`: one cell or a range, broadcast with the others, cell by cell.
 * The others hold for the whole call: `once` one cell, `column` a row or column of
 * cells, `block` a rectangle.
 */
export type Shape = "each" | "once" | "column" | "block";

export interface Argument<T, S extends Shape = Shape, Optional extends boolean = boolean> {
  readonly shape: S;
  /** How one of its cells is read. */
  readonly kind: Kind<unknown>;
  readonly optional: Optional;
  /** The value of an argument that is left out. */
  readonly standIn?: T;
  /** `standIn` as the catalogue prints it. */
  readonly printed?: string;
  /** Beside a value a blank cell means "not given", as if the argument were left out, and not "missing". */
  readonly blankIsNotGiven?: true;
  /** Reads the whole range at once. `label` is the argument's name in words. */
  read(given: Matrix, label: string, unit: TemperatureUnit): T | Refusal | CellError;
}

export type Arguments = Readonly<Record<string, Argument<unknown>>>;

export type Value<A> = A extends Argument<infer T> ? T : never;
export type Values<A extends Arguments> = { readonly [K in keyof A]: Value<A[K]> };

/** What a worksheet function hands on: each declared argument by its own name. */
export type Given<A extends Arguments> = {
  readonly [K in keyof A]: A[K] extends Argument<unknown, Shape, true>
    ? unknown[][] | undefined
    : unknown[][];
};

/** May be left out; then this value holds. */
export const orElse = <T, S extends Shape>(
  argument: Argument<T, S, false>,
  standIn: NoInfer<T>,
  printed: string,
): Argument<T, S, true> => ({ ...argument, optional: true, standIn, printed });

/** May be left out; the function then sees undefined. */
export const ifGiven = <T, S extends Shape>(
  argument: Argument<T, S, false>,
): Argument<T | undefined, S, true> => ({
  ...argument,
  optional: true,
});

/** May be left out, or be blank beside a value (rule 4); the function then sees undefined. */
export const ifGivenOrBlank = <T>(
  argument: Argument<T, "each", false>,
): Argument<T | undefined, "each", true> => ({
  ...argument,
  optional: true,
  blankIsNotGiven: true,
});
