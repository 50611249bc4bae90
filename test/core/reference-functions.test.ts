/** What must hold of every published record, whatever its digits. */
import { describe, expect, it } from "vitest";
import {
  furtherDesignations,
  letterDesignations,
  publications,
  type Thermocouple,
  thermocouple,
} from "../../src/core";

const couples = [...letterDesignations, ...furtherDesignations].map(
  (name) => thermocouple(name) as Thermocouple,
);

/**
 * The largest step at a join of the published functions, mV. It belongs to GOST R 8.585 chromel/copel at 0 °C,
 * whose two printed constants differ by 0.04 µV; all others are below 3 nV.
 */
const LARGEST_STEP = { "Chromel/Copel": 4.1e-5 } as Readonly<Record<string, number>>;

describe.each(couples.map((couple) => [couple.designation, couple] as const))("%s", (designation, couple) => {
  const { segments, standard, publication, evidence, conductors } = couple.reference;

  it("says where it comes from", () => {
    expect(publications[standard].citation).not.toBe("");
    expect(publications[publication].citation).not.toBe("");
    expect(evidence).not.toBe("");
    expect(conductors).toContain("/");
  });

  it("has adjoining, rising segments", () => {
    segments.forEach(({ from, to }, index) => {
      expect(from).toBeLessThan(to);
      if (index > 0) expect(from).toBe(segments[index - 1]?.to);
    });
  });

  it("hardly steps at its joins", () => {
    for (const { from } of segments.slice(1)) {
      const below = couple.emf(from);
      const above = couple.emf(from + Math.abs(from) * 2 ** -52 + Number.MIN_VALUE);
      expect(Math.abs(above - below)).toBeLessThan(LARGEST_STEP[designation] ?? 3e-6);
    }
  });

  it("is zero at 0 °C but for a published constant", () => {
    expect(Math.abs(couple.emf(0))).toBeLessThan(designation === "A" ? 7.2e-4 : 1.1e-4);
  });

  it("rises where its EMF is unique", () => {
    const steps = 2000;
    let before = couple.emfUniqueFrom;
    for (let i = 1; i <= steps; i++) {
      const emf = couple.emf(couple.uniqueFrom + ((couple.high - couple.uniqueFrom) * i) / steps);
      expect(emf).toBeGreaterThan(before);
      before = emf;
    }
  });

  it("has the slope of its own EMF", () => {
    for (const { from, to } of segments) {
      for (const share of [0.1, 0.35, 0.5, 0.8, 0.95]) {
        const t = from + share * (to - from);
        const h = (to - from) * 1e-5;
        const chord = (couple.emf(t + h) - couple.emf(t - h)) / (2 * h);
        expect(couple.seebeck(t)).toBeCloseTo(chord, 7);
      }
    }
  });

  it("answers at both ends and nowhere beyond", () => {
    expect(couple.temperature(couple.emfHigh)).toBe(couple.high);
    expect(couple.temperature(couple.emfUniqueFrom)).toBe(couple.uniqueFrom);
    expect(couple.temperature(couple.emfHigh + 9e-10)).toBe(couple.high);
    expect(couple.temperature(couple.emfUniqueFrom - 9e-10)).toBe(couple.uniqueFrom);
    expect(couple.temperature(couple.emfHigh + 2e-9)).toBeNaN();
    expect(couple.temperature(couple.emfUniqueFrom - 2e-9)).toBeNaN();
    expect(couple.emf(couple.high + 1e-9)).toBeNaN();
    expect(couple.emf(couple.low - 1e-9)).toBeNaN();
    expect(couple.seebeck(couple.high + 1e-9)).toBeNaN();
    for (const beyond of [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]) {
      expect(couple.temperature(beyond)).toBeNaN();
      expect(couple.emf(beyond)).toBeNaN();
    }
  });

  it("is found by each of its names", () => {
    for (const name of [designation, ...couple.reference.otherNames]) {
      expect(thermocouple(name)).toBe(couple);
      expect(thermocouple(` type ${name.toLowerCase()} `)).toBe(couple);
      expect(thermocouple(name.toUpperCase())).toBe(couple);
    }
  });
});

describe("type B", () => {
  const b = thermocouple("B") as Thermocouple;

  it("gives no temperature for an EMF that belongs to two", () => {
    expect(b.temperature(-0.001)).toBeNaN();
    expect(b.temperature(0)).toBe(b.uniqueFrom);
  });
});

describe("type A", () => {
  it("has its lowest EMF at 0 °C, its constant, and none below", () => {
    const a = thermocouple("A") as Thermocouple;
    expect(a.temperature(0.00071564735)).toBe(0);
    expect(a.temperature(0)).toBeNaN();
  });
});

describe("a join whose sides do not meet", () => {
  const meets = couples.flatMap((couple) =>
    couple.reference.segments.slice(1).map(({ from }) => {
      const below = couple.emf(from);
      const above = couple.emf(from + Math.max(Math.abs(from) * 2 ** -52, Number.MIN_VALUE));
      return { couple, from, below, above };
    }),
  );

  it.each(meets.filter(({ below, above }) => above > below))(
    "$couple.designation at $from °C: an EMF in the gap gives the join",
    ({ couple, from, below, above }) => {
      expect(couple.temperature(below + (above - below) / 2)).toBeCloseTo(from, 9);
    },
  );

  it.each(meets.filter(({ below, above }) => above < below))(
    "$couple.designation at $from °C: an EMF in the overlap gives the lower segment",
    ({ couple, from, below, above }) => {
      expect(couple.temperature(above + (below - above) / 2)).toBeLessThanOrEqual(from);
    },
  );
});

describe("names that are not couples", () => {
  it.each(["", "type", "L", "M", "constructor", "__proto__", "toString", "KK", "K,", "X".repeat(32767)])(
    "%s is unknown",
    (name) => {
      expect(thermocouple(name)).toBeUndefined();
    },
  );
});
