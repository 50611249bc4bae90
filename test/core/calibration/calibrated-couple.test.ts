import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, thermocouple } from "../../../src/core";
import { type CalibratedCouple, calibratedCouple } from "../../../src/core/calibration";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const message = (value: unknown): string => (value instanceof Refusal ? value.message() : "no refusal");
const made = (...given: Parameters<typeof calibratedCouple>): CalibratedCouple => {
  const found = calibratedCouple(...given);
  if (found instanceof Refusal) throw new Error(found.message());
  return found;
};

describe("a calibrated couple", () => {
  const s = couple("S");
  // ΔE(t) = 2 µV + 0.01 µV/°C · t − 4E-6 µV/°C² · t²
  const coefficients = [2, 0.01, -4e-6];
  const deviation = (t: number) => (2 + 0.01 * t - 4e-6 * t * t) / 1000;
  const own = made(s, coefficients, 0, 1200);

  it("adds its deviation in µV to the reference function in mV", () => {
    expect(own.emf(800, 0)).toBeCloseTo(s.emf(800) + deviation(800), 14);
  });

  it("read through an extension cable subtracts the reference function alone", () => {
    expect(own.emf(800, 25)).toBeCloseTo(s.emf(800) + deviation(800) - s.emf(25), 14);
  });

  it("whose own wires reach the reference junction subtracts its deviation there too", () => {
    expect(own.emf(800, 25, "individual")).toBeCloseTo(
      s.emf(800) + deviation(800) - s.emf(25) - deviation(25),
      14,
    );
    expect(own.emf(25, 25, "individual")).toBe(0);
  });

  it("comes back by either kind of reference", () => {
    for (const by of ["standard", "individual"] as const) {
      for (const t of [0.5, 26, 640, 1199.9]) {
        expect(own.temperature(own.emf(t, 24, by) as number, 24, by)).toBeCloseTo(t, 9);
      }
    }
  });

  it("with coefficients of zero is its reference function", () => {
    const plain = made(s, [0], 100, 1500);
    expect(plain.temperature(9.5, 20)).toBeCloseTo(s.temperature(9.5 + s.emf(20)), 11);
  });

  it("answers from low to high and nowhere beyond", () => {
    expect(own.temperature(own.emf(1200, 0) as number, 0)).toBe(1200);
    expect(own.temperature((own.emf(0, 0) as number) - 9e-10, 0)).toBe(0);
    expect(message(own.emf(1201, 0))).toBe(
      "temperature 1201 °C is outside the calibrated range, 0 °C to 1200 °C",
    );
    expect(message(own.temperature(15, 0))).toMatch(
      /^the EMF comes to 15 mV, outside the calibrated range, 0\.002 mV \(0 °C\) to 11\.9\d* mV \(1200 °C\)$/,
    );
    expect(own.temperature(Number.POSITIVE_INFINITY, 0)).toBeInstanceOf(Refusal);
  });

  it("takes what lies beyond an end by no more than 1E-9, °C or mV, as that end", () => {
    for (const by of [0, 5e-10, 1e-9]) {
      expect(own.emf(0 - by, 0)).toBe(own.emfLow);
      expect(own.emf(1200 + by, 0)).toBe(own.emfHigh);
      expect(own.temperature(own.emfLow - by, 0)).toBe(0);
      expect(own.temperature(own.emfHigh + by, 0)).toBe(1200);
    }
    expect(message(own.emf(-2e-9, 0))).toContain("is outside the calibrated range, 0 °C to 1200 °C");
    expect(own.emf(1200 + 2e-9, 0)).toBeInstanceOf(Refusal);
    expect(own.temperature(own.emfLow - 2e-9, 0)).toBeInstanceOf(Refusal);
    expect(own.temperature(own.emfHigh + 2e-9, 0)).toBeInstanceOf(Refusal);
    // So it is where the reference function ends as well.
    const whole = made(s, [1], -50, 1000);
    expect(whole.emf(-50 - 5e-10, 0)).toBe(whole.emfLow);
  });

  it("knows its deviation at the very ends of its range", () => {
    const high = made(s, coefficients, 400, 1100);
    expect(high.emf(400, 400, "individual")).toBe(0);
    expect(high.emf(1100, 1100, "individual")).toBe(0);
    expect(message(high.emf(800, 1101, "individual"))).toContain("reference temperature 1101 °C is outside");
  });

  it("does not mind what its deviation would do outside the range, in the next segment", () => {
    // ΔE' = −0.011 t passes the slope of type S, 11.5 µV/°C at 1000 °C, near 1060 °C; the next segment starts at 1064.18 °C.
    expect(made(s, [0, 0, -0.0055], 0, 1000).high).toBe(1000);
    expect(message(calibratedCouple(s, [0, 0, -0.0055], 0, 1150))).toContain("turns back at 10");
  });

  it("does not extrapolate its deviation to a reference junction outside the range", () => {
    const high = made(s, coefficients, 400, 1100);
    expect(message(high.emf(800, 25, "individual"))).toBe(
      "reference temperature 25 °C is outside the calibrated range, 400 °C to 1100 °C: the couple's own deviation there is not known",
    );
    expect(message(high.temperature(5, 25, "individual"))).toBe(message(high.emf(800, 25, "individual")));
    expect(message(high.emf(800, 5000))).toContain(
      "reference temperature 5000 °C is outside the range of type S",
    );
    // An ice point is where the certificate's own reference junction was.
    expect(high.emf(800, 0, "individual")).toBe(high.emf(800, 0, "standard"));
  });

  it.each([
    ["K", -200, 1300, 0],
    ["S", -50, 1768, 1064.18],
    ["B", 100, 1800, 630.615],
  ])("of type %s gives the join of two segments itself, and both sides of it", (type, low, high, join) => {
    const own = made(couple(type), [5, -0.002], low, high);
    for (const t of [join - 0.01, join, join + 0.01]) {
      expect(own.temperature(own.emf(t, 100) as number, 100)).toBeCloseTo(t, 9);
    }
  });

  it("of type B may be calibrated from above the minimum of its EMF", () => {
    const b = made(couple("B"), [0], 25, 1700);
    // 30 °C has the same EMF as 12 °C, but that is not in the range.
    expect(b.temperature(couple("B").emf(30), 0)).toBeCloseTo(30, 7);
  });
});

describe("coefficients that are refused", () => {
  const s = couple("S");

  it("make the EMF turn back, and the temperature is named", () => {
    // 2 µV/°C² · (t − 800)²/2 falls away above 800 °C: S'(t) − 0.2 (t − 800) = 0 where S = 0.2 (t − 800).
    const c = -0.1;
    const refused = calibratedCouple(s, [c * 800 ** 2, -2 * c * 800, c], 700, 1000);
    const named = Number(/turns back at ([\d.]+) °C, inside 700 °C to 1000 °C/.exec(message(refused))?.[1]);
    expect(Math.abs(s.seebeck(named) * 1000 - 0.2 * (named - 800))).toBeLessThan(1e-3);
  });

  it("do so in a dip between two looks", () => {
    // A tenth-order ΔE whose slope dips below −S over a fraction of a degree near 500.3 °C.
    const dip = (t: number) => t - 500.3;
    const slope = s.seebeck(500.3) * 1000;
    // ΔE' = −1.001 S + 5 (t − 500.3)², so ΔE = −1.001 S t + 5/3 (t − 500.3)³.
    const cubic = 5 / 3;
    const coefficients = [
      cubic * -(500.3 ** 3),
      cubic * 3 * 500.3 ** 2 - 1.001 * slope,
      cubic * -3 * 500.3,
      cubic,
    ];
    const refused = calibratedCouple(s, coefficients, 0, 1600);
    expect(message(refused)).toMatch(/turns back at 500\.\d+ °C/);
    expect(dip(Number(/at ([\d.]+)/.exec(message(refused))?.[1]))).toBeLessThan(0);
  });

  it("of type B from 0 °C, whose own EMF falls first", () => {
    expect(message(calibratedCouple(couple("B"), [0], 0, 1700))).toMatch(/turns back at 21\.0\d* °C/);
  });

  it("make the EMF fall throughout", () => {
    expect(message(calibratedCouple(s, [0, -100], 0, 1000))).toBe(
      "with these coefficients the EMF falls from 0 °C to 1000 °C",
    );
  });

  it("come with an empty range, one outside the reference function, or not at all", () => {
    expect(message(calibratedCouple(s, [0], 500, 500))).toBe("low 500 °C is not below high 500 °C");
    expect(message(calibratedCouple(s, [0], 0, 1800))).toBe(
      "high 1800 °C is outside the range of type S, -50 °C to 1768.1 °C",
    );
    expect(message(calibratedCouple(s, [0], -60, 1000))).toBe(
      "low -60 °C is outside the range of type S, -50 °C to 1768.1 °C",
    );
    expect(message(calibratedCouple(s, [], 0, 1000))).toBe("no coefficients are given");
  });

  it("are too large for a double", () => {
    expect(calibratedCouple(s, [0, 1e308, 1e308], 0, 1000)).toBeInstanceOf(Refusal);
    expect(message(calibratedCouple(s, [1e308, 1], 0, 1000))).toBe("the coefficients are too large");
  });
});
