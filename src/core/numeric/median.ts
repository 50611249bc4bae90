/** Medians: of a set, and of a window that moves along a record. */

/** Median of the values, which it sorts in place; NaN when there are none. */
export function medianInPlace(values: Float64Array): number {
  const sorted = values.sort();
  const middle = sorted.length >> 1;
  if (sorted.length === 0) return Number.NaN;
  if (sorted.length % 2 === 1) return sorted[middle] as number;
  return ((sorted[middle - 1] as number) + (sorted[middle] as number)) / 2;
}

/** A handful of numbers kept in order while some come and some go, so that nothing is sorted twice. */
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
    const { sorted } = this;
    let place = this.count++;
    while (place > 0 && (sorted[place - 1] as number) > value) {
      sorted[place] = sorted[place - 1] as number;
      place--;
    }
    sorted[place] = value;
  }

  /** Takes out one number that was added before. */
  remove(value: number): void {
    const { sorted } = this;
    let place = this.firstNotBelow(value);
    this.count--;
    for (; place < this.count; place++) sorted[place] = sorted[place + 1] as number;
  }

  median(): number {
    const middle = this.count >> 1;
    const upper = this.sorted[middle] as number;
    return this.count % 2 === 1 ? upper : ((this.sorted[middle - 1] as number) + upper) / 2;
  }

  /** Median of the distances from `centre`: in a sorted window they grow outward from it on both sides. */
  medianDistance(centre: number): number {
    let right = this.firstNotBelow(centre);
    let left = right - 1;
    let before = 0;
    let distance = 0;
    for (let taken = 0; taken <= this.count >> 1; taken++) {
      before = distance;
      const toLeft = left >= 0 ? centre - (this.sorted[left] as number) : Number.POSITIVE_INFINITY;
      const toRight = right < this.count ? (this.sorted[right] as number) - centre : Number.POSITIVE_INFINITY;
      if (toLeft < toRight) {
        distance = toLeft;
        left--;
      } else {
        distance = toRight;
        right++;
      }
    }
    return this.count % 2 === 1 ? distance : (before + distance) / 2;
  }

  private firstNotBelow(value: number): number {
    let place = 0;
    while (place < this.count && (this.sorted[place] as number) < value) place++;
    return place;
  }
}
