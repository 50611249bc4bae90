/**
 * The exact inverse of one segment: the temperature at which the reference
 * function itself gives the EMF, not a published approximation of it.
 *
 * A seed t(E) from a cubic Hermite table on a uniform grid of E is so close that
 * one evaluation of the reference function and the seed's own slope finish the job
 * nearly everywhere; where the first step is not tiny, Newton's method goes on,
 * kept inside a bracket. The table is computed at first use from the reference
 * function; nothing in it is typed in.
 */
import { type Rising, whereReached } from "../numeric/root";
import type { Segment } from "./segment";

const CELLS = 512;

/** The seed's slope is good to 1E-4 or better, so a first step below this leaves less than 1E-10 °C. */
const TINY_STEP = 1e-6;

/** Newton's method has converged when its step is below the spacing that matters, °C. */
const CONVERGED = 1e-12;

export class SegmentInverse {
  readonly emfFrom: number;
  readonly emfTo: number;
  private readonly cellsPerMillivolt: number;
  /** Four coefficients a cell: t = c0 + u·(c1 + u·(c2 + u·c3)), u the place inside the cell, 0…1. */
  private readonly cubics: Float64Array;
  private readonly rising: Rising;

  /** `lowest` and `highest` bound the part of the segment in which E rises. */
  constructor(
    private readonly segment: Segment,
    private readonly lowest: number,
    private readonly highest: number,
  ) {
    this.rising = { value: (t) => segment.emf(t), slope: (t) => segment.slope(t) };
    this.emfFrom = segment.emf(lowest);
    this.emfTo = segment.emf(highest);
    this.cellsPerMillivolt = CELLS / (this.emfTo - this.emfFrom);
    this.cubics = this.tabulate();
  }

  /** t in °C for an EMF between `emfFrom` and `emfTo`. */
  temperature(emf: number): number {
    const { cubics, cellsPerMillivolt, segment } = this;
    const place = (emf - this.emfFrom) * cellsPerMillivolt;
    const cell = place < CELLS ? place | 0 : CELLS - 1;
    const u = place - cell;
    const at = cell * 4;
    const c1 = cubics[at + 1] as number;
    const c2 = cubics[at + 2] as number;
    const c3 = cubics[at + 3] as number;
    const seed = (cubics[at] as number) + u * (c1 + u * (c2 + u * c3));
    const slope = (c1 + u * (2 * c2 + 3 * u * c3)) * cellsPerMillivolt;
    const step = (emf - segment.emf(seed)) * slope;
    const t = seed + step;
    if (step < TINY_STEP && step > -TINY_STEP) {
      return t < this.lowest ? this.lowest : Math.min(t, this.highest);
    }
    return this.refine(emf, t);
  }

  /**
   * Converts those of the first `count` EMFs that lie inside this segment and are not
   * converted yet: where two segments overlap, the lower one came first.
   */
  temperatures(emfs: Float64Array, temperatures: Float64Array, count: number): void {
    const { emfFrom, emfTo } = this;
    for (let i = 0; i < count; i++) {
      const emf = emfs[i] as number;
      if (emf > emfFrom && emf <= emfTo && Number.isNaN(temperatures[i]))
        temperatures[i] = this.temperature(emf);
    }
  }

  private refine(emf: number, start: number): number {
    return whereReached(this.rising, emf, this.lowest, this.highest, start, CONVERGED);
  }

  private tabulate(): Float64Array {
    const cubics = new Float64Array(4 * CELLS);
    let left = this.lowest;
    let leftSlope = this.rise(left);
    for (let cell = 0; cell < CELLS; cell++) {
      const emf = this.emfFrom + (cell + 1) / this.cellsPerMillivolt;
      const right = cell === CELLS - 1 ? this.highest : this.refine(emf, left);
      const rightSlope = this.rise(right);
      const chord = right - left;
      cubics.set(
        [left, leftSlope, 3 * chord - 2 * leftSlope - rightSlope, leftSlope + rightSlope - 2 * chord],
        4 * cell,
      );
      left = right;
      leftSlope = rightSlope;
    }
    return cubics;
  }

  /** dt per cell of the table at t. */
  private rise(t: number): number {
    return 1 / (this.segment.slope(t) * this.cellsPerMillivolt);
  }
}
