import { describe, expect, it } from "vitest";
import { Refusal } from "../../src/core";
import { timeGrid } from "../../src/core/log";
import { type LethalityMethod, lethality, meanKinetic } from "../../src/core/survey";
import { publishedLethality, publishedMeanKinetic } from "./lethality";

function given<T>(value: T | Refusal): T {
  if (value instanceof Refusal) throw new Error(value.message());
  return value;
}

/** A steady load, a scan a minute. */
function f(
  minutes: number,
  temperature: number,
  reference: number,
  z: number,
  method: LethalityMethod,
): number {
  const times = Float64Array.from({ length: minutes + 1 }, (_, i) => i);
  const settings = given(lethality({ reference, z, method }));
  return given(
    settings(
      given(timeGrid(times)),
      times.map(() => temperature),
    ),
  ).f;
}

describe.each(publishedLethality)("F values: $source", ({ rows }) => {
  it.each(rows)(
    "$minutes min at $temperature °C, reference $reference °C, z $z °C: $f min",
    ({ minutes, temperature, reference, z, f: printed, tolerance }) => {
      for (const method of ["straight", "trapezoid"] as const) {
        const found = f(minutes, temperature, reference, z, method);
        expect(Math.abs(found - printed)).toBeLessThanOrEqual(tolerance);
      }
    },
  );
});

describe("the reference temperature of F0", () => {
  it("is an argument: 121, 121.1 and 121.11 °C, all in print, differ by up to 2.6 %", () => {
    const [a, b, c] = [121, 121.1, 121.11].map((reference) => f(15, 121, reference, 10, "straight")) as [
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

describe("mean kinetic temperature with the published activation energy", () => {
  const { temperatures, meanKinetic: printed, arithmetic, tolerance } = publishedMeanKinetic;

  it(`of ${temperatures.join(", ")} °C is ${printed} °C`, () => {
    const found = given(given(meanKinetic())(Float64Array.from(temperatures)));
    expect(Math.abs(found - printed)).toBeLessThanOrEqual(tolerance);
  });

  it("is not the plain mean that a page in print calls by its name", () => {
    const found = given(given(meanKinetic())(Float64Array.from(temperatures)));
    expect(found - arithmetic).toBeGreaterThan(0.7);
  });
});
