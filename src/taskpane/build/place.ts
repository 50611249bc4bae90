import type { Shape } from "../formula/shape";
import { addressOn, cellName, parseBlock } from "../workbook/address";
import type { Workbook } from "../workbook/workbook";
import { type Form, grownOver } from "./insert";
import { filledBy, hindranceTo, type Target } from "./target";

/** Where a formula's result would lie, and what stands there. */
export interface ResultPlace {
  readonly shape: Shape;
  readonly area: string;
  readonly occupiedCount: number;
  /** Some of the cells in use. */
  readonly occupied: readonly string[];
  /** Why the formula cannot stand there at all, in a sentence. */
  readonly hindrance: string | undefined;
}

export const PAST_THE_END =
  "The result would run past the end of the sheet. Choose a place further up or left.";

export const cellsInUse = (count: number) => (count === 1 ? "1 cell is in use" : `${count} cells are in use`);

/**
 * Looks at the place of a result of this shape; undefined where it would run past the end of the sheet. `own` is the
 * area that the same formula fills already, which is no obstacle.
 */
export async function placeOf(
  workbook: Workbook,
  target: Target,
  shape: Shape,
  own: string | undefined,
  form: Form,
): Promise<ResultPlace | undefined> {
  const area = filledBy(target, shape);
  if (!area) return undefined;
  const parts = own ? grownOver(area, own) : [area];
  const looked = await Promise.all(parts.map((range) => workbook.inspect(addressOn(target.sheet, range))));
  const spills = form === "spill" && shape.rows * shape.columns > 1;
  return {
    shape,
    area,
    occupiedCount: looked.reduce((sum, { occupiedCount }) => sum + occupiedCount, 0),
    occupied: looked.flatMap(({ occupied }) => occupied),
    hindrance: looked.map((place) => hindranceTo(place, spills)).find((each) => each !== undefined),
  };
}

/** The same row, in the second column after the last one in use. */
export async function freePlace(workbook: Workbook, { sheet, cell }: Target): Promise<string> {
  const used = await workbook.getUsedRange(addressOn(sheet, cell));
  return cellName(parseBlock(cell).row, used ? parseBlock(used).lastColumn + 2 : 0);
}
