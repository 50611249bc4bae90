/** Sums for the least-squares slope over any stretch of a record, a long stretch from sums over its parts. */

/** Parts of this many points are summed point by point; longer ones from two halves. */
const SMALLEST_PART = 32;

/** n, Σx, Σy, Σx², Σxy over points, counted from an origin near them so that they keep their digits. */
export class SlopeSums {
  private n = 0;
  private x = 0;
  private y = 0;
  private xx = 0;
  private xy = 0;
  private originX = 0;
  private originY = 0;

  /** No points, counted from here. */
  from(originX: number, originY: number): this {
    this.n = this.x = this.y = this.xx = this.xy = 0;
    this.originX = originX;
    this.originY = originY;
    return this;
  }

  point(x: number, y: number): void {
    const dy = y - this.originY;
    if (Number.isNaN(dy)) return;
    const dx = x - this.originX;
    this.n++;
    this.x += dx;
    this.y += dy;
    this.xx += dx * dx;
    this.xy += dx * dy;
  }

  /** All points of another sum, moved to this one's origin. */
  part(other: SlopeSums): void {
    const dx = other.originX - this.originX;
    const dy = other.originY - this.originY;
    this.n += other.n;
    this.x += other.x + other.n * dx;
    this.y += other.y + other.n * dy;
    this.xx += other.xx + dx * (2 * other.x + other.n * dx);
    this.xy += other.xy + dx * other.y + dy * other.x + other.n * dx * dy;
  }

  /** NaN when all points lie at the origin's abscissa: 0/0. The origin itself is one of them. */
  slope(): number {
    const { n, x, y, xx, xy } = this;
    return (n * xy - x * y) / (n * xx - x * x);
  }

  /** The points of both, about this one's origin. */
  with(other: SlopeSums): SlopeSums {
    const both = new SlopeSums().from(this.originX, this.originY);
    both.part(this);
    both.part(other);
    return both;
  }
}

/** The parts of a record: `levels[k]` holds those of 32·2ᵏ points. A window of any width is a few dozen of them. */
export class SlopeParts {
  private readonly levels: SlopeSums[][] = [];

  constructor(
    private readonly x: Float64Array,
    private readonly y: Float64Array,
  ) {
    let parts: SlopeSums[] = [];
    for (let start = 0; start + SMALLEST_PART <= x.length; start += SMALLEST_PART) {
      const part = this.origin(start);
      for (let i = start; i < start + SMALLEST_PART; i++) part.point(x[i] as number, y[i] as number);
      parts.push(part);
    }
    while (parts.length > 0) {
      this.levels.push(parts);
      const halves = parts;
      parts = [];
      for (let k = 0; k + 1 < halves.length; k += 2) {
        parts.push((halves[k] as SlopeSums).with(halves[k + 1] as SlopeSums));
      }
    }
  }

  /** Adds the points from ≤ index < to. */
  add(sums: SlopeSums, from: number, to: number): void {
    for (let i = from; i < to; ) {
      if (i % SMALLEST_PART !== 0 || i + SMALLEST_PART > to) {
        sums.point(this.x[i] as number, this.y[i] as number);
        i++;
        continue;
      }
      let level = 0;
      let size = SMALLEST_PART;
      while (i % (2 * size) === 0 && i + 2 * size <= to) {
        size *= 2;
        level++;
      }
      sums.part((this.levels[level] as SlopeSums[])[i / size] as SlopeSums);
      i += size;
    }
  }

  /** Empty sums about the first present point from `start` on. */
  private origin(start: number): SlopeSums {
    let i = start;
    while (i < this.y.length && Number.isNaN(this.y[i])) i++;
    return new SlopeSums().from(this.x[i] ?? 0, this.y[i] ?? 0);
  }
}
