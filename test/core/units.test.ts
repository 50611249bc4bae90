/** Temperature units, by points that are exact by definition. */
import { describe, expect, it } from "vitest";
import { fromCelsius, type TemperatureUnit, temperatureUnits, toCelsius } from "../../src/core";

describe("a temperature unit", () => {
  it.each([
    ["C", 0, 100],
    ["F", 32, 212],
    ["K", 273.15, 373.15],
    ["R", 491.67, 671.67],
  ])("%s shows the ice point as %d and 100 °C as %d", (symbol, ice, hundred) => {
    const unit = temperatureUnits.find((each) => each.symbol === symbol) as TemperatureUnit;
    expect(fromCelsius(0, unit)).toBe(ice);
    expect(fromCelsius(100, unit)).toBeCloseTo(hundred, 12);
    expect(toCelsius(ice, unit)).toBe(0);
    expect(toCelsius(hundred, unit)).toBeCloseTo(100, 12);
  });

  it("meets the others where two scales cross: −40 °C is −40 °F, and 0 K is 0 °R", () => {
    const [, fahrenheit, kelvin, rankine] = temperatureUnits as readonly [
      TemperatureUnit,
      TemperatureUnit,
      TemperatureUnit,
      TemperatureUnit,
    ];
    expect(fromCelsius(-40, fahrenheit)).toBeCloseTo(-40, 12);
    expect(toCelsius(0, kelvin)).toBe(-273.15);
    expect(toCelsius(0, rankine)).toBeCloseTo(-273.15, 12);
  });
});
