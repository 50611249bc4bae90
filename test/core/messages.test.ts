/** Numbers in messages, for whatever numbers a sheet can hold. */
import { describe, expect, it } from "vitest";
import { degrees, degreesApart, measured, millivolts, noAnswer, temperatureUnits } from "../../src/core";

const inFahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F");

describe("a message", () => {
  it("names a number beyond all numbers as a limit that was passed, never as Infinity", () => {
    const refusal = noAnswer`${measured(1e308 * 10, "Ω")}, ${degreesApart(-1e308 * 10)}, ${millivolts(1e308 * 10)}`;
    expect(refusal.message()).toBe("over 1.8E+308 Ω, under -1.8E+308 °C, over 1.8E+308 mV");
  });

  it("does so where only the call's unit takes it there", () => {
    expect(noAnswer`${degrees(1.5e308)}`.message(inFahrenheit)).toBe("over 1.8E+308 °F");
    expect(noAnswer`${degrees(1.5e308)}`.message()).toBe("1.5e+308 °C");
  });

  it("counts what cannot be counted likewise", () => {
    expect(noAnswer`a table of ${1 / 0} rows`.message()).toBe("a table of over 1.8E+308 rows");
    expect(noAnswer`step ${Number.NaN}`.message()).toBe("step (not a number)");
  });
});
