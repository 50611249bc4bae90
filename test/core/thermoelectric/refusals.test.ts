/** What is said where a couple has no answer. The EMFs at range ends are those of the printed tables, to their microvolt. */
import { describe, expect, it } from "vitest";
import {
  emfBetween,
  Refusal,
  seebeckAt,
  type Thermocouple,
  temperatureOf,
  temperatureUnits,
  thermocouple,
  toIts90,
} from "../../../src/core";
import { unreachable } from "../../../src/core/thermoelectric/refusals";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F");
const refusal = (found: unknown): Refusal => {
  expect(found).toBeInstanceOf(Refusal);
  return found as Refusal;
};
const message = (found: unknown): string => refusal(found).message();

describe("a temperature outside the reference function", () => {
  it("is named, the junction first that was asked for", () => {
    expect(message(emfBetween(couple("K"), 1400, 20))).toBe(
      "temperature 1400 °C is outside the range of type K, -270 °C to 1372 °C",
    );
    expect(message(emfBetween(couple("K"), 20, -300))).toBe(
      "reference temperature -300 °C is outside the range of type K, -270 °C to 1372 °C",
    );
    expect(message(emfBetween(couple("K"), 1400, -300))).toContain("temperature 1400 °C is outside");
    expect(message(seebeckAt(couple("Au/Pt"), 1001))).toBe(
      "temperature 1001 °C is outside the range of Au/Pt, 0 °C to 1000 °C",
    );
    expect(message(temperatureOf(couple("B"), 1, -1))).toBe(
      "reference temperature -1 °C is outside the range of type B, 0 °C to 1820 °C",
    );
    expect(refusal(seebeckAt(couple("K"), 2000)).kind).toBe("no answer");
  });

  it("is printed in the unit of the call", () => {
    expect(refusal(emfBetween(couple("J"), 1300, 0)).message(fahrenheit)).toBe(
      "temperature 2372 °F is outside the range of type J, -346 °F to 2192 °F",
    );
  });

  it("of the older scale is refused at both ends of the differences", () => {
    // t90 − t68 is 0.007 °C to 0.008 °C at −200 °C (from memory; 0.008 °C at −180 °C in print), and −¼(T/1337.33 K)² = −2.5525 °C at 4000 °C.
    for (const t68 of [-200.1, 4003]) {
      expect(message(toIts90(t68))).toMatch(
        new RegExp(
          `^temperature ${t68} °C is outside the range of the IPTS-68 differences, -200\\.00[789]\\d* °C to 4002\\.55 °C$`,
        ),
      );
    }
    expect(toIts90(-200.006)).toBeTypeOf("number");
    expect(toIts90(4002.55)).toBeTypeOf("number");
  });
});

describe("an EMF without a temperature", () => {
  it("is above or below what the couple gives, and the limit is named with its temperature", () => {
    expect(message(temperatureOf(couple("K"), 60, 0))).toMatch(
      /^EMF 60 mV is above the limit of type K, 54\.886\d? mV \(1372 °C\)$/,
    );
    expect(message(temperatureOf(couple("S"), -1, 0))).toMatch(
      /^EMF -1 mV is below the limit of type S, -0\.23[56]\d? mV \(-50 °C\)$/,
    );
    expect(message(temperatureOf(couple("Au/Pt"), -1, 0))).toBe(
      "EMF -1 mV is below the limit of Au/Pt, 0 mV (0 °C)",
    );
  });

  it("is what an EMF comes to, unless the caller knows better", () => {
    expect(message(unreachable(couple("K"), 60))).toMatch(
      /^the EMF comes to 60 mV, above the limit of type K, 54\.886\d? mV \(1372 °C\)$/,
    );
  });

  it("is told with the reference junction where that makes a part of it", () => {
    // Type K: 1.000 mV at 25 °C.
    expect(message(temperatureOf(couple("K"), 54, 25))).toMatch(
      /^EMF 54 mV with the reference junction at 25 °C makes 55(\.000\d)? mV, above the limit of type K, 54\.886\d? mV \(1372 °C\)$/,
    );
  });

  it("of type B belongs to two temperatures below the zero crossing near 42 °C", () => {
    expect(message(temperatureOf(couple("B"), -0.001, 0))).toMatch(
      /^EMF -0\.001 mV is below 0 mV: under 42\.\d+ °C an EMF of type B belongs to two temperatures$/,
    );
  });
});
