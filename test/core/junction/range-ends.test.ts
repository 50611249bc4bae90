/** The very ends of a platinum sensor's range, and a thermistor's curve where it turns. */
import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import {
  platinumResistance,
  platinumTemperature,
  type Thermistor,
  thermistor,
} from "../../../src/core/junction";

const message = (value: unknown): string => (value instanceof Refusal ? value.message() : `${value}`);

describe("a platinum sensor", () => {
  /** IEC 60751 as printed, R0 = 100 Ω; nothing shared with the code, and no range. */
  const printed = (t: number): number =>
    100 * (1 + 3.9083e-3 * t - 5.775e-7 * t ** 2 + (t < 0 ? -4.183e-12 * (t - 100) * t ** 3 : 0));

  it("has a resistance up to 1E-9 °C beyond an end, and none further", () => {
    expect(platinumResistance(-200 - 0.9e-9, 100)).toBeCloseTo(printed(-200), 7);
    expect(platinumResistance(850 + 0.9e-9, 100)).toBeCloseTo(printed(850), 7);
    expect(platinumResistance(-200 - 1e-9, 100)).toBeCloseTo(printed(-200), 7);
    expect(platinumResistance(850 + 1e-9, 100)).toBeCloseTo(printed(850), 7);
    const outside = /^temperature .* is outside the range of platinum sensors, -200 °C to 850 °C$/;
    expect(message(platinumResistance(-200 - 1.1e-9, 100))).toMatch(outside);
    expect(message(platinumResistance(850 + 1.1e-9, 100))).toMatch(outside);
    expect(message(platinumResistance(Number.NaN, 100))).toMatch(outside);
  });

  it("has the temperature of an end for what lies up to 1E-9 °C beyond it, and none further", () => {
    expect(platinumTemperature(printed(-200 - 0.99e-9), 100)).toBe(-200);
    expect(platinumTemperature(printed(850 + 0.99e-9), 100)).toBe(850);
    const outside =
      /^resistance .* is outside the range of a platinum sensor with 100 Ω at 0 °C, 18.5201 Ω \(-200 °C\) to 390.481 Ω \(850 °C\)$/;
    expect(message(platinumTemperature(printed(-200 - 1.01e-9), 100))).toMatch(outside);
    expect(message(platinumTemperature(printed(850 + 1.01e-9), 100))).toMatch(outside);
    expect(message(platinumTemperature(Number.POSITIVE_INFINITY, 100))).toMatch(outside);
  });

  it("comes back from its printed resistance below 0 °C to the last digits", () => {
    for (const t of [-199.9, -150, -100, -50, -10, -1, -0.001]) {
      expect(Math.abs((platinumTemperature(printed(t), 100) as number) - t)).toBeLessThan(2e-13 * 200);
    }
  });

  it("refuses what is no resistance at 0 °C, and a resistance beyond all numbers", () => {
    for (const sensor of [platinumResistance, platinumTemperature]) {
      expect(message(sensor(20, 0))).toBe("resistance at 0 °C (r0) is 0 or an empty cell");
      expect(message(sensor(20, -100))).toBe("resistance at 0 °C (r0) is -100 Ω, not above 0");
    }
    expect(message(platinumResistance(850, 1e308))).toBe("resistance is too large for a number");
  });
});

describe("a thermistor", () => {
  const believed = (...coefficients: number[]): Thermistor => {
    const sensor = thermistor(coefficients);
    if (sensor instanceof Refusal) throw new Error(sensor.message());
    return sensor;
  };
  /** 1/T = A + B ln R + C ln³R, as printed by Steinhart and Hart; in °C. */
  const printed = (a: number, b: number, c: number, log: number): number =>
    1 / (a + b * log + c * log ** 3) - 273.15;
  const outside = (resistance: string) =>
    `resistance ${resistance} Ω is outside what this thermistor can have from -100 °C to 350 °C`;

  // B + 3C ln²R = 0 at ln R = 18 (cold), ± 3 (hot) and 3 (hot); past it the curve runs back into the range.
  it.each([
    ["a cold turn", [7.39e-4, 3.11e-4, -3.2e-7], 17.9, 20.7],
    ["a hot turn below 1 Ω", [3.254e-3, 1e-3, -3.7e-5], -1.5, -5],
    ["a hot turn above 1 Ω", [1.794e-3, -7.91e-5, 2.93e-6], 3.1, -2],
  ] as const)("with %s is read up to it, and not past it", (_, [a, b, c], upTo, past) => {
    const sensor = believed(a, b, c);
    expect(sensor.temperature(Math.exp(upTo))).toBeCloseTo(printed(a, b, c, upTo), 8);
    const misread = printed(a, b, c, past);
    expect(misread > -100 && misread < 350).toBe(true);
    const named = String(Number(Math.exp(past).toPrecision(6)));
    expect(message(sensor.temperature(Math.exp(past)))).toBe(outside(named));
  });

  it("is read from −100 to 350 °C, the ends included", () => {
    // 350 °C at 1 Ω.
    const sensor = believed(1 / 623.15, 2.19e-4, 0);
    expect(sensor.temperature(1)).toBe(350);
    expect(message(sensor.temperature(0.999))).toBe(outside("0.999"));
    const atMinus = (t: number): number => 10_000 * Math.exp(3950 * (1 / (t + 273.15) - 1 / 298.15));
    expect(believed(10_000, 3950).temperature(atMinus(-99.99))).toBeCloseTo(-99.99, 9);
    expect(believed(10_000, 3950).temperature(atMinus(-100.01))).toBeInstanceOf(Refusal);
  });

  it("has no more than 1 TΩ and no less than 1 mΩ", () => {
    // 1/T = 1/298.15 K + ln(R/R25)/β reaches both within −100 to 350 °C for the extremes of R25 and β.
    const sensor = believed(1e8, 8000);
    const t = (resistance: number): number => 1 / (1 / 298.15 + Math.log(resistance / 1e8) / 8000) - 273.15;
    expect(sensor.temperature(0.99e12)).toBeCloseTo(t(0.99e12), 9);
    expect(sensor.temperature(1e12)).toBeCloseTo(t(1e12), 9);
    expect(sensor.temperature(1.01e12)).toBeInstanceOf(Refusal);
    const low = believed(1, 8000);
    expect(low.temperature(0.00101)).toBeCloseTo(1 / (1 / 298.15 + Math.log(0.00101) / 8000) - 273.15, 9);
    expect(low.temperature(0.001)).toBeCloseTo(1 / (1 / 298.15 + Math.log(0.001) / 8000) - 273.15, 9);
    expect(low.temperature(0.00099)).toBeInstanceOf(Refusal);
  });

  it("is believed from 1 Ω to 100 MΩ at 25 °C and with a beta from 1000 to 8000 K there", () => {
    const refused = (r25: number, beta: number) => message(thermistor([r25, beta]));
    for (const r25 of [1, 1e8]) for (const beta of [1000, 8000]) believed(r25, beta);
    const resistance = (r25: string) => `thermistor coefficients: no thermistor has ${r25} Ω at 25 °C`;
    expect(refused(0.99, 3950)).toBe(resistance("0.99"));
    expect(refused(1.01e8, 3950)).toBe(resistance("101000000"));
    expect(refused(-10, 3950)).toBe(resistance("-10"));
    const slope = (beta: string) => `thermistor coefficients: no thermistor has a beta of ${beta} K at 25 °C`;
    expect(refused(10_000, 999)).toBe(slope("999"));
    expect(refused(10_000, 8001)).toBe(slope("8001"));
    // The same of A, B and C: 1/B is beta where C is 0.
    expect(message(thermistor([1 / 298.15 - 9 / 900, 1 / 900, 0]))).toBe(slope("900"));
    expect(message(thermistor([1 / 298.15 - 20 / 3950, 1 / 3950, 0]))).toBe(resistance("485165000"));
  });

  it("says why a set of coefficients is none", () => {
    const counted = (count: number) =>
      `thermistor coefficients: ${count} given, not 3 (A, B, C) or 2 (resistance at 25 °C and beta)`;
    expect(message(thermistor([]))).toBe(counted(0));
    expect(message(thermistor([1]))).toBe(counted(1));
    expect(message(thermistor([1, 2, 3, 4]))).toBe(counted(4));
    const none =
      "thermistor coefficients: no resistance gives 25 °C; A, B and C are needed in this order, for Ω and K";
    expect(message(thermistor([0, 0, 0]))).toBe(none);
    expect(message(thermistor([10, 1e-4, 0]))).toBe(none);
    // Turns at ln R = 15, which is −25 °C, and at ln R = 3, which is 96 °C.
    const turns = (at: string) => `thermistor coefficients: the curve turns back before it reaches ${at} °C`;
    expect(message(thermistor([5.386e-4, 3.5e-4, -5.2e-7]))).toBe(turns("-40"));
    expect(message(thermistor([2.769e-3, -2.967e-5, 1.099e-6]))).toBe(turns("125"));
  });

  it("refuses a resistance that is none by what it is", () => {
    const sensor = believed(10_000, 3950);
    expect(message(sensor.temperature(0))).toBe("resistance is 0 or an empty cell");
    expect(message(sensor.temperature(-2))).toBe("resistance -2 Ω is not above 0");
    expect(message(sensor.temperature(Number.NaN))).toBe("resistance (not a number) Ω is not above 0");
  });
});
