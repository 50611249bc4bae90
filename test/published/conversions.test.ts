/**
 * Worked conversions from print. Where the published answer came from a table with rounded
 * values, its tolerance says so in the row.
 */
import { describe, expect, it } from "vitest";
import { EMF, TEMPERATURE } from "../../src/functions";
import { fixedPoints, makersPage, textbook, textbookEmfs, textbookTemperatures } from "./conversions";

const one = (value: unknown): unknown[][] => [[value]];
const first = (cells: unknown[][]): number => cells[0]?.[0] as number;

describe(textbook, () => {
  it.each(textbookTemperatures)(
    "type K: %d mV with the terminals at %d °F is %d °F",
    (emf, reference, printed) => {
      expect(
        Math.abs(first(TEMPERATURE(one(emf), one("K"), one(reference), one("F"))) - printed),
      ).toBeLessThan(0.5);
    },
  );

  it.each(textbookEmfs)(
    "type %s: %d with the terminals at %d (°%s) gives %d mV",
    (type, t, reference, unit, printed, tolerance) => {
      expect(Math.abs(first(EMF(one(t), one(type), one(reference), one(unit))) - printed)).toBeLessThan(
        tolerance,
      );
    },
  );
});

describe("a sensor maker's technical page, EMF at 350 °C", () => {
  it.each(makersPage)("type %s: %d mV", (type, printed) => {
    expect(Math.abs(first(EMF(one(350), one(type))) - printed)).toBeLessThanOrEqual(0.0005 + 1e-9);
  });
});

describe("a textbook answer that is wrong", () => {
  it("adding the terminals' degrees instead of their EMF misses a type S reading by 21 °C", () => {
    // Posted answer: 5.975 mV → 671.37 °C, + 50 °C = 721.37 °C. By EMF: 5.975 + 0.299 mV → 699.87 °C.
    const right = first(TEMPERATURE(one(5.975), one("S"), one(50)));
    expect(right).toBeCloseTo(699.87, 1);
    expect(721.37 - right).toBeGreaterThan(21);
  });
});

describe("published EMF of type S at fixed points of ITS-90 (IEC 60584-1:2013 and calibration guides, from memory)", () => {
  it.each(fixedPoints)("%s, %d °C: %d mV", (_, t, printed) => {
    expect(Math.abs(first(EMF(one(t), one("S"))) - printed)).toBeLessThanOrEqual(0.00005 + 1e-9);
  });
});
