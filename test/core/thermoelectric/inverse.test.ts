/** How the inverse gets there: which temperatures it asks of the reference function, and what a column leaves alone. */
import { describe, expect, it } from "vitest";
import { letterDesignations, thermocouple } from "../../../src/core";
import { SegmentInverse } from "../../../src/core/thermoelectric/inverse";
import type { PublishedSegment } from "../../../src/core/thermoelectric/reference-function";
import { Segment } from "../../../src/core/thermoelectric/segment";
import { Thermocouple } from "../../../src/core/thermoelectric/thermocouple";

const segments = letterDesignations.flatMap((name) => {
  const { reference } = thermocouple(name) as Thermocouple;
  return reference.segments.map((published, i) => [`${name} from ${published.from} °C`, name, i] as const);
});

/** A segment that counts how often it is asked, and its inverse. */
function watched(name: string, index: number) {
  const couple = new Thermocouple((thermocouple(name) as Thermocouple).reference);
  const published = couple.reference.segments[index] as PublishedSegment;
  const segment = new Segment(published);
  const emf = segment.emf.bind(segment);
  const looks = { asked: 0 };
  segment.emf = (t) => {
    looks.asked++;
    return emf(t);
  };
  const low = index === 0 ? couple.uniqueFrom : published.from;
  const inverse = new SegmentInverse(segment, low, published.to);
  return { looks, segment, inverse, low, high: published.to };
}

describe.each(segments)("the inverse of type %s", (_, name, index) => {
  it("is prepared with a few looks for each of its 512 cells", () => {
    expect(watched(name, index).looks.asked).toBeLessThan(512 * 6);
  });

  it("needs one look at the reference function, seldom a second", () => {
    const { looks, inverse, high } = watched(name, index);
    const { emfFrom, emfTo } = inverse;
    const count = 2000;
    looks.asked = 0;
    for (let i = 1; i <= count; i++) inverse.temperature(emfFrom + ((emfTo - emfFrom) * i) / count);
    expect(looks.asked).toBeGreaterThanOrEqual(count);
    expect(looks.asked).toBeLessThan(1.1 * count);
    looks.asked = 0;
    expect(inverse.temperature(emfTo)).toBeCloseTo(high, 9);
    expect(looks.asked).toBe(1);
  });

  it("gives the EMF back within 1E-9 °C or 5E-11 mV all the way", () => {
    const { segment, inverse } = watched(name, index);
    const { emfFrom, emfTo } = inverse;
    for (let i = 0; i <= 3000; i++) {
      // Closer together towards the lower end, where the slopes change most.
      const emf = emfFrom + (emfTo - emfFrom) * (i / 3000) ** 3;
      const t = inverse.temperature(emf);
      expect(Math.abs(segment.emf(t) - emf)).toBeLessThanOrEqual(Math.max(1e-9 * segment.slope(t), 5e-11));
    }
  });

  it("stays inside the segment to the last bit", () => {
    const { inverse, low, high } = watched(name, index);
    const { emfFrom, emfTo } = inverse;
    for (let i = 0; i <= 40; i++) {
      const bits = i * 2 ** -52;
      expect(inverse.temperature(emfFrom + Math.abs(emfFrom) * bits)).toBeGreaterThanOrEqual(low);
      expect(inverse.temperature(emfTo - Math.abs(emfTo) * bits)).toBeLessThanOrEqual(high);
    }
  });

  it("fills of a column what lies above its lower end up to its upper one, is not there yet, and is counted", () => {
    const { inverse } = watched(name, index);
    const { emfFrom, emfTo } = inverse;
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
