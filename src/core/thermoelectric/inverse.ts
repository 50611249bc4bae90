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
import type { Segment } from "./segment";

const CELLS = 512;

/** The seed's slope is good to 1E-4 or better, so a first step below this leaves less than 1E-10 °C. */
const TINY_STEP = 1e-6;

/** Newton's method has converged when its step is below the spacing that matters, °C. */
const CONVERGED = 1e-12;

const MOST_STEPS = 100;

export class SegmentInverse {
  readonly emfFrom: number;
  readonly emfTo: number;
  private readonly cellsPerMillivolt: number;
  /** Four coefficients a cell: t = c0 + u·(c1 + u·(c2 + u·c3)), u the place inside the cell, 0…1. */
  private readonly cubics: Float64Array;

  /** `lowest` and `highest` bound the part of the segment in which E rises. */
  constructor(
    private readonly segment: Segment,
    private readonly lowest: number,
    private readonly highest: number,
  ) {
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

  /** Newton's method inside a shrinking bracket; halves the bracket when a step would leave it. */
  private refine(emf: number, start: number): number {
    let low = this.lowest;
    let high = this.highest;
    let t = start > low && start < high ? start : low + (high - low) / 2;
    for (let i = 0; i < MOST_STEPS; i++) {
      const missing = emf - this.segment.emf(t);
      if (missing === 0) return t;
      if (missing > 0) low = t;
      else high = t;
      let next = t + missing / this.segment.slope(t);
      if (!(next >= low && next <= high)) next = low + (high - low) / 2;
      const step = Math.abs(next - t);
      t = next;
      if (step <= CONVERGED) return t;
    }
    return t;
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
