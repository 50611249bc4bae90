import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { Refusal, type TemperatureUnit, temperatureUnits, toCelsius } from "../../src/core";
import { timeGrid } from "../../src/core/log";
import {
  envelope,
  lethality,
  meanKinetic,
  type SurveyQuestion,
  soak,
  survey,
  surveySummary,
  surveyTable,
  timeAbove,
} from "../../src/core/survey";

const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F") as TemperatureUnit;

function given<T>(value: T | Refusal): T {
  if (value instanceof Refusal) throw new Error(value.message());
  return value;
}

/**
 * A survey in whole tenths of a degree about the set point 0: rows of scans with a reading per sensor, some missing,
 * most in a band of ± 6.0.
 */
const tenths = fc.oneof(
  { weight: 30, arbitrary: fc.integer({ min: -60, max: 60 }) },
  { weight: 3, arbitrary: fc.integer({ min: -70, max: 70 }) },
  { weight: 1, arbitrary: fc.constant(undefined) },
);
const block = fc
  .tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 2, max: 30 }))
  .chain(([sensors, scans]) =>
    fc.record({
      rows: fc.array(fc.array(tenths, { minLength: sensors, maxLength: sensors }), {
        minLength: scans,
        maxLength: scans,
      }),
      intervals: fc.array(fc.constantFrom(2, 2, 2, 2, 2, 3, 0, 7), { minLength: scans, maxLength: scans }),
      corrections: fc.array(fc.integer({ min: -5, max: 5 }), { minLength: sensors, maxLength: sensors }),
    }),
  );
type Block = typeof block extends fc.Arbitrary<infer T> ? T : never;

/** As it reaches the core when a sheet in `unit` holds it: each number converted by itself. */
function asked(
  { rows, intervals, corrections }: Block,
  unit = temperatureUnits[0]!,
  setpoint = 900,
): SurveyQuestion {
  let time = 0;
  return {
    times: Float64Array.from(intervals, (interval, i) => (time += i === 0 ? 0 : interval)),
    readings: corrections.map((_, s) =>
      Float64Array.from(rows, (row) =>
        row[s] === undefined ? Number.NaN : toCelsius(setpoint + row[s] / 10, unit),
      ),
    ),
    setpoint: toCelsius(setpoint, unit),
    tolerance: { below: 6 * unit.degree, above: 6 * unit.degree },
    corrections: corrections.map((tenth) => (tenth / 10) * unit.degree),
    requiredMinutes: 10,
    unit,
  };
}

const words = (question: SurveyQuestion) => {
  const found = survey(question);
  return found instanceof Refusal ? found.message() : surveySummary(found).verdict;
};

describe("a survey", () => {
  it("permuted in its sensors is the same survey with its table permuted", () => {
    fc.assert(
      fc.property(block, fc.infiniteStream(fc.nat()), (data, order) => {
        const question = asked(data);
        const found = survey(question);
        fc.pre(!(found instanceof Refusal));
        const keys = data.corrections.map(() => order.next().value as number);
        const places = keys.map((_, s) => s).sort((a, b) => keys[a]! - keys[b]! || a - b);
        const permuted = given(
          survey({
            ...question,
            readings: places.map((s) => question.readings[s]!),
            corrections: places.map((s) => question.corrections![s]!),
          }),
        );
        expect(surveyTable(permuted)).toEqual(places.map((s) => surveyTable(found)[s]));
        const [before, after] = [surveySummary(found), surveySummary(permuted)];
        for (const name of [
          "highest",
          "lowest",
          "spread",
          "overshoot",
          "minutes",
          "missing",
          "verdict",
          "margin",
          "classMet",
        ] as const) {
          expect(after[name]).toBe(before[name]);
        }
      }),
    );
  });

  it("moved by a constant, set point and all, moves its temperatures and nothing else", () => {
    fc.assert(
      fc.property(block, fc.integer({ min: -1000, max: 1000 }), (data, by) => {
        const found = survey(asked(data));
        fc.pre(!(found instanceof Refusal));
        const moved = surveySummary(given(survey(asked(data, temperatureUnits[0], 900 + by))));
        const still = surveySummary(found);
        for (const [name, value] of Object.entries(still)) {
          const other = moved[name as keyof typeof moved];
          const shift = name === "highest" || name === "lowest" ? by : 0;
          if (typeof value === "number") expect(other, name).toBeCloseTo(value + shift, 8);
          else if (!(value instanceof Refusal)) expect(other, name).toBe(value);
        }
      }),
    );
  });

  it("moved by a constant without its set point moves its deviations by it, and leaves spread, drift and stability", () => {
    fc.assert(
      fc.property(block, fc.integer({ min: -20, max: 20 }), (data, by) => {
        const question = { ...asked(data), start: 0, end: 1000 };
        const found = survey(question);
        fc.pre(!(found instanceof Refusal));
        const readings = question.readings.map((column) => column.map((t) => t + by));
        const moved = surveySummary(given(survey({ ...question, readings })));
        const still = surveySummary(found);
        for (const name of ["highest", "lowest", "plusDeviation", "minusDeviation"] as const) {
          expect(moved[name] - still[name]).toBeCloseTo(by, 8);
        }
        expect(moved.centringShift - still.centringShift).toBeCloseTo(-by, 8);
        expect(moved.spread).toBeCloseTo(still.spread, 8);
        if (typeof still.drift === "number") expect(moved.drift).toBeCloseTo(still.drift, 6);
      }),
    );
  });

  it("in °F gives the verdict that its numbers give in °C, at the limits too", () => {
    fc.assert(
      fc.property(block, (data) => {
        expect(words(asked(data, fahrenheit))).toBe(words(asked(data)));
        const [inFahrenheit, inCelsius] = [survey(asked(data, fahrenheit)), survey(asked(data))];
        if (inFahrenheit instanceof Refusal || inCelsius instanceof Refusal) return;
        const [f, c] = [surveySummary(inFahrenheit), surveySummary(inCelsius)];
        for (const name of [
          "highestSensor",
          "highestScan",
          "lowestSensor",
          "lowestScan",
          "missing",
        ] as const) {
          expect(f[name]).toBe(c[name]);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it("of one furnace gives the same verdict from a sheet in °C and from one in °F", () => {
    fc.assert(
      fc.property(block, (data) => {
        const inCelsius = asked(data);
        const throughFahrenheit = (t: number): number => toCelsius(t / fahrenheit.degree + 32, fahrenheit);
        const degree = (t: number): number => t * 1.8 * fahrenheit.degree;
        expect(
          words({
            ...inCelsius,
            readings: inCelsius.readings.map((column) => column.map(throughFahrenheit)),
            setpoint: throughFahrenheit(inCelsius.setpoint),
            tolerance: { below: degree(6), above: degree(6) },
            corrections: inCelsius.corrections!.map(degree),
            unit: fahrenheit,
          }),
        ).toBe(words(inCelsius));
      }),
      { numRuns: 1000 },
    );
  });

  it("never passes with a missing reading or a reading out of band in its period", () => {
    fc.assert(
      fc.property(block, (data) => {
        const question = asked(data);
        const found = survey(question);
        fc.pre(!(found instanceof Refusal));
        const { first, last } = found.period;
        const cells = data.rows
          .slice(first, last + 1)
          .flatMap((row) => row.map((x, s) => (x === undefined ? x : x + data.corrections[s]!)));
        const { verdict, missing } = surveySummary(found);
        expect(missing).toBe(cells.filter((x) => x === undefined).length);
        if (cells.some((x) => x !== undefined && Math.abs(x) > 60)) expect(verdict).toBe("Fail");
        else if (missing > 0) expect(["Fail", "Incomplete"]).toContain(verdict);
        const rank = ["Fail", "Incomplete", "Short", "Pass"];
        expect(verdict).toBe(rank[Math.min(...surveyTable(found).map((row) => rank.indexOf(row.verdict)))]);
      }),
      { numRuns: 1000 },
    );
  });

  it("never has a soak longer than its period, nor one with anything missing or out of band", () => {
    fc.assert(
      fc.property(block, (data) => {
        const question = asked(data);
        const found = soak(question);
        fc.pre(!(found instanceof Refusal));
        const period = given(survey(question)).period;
        expect(found.first).toBeGreaterThanOrEqual(period.first);
        expect(found.last).toBeLessThanOrEqual(period.last);
        for (const row of data.rows.slice(found.first, found.last + 1)) {
          row.forEach((x, s) => {
            expect(Math.abs((x ?? Number.NaN) + data.corrections[s]!)).toBeLessThanOrEqual(60);
          });
        }
      }),
      { numRuns: 1000 },
    );
  });

  it("never says NaN or Infinity, whatever the numbers", () => {
    const cell = fc.oneof(
      fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e6, max: 1e6 }),
      fc.constant(Number.NaN),
      fc.constant(900),
    );
    fc.assert(
      fc.property(
        fc.array(fc.tuple(cell, cell), { minLength: 1, maxLength: 12 }),
        fc.boolean(),
        (rows, given_) => {
          const times = Float64Array.from(rows, (_, i) => i);
          const found = survey({
            times,
            readings: [0, 1].map((s) => Float64Array.from(rows, (row) => row[s] as number)),
            setpoint: 900,
            tolerance: { below: 5, above: 5 },
            ...(given_ ? { start: 0, end: rows.length } : {}),
          });
          if (found instanceof Refusal) return;
          for (const value of [surveySummary(found), ...surveyTable(found)].flatMap((part) =>
            Object.values(part),
          )) {
            if (typeof value === "number") expect(Number.isFinite(value)).toBe(true);
          }
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe("the envelope", () => {
  it("holds its mean, and spans its spread", () => {
    fc.assert(
      fc.property(block, (data) => {
        const { readings, corrections } = asked(data);
        const { lowest, highest, mean, spread } = given(envelope(readings, corrections));
        data.rows.forEach((row, scan) => {
          if (row.every((x) => x === undefined)) {
            expect([lowest[scan], highest[scan], mean[scan], spread[scan]]).toEqual(
              new Array(4).fill(Number.NaN),
            );
          } else {
            expect(mean[scan]).toBeGreaterThanOrEqual(lowest[scan]! - 1e-9);
            expect(mean[scan]).toBeLessThanOrEqual(highest[scan]! + 1e-9);
            expect(spread[scan]).toBe(highest[scan]! - lowest[scan]!);
          }
        });
      }),
    );
  });
});

describe("integrals over a record", () => {
  const reading = fc.double({ min: 90, max: 135, noNaN: true });
  const record = fc.array(fc.tuple(fc.double({ min: 0.01, max: 5, noNaN: true }), reading), {
    minLength: 2,
    maxLength: 20,
  });
  const settings = { reference: 121.1, z: 10 };
  const columns = (steps: readonly (readonly [number, number])[]) => {
    let time = 0;
    return {
      times: Float64Array.from(steps, ([step], i) => (time += i === 0 ? 0 : step)),
      temperatures: Float64Array.from(steps, ([, t]) => t),
    };
  };
  /** The same straight lines with `parts` scans in each interval. */
  const finer = (values: Float64Array, parts: number): Float64Array =>
    Float64Array.from({ length: (values.length - 1) * parts + 1 }, (_, i) => {
      const [k, share] = [Math.floor(i / parts), (i % parts) / parts];
      return share === 0 ? values[k]! : values[k]! + share * (values[k + 1]! - values[k]!);
    });
  const wide = 1e9;

  it("a finer time grid leaves F by straight temperature unchanged", () => {
    fc.assert(
      fc.property(
        record,
        fc.integer({ min: 2, max: 5 }),
        fc.option(reading, { nil: undefined }),
        (steps, parts, threshold) => {
          const { times, temperatures } = columns(steps);
          const F = given(lethality({ ...settings, threshold }));
          const coarse = given(F(given(timeGrid(times, wide)), temperatures)).f;
          const fine = given(F(given(timeGrid(finer(times, parts), wide)), finer(temperatures, parts))).f;
          expect(Math.abs(fine - coarse)).toBeLessThanOrEqual(1e-7 * (1 + coarse));
        },
      ),
    );
  });

  it("a finer time grid leaves F by trapezoid unchanged within the trapezoid's error, h²·max L″/12 an interval", () => {
    fc.assert(
      fc.property(record, fc.integer({ min: 2, max: 5 }), (steps, parts) => {
        const { times, temperatures } = columns(steps);
        const F = given(lethality({ ...settings, method: "trapezoid" }));
        const coarse = given(F(given(timeGrid(times, wide)), temperatures)).f;
        const fine = given(F(given(timeGrid(finer(times, parts), wide)), finer(temperatures, parts))).f;
        let bound = 1e-9;
        for (let i = 1; i < times.length; i++) {
          const k = (Math.LN10 / 10) * (temperatures[i]! - temperatures[i - 1]!);
          const most = 10 ** ((Math.max(temperatures[i]!, temperatures[i - 1]!) - 121.1) / 10);
          bound += ((times[i]! - times[i - 1]!) * k * k * most) / 12;
        }
        expect(coarse - fine).toBeGreaterThanOrEqual(-1e-9);
        expect(coarse - fine).toBeLessThanOrEqual(bound);
      }),
    );
  });

  it("the time above falls as the threshold rises, from the whole record to none", () => {
    fc.assert(
      fc.property(record, reading, reading, (steps, a, b) => {
        const { times, temperatures } = columns(steps);
        const grid = given(timeGrid(times, wide));
        const above = (threshold: number) => given(timeAbove(grid, temperatures, threshold));
        expect(above(Math.min(a, b))).toBeGreaterThanOrEqual(above(Math.max(a, b)));
        expect(above(90)).toBeCloseTo(times[times.length - 1]!, 5);
        expect(above(135.1)).toBe(0);
      }),
    );
  });

  it("the mean kinetic temperature lies between the mean and the maximum", () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -30, max: 60, noNaN: true }), { minLength: 1 }),
        fc.integer({ min: 10, max: 500 }),
        (list, energy) => {
          // Above the mean because the rate is convex in T while ΔH/R > 2T, from 10 kJ/mol up to 328 °C.
          const found = given(given(meanKinetic(energy))(Float64Array.from(list)));
          const mean = list.reduce((sum, t) => sum + t, 0) / list.length;
          expect(found).toBeGreaterThanOrEqual(mean - 1e-9);
          expect(found).toBeLessThanOrEqual(Math.max(...list) + 1e-9);
        },
      ),
    );
  });
});
