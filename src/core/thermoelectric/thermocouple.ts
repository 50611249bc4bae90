/** A couple that can be asked both ways: EMF from temperature and temperature from EMF. */
import { SegmentInverse } from "./inverse";
import type { ReferenceFunction } from "./reference-function";
import { Segment } from "./segment";
import { uniqueFrom } from "./unique-range";

/** An EMF beyond the value at a range end by no more than this, in mV, is taken as that end. */
const AT_THE_END = 1e-9;

export class Thermocouple {
  readonly designation: string;
  /** Range of the reference function, °C. */
  readonly low: number;
  readonly high: number;
  /** E(low) and E(high), mV. */
  readonly emfLow: number;
  readonly emfHigh: number;
  /**
   * From this temperature up, °C, an EMF belongs to one temperature only: `low`,
   * but for type B, whose EMF falls below zero before it rises.
   */
  readonly uniqueFrom: number;
  /** E(uniqueFrom), mV: the least EMF that can be converted. */
  readonly emfUniqueFrom: number;

  private readonly segments: readonly Segment[];
  private inverses: readonly SegmentInverse[] | undefined;

  constructor(readonly reference: ReferenceFunction) {
    this.designation = reference.designation;
    this.segments = reference.segments.map((segment) => new Segment(segment));
    this.low = (this.segments[0] as Segment).from;
    this.high = (this.segments[this.segments.length - 1] as Segment).to;
    this.emfLow = this.emf(this.low);
    this.emfHigh = this.emf(this.high);
    this.uniqueFrom = uniqueFrom(this.segments[0] as Segment);
    this.emfUniqueFrom = this.emf(this.uniqueFrom);
  }

  /** Which published segment serves at t: at a join the lower one. Index from 0, or −1 outside the range. */
  segmentIndex(t: number): number {
    if (!(t >= this.low)) return -1;
    return this.segments.findIndex((segment) => t <= segment.to);
  }

  /** E(t) in mV, reference junction at 0 °C; NaN outside the range. */
  emf(t: number): number {
    const { segments } = this;
    if (!(t >= this.low)) return Number.NaN;
    for (let i = 0; i < segments.length; i++) {
      const segment = segments[i] as Segment;
      if (t <= segment.to) return segment.emf(t);
    }
    return Number.NaN;
  }

  /** `emf` for the first `count` temperatures, written into `emfs`; segment by segment, as `temperatures` is. */
  emfs(temperatures: Float64Array, emfs: Float64Array, count: number): void {
    emfs.fill(Number.NaN, 0, count);
    let from = this.low;
    for (const segment of this.segments) {
      segment.emfs(temperatures, emfs, count, from);
      from = segment.to;
    }
  }

  /** Seebeck coefficient dE/dt in mV/°C; NaN outside the range. */
  seebeck(t: number): number {
    const segment = this.segments[this.segmentIndex(t)];
    return segment === undefined ? Number.NaN : segment.slope(t);
  }

  /** The exact inverse of `emf`, °C; NaN where no single temperature has this EMF. */
  temperature(emf: number): number {
    if (emf >= this.emfHigh) return emf <= this.emfHigh + AT_THE_END ? this.high : Number.NaN;
    if (emf <= this.emfUniqueFrom)
      return emf >= this.emfUniqueFrom - AT_THE_END ? this.uniqueFrom : Number.NaN;
    this.inverses ??= this.invert();
    const { inverses } = this;
    for (let i = 0; i < inverses.length; i++) {
      const inverse = inverses[i] as SegmentInverse;
      if (emf <= inverse.emfTo) {
        // Between two segments that do not quite meet: the join. Where they overlap, the lower one came first.
        return emf >= inverse.emfFrom ? inverse.temperature(emf) : (this.segments[i] as Segment).from;
      }
    }
    return Number.NaN;
  }

  /**
   * `temperature` for the first `count` EMFs, written into `temperatures`. Segment by
   * segment, because a loop over one segment runs half as fast again; what lies at an
   * end, at a join or outside is left to the single routine.
   */
  temperatures(emfs: Float64Array, temperatures: Float64Array, count: number): void {
    this.inverses ??= this.invert();
    temperatures.fill(Number.NaN, 0, count);
    for (const inverse of this.inverses) inverse.temperatures(emfs, temperatures, count);
    for (let i = 0; i < count; i++) {
      const emf = emfs[i] as number;
      if (Number.isNaN(temperatures[i]) || emf >= this.emfHigh) temperatures[i] = this.temperature(emf);
    }
  }

  private invert(): SegmentInverse[] {
    return this.segments.map(
      (segment, index) =>
        new SegmentInverse(segment, index === 0 ? this.uniqueFrom : segment.from, segment.to),
    );
  }
}
