import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { letterDesignations, Refusal, type Thermocouple, thermocouple } from "../../src/core";
import {
  type Budget,
  budget,
  combinedUncertainty,
  coverageFactor,
  distributions,
  effectiveDof,
  INFINITE_DOF,
  reportValue,
  type Simulation,
  simulateTemperature,
  standardUncertainty,
  type TypeA,
  temperatureUncertainty,
  typeA,
} from "../../src/core/uncertainty";

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const anyFinite = fc.double({ noNaN: true, noDefaultInfinity: true });

const sound = (found: unknown): void => {
  if (found instanceof Refusal) expect(found.message()).not.toMatch(/NaN|undefined|Infinity/);
  else if (typeof found === "number") expect(Number.isFinite(found)).toBe(true);
  else expect(found).toBeTypeOf("string");
};

const line = fc.record({
  name: fc.constantFrom("a", "b", ""),
  value: within(1e-6, 1e6),
  distribution: fc.constantFrom("normal", "rectangular", "triangular", "u-shaped", "resolution", "standard"),
  divisor: fc.option(within(0.5, 5), { nil: undefined }),
  sensitivity: fc.option(fc.oneof(within(-1e3, -1e-3), within(1e-3, 1e3)), { nil: undefined }),
  dof: fc.option(fc.integer({ min: 1, max: 200 }), { nil: undefined }),
});
const lines = fc.array(line, { minLength: 1, maxLength: 8 });

describe("budget", () => {
  it("has shares that add to one", () => {
    fc.assert(
      fc.property(lines, (given) => {
        const { rows } = budget(given) as Budget;
        expect(rows.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
      }),
    );
  });

  it("does not depend on the order of its rows", () => {
    fc.assert(
      fc.property(lines, (given) => {
        const there = budget(given) as Budget;
        const back = budget([...given].reverse()) as Budget;
        expect(back.combined / there.combined).toBeCloseTo(1, 12);
        expect(back.dof / there.dof).toBeCloseTo(1, 9);
      }),
    );
  });

  it("agrees with the functions that make its parts", () => {
    fc.assert(
      fc.property(lines, (given) => {
        const { rows, combined, dof } = budget(given) as Budget;
        const u = rows.map((row) => row.standardUncertainty);
        const sensitivities = rows.map((row) => row.sensitivity);
        expect((combinedUncertainty(u, sensitivities) as number) / combined).toBeCloseTo(1, 12);
        const dofs = rows.map((row) => row.dof);
        expect((effectiveDof(u, dofs, sensitivities) as number) / dof).toBeCloseTo(1, 12);
      }),
    );
  });

  it("has effective degrees of freedom between the least and the sum of its rows'", () => {
    fc.assert(
      fc.property(lines, (given) => {
        const { rows, dof } = budget(given) as Budget;
        const dofs = rows.map((row) => row.dof);
        expect(dof).toBeGreaterThanOrEqual(Math.min(...dofs) * (1 - 1e-12));
        if (dofs.every((one) => one < INFINITE_DOF)) {
          expect(dof).toBeLessThanOrEqual(dofs.reduce((sum, one) => sum + one, 0) * (1 + 1e-12));
        }
      }),
    );
  });
});

describe("combinedUncertainty", () => {
  it("lies between difference and sum for any correlation of two", () => {
    fc.assert(
      fc.property(within(0, 1e3), within(0, 1e3), within(-1, 1), (a, b, r) => {
        const u = combinedUncertainty([a, b], undefined, [
          [1, r],
          [r, 1],
        ]) as number;
        expect(u).toBeGreaterThanOrEqual(Math.abs(a - b) - 1e-5);
        expect(u).toBeLessThanOrEqual(a + b + 1e-9);
      }),
    );
  });

  it("takes the correlations of any set of readings", () => {
    const series = fc.array(fc.array(fc.integer({ min: -10, max: 10 }), { minLength: 5, maxLength: 5 }), {
      minLength: 2,
      maxLength: 6,
    });
    fc.assert(
      fc.property(series, (given) => {
        const centred = given.map((x) => x.map((one) => one - x.reduce((s, y) => s + y, 0) / x.length));
        const dot = (x: number[], y: number[]): number =>
          x.reduce((s, one, i) => s + one * (y[i] as number), 0);
        fc.pre(centred.every((x) => dot(x, x) > 0.1));
        const matrix = centred.map((x) => centred.map((y) => dot(x, y) / Math.sqrt(dot(x, x) * dot(y, y))));
        expect(
          combinedUncertainty(
            given.map(() => 1),
            undefined,
            matrix,
          ),
        ).toBeTypeOf("number");
      }),
    );
  });
});

describe("coverageFactor", () => {
  it("falls with degrees of freedom and rises with the probability", () => {
    fc.assert(
      fc.property(
        within(1, 5000),
        within(1, 5000),
        within(0.01, 0.9999),
        within(0.01, 0.9999),
        (n, m, p, q) => {
          const k = (dof: number, probability: number) => coverageFactor(dof, probability) as number;
          expect(k(Math.max(n, m), p)).toBeLessThanOrEqual(k(Math.min(n, m), p) * (1 + 1e-13));
          expect(k(n, Math.max(p, q))).toBeGreaterThanOrEqual(k(n, Math.min(p, q)) * (1 - 1e-13));
        },
      ),
    );
  });
});

describe("typeA", () => {
  it("moves with the readings and keeps their spread", () => {
    fc.assert(
      fc.property(
        fc.array(within(-1, 1), { minLength: 2, maxLength: 30 }),
        fc.integer({ min: -1000, max: 1000 }),
        (readings, shift) => {
          const here = typeA(readings) as TypeA;
          const there = typeA(readings.map((reading) => reading + shift)) as TypeA;
          expect(there.mean as number).toBeCloseTo((here.mean as number) + shift, 11);
          expect(there.sd as number).toBeCloseTo(here.sd as number, 11);
        },
      ),
    );
  });
});

describe("reportValue", () => {
  it("keeps the value within half a unit, and U within 5 % below and one unit above", () => {
    fc.assert(
      fc.property(
        within(-1e4, 1e4),
        within(1e-3, 1e3),
        fc.integer({ min: 1, max: 3 }),
        (value, u, digits) => {
          const [v, reported] = (reportValue(value, u, digits) as string).split(" ± ").map(Number) as [
            number,
            number,
          ];
          const unit = 10 ** (Math.floor(Math.log10(reported) + 1e-9) - digits + 1);
          expect(Math.abs(v - value)).toBeLessThanOrEqual(unit / 2 + 1e-9);
          expect(reported).toBeGreaterThanOrEqual(0.95 * u - 1e-12);
          expect(reported - u).toBeLessThan(unit);
        },
      ),
    );
  });

  it("writes plain decimals, both to the same place", () => {
    fc.assert(
      fc.property(anyFinite, within(1e-300, 1e300), (value, u) => {
        const text = reportValue(value, u) as string;
        expect(text).toMatch(/^-?\d+(\.\d+)? ± \d+(\.\d+)?$/);
        expect(text).not.toMatch(/^-0(\.0+)? /);
        const [v, reported] = text.split(" ± ").map((one) => one.split(".")[1]?.length ?? 0);
        expect(v).toBe(reported);
      }),
    );
  });
});

describe("simulation", () => {
  it("agrees with the first order wherever the uncertainty is small", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...letterDesignations),
        within(0.1, 0.9),
        within(0.5, 3),
        fc.integer({ min: 0, max: 1e9 }),
        (name, share, uEmfUv, seed) => {
          const couple = thermocouple(name) as Thermocouple;
          const t = couple.uniqueFrom + share * (couple.high - couple.uniqueFrom);
          // Nearly straight: below −200 °C and near the minimum of type B the functions bend sharply.
          fc.pre(couple.seebeck(t) > 0.005 && t > -200);
          const reference = 20;
          const emf = couple.emf(t) - couple.emf(reference);
          const u = temperatureUncertainty(couple, t, uEmfUv, 0.1, reference) as number;
          const found = simulateTemperature({
            couple,
            emf,
            reference,
            uEmfUv,
            uReference: 0.1,
            trials: 20_000,
            seed,
          });
          const { mean, standard } = found as Simulation;
          expect(Math.abs(mean - t)).toBeLessThan((6 * u) / Math.sqrt(20_000));
          expect(Math.abs(standard / u - 1)).toBeLessThan(6 / Math.sqrt(40_000));
        },
      ),
      { numRuns: 40 },
    );
  });
});

describe("whatever numbers are given", () => {
  it("every answer is a finite number, a word or a refusal", () => {
    const maybe = fc.option(anyFinite, { nil: undefined });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(anyFinite, fc.constantFrom(...distributions), maybe, maybe, maybe), {
          maxLength: 4,
        }),
        anyFinite,
        (rows, probability) => {
          const values = rows.map(([value]) => value);
          const sensitivities = rows.map(([, , , sensitivity]) => sensitivity);
          for (const [value, kind, divisor] of rows) sound(standardUncertainty(value, kind, divisor));
          sound(combinedUncertainty(values, sensitivities));
          sound(effectiveDof(values, sensitivities));
          sound(coverageFactor(probability, 0.95));
          sound(coverageFactor(5, probability));
          sound(reportValue(probability, values[0] ?? 1));
          const found = budget(
            rows.map(([value, distribution, divisor, sensitivity, dof]) => ({
              name: "",
              value,
              distribution,
              divisor,
              sensitivity,
              dof,
            })),
            probability,
          );
          if (found instanceof Refusal) sound(found);
          else for (const total of [found.combined, found.dof, found.k, found.expanded]) sound(total);
          const statistics = typeA(values);
          if (statistics instanceof Refusal) sound(statistics);
          else for (const one of Object.values(statistics)) sound(one);
        },
      ),
      { numRuns: 2000 },
    );
  });

  it("a converted temperature's uncertainty and simulation are numbers or refusals", () => {
    const couple = fc.constantFrom(...letterDesignations).map((name) => thermocouple(name) as Thermocouple);
    fc.assert(
      fc.property(couple, anyFinite, anyFinite, anyFinite, anyFinite, (c, a, b, d, e) => {
        sound(temperatureUncertainty(c, 100, a, b, 20, d, e));
        sound(temperatureUncertainty(c, a, 1, 1, b, d, e));
        const found = simulateTemperature({
          couple: c,
          emf: 1,
          reference: 20,
          uEmfUv: a,
          uReference: b,
          uOther: d,
          trials: 1000,
        });
        if (found instanceof Refusal) sound(found);
        else for (const one of Object.values(found)) sound(one);
      }),
      { numRuns: 300 },
    );
  });
});
