import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { letterDesignations, Refusal, type Thermocouple, thermocouple } from "../../src/core";
import {
  acceptanceLimit,
  checkTable,
  classMet,
  conformityProbability,
  type DecisionRule,
  decisionRule,
  enScore,
  largestPassRisk,
  statement,
  tolerance,
  toleranceClassesOf,
  toleranceClassNames,
  toleranceUv,
  type Verdict,
  verdict,
} from "../../src/core/conformity";

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const positive = within(1e-6, 1e3);
const anyFinite = fc.double({ noNaN: true, noDefaultInfinity: true });
const rule = fc
  .constantFrom("simple", "guarded", "conditional", "guarded 0.83", "conditional 1.5", "guarded 3")
  .map((name) => decisionRule(name) as DecisionRule);
const order: readonly Verdict[] = ["Fail", "Conditional fail", "Conditional pass", "Pass"];
const merit = (found: Verdict | Refusal): number => order.indexOf(found as Verdict);

const sound = (found: unknown): void => {
  if (found instanceof Refusal) expect(found.message()).not.toMatch(/NaN|undefined|Infinity/);
  else if (typeof found === "number") expect(Number.isFinite(found)).toBe(true);
  else expect(found).toBeTypeOf("string");
};

describe("verdict", () => {
  it("never gets better as the error grows", () => {
    fc.assert(
      fc.property(
        positive,
        positive,
        rule,
        within(0, 3),
        within(0, 3),
        fc.boolean(),
        (limit, u, how, a, b, minus) => {
          const [small, large] = [Math.min(a, b) * limit, Math.max(a, b) * limit].map((e) =>
            minus ? -e : e,
          );
          const smaller = merit(verdict(small as number, limit, u, how));
          expect(smaller).toBeGreaterThanOrEqual(merit(verdict(large as number, limit, u, how)));
          expect(smaller).toBeGreaterThanOrEqual(0);
        },
      ),
    );
  });

  it("never turns from Fail to Pass by a wider guard band", () => {
    fc.assert(
      fc.property(positive, within(-3, 3), positive, positive, rule, (limit, share, u, more, how) => {
        const error = share * limit;
        const passes = (uncertainty: number, by: DecisionRule) =>
          verdict(error, limit, uncertainty, by) === "Pass";
        if (passes(u + more, how)) expect(passes(u, how)).toBe(true);
        const wider = { ...how, multiple: how.multiple + more };
        if (how.kind !== "simple" && passes(u, wider)) expect(passes(u, how)).toBe(true);
      }),
    );
  });

  it("passes exactly what lies within the acceptance limit", () => {
    fc.assert(
      fc.property(positive, within(-1.5, 1.5), positive, rule, (limit, share, u, how) => {
        const accepted = acceptanceLimit(limit, u, how);
        const error = share * limit;
        fc.pre(accepted instanceof Refusal || Math.abs(Math.abs(error) - accepted) > 2e-9);
        const passed = !(accepted instanceof Refusal) && Math.abs(error) <= accepted;
        expect(verdict(error, limit, u, how) === "Pass").toBe(passed);
      }),
    );
  });

  it("is the same for limits and error turned over", () => {
    fc.assert(
      fc.property(
        within(-10, 10),
        within(-10, 10),
        within(0, 10),
        positive,
        rule,
        (error, lower, span, u, how) => {
          const upper = lower + span;
          expect(verdict(error, upper, u, how, lower)).toBe(verdict(-error, -lower, u, how, -upper));
        },
      ),
    );
  });

  it("is the same in any unit of the error, to within the ninth decimal", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -4000, max: 4000 }),
        fc.integer({ min: 1, max: 3000 }),
        (error, limit) => {
          const celsius = verdict(error / 1000, limit / 1000);
          expect(verdict((error / 1000) * (5 / 9), (limit / 1000) * (5 / 9))).toBe(celsius);
        },
      ),
    );
  });
});

describe("conformityProbability", () => {
  it("lies between 0 and 1, and with its complement makes 1", () => {
    fc.assert(
      fc.property(within(-50, 50), within(-10, 10), positive, (value, upper, u) => {
        const below = conformityProbability(value, upper, u, "none") as number;
        const above = conformityProbability(-value, -upper, u, "none") as number;
        expect(below).toBeGreaterThanOrEqual(0);
        expect(below + above).toBeCloseTo(1, 14);
      }),
    );
  });

  it("is at least one less the risk for whatever passes", () => {
    fc.assert(
      fc.property(positive, within(-1, 1), within(0.01, 1), rule, (limit, share, ratio, how) => {
        const uncertainty = ratio * limit;
        const error = share * limit;
        fc.pre(verdict(error, limit, uncertainty, how) === "Pass");
        const risk = largestPassRisk(limit, uncertainty, how, 2) as number;
        const conforms = conformityProbability(error, limit, uncertainty / 2) as number;
        // The ninth decimal may let an error pass that lies 1E-9 outside.
        expect(1 - conforms).toBeLessThanOrEqual(risk + 1e-2 * (1e-6 / limit));
      }),
    );
  });
});

describe("classMet", () => {
  it("never gets tighter as an error grows", () => {
    const rank = (name: string): number => ["1", "2", "3", "none"].indexOf(name);
    fc.assert(
      fc.property(within(-200, 1200), within(0, 12), within(0, 12), (t, a, b) => {
        const met = (error: number): number => rank(classMet([t], [error], "K") as string);
        expect(met(Math.max(a, b))).toBeGreaterThanOrEqual(met(Math.min(a, b)));
      }),
    );
  });

  it("passes with the class that it names", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...letterDesignations),
        fc.constantFrom("IEC", "ASTM"),
        fc.array(fc.tuple(within(-200, 1700), within(-5, 5)), { minLength: 1, maxLength: 4 }),
        (type, standard, points) => {
          const met = classMet(
            points.map(([t]) => t),
            points.map(([, error]) => error),
            type,
            standard,
          );
          fc.pre(!(met instanceof Refusal) && met !== "none");
          for (const [t, error] of points) {
            expect(verdict(error, tolerance(type, met as string, t) as number)).toBe("Pass");
          }
        },
      ),
    );
  });
});

describe("whatever numbers are given", () => {
  it("a tolerance is above 0 or refused", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...letterDesignations, "Pt", "Au/Pt"),
        fc.constantFrom(...toleranceClassNames),
        fc.oneof(within(-300, 2600), anyFinite),
        (type, name, t) => {
          const limit = tolerance(type, name, t);
          sound(limit);
          if (typeof limit === "number") expect(limit).toBeGreaterThan(0);
          const couple = thermocouple(type) as Thermocouple | undefined;
          if (couple !== undefined) sound(toleranceUv(couple, name, t));
        },
      ),
    );
  });

  it("a limit grows with |t| within its class", () => {
    fc.assert(
      fc.property(fc.constantFrom(...letterDesignations, "Pt"), within(0, 1), within(0, 1), (type, a, b) => {
        for (const one of toleranceClassesOf(type)) {
          const at = (share: number): number => {
            const low = Math.max(0, one.from);
            return one.limit(low + share * (Math.max(low, one.to) - low)) as number;
          };
          expect(at(Math.max(a, b))).toBeGreaterThanOrEqual(at(Math.min(a, b)));
        }
      }),
    );
  });

  it("every answer is a finite number, a word or a refusal", () => {
    const lower = fc.oneof(anyFinite, fc.constant("none" as const), fc.constant(undefined));
    fc.assert(
      fc.property(anyFinite, anyFinite, anyFinite, anyFinite, lower, rule, (a, b, c, d, low, how) => {
        sound(verdict(a, b, c, how, low));
        sound(acceptanceLimit(a, b, how));
        sound(conformityProbability(a, b, c, low));
        sound(largestPassRisk(a, b, how, c, low));
        sound(enScore(a, b, c, d));
        const stated = statement(a, b, c, how, d);
        sound(stated instanceof Refusal ? stated : stated.sentence());
        const table = checkTable({ references: [a], readings: [[b]], limits: c, uncertainty: d, rule: how });
        if (table instanceof Refusal) sound(table);
        else for (const row of table) for (const cell of Object.values(row)) sound(cell);
      }),
      { numRuns: 2000 },
    );
  });
});
