/** The ends of a couple's range, made anew in each test. */
import { describe, expect, it } from "vitest";
import { furtherDesignations, letterDesignations, thermocouple } from "../../../src/core";
import { Thermocouple } from "../../../src/core/thermoelectric/thermocouple";

const made = (name: string): Thermocouple => new Thermocouple((thermocouple(name) as Thermocouple).reference);

describe.each([...letterDesignations, ...furtherDesignations])("%s", (name) => {
  it("has a segment at every temperature of its range, at a join the lower one, and none outside", () => {
    const couple = made(name);
    couple.reference.segments.forEach(({ from, to }, i) => {
      expect(couple.segmentIndex(to)).toBe(i);
      expect(couple.segmentIndex((from + to) / 2)).toBe(i);
    });
    expect(couple.segmentIndex(couple.low)).toBe(0);
    for (const outside of [couple.low - 1e-9, couple.high + 1e-9, Number.NaN]) {
      expect(couple.segmentIndex(outside)).toBe(-1);
      expect(couple.seebeck(outside)).toBeNaN();
    }
  });

  it("gives the very join for an EMF in the gap between two segments", () => {
    const couple = made(name);
    for (const { from } of couple.reference.segments.slice(1)) {
      const below = couple.emf(from);
      const above = couple.emf(from + Math.max(Math.abs(from) * 2 ** -52, Number.MIN_VALUE));
      for (const share of [0.3, 0.5, 0.7]) {
        const emf = below + share * (above - below);
        if (emf > below && emf < above) expect(couple.temperature(emf)).toBe(from);
      }
    }
  });

  it("takes an EMF beyond an end by no more than 1E-9 mV as that end, alone and in a column", () => {
    const couple = made(name);
    const { emfHigh, high, emfUniqueFrom, uniqueFrom } = couple;
    const emfs = Float64Array.of(
      ...[emfHigh, emfHigh + 1e-9, emfHigh + 2e-9],
      ...[emfUniqueFrom, emfUniqueFrom - 1e-9, emfUniqueFrom - 2e-9],
    );
    const expected = [high, high, Number.NaN, uniqueFrom, uniqueFrom, Number.NaN];
    const column = new Float64Array(6);
    couple.temperatures(emfs, column, 6);
    expect([...column]).toEqual(expected);
    expect(Array.from(emfs, (emf) => couple.temperature(emf))).toEqual(expected);
  });
});
