import { describe, expect, it } from "vitest";
import { eachAgrees } from "./agrees";
import { fOfSteadyLoad, lethalitySets, publishedLethality } from "./lethality";

eachAgrees(lethalitySets);

describe("a steady load", () => {
  it.each(publishedLethality.flatMap(({ rows }) => rows))(
    "has the same F by trapezoid: $minutes min at $temperature °C",
    ({ minutes, temperature, reference, z }) => {
      const straight = fOfSteadyLoad(minutes, temperature, reference, z);
      expect(fOfSteadyLoad(minutes, temperature, reference, z, "trapezoid")).toBeCloseTo(straight, 12);
    },
  );
});

describe("the reference temperature of F0", () => {
  it("is an argument: 121, 121.1 and 121.11 °C, all in print, differ by up to 2.6 %", () => {
    const [a, b, c] = [121, 121.1, 121.11].map((reference) => fOfSteadyLoad(15, 121, reference, 10)) as [
      number,
      number,
      number,
    ];
    expect(a).toBeGreaterThan(b);
    expect(b).toBeGreaterThan(c);
    expect(a / c - 1).toBeGreaterThan(0.025);
    expect(a / c - 1).toBeLessThan(0.0261);
  });
});
