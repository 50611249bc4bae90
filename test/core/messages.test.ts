/** Numbers in messages, for whatever numbers a sheet can hold. */
import { describe, expect, it } from "vitest";
import {
  degrees,
  degreesApart,
  measured,
  millivolts,
  noAnswer,
  temperatureUnits,
  wrongKind,
} from "../../src/core";

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

describe("a number in a message", () => {
  it("has six significant digits, but a count has all of its own", () => {
    expect(noAnswer`${1_048_576} rows at ${1_234_567.8}`.message()).toBe("1048576 rows at 1234570");
    expect(noAnswer`${measured(0.123456789, "Ω")}, ${degrees(-1234.5678)}`.message()).toBe(
      "0.123457 Ω, -1234.57 °C",
    );
  });

  it("as an EMF goes to the tenth of a microvolt, and needs no zeros", () => {
    expect(noAnswer`${millivolts(41.27649)} and ${millivolts(5)}`.message()).toBe("41.2765 mV and 5 mV");
    expect(noAnswer`${millivolts(Number.NaN)}`.message()).toBe("(not a number) mV");
    expect(noAnswer`${millivolts(-1 / 0)}`.message()).toBe("under -1.8E+308 mV");
  });

  it.each([
    ["C", "100 °C and 100 °C apart"],
    ["F", "212 °F and 180 °F apart"],
    ["K", "373.15 K and 100 K apart"],
    ["R", "671.67 °R and 180 °R apart"],
  ])("is a temperature, or a difference without the offset, in the unit %s of the call", (symbol, words) => {
    const unit = temperatureUnits.find((each) => each.symbol === symbol);
    expect(noAnswer`${degrees(100)} and ${degreesApart(100)} apart`.message(unit)).toBe(words);
  });
});

describe("a refusal", () => {
  it("takes more words, and keeps its kind and its numbers until it is printed", () => {
    const refusal = wrongKind`point ${2} is ${degrees(0)}`.and` after ${degrees(100)}: ${"points"} rise`;
    expect(refusal.kind).toBe("wrong kind");
    expect(refusal.message()).toBe("point 2 is 0 °C after 100 °C: points rise");
    expect(refusal.message(inFahrenheit)).toBe("point 2 is 32 °F after 212 °F: points rise");
    expect(noAnswer`none`.and`, at all`.kind).toBe("no answer");
  });
});
