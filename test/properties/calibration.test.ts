/** What must hold of every certificate, fit and calibrated couple. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { letterDesignations, Refusal, type Thermocouple, thermocouple } from "../../src/core";
import {
  type Certificate,
  calibratedCouple,
  certificate,
  type DeviationFunction,
  fitDeviation,
} from "../../src/core/calibration";

const within = (from: number, to: number) => fc.double({ min: from, max: to, noNaN: true });

/** Points at least 5 °C apart, with corrections of a few degrees. */
const points = fc
  .array(fc.tuple(within(5, 200), within(-3, 3)), { minLength: 2, maxLength: 12 })
  .map((steps) => {
    let t = -100;
    return steps.map(([step, correction]) => {
      t += step;
      return [t, correction] as const;
    });
  });

const read = (
  rows: readonly (readonly [number, number])[],
  method: "linear" | "smooth" | "nearest",
): Certificate =>
  certificate(
    rows.map(([t]) => t),
    rows.map(([, correction]) => correction),
    { method },
  ) as Certificate;

describe("a certificate", () => {
  it("never leaves the band of the two points beside the reading: no overshoot", () => {
    fc.assert(
      fc.property(
        points,
        within(0, 1),
        fc.constantFrom("linear", "smooth", "nearest"),
        (rows, share, method) => {
          const sensor = read(rows, method);
          const t = Math.min(sensor.first + share * (sensor.last - sensor.first), sensor.last);
          const i = rows.findIndex(([at], index) => index > 0 && t <= at);
          const beside = [rows[i - 1]?.[1] ?? Number.NaN, rows[i]?.[1] ?? Number.NaN];
          const correction = sensor.correction(t) as number;
          expect(correction).toBeGreaterThanOrEqual(Math.min(...beside) - 1e-14);
          expect(correction).toBeLessThanOrEqual(Math.max(...beside) + 1e-14);
        },
      ),
      { numRuns: 2000 },
    );
  });

  it("rises or falls with its points between them: the shape is kept", () => {
    fc.assert(
      fc.property(points, within(0, 1), within(0, 1), fc.nat(), (rows, a, b, at) => {
        const sensor = read(rows, "smooth");
        const i = at % (rows.length - 1);
        const [left, right] = [rows[i], rows[i + 1]] as [
          readonly [number, number],
          readonly [number, number],
        ];
        const [near, far] = [Math.min(a, b), Math.max(a, b)].map(
          (share) => sensor.correction(Math.min(left[0] + share * (right[0] - left[0]), right[0])) as number,
        ) as [number, number];
        expect((far - near) * Math.sign(right[1] - left[1])).toBeGreaterThanOrEqual(-1e-13);
      }),
      { numRuns: 2000 },
    );
  });

  it("is continuous, linear and smooth alike", () => {
    fc.assert(
      fc.property(points, within(0, 1), fc.constantFrom("linear", "smooth"), (rows, share, method) => {
        const sensor = read(rows, method);
        const t = Math.min(sensor.first + share * (sensor.last - sensor.first), sensor.last);
        const next = Math.min(t + 1e-6, sensor.last);
        // Steps of up to 6 °C over 5 °C, and a cubic at most three times as steep.
        const change = (sensor.correction(next) as number) - (sensor.correction(t) as number);
        expect(Math.abs(change)).toBeLessThanOrEqual(3 * 1.2e-6 + 1e-13);
      }),
      { numRuns: 2000 },
    );
  });

  it("is a number or a refusal, for any numbers whatever", () => {
    const method = fc.constantFrom("linear", "nearest", "smooth", "fit1", "fit2", "fit3");
    const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(finite, finite), { maxLength: 8 }),
        method,
        fc.double(),
        (rows, how, t) => {
          const sorted = [...rows].sort(([a], [b]) => a - b);
          const sensor = certificate(
            sorted.map(([at]) => at),
            sorted.map(([, value]) => value),
            { method: how },
          );
          if (sensor instanceof Refusal) return;
          const correction = sensor.correction(t);
          if (!(correction instanceof Refusal)) expect(Number.isFinite(correction)).toBe(true);
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe("a deviation function", () => {
  it("finds a polynomial of its own order again", () => {
    const order = fc.integer({ min: 0, max: 10 });
    fc.assert(
      fc.property(
        order,
        fc.array(within(-1, 1), { minLength: 11, maxLength: 11 }),
        fc.boolean(),
        within(0, 400),
        within(600, 1800),
        (n, shape, throughZero, low, high) => {
          fc.pre(!(throughZero && n === 0));
          const coefficients = shape
            .slice(0, n + 1)
            .map((c, i) => (throughZero && i === 0 ? 0 : 100 * c * 1000 ** -i));
          const at = Array.from({ length: 15 }, (_, i) => low + ((high - low) * i) / 14);
          const y = at.map((t) => coefficients.reduceRight((sum, c) => sum * t + c, 0));
          const fit = fitDeviation(at, y, n, { throughZero }) as DeviationFunction;
          const size = Math.max(...y.map(Math.abs));
          for (const residual of fit.residuals)
            expect(Math.abs(residual)).toBeLessThanOrEqual(1e-12 * size + 1e-12);
          at.forEach((t, i) => {
            const found = fit.coefficients.reduceRight((sum, c) => sum * t + c, 0);
            expect(Math.abs(found - (y[i] as number))).toBeLessThanOrEqual(1e-8 * (size + 1));
          });
        },
      ),
      { numRuns: 300 },
    );
  });

  it("has a covariance that is symmetric and belongs to its uncertainties", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 6 }),
        fc.array(within(-5, 5), { minLength: 12, maxLength: 12 }),
        (n, y) => {
          const at = y.map((_, i) => 90 * i);
          const { covariance, uncertainties } = fitDeviation(at, y, n) as DeviationFunction;
          const matrix = covariance as number[][];
          matrix.forEach((row, i) => {
            row.forEach((entry, j) => {
              expect(entry).toBe(matrix[j]?.[i]);
              const bound =
                ((uncertainties as number[])[i] as number) * ((uncertainties as number[])[j] as number);
              expect(Math.abs(entry)).toBeLessThanOrEqual(bound * (1 + 1e-12));
            });
          });
        },
      ),
      { numRuns: 200 },
    );
  });

  it("is finite or refused, for any numbers whatever", () => {
    const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(finite, finite), { maxLength: 12 }),
        fc.integer({ min: 0, max: 4 }),
        fc.boolean(),
        (rows, order, throughZero) => {
          const fit = fitDeviation(
            rows.map(([t]) => t),
            rows.map(([, y]) => y),
            order,
            { throughZero },
          );
          if (fit instanceof Refusal) return;
          for (const value of Object.values(fit).flat(2)) {
            if (!(value instanceof Refusal)) expect(Number.isFinite(value)).toBe(true);
          }
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe.each(letterDesignations)("a calibrated couple of type %s", (type) => {
  const c = thermocouple(type) as Thermocouple;
  const low = Math.max(c.uniqueFrom, type === "B" ? 100 : 0);
  const most = Math.min(c.seebeck(low + 1), c.seebeck(c.high)) * 1000;

  it("comes back from its EMF within max(1E-9 °C, 1E-10 mV over the slope)", () => {
    const shape = fc.tuple(within(-50, 50), within(-0.3, 0.3), within(-0.3, 0.3));
    const by = fc.constantFrom("standard", "individual");
    fc.assert(
      fc.property(shape, within(0, 1), by, ([c0, c1, c2], share, how) => {
        const own = calibratedCouple(c, [c0, c1 * most, (c2 * most) / (2 * c.high)], low, c.high);
        fc.pre(!(own instanceof Refusal));
        const t = low + share * (c.high - low);
        fc.pre(c.reference.segments.every(({ from }) => Math.abs(t - from) > 0.01));
        const reference = how === "individual" ? low : Math.max(c.low, 20);
        const back = own.temperature(own.emf(t, reference, how) as number, reference, how) as number;
        expect(Math.abs(back - t)).toBeLessThanOrEqual(Math.max(1e-9, 1e-10 / own.slope(t)));
      }),
      { numRuns: 500 },
    );
  });
});
