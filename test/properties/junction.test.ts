/** Each repair undoes its fault exactly, and each sensor's two functions undo each other. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { letterDesignations, Refusal, type Thermocouple, thermocouple } from "../../src/core";
import {
  diagnose,
  differential,
  leadError,
  platinumResistance,
  platinumTemperature,
  releaded,
  rereferenced,
  retyped,
  type Thermistor,
  thermistor,
  unreversed,
} from "../../src/core/junction";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const within = (from: number, to: number) => fc.double({ min: from, max: to, noNaN: true });
const types = fc.constantFrom(...letterDesignations);
const room = within(0, 60);

/**
 * Where a junction's temperature is told from its EMF to the 1E-9 °C that is asked for;
 * within a hundredth of a degree of a join two segments differ by nanovolts.
 */
const told = (c: Thermocouple, t: number): boolean =>
  t > c.uniqueFrom && t < c.high && c.reference.segments.every(({ from }) => Math.abs(t - from) > 0.01);
const bound = (c: Thermocouple, t: number): number => Math.max(1e-9, 1e-10 / c.seebeck(t));

/** The junction temperature of a couple, as a share of the range in which its EMF is unique. */
const junctionOf = (c: Thermocouple, share: number): number => c.uniqueFrom + share * (c.high - c.uniqueFrom);

/** Repairs the reading that a fault makes of t, and compares; a fault that shows no reading has nothing to repair. */
function undone(
  set: Thermocouple,
  emfShown: number,
  fitted: Thermocouple,
  t: number,
  repair: (shown: number) => number | Refusal,
): void {
  const shown = set.temperature(emfShown);
  fc.pre(told(fitted, t) && told(set, shown));
  const amplified = Math.max(1, set.seebeck(shown) / fitted.seebeck(t));
  expect(Math.abs((repair(shown) as number) - t)).toBeLessThanOrEqual(
    bound(fitted, t) + amplified * bound(set, shown),
  );
}

describe("a wiring fault is undone exactly", () => {
  it("by REREFERENCE", () => {
    fc.assert(
      fc.property(types, within(0, 1), room, room, (type, share, assumed, actual) => {
        const c = couple(type);
        const t = junctionOf(c, share);
        undone(c, c.emf(t) - c.emf(actual) + c.emf(assumed), c, t, (shown) =>
          rereferenced(shown, c, assumed, actual),
        );
      }),
    );
  });

  it("by RETYPE", () => {
    fc.assert(
      fc.property(types, types, within(0, 1), room, (setType, fittedType, share, reference) => {
        const [set, fitted] = [couple(setType), couple(fittedType)];
        const t = junctionOf(fitted, share);
        undone(set, fitted.emf(t) - fitted.emf(reference) + set.emf(reference), fitted, t, (shown) =>
          retyped(shown, set, fitted, reference),
        );
      }),
    );
  });

  it("by UNREVERSE, for the three crossings", () => {
    const crossings = fc.constantFrom("terminals", "head", "both");
    fc.assert(
      fc.property(types, crossings, within(0, 1), room, room, (type, crossing, share, reference, head) => {
        const c = couple(type);
        // Near room temperature, where a reversed EMF is still in range.
        const t = c.low + share * Math.min(c.high - c.low, 500);
        const [e, r, h] = [c.emf(t), c.emf(reference), c.emf(head)];
        const atTerminals = { terminals: -(e - r), head: -(e - h) + (h - r), both: e - h - (h - r) }[
          crossing
        ];
        undone(c, atTerminals + r, c, t, (shown) => unreversed(shown, c, crossing, reference, head));
      }),
      { numRuns: 300 },
    );
  });

  it("by RELEAD, and LEADERROR is what it took away", () => {
    fc.assert(
      fc.property(
        types,
        fc.option(types, { nil: undefined }),
        within(0, 1),
        room,
        room,
        (type, run, share, head, reference) => {
          const c = couple(type);
          const lead = run === undefined ? "copper" : couple(run);
          const t = junctionOf(c, share);
          const error = leadError(t, c, lead, head, reference);
          fc.pre(!(error instanceof Refusal));
          undone(c, c.emf(t + error), c, t, (shown) => releaded(shown, c, lead, head, reference));
          if (lead === c) expect(Math.abs(error)).toBeLessThanOrEqual(2 * bound(c, t));
        },
      ),
    );
  });

  it("by DIFFERENTIAL, for any count of pairs", () => {
    fc.assert(
      fc.property(types, fc.integer({ min: 1, max: 200 }), within(0, 1), room, (type, pairs, share, base) => {
        const c = couple(type);
        const t = junctionOf(c, share);
        fc.pre(told(c, t));
        const difference = differential(pairs * (c.emf(t) - c.emf(base)), c, base, pairs) as number;
        expect(Math.abs(base + difference - t)).toBeLessThanOrEqual(2 * bound(c, t));
      }),
    );
  });
});

it("a diagnosis never shows what is not a number, and is in order", () => {
  fc.assert(
    fc.property(
      types,
      fc.double(),
      within(-500, 3000),
      fc.double(),
      fc.option(fc.double(), { nil: undefined }),
      (type, indicated, expected, reference, head) => {
        const found = diagnose(indicated, expected, couple(type), reference, head);
        if (found instanceof Refusal) expect(found.message()).not.toMatch(/undefined/);
        else {
          expect(found.every(({ temperature }) => Number.isFinite(temperature))).toBe(true);
          for (const [i, { residual }] of found.entries()) {
            expect(Math.abs(residual)).toBeGreaterThanOrEqual(Math.abs(found[i - 1]?.residual ?? 0));
          }
        }
      },
    ),
  );
});

describe("a platinum sensor", () => {
  it("comes back from its resistance within 1E-9 °C, for any R0", () => {
    fc.assert(
      fc.property(within(-200, 850), within(1, 10_000), (t, r0) => {
        const resistance = platinumResistance(t, r0) as number;
        expect(Math.abs((platinumTemperature(resistance, r0) as number) - t)).toBeLessThanOrEqual(1e-9);
      }),
      { numRuns: 5000 },
    );
  });

  it("is a number or a refusal for any numbers whatever", () => {
    fc.assert(
      fc.property(fc.double(), fc.double(), (a, b) => {
        for (const value of [platinumTemperature(a, b), platinumResistance(a, b)]) {
          if (!(value instanceof Refusal)) expect(Number.isFinite(value)).toBe(true);
        }
      }),
      { numRuns: 5000 },
    );
  });
});

it("a thermistor is a number or a refusal for any numbers, and falls with its resistance", () => {
  const coefficients = fc.oneof(
    fc.tuple(within(0.5e-3, 2e-3), within(1e-4, 4e-4), within(-3e-7, 5e-7)),
    fc.tuple(within(10, 1e6), within(2000, 6000)),
    fc.array(fc.double(), { maxLength: 4 }),
  );
  fc.assert(
    fc.property(coefficients, within(-2, 20), within(-2, 20), (given, first, second) => {
      const sensor = thermistor(given);
      if (sensor instanceof Refusal) {
        expect(sensor.message()).not.toMatch(/undefined/);
        return;
      }
      const [low, high] = [Math.min(first, second), Math.max(first, second)].map((log) =>
        (sensor as Thermistor).temperature(Math.exp(log)),
      ) as [number | Refusal, number | Refusal];
      for (const t of [low, high]) if (!(t instanceof Refusal)) expect(Number.isFinite(t)).toBe(true);
      if (!(low instanceof Refusal) && !(high instanceof Refusal)) expect(low).toBeGreaterThanOrEqual(high);
    }),
    { numRuns: 3000 },
  );
});
