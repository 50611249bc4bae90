import { describe, expect, it } from "vitest";
import { type TemperatureUnit, temperatureUnits } from "../../../src/core";
import { furnaceClass, furnaceClasses } from "../../../src/core/survey";

const unit = (symbol: string): TemperatureUnit => temperatureUnits.find((each) => each.symbol === symbol)!;

describe("the furnace class", () => {
  it.each(furnaceClasses)("$class is met at ± $celsius °C and ± $fahrenheit °F, and no further", (row) => {
    const next = row.class === 6 ? undefined : row.class + 1;
    const over = (found: unknown) => (typeof found === "number" ? found : undefined);
    for (const sign of [1, -1]) {
      expect(furnaceClass(sign * row.celsius)).toBe(row.class);
      expect(over(furnaceClass(sign * (row.celsius + 0.01)))).toBe(next);
      expect(furnaceClass(sign * row.celsius, unit("K"))).toBe(row.class);
      for (const symbol of ["F", "R"]) {
        expect(furnaceClass((sign * row.fahrenheit * 5) / 9, unit(symbol))).toBe(row.class);
        expect(over(furnaceClass((sign * (row.fahrenheit + 0.01) * 5) / 9, unit(symbol)))).toBe(next);
      }
    }
  });

  it("is none beyond the last, which the message names in the call's unit", () => {
    const words = (deviation: number, symbol: string) => {
      const found = furnaceClass(deviation, unit(symbol));
      return typeof found === "number" ? found : found.message(unit(symbol));
    };
    expect(words(-29, "C")).toBe("deviation 29 °C exceeds class 6: ± 28 °C");
    expect(words(30, "F")).toBe("deviation 54 °F exceeds class 6: ± 50 °F");
  });
});
