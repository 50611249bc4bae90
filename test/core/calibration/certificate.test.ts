import { describe, expect, it } from "vitest";
import { Refusal, temperatureUnits } from "../../../src/core";
import { type Certificate, certificate, correctionUncertainty } from "../../../src/core/calibration";

const points = [100, 300, 500, 700, 900];
const corrections = [0.2, -0.4, -0.9, -0.6, 0.5];
const message = (value: unknown, symbol = "C"): string => {
  const unit = temperatureUnits.find((each) => each.symbol === symbol);
  return value instanceof Refusal ? value.message(unit) : "no refusal";
};
const made = (...given: Parameters<typeof certificate>): Certificate => {
  const found = certificate(...given);
  if (found instanceof Refusal) throw new Error(found.message());
  return found;
};

describe("a certificate", () => {
  it.each(["linear", "nearest", "smooth"] as const)("read by %s gives its points' own values", (method) => {
    const sensor = made(points, corrections, { method });
    points.forEach((point, i) => {
      expect(sensor.correction(point)).toBe(corrections[i]);
    });
  });

  it("is linear between points", () => {
    expect(made(points, corrections).correction(350)).toBeCloseTo(-0.4 - 0.25 * 0.5, 15);
  });

  it("takes the nearest point, half-way the lower", () => {
    const sensor = made(points, corrections, { method: "nearest" });
    expect([200, 200.1, 399.9].map((t) => sensor.correction(t))).toEqual([0.2, -0.4, -0.4]);
  });

  it("says the same whether its points rise or fall", () => {
    for (const method of ["linear", "nearest", "smooth", "fit2"] as const) {
      const up = made(points, corrections, { method });
      const down = made([...points].reverse(), [...corrections].reverse(), { method });
      for (const t of [100, 200, 333, 600, 899, 900]) expect(down.correction(t)).toBe(up.correction(t));
    }
  });

  it("given as errors has the opposite sign, without a negative zero", () => {
    const sensor = made([0, 100], [0, 0.3], { givenAs: "error" });
    expect(sensor.correction(100)).toBe(-0.3);
    expect(Object.is(sensor.correction(0), 0)).toBe(true);
  });

  it("given at true temperatures is moved to the readings by each point's own error", () => {
    // At a true 800 °C the sensor shows 802 °C: its correction of −2 °C belongs to a reading of 802 °C.
    const sensor = made([400, 800], [1, 2], { givenAs: "error", pointsAre: "true" });
    expect([sensor.first, sensor.last]).toEqual([401, 802]);
    expect(sensor.correction(802)).toBe(-2);
    expect(sensor.correction(400)).toBeInstanceOf(Refusal);
    expect(made([400, 800], [-1, -2], { pointsAre: "true" }).correction(600)).toBe(sensor.correction(600));
  });

  it("reads least squares of its order: a parabola through six of its own points is itself", () => {
    const parabola = (t: number) => 1 - 0.004 * t + 3e-6 * t * t;
    const at = [0, 200, 400, 600, 800, 1000];
    const sensor = made(at, at.map(parabola), { method: "fit2" });
    for (const t of at)
      expect(sensor.correction(t + (t < 1000 ? 50 : 0))).toBeCloseTo(parabola(t + (t < 1000 ? 50 : 0)), 12);
  });

  it("with a straight fit balances its residuals", () => {
    const sensor = made([0, 1, 2], [0, 1, 5], { method: "fit1" });
    // Slope 2.5, mean 2 at 1: the line −0.5 + 2.5 x.
    expect(sensor.correction(0)).toBeCloseTo(-0.5, 14);
    expect(sensor.correction(2)).toBeCloseTo(4.5, 14);
  });

  it.each(["linear", "nearest", "smooth"] as const)(
    "of one point, read by %s, serves that reading alone",
    (method) => {
      const sensor = made([850], [-1.2], { method });
      expect(sensor.correction(850)).toBe(-1.2);
      expect(message(sensor.correction(851))).toBe(
        "reading 851 °C is not the certificate's only point, 850 °C",
      );
    },
  );
});

describe("a certificate is never extrapolated", () => {
  const sensor = made(points, corrections, { method: "smooth" });

  it("and says between which points it holds", () => {
    expect(message(sensor.correction(950))).toBe(
      "reading 950 °C is outside the certificate's points, 100 °C to 900 °C",
    );
    expect(message(sensor.correction(99, "set point"))).toContain("set point 99 °C");
    expect(message(sensor.correction(Number.NaN))).not.toBe("no refusal");
  });

  it("but a reading that differs from an end by rounding is that end", () => {
    expect(sensor.correction(900 + 5e-10)).toBe(0.5);
    expect(sensor.correction(100 - 5e-10)).toBe(0.2);
    expect(sensor.correction(900 + 1e-9)).toBe(0.5);
    expect(sensor.correction(100 - 1e-9)).toBe(0.2);
    expect(sensor.correction(900 + 2e-9)).toBeInstanceOf(Refusal);
    expect(sensor.correction(100 - 2e-9)).toBeInstanceOf(Refusal);
  });
});

describe("points that are refused", () => {
  it("a trailing empty cell, which arrives as 0, is named", () => {
    expect(message(certificate([100, 300, 500, 0], [0.1, 0.2, 0.3, 0]))).toBe(
      "points must rise or fall throughout: point 4 is 0 °C (0 or an empty cell) after 500 °C",
    );
  });

  it("in °F the empty cell is 0 °F", () => {
    const zeroFahrenheit = (0 - 32) * (5 / 9);
    expect(message(certificate([100, 300, zeroFahrenheit], [0, 0, 0]), "F")).toBe(
      "points must rise or fall throughout: point 3 is 0 °F (0 or an empty cell) after 572 °F",
    );
  });

  it("an empty cell in the middle of rising points is named, not the good point after it", () => {
    expect(message(certificate([100, 0, 300, 400], [0, 0, 0, 0]))).toContain(
      "point 2 is 0 °C (0 or an empty cell)",
    );
  });

  it.each([
    ["equal", [100, 100]],
    ["all empty", [0, 0, 0]],
    ["turning", [100, 300, 200]],
  ])("%s points", (_, given) => {
    const refused = certificate(
      given,
      given.map(() => 0),
    );
    expect((refused as Refusal).kind).toBe("wrong kind");
  });

  it("none, or not as many as values", () => {
    expect(message(certificate([], []))).toBe("no points are given");
    expect(message(certificate([1, 2], [1]))).toBe("points and values differ in number, 2 and 1");
  });

  it("errors so large that the readings no longer rise", () => {
    expect(message(certificate([100, 110], [0, -15], { givenAs: "error", pointsAre: "true" }))).toBe(
      "moved by their errors the points must keep their order: point 2 is 95 °C after 100 °C",
    );
  });

  it("too few for a fit, with the count that is needed", () => {
    expect(message(certificate([1, 2, 3], [0, 0, 0], { method: "fit2" }))).toBe(
      "a fit of order 2 needs at least 4 points; the certificate has 3",
    );
  });

  it("numbers that are no temperatures, and points that a double can hardly tell apart", () => {
    expect(message(certificate([1, 2, 3], [0, 1e308, 0]))).toBe("point 2 or its value is no temperature");
    expect(message(certificate([-1e9, 2], [0, 0]))).toBe("point 1 or its value is no temperature");
    expect(message(certificate([1, 1e6], [0, 0]))).toBe("point 2 or its value is no temperature");
    expect(made([1, 999_999], [0, 0]).last).toBe(999_999);
    for (const [last, method] of [
      [1, "smooth"],
      [2e-320, "fit1"],
    ] as const) {
      expect(message(certificate([0, 1e-320, last], [0, 1, 0], { method }))).toBe(
        "the certificate's points lie too close together",
      );
    }
  });
});

describe("the uncertainty of a correction", () => {
  const at = (t: number, drift = 0) => {
    const prepared = correctionUncertainty([0, 200, 400], [0.6, 1.0, 0.8], 2);
    return prepared instanceof Refusal ? prepared : prepared.at(t, drift);
  };

  it("is the larger U/k of the two points beside the reading", () => {
    expect([100, 300].map((t) => at(t))).toEqual([0.5, 0.5]);
  });

  it("is a point's own at that point", () => {
    expect([0, 200, 400].map((t) => at(t))).toEqual([0.3, 0.5, 0.4]);
  });

  it("is so below zero too, and a point reaches 1E-9 °C to either side", () => {
    const below = correctionUncertainty([-400, -200, 0], [0.6, 1, 0.8], 2);
    const beside = (t: number) => (below instanceof Refusal ? below : below.at(t));
    expect([-300, -100, -1e-9, 1e-9].map(beside)).toEqual([0.5, 0.5, 0.4, 0.4]);
    expect(beside(-1.1e-9)).toBe(0.5);
    expect([1e-9, 1.1e-9, -1e-9, 400 + 1e-9].map((t) => at(t))).toEqual([0.3, 0.5, 0.3, 0.4]);
  });

  it("takes in the drift as a rectangular half-width", () => {
    expect(at(100, 0.6)).toBeCloseTo(Math.sqrt(0.25 + 0.12), 14);
  });

  it("is refused outside the points, and for a negative drift", () => {
    expect(message(at(401))).toBe("reading 401 °C is outside the certificate's points, 0 °C to 400 °C");
    expect(message(at(-1))).toBe("reading -1 °C is outside the certificate's points, 0 °C to 400 °C");
    expect(message(at(100, -0.1))).toBe("drift allowance -0.1 °C is below 0");
  });

  it("is refused for an uncertainty or a coverage factor that is not above 0", () => {
    expect(message(correctionUncertainty([0, 200], [0.6, 0], 2))).toBe(
      "expanded uncertainty of point 2 is 0 or an empty cell",
    );
    expect(message(correctionUncertainty([0, 200], [-0.6, 1], 2))).toContain(
      "point 1 is -0.6 °C, not above 0",
    );
    for (const k of [0, -2]) {
      expect(message(correctionUncertainty([0, 200], [0.6, 1], k))).toBe(
        `coverage factor k ${k} is not above 0`,
      );
    }
    expect(message(correctionUncertainty([0, 200], [1e300, 1], 1e-10))).toBe(
      "coverage factor k 1e-10 is too near to 0",
    );
    expect(message(correctionUncertainty([0, 200], [0.6], 2))).toBe(
      "points and expanded uncertainties differ in number, 2 and 1",
    );
    expect(message(correctionUncertainty([0, 0], [1, 1], 2))).toContain(
      "points must rise or fall throughout",
    );
  });

  it("serves a certificate of one point", () => {
    const prepared = correctionUncertainty([850], [1], 2);
    expect(prepared instanceof Refusal ? prepared : prepared.at(850)).toBe(0.5);
  });
});
