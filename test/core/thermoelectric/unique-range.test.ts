import { describe, expect, it } from "vitest";
import type { Segment } from "../../../src/core/thermoelectric/segment";
import { uniqueFrom } from "../../../src/core/thermoelectric/unique-range";

/** A segment of that EMF, which is not asked for another temperature than its own. */
const segment = (from: number, to: number, emf: (t: number) => number): Segment =>
  ({
    from,
    to,
    emf: (t: number): number => {
      if (!(t >= from && t <= to)) throw new Error(`asked at ${t}`);
      return emf(t);
    },
  }) as Segment;

describe("the temperature from which an EMF is unique", () => {
  it("is the lower end where the EMF rises throughout", () => {
    expect(uniqueFrom(segment(-50, 100, (t) => t))).toBe(-50);
    expect(uniqueFrom(segment(10, 100, (t) => t * t))).toBe(10);
  });

  it.each([
    [0, 100, 21],
    [10, 90, 30],
    [-40, 200, -10.3],
    // Here the EMF is back exactly at one of the 512 looks.
    [0, 84, 21],
  ])(
    "is from %d to %d °C, with the least EMF at %d °C, as far beyond it as it lies from the end",
    (from, to, least) => {
      expect(uniqueFrom(segment(from, to, (t) => (t - least) ** 2))).toBeCloseTo(2 * least - from, 10);
    },
  );

  it("is the upper end where the EMF falls throughout", () => {
    expect(uniqueFrom(segment(0, 100, (t) => -t))).toBe(100);
  });
});
