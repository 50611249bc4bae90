import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import { platinumResistance, platinumTemperature } from "../../../src/core/junction";

const message = (value: number | Refusal): string =>
  value instanceof Refusal ? value.message() : "no refusal";

describe("platinumTemperature", () => {
  it("is 0 °C at R0 exactly, for any R0", () => {
    for (const r0 of [100, 1000, 99.963, 25.5]) expect(platinumTemperature(r0, r0)).toBe(0);
  });

  it("names the limits in ohms of this sensor", () => {
    expect(message(platinumTemperature(3905, 1000))).toBe(
      "resistance 3905 Ω is outside the range of a platinum sensor with 1000 Ω at 0 °C, 185.201 Ω (-200 °C) to 3904.81 Ω (850 °C)",
    );
    expect(message(platinumTemperature(18.5, 100))).toContain("18.5201 Ω (-200 °C)");
    expect(platinumTemperature(-5, 100)).toBeInstanceOf(Refusal);
    expect(platinumTemperature(1e300, 100)).toBeInstanceOf(Refusal);
  });

  it("takes a value at an end as that end", () => {
    for (const end of [-200, 850]) {
      const resistance = platinumResistance(end, 100) as number;
      expect(platinumTemperature(resistance, 100)).toBe(end);
      expect(platinumTemperature(resistance + Math.sign(end) * 1e-11, 100)).toBe(end);
      expect(platinumTemperature(resistance + Math.sign(end) * 1e-7, 100)).toBeInstanceOf(Refusal);
    }
  });

  it("refuses an R0 that is 0, negative or an empty cell", () => {
    expect(message(platinumTemperature(100, 0))).toBe("resistance at 0 °C (r0) is 0 or an empty cell");
    expect(message(platinumTemperature(100, -100))).toContain("-100 Ω, not above 0");
    expect((platinumTemperature(100, 0) as Refusal).kind).toBe("wrong kind");
  });
});

describe("platinumResistance", () => {
  it("refuses temperatures outside the standard", () => {
    expect(message(platinumResistance(851, 100))).toBe(
      "temperature 851 °C is outside the range of platinum sensors, -200 °C to 850 °C",
    );
    expect(platinumResistance(-200.001, 100)).toBeInstanceOf(Refusal);
  });

  it("has no step in value or slope at 0 °C", () => {
    const h = 1e-4;
    const [below, zero, above] = [-h, 0, h].map((t) => platinumResistance(t, 100) as number) as [
      number,
      number,
      number,
    ];
    expect((zero - below) / h).toBeCloseTo((above - zero) / h, 6);
  });
});
