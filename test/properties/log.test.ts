import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { Refusal } from "../../src/core";
import { despiker, flagger, rampRate, timeConstant, timeGrid, timeline, unlag } from "../../src/core/log";

function given<T>(value: T | Refusal): T {
  if (value instanceof Refusal) throw new Error(value.message());
  return value;
}

const reading = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: -200, max: 1800, noNaN: true }) },
  { weight: 6, arbitrary: fc.integer({ min: 890, max: 910 }) },
  { weight: 1, arbitrary: fc.constant(Number.NaN) },
);
const readings = fc.array(reading, { maxLength: 60 }).map((list) => Float64Array.from(list));

describe("a repaired timeline", () => {
  const intervals = fc.array(fc.integer({ min: 1, max: 3 }), { minLength: 6, maxLength: 400 });

  it("rises, and is the true one again after any number of lost midnights", () => {
    fc.assert(
      fc.property(intervals, fc.integer({ min: 0, max: 1439 }), (steps, start) => {
        let time = start;
        const truth = steps.map((step) => (time += 5 * step));
        const { added } = given(timeline(Float64Array.from(truth, (minute) => minute % 1440)));
        truth.forEach((minute, i) => {
          expect((minute % 1440) + added[i]!).toBeCloseTo(minute - 1440 * Math.floor(truth[0]! / 1440), 6);
        });
      }),
    );
  });

  it("is the true one again after the clock went back an hour", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 12, max: 200 }),
        fc.integer({ min: 1, max: 29 }),
        fc.nat(),
        (count, interval, at) => {
          const back = 1 + (at % (count - 2));
          const times = Float64Array.from({ length: count }, (_, i) => i * interval - (i >= back ? 60 : 0));
          const { added } = given(timeline(times));
          times.forEach((time, i) => {
            expect(time + added[i]!).toBe(i * interval);
          });
        },
      ),
    );
  });

  it("never falls, whatever was given", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 3000 }), { minLength: 2, maxLength: 60 }), (list) => {
        const times = Float64Array.from(list);
        const found = timeline(times);
        if (found instanceof Refusal) return;
        const repaired = times.map((time, i) => time + found.added[i]!);
        given(timeGrid(repaired));
      }),
      { numRuns: 2000 },
    );
  });
});

describe("screening a column", () => {
  it("gives each reading one word, `missing` to those that are and to no other", () => {
    fc.assert(
      fc.property(readings, (column) => {
        const flags = given(flagger({ low: 0, high: 1000, maxStep: 5, stuckCount: 3, spikeWidth: 2 }))(
          column,
        );
        expect(flags).toHaveLength(column.length);
        column.forEach((t, i) => {
          expect(flags[i] === "missing").toBe(Number.isNaN(t));
          if (t > 1000.1) expect(flags[i]).toBe("over");
          if (t < -0.1) expect(flags[i]).toBe("under");
        });
      }),
    );
  });

  it("puts a value from the window in the place of a spike and leaves all others bit-identical", () => {
    fc.assert(
      fc.property(readings, fc.integer({ min: 1, max: 6 }), (column, half) => {
        const result = given(despiker(half))(column);
        column.forEach((t, i) => {
          const window = [...column.slice(Math.max(0, i - half), i + half + 1)].filter(
            (x) => !Number.isNaN(x),
          );
          if (Number.isNaN(t)) expect(result[i]).toBeNaN();
          else if (!Object.is(result[i], t)) {
            expect(result[i]).toBeGreaterThanOrEqual(Math.min(...window));
            expect(result[i]).toBeLessThanOrEqual(Math.max(...window));
          }
        });
      }),
    );
  });
});

describe("dynamics", () => {
  const step = fc.double({ min: 0.1, max: 3, noNaN: true });

  it("of a straight ramp: its rate everywhere, and ahead by rate × time constant", () => {
    fc.assert(
      fc.property(
        fc.array(step, { minLength: 3, maxLength: 40 }),
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.integer({ min: 1, max: 600 }),
        (steps, rate, seconds) => {
          let time = 0;
          const grid = given(timeGrid(Float64Array.from(steps, (x) => (time += x))));
          const record = grid.times.map((t) => 20 + rate * t);
          const window = 4 * Math.max(...steps);
          given(rampRate(grid, record, window)).forEach((found) => {
            expect(found).toBeCloseTo(rate, 7);
          });
          given(unlag(grid, record, seconds, window)).forEach((found, i) => {
            expect(found).toBeCloseTo(20 + rate * (grid.times[i]! + seconds / 60), 5);
          });
        },
      ),
    );
  });

  it("of a clean step: its time constant, whatever the scale, the direction and the level before", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 30 }),
        fc.double({ min: 3, max: 15, noNaN: true }),
        fc.integer({ min: -200, max: 1200 }),
        fc.integer({ min: 5, max: 900 }),
        fc.boolean(),
        (before, tau, level, size, up) => {
          const times = Float64Array.from({ length: before + 50 }, (_, i) => i / 60);
          const record = times.map((_, i) => {
            const done = i < before ? 0 : 1 - Math.exp(-(i - before) / tau);
            return level + (up ? size : -size) * done;
          });
          const found = given(timeConstant(given(timeGrid(times)), record));
          expect(found.timeConstant / tau).toBeCloseTo(1, 6);
          expect(found.initial).toBeCloseTo(level, 4);
        },
      ),
    );
  });

  it("never answers with NaN or Infinity", () => {
    fc.assert(
      fc.property(readings, (column) => {
        const grid = timeGrid(Float64Array.from(column, (_, i) => i / 4));
        if (grid instanceof Refusal) return;
        const found = timeConstant(grid, column);
        if (found instanceof Refusal) expect(found.message()).not.toMatch(/NaN|Infinity/);
        else for (const value of Object.values(found)) expect(Number.isFinite(value)).toBe(true);
      }),
      { numRuns: 300 },
    );
  });
});
