import { describe, expect, it } from "vitest";
import { type Thermistor, thermistor } from "../../src/core/junction";
import { manualCoefficients, manualTable } from "./thermistor";

describe("a data logger's manual, 10 kΩ thermistor", () => {
  const sensor = thermistor(manualCoefficients) as Thermistor;

  // The manual prints what its equation gives to 0.01 °C.
  it.each(manualTable)("%d °C is read from %d Ω", (t, resistance) => {
    expect(Math.abs((sensor.temperature(resistance) as number) - t)).toBeLessThanOrEqual(0.005 + 1e-9);
  });
});
