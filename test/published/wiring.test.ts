/** Wiring faults and compensations from print. */
import { describe, expect, it } from "vitest";
import { type Thermocouple, thermocouple } from "../../src/core";
import { differential, rereferenced, unreversed } from "../../src/core/junction";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;

describe("a sensor maker's FAQ page: type E, extension crossed from a terminal box at 40 °C to a receiver at 20 °C", () => {
  const e = couple("E");

  it("uses E(40 °C) = 2420 µV and E(20 °C) = 1192 µV", () => {
    expect(Math.abs(e.emf(40) * 1000 - 2420)).toBeLessThanOrEqual(0.5);
    expect(Math.abs(e.emf(20) * 1000 - 1192)).toBeLessThanOrEqual(0.5);
  });

  it("takes 2456 µV, 30 °C at about 500 °C, from the reading; UNREVERSE gives it back", () => {
    const indicated = e.temperature(e.emf(500) - 2.456);
    expect(Math.abs(indicated - 500 - -30)).toBeLessThan(0.5);
    const t = unreversed(indicated, e, "both", 20, 40) as number;
    // Printed EMFs are rounded to 1 µV: twice that over 81 µV/°C.
    expect(Math.abs(t - 500)).toBeLessThan(0.02);
  });
});

describe("a textbook problem with a wrong answer: type S, 5.975 mV, reference junction at 50 °C", () => {
  it("logged with the junction taken as 0 °C, the reading is put right by EMF, not by adding 50 °C", () => {
    const s = couple("S");
    const logged = s.temperature(5.975);
    expect(Math.abs(logged - 671.37)).toBeLessThan(0.05);
    expect(Math.abs((rereferenced(logged, s, 0, 50) as number) - 699.87)).toBeLessThan(0.01);
    // Posted: 671.37 + 50 = 721.37 °C, 21 °C too much.
    expect(721.37 - (rereferenced(logged, s, 0, 50) as number)).toBeGreaterThan(21);
  });
});

describe("textbook problems on thermopiles", () => {
  const fahrenheit = (t: number): number => (t - 32) / 1.8;

  it("type K between 70 °F and 700 °C: 53.03 couples make 1.5 V (printed 52.93 from rounded table values)", () => {
    // One couple short is too little for 1.5 V: 53 would have to be hotter than 700 °C, 54 not so hot.
    const base = fahrenheit(70);
    const above = (pairs: number) => base + (differential(1500, couple("K"), base, pairs) as number);
    expect(above(53)).toBeGreaterThan(700);
    expect(above(54)).toBeLessThan(700);
  });

  it("type T at 200 °F: 4 µV are worth less than 0.05 °F from 4 pairs on (3.10 needed)", () => {
    const worth = (pairs: number) =>
      (differential(0.004, couple("T"), fahrenheit(200), pairs) as number) * 1.8;
    expect(worth(3)).toBeGreaterThan(0.05);
    expect(worth(4)).toBeLessThan(0.05);
  });
});
