import { describe, expect, it } from "vitest";
import { emfsBetween, seebeckAt, type Thermocouple, temperaturesOf, thermocouple } from "../../../src/core";

const k = thermocouple("K") as Thermocouple;

/** Type K, which counts how often it is asked for one EMF and for a column of them. */
function counting(): Thermocouple & { single: number; columns: number } {
  const couple = Object.create(k) as Thermocouple & { single: number; columns: number };
  couple.single = 0;
  couple.columns = 0;
  couple.emf = (t) => {
    couple.single++;
    return k.emf(t);
  };
  couple.emfs = (...given) => {
    couple.columns++;
    k.emfs(...given);
  };
  return couple;
}

describe("the Seebeck coefficient", () => {
  it("is in µV/°C: 39.4 for type K at 0 °C, by the printed 0.039 mV at 1 °C and −0.039 mV at −1 °C", () => {
    expect(Math.abs((seebeckAt(k, 0) as number) - 39.4)).toBeLessThan(0.6);
    // 41.276 mV at 1000 °C and 41.665 mV at 1010 °C in print.
    expect(Math.abs((seebeckAt(k, 1005) as number) - 38.9)).toBeLessThan(0.1);
  });
});

describe("a column", () => {
  const emfs = Float64Array.of(1, 2, 3, 4);
  const results = (): Float64Array => new Float64Array(4).fill(-999);

  it.each([
    ["all the way", [25, 25, 25], 1, 0],
    ["all the way, and another beyond the count", [25, 25, 25, 30], 1, 0],
    ["but in the second place", [25, 30, 25], 0, 1],
    ["but at the end", [25, 25, 30], 0, 1],
  ])("with one reference junction %s asks %j once or as a column", (_, references, single, columns) => {
    const couple = counting();
    temperaturesOf(couple, emfs, Float64Array.from(references), results(), 3);
    expect([couple.single, couple.columns]).toEqual([single, columns]);
  });

  it("of a couple is filled as far as it counts and not beyond", () => {
    const temperatures = new Float64Array(4).fill(Number.NaN);
    k.temperatures(Float64Array.of(1, 60, k.emfHigh, 5), temperatures, 3);
    expect([...temperatures]).toEqual([k.temperature(1), Number.NaN, 1372, Number.NaN]);
  });

  it("is filled as far as it counts and not beyond", () => {
    const references = Float64Array.of(25, 26, 25, 25);
    const temperatures = results();
    temperaturesOf(k, emfs, references, temperatures, 3);
    expect(temperatures[3]).toBe(-999);
    expect(temperatures[1]).toBe(k.temperature(2 + k.emf(26)));
    const back = results();
    emfsBetween(k, Float64Array.of(100, 200, 300, 400), references, back, 3);
    expect([...back]).toEqual([k.emf(100) - k.emf(25), k.emf(200) - k.emf(26), k.emf(300) - k.emf(25), -999]);
  });
});
