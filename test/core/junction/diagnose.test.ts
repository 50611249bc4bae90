import { describe, expect, it } from "vitest";
import { letterDesignations, Refusal, type Thermocouple, thermocouple } from "../../../src/core";
import { diagnose, type Explanation, leadError } from "../../../src/core/junction";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const best = (found: readonly Explanation[] | Refusal): Explanation => {
  if (found instanceof Refusal) throw new Error(found.message());
  return found[0] as Explanation;
};

describe("diagnose", () => {
  const k = couple("K");

  it("recognises each fault from the reading that it makes", () => {
    const terminals = 22;
    const shows = (emfAtTerminals: number, set = k) => set.temperature(emfAtTerminals + set.emf(terminals));
    const sound = k.emf(180) - k.emf(terminals);
    const faults: [string, number][] = [
      ["no fault", 180],
      ["instrument set to type J", shows(sound, couple("J"))],
      ["couple is type E", shows(couple("E").emf(180) - couple("E").emf(terminals))],
      ["crossed at the terminals", k.temperature(2 * k.emf(terminals) - k.emf(180))],
      ["crossed at the head", k.temperature(2 * k.emf(61) - k.emf(180))],
      ["extension crossed at both ends", k.temperature(k.emf(180) - 2 * (k.emf(61) - k.emf(terminals)))],
      ["copper from head to terminals", 180 + (leadError(180, k, "copper", 61, terminals) as number)],
      ["extension of type J", 180 + (leadError(180, k, couple("J"), 61, terminals) as number)],
      ["reference junction not compensated", k.temperature(sound)],
      ["reference junction compensated twice", k.temperature(k.emf(180) + k.emf(terminals))],
    ];
    for (const [fault, indicated] of faults) {
      const found = best(diagnose(indicated, 180, k, terminals, 61));
      expect(found.fault).toBe(fault);
      expect(found.temperature).toBeCloseTo(180, 8);
      expect(found.residual).toBeCloseTo(0, 8);
    }
  });

  it("puts the least difference from the expected reading first", () => {
    const found = diagnose(431, 500, k, 25, 70) as readonly Explanation[];
    const sizes = found.map(({ residual }) => Math.abs(residual));
    expect(sizes).toEqual([...sizes].sort((a, b) => a - b));
    for (const { temperature, residual } of found) expect(temperature - 500).toBe(residual);
  });

  it("leaves out what cannot be, and always holds the reading as it stands", () => {
    const found = diagnose(1300, 1300, k, 25) as readonly Explanation[];
    const faults = found.map(({ fault }) => fault);
    expect(faults[0]).toBe("no fault");
    expect(faults).not.toContain("crossed at the terminals");
    expect(faults).not.toContain("instrument set to type J");
    expect(new Set(faults).size).toBe(faults.length);
  });

  it("weighs the run to the terminals only where the head temperature is given", () => {
    const faults = (head?: number) =>
      (diagnose(100, 120, k, 25, head) as readonly Explanation[]).map(({ fault }) => fault);
    expect(faults()).toContain("crossed at the terminals");
    for (const fault of [
      "crossed at the head",
      "extension crossed at both ends",
      "copper from head to terminals",
    ]) {
      expect(faults()).not.toContain(fault);
      expect(faults(60)).toContain(fault);
    }
  });

  it("weighs every letter type as setting and as couple, and the extensions of their own alloys (IEC 60584-3)", () => {
    const others = letterDesignations.filter((name) => name !== "K");
    const withoutHead = [
      "no fault",
      "reference junction not compensated",
      "reference junction compensated twice",
      ...others.flatMap((name) => [`instrument set to type ${name}`, `couple is type ${name}`]),
      "crossed at the terminals",
    ];
    const withHead = [
      ...withoutHead,
      "crossed at the head",
      "extension crossed at both ends",
      "copper from head to terminals",
      ...["E", "J", "N", "T"].map((name) => `extension of type ${name}`),
    ];
    // At these temperatures each of them has a true temperature.
    const faults = (head?: number) =>
      (diagnose(100, 120, k, 30, head) as readonly Explanation[]).map(({ fault }) => fault).sort();
    expect(faults()).toEqual(withoutHead.sort());
    expect(faults(60)).toEqual(withHead.sort());
  });

  it("serves couples that are no letter type", () => {
    expect(best(diagnose(500, 500, couple("Au/Pt"), 20)).fault).toBe("no fault");
  });

  it("refuses a reading that the couple cannot show", () => {
    const refused = (indicated: number, reference: number, head?: number) =>
      (diagnose(indicated, 500, k, reference, head) as Refusal).message();
    const outside = "is outside the range of type K, -270 °C to 1372 °C";
    expect(refused(2000, 25)).toBe(`indicated temperature 2000 °C ${outside}`);
    expect(refused(200, -300)).toBe(`reference temperature -300 °C ${outside}`);
    expect(refused(200, -300, 20)).toBe(`reference temperature -300 °C ${outside}`);
    expect(refused(200, 25, 9000)).toBe(`head temperature 9000 °C ${outside}`);
  });
});
