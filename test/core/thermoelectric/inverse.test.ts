/** How the inverse gets there: which temperatures it asks of the reference function, and what a column leaves alone. */
import { describe, expect, it } from "vitest";
import { letterDesignations, type Thermocouple, thermocouple } from "../../../src/core";
import { SegmentInverse } from "../../../src/core/thermoelectric/inverse";
import { Segment } from "../../../src/core/thermoelectric/segment";

interface Watched {
  readonly name: string;
  readonly inverse: SegmentInverse;
  readonly low: number;
  readonly high: number;
  asked: number;
}

const segments: Watched[] = letterDesignations.flatMap((name) => {
  const couple = thermocouple(name) as Thermocouple;
  return couple.reference.segments.map((published, i) => {
    const segment = new Segment(published);
    const low = i === 0 ? couple.uniqueFrom : published.from;
    const watched = {
      name: `${name} from ${published.from} °C`,
      inverse: new SegmentInverse(segment, low, published.to),
      low,
      high: published.to,
      asked: 0,
    };
    const emf = segment.emf.bind(segment);
    segment.emf = (t) => {
      watched.asked++;
      return emf(t);
    };
    return watched;
  });
});

describe.each(segments)("the inverse of type $name", (segment) => {
  const { inverse, low, high } = segment;
  const { emfFrom, emfTo } = inverse;

  it("needs one look at the reference function, seldom a second", () => {
    const count = 2000;
    segment.asked = 0;
    for (let i = 1; i <= count; i++) inverse.temperature(emfFrom + ((emfTo - emfFrom) * i) / count);
    expect(segment.asked).toBeGreaterThanOrEqual(count);
    expect(segment.asked).toBeLessThan(1.1 * count);
    segment.asked = 0;
    expect(inverse.temperature(emfTo)).toBeCloseTo(high, 9);
    expect(segment.asked).toBe(1);
  });

  it("stays inside the segment to the last bit", () => {
    for (let i = 0; i <= 40; i++) {
      const bits = i * 2 ** -52;
      expect(inverse.temperature(emfFrom + Math.abs(emfFrom) * bits)).toBeGreaterThanOrEqual(low);
      expect(inverse.temperature(emfTo - Math.abs(emfTo) * bits)).toBeLessThanOrEqual(high);
    }
  });

  it("fills of a column what lies above its lower end up to its upper one, is not there yet, and is counted", () => {
    const middle = (emfFrom + emfTo) / 2;
    const above = emfTo + 1;
    const emfs = Float64Array.of(emfFrom, middle, emfTo, above, emfFrom - 1, middle, Number.NaN, middle);
    const temperatures = new Float64Array(emfs.length).fill(Number.NaN);
    temperatures[5] = -999;
    inverse.temperatures(emfs, temperatures, 7);
    const [t, end] = [inverse.temperature(middle), inverse.temperature(emfTo)];
    const none = Number.NaN;
    expect([...temperatures]).toEqual([none, t, end, none, none, -999, none, none]);
  });
});
