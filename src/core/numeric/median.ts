/** Medians: of a set, and of a window that moves along a record. */

/** Median of the values, which it sorts in place; NaN when there are none. */
export function medianInPlace(values: Float64Array): number {
  const sorted = values.sort();
  const middle = sorted.length >> 1;
  if (sorted.length === 0) return Number.NaN;
  if (sorted.length % 2 === 1) return sorted[middle] as number;
  return ((sorted[middle - 1] as number) + (sorted[middle] as number)) / 2;
}

/** Fewer numbers than this move sooner one by one than as a block. */
const BLOCK = 200;

/**
 * Numbers kept in order while some come and some go, so that nothing is sorted twice. Places are found by halving and
 * what lies behind one moves as a block, so that a window of thousands is not a thousand times as dear as one of ten.
 */
export class MedianWindow {
  private readonly sorted: Float64Array;
  private count = 0;

  constructor(capacity: number) {
    this.sorted = new Float64Array(capacity);
  }

  get size(): number {
    return this.count;
  }

  clear(): void {
    this.count = 0;
  }

  add(value: number): void {
    const place = this.firstNotBelow(value);
    this.move(place, place + 1);
    this.sorted[place] = value;
    this.count++;
  }

  /** Takes out one number that was added before. */
  remove(value: number): void {
    const place = this.firstNotBelow(value);
    this.move(place + 1, place);
    this.count--;
  }

  median(): number {
    const middle = this.count >> 1;
    const upper = this.sorted[middle] as number;
    return this.count % 2 === 1 ? upper : ((this.sorted[middle - 1] as number) + upper) / 2;
  }

  /**
   * Median of the distances from `centre`. The nearer half of a sorted window is a run of neighbours, whose two ends are its
   * farthest: the run is found by halving, moved right while what it would leave is farther than what it would gain.
   */
  medianDistance(centre: number): number {
    const { sorted, count } = this;
    const more = count >> 1;
    let first = 0;
    for (let last = count - more - 1; first < last; ) {
      const half = (first + last) >> 1;
      if (centre - (sorted[half] as number) > (sorted[half + more + 1] as number) - centre) first = half + 1;
      else last = half;
    }
    const toFirst = centre - (sorted[first] as number);
    const toLast = (sorted[first + more] as number) - centre;
    if (count % 2 === 1) return Math.max(toFirst, toLast);
    // Without its farther end the run holds one less.
    return toFirst > toLast
      ? (toFirst + Math.max(centre - (sorted[first + 1] as number), toLast)) / 2
      : (Math.max(toFirst, (sorted[first + more - 1] as number) - centre) + toLast) / 2;
  }

  private firstNotBelow(value: number): number {
    const { sorted } = this;
    let low = 0;
    for (let high = this.count; low < high; ) {
      const half = (low + high) >> 1;
      if ((sorted[half] as number) < value) low = half + 1;
      else high = half;
    }
    return low;
  }

  /** All from `from` on come to stand at `to`, its neighbour. */
  private move(from: number, to: number): void {
    const { sorted, count } = this;
    if (count - from > BLOCK) sorted.copyWithin(to, from, count);
    else if (to < from) for (let i = from; i < count; i++) sorted[i - 1] = sorted[i] as number;
    else for (let i = count; i > from; i--) sorted[i] = sorted[i - 1] as number;
  }
}
