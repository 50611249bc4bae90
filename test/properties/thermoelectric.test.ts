import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  emfBetween,
  emfsBetween,
  furtherDesignations,
  letterDesignations,
  Refusal,
  type Thermocouple,
  temperatureOf,
  temperaturesOf,
  thermocouple,
} from "../../src/core";

const names = [...letterDesignations, ...furtherDesignations];
const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
const within = (from: number, to: number) => fc.double({ min: from, max: to, noNaN: true });

/** An overlap of two segments at a join belongs to both: there the lower one answers. */
const inOverlap = (c: Thermocouple, t: number): boolean =>
  c.reference.segments.slice(1).some(({ from }) => t > from && c.emf(t) <= c.emf(from));

describe.each(names)("%s", (name) => {
  const c = couple(name);

  it("comes back from its EMF within max(1E-9 °C, 5E-11 mV over the Seebeck coefficient)", () => {
    fc.assert(
      fc.property(within(c.uniqueFrom, c.high), (t) => {
        fc.pre(!inOverlap(c, t));
        const bound = Math.max(1e-9, 5e-11 / c.seebeck(t));
        expect(Math.abs(c.temperature(c.emf(t)) - t)).toBeLessThanOrEqual(bound);
      }),
      { numRuns: 2000 },
    );
  });

  it("comes back from its temperature with the same EMF", () => {
    fc.assert(
      fc.property(within(c.emfUniqueFrom, c.emfHigh), (emf) => {
        const t = c.temperature(emf);
        fc.pre(c.reference.segments.every(({ from }) => t !== from));
        expect(Math.abs(c.emf(t) - emf)).toBeLessThanOrEqual(1e-10);
      }),
      { numRuns: 1000 },
    );
  });
});

describe("temperatureOf", () => {
  it("undoes emfBetween for any reference junction in range", () => {
    fc.assert(
      fc.property(fc.constantFrom(...names), within(0, 1), within(0, 1), (name, share, referenceShare) => {
        const c = couple(name);
        const t = c.uniqueFrom + share * (c.high - c.uniqueFrom);
        const reference = c.low + referenceShare * (c.high - c.low);
        fc.pre(!inOverlap(c, t));
        const emf = emfBetween(c, t, reference) as number;
        // Adding and subtracting E(reference) costs a rounding of the larger of the two.
        const bound = Math.max(1e-9, 5e-11 / c.seebeck(t));
        expect(Math.abs((temperatureOf(c, emf, reference) as number) - t)).toBeLessThanOrEqual(bound);
      }),
      { numRuns: 3000 },
    );
  });

  it("rises with the EMF, to within the 1E-9 °C of the inverse", () => {
    fc.assert(
      fc.property(fc.constantFrom(...names), within(0, 1), within(0, 1), (name, a, b) => {
        const c = couple(name);
        const at = (share: number) => c.temperature(c.emfUniqueFrom + share * (c.emfHigh - c.emfUniqueFrom));
        // Two EMFs a few bits apart may come out in either order.
        expect(at(Math.max(a, b))).toBeGreaterThanOrEqual(at(Math.min(a, b)) - 1e-9);
      }),
    );
  });

  it("is a number or a refusal, never NaN, for any numbers whatever", () => {
    fc.assert(
      fc.property(fc.constantFrom(...names), finite, finite, (name, emf, reference) => {
        const t = temperatureOf(couple(name), emf, reference);
        if (t instanceof Refusal) expect(t.message()).not.toMatch(/NaN|undefined/);
        else expect(Number.isFinite(t)).toBe(true);
      }),
    );
  });

  it("gives a column the same bits as single readings", () => {
    const cell = fc.oneof(within(-12, 80), fc.constant(Number.NaN), fc.double());
    fc.assert(
      fc.property(
        fc.constantFrom(...names),
        fc.array(fc.tuple(cell, fc.oneof(within(-40, 120), fc.constant(25))), { minLength: 1 }),
        (name, rows) => {
          const c = couple(name);
          const emfs = Float64Array.from(rows, ([emf]) => emf);
          const references = Float64Array.from(rows, ([, reference]) => reference);
          const temperatures = new Float64Array(rows.length);
          temperaturesOf(c, emfs, references, temperatures, rows.length);
          // The same numbers once more, read as temperatures.
          const emfColumn = new Float64Array(rows.length);
          emfsBetween(c, emfs, references, emfColumn, rows.length);
          rows.forEach(([emf, reference], i) => {
            const alone = temperatureOf(c, emf, reference);
            expect(temperatures[i]).toBe(alone instanceof Refusal ? Number.NaN : alone);
            const back = emfBetween(c, emf, reference);
            expect(emfColumn[i]).toBe(back instanceof Refusal ? Number.NaN : back);
          });
        },
      ),
    );
  });
});
