import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import { type Thermistor, thermistor } from "../../../src/core/junction";

const believed = (coefficients: number[]): Thermistor => {
  const sensor = thermistor(coefficients);
  if (sensor instanceof Refusal) throw new Error(sensor.message());
  return sensor;
};
const message = (value: unknown): string => (value instanceof Refusal ? value.message() : "no refusal");

describe("thermistor by resistance at 25 °C and beta", () => {
  const sensor = believed([10_000, 3950]);

  it("is at 25 °C with that resistance", () => {
    expect(sensor.temperature(10_000)).toBeCloseTo(25, 11);
  });

  it("follows R = R25 exp(β (1/T − 1/298.15 K))", () => {
    for (const t of [-40, 0, 20, 60, 120]) {
      const resistance = 10_000 * Math.exp(3950 * (1 / (t + 273.15) - 1 / 298.15));
      expect(sensor.temperature(resistance)).toBeCloseTo(t, 10);
    }
  });

  it("catches the two in the wrong order", () => {
    expect(message(thermistor([3950, 10_000]))).toBe(
      "thermistor coefficients: no thermistor has a beta of 10000 K at 25 °C",
    );
  });
});

describe("thermistor by A, B and C", () => {
  it("refuses resistances that no thermistor in use has", () => {
    const sensor = believed([1.129241e-3, 2.341077e-4, 8.775468e-8]);
    expect(message(sensor.temperature(0))).toBe("resistance is 0 or an empty cell");
    expect(message(sensor.temperature(-1))).toBe("resistance -1 Ω is not above 0");
    expect(message(sensor.temperature(0.5))).toContain("outside what this thermistor can have");
    expect(sensor.temperature(1e9)).toBeInstanceOf(Refusal);
    expect(sensor.temperature(1e-300)).toBeInstanceOf(Refusal);
  });

  it.each([
    ["typed without their powers of ten", [1.129241, 2.341077, 8.775468]],
    ["in milli-units", [1.129241, 0.2341077, 8.775468e-5]],
    ["in the order C, B, A", [8.775468e-8, 2.341077e-4, 1.129241e-3]],
    ["of a sensor whose resistance rises with the temperature", [5.5e-3, -2.3e-4, -1e-8]],
    ["that turn back inside the working range", [1e-3, 3e-4, -6e-7]],
    ["all zero", [0, 0, 0]],
    ["a single empty cell: A alone", [1.129241e-3, 0, 0]],
    ["of another count", [1, 2, 3, 4]],
    ["none", []],
  ])("refuses coefficients %s", (_, coefficients) => {
    const refused = thermistor(coefficients);
    expect(refused).toBeInstanceOf(Refusal);
    expect((refused as Refusal).kind).toBe("wrong kind");
    expect(message(refused)).not.toMatch(/NaN|Infinity|undefined/);
  });

  it("believes a set with C = 0 and one with a small negative C", () => {
    expect(believed([1.0212e-3, 2.5316e-4, 0]).temperature(10_000)).toBeCloseTo(25, 0);
    expect(believed([8.7e-4, 2.9e-4, -1e-7]).temperature(8000)).toBeGreaterThan(0);
  });
});
