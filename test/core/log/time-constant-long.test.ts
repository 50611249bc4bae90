/** What many records say together of the fit of a step: too many for mutation testing, which leaves this file out. */
import { describe, expect, it } from "vitest";
import { timeConstant } from "../../../src/core/log";
import { every, given, grid, jitter, refusal } from "./record";

const seconds = (count: number) => every(1 / 60, count);

describe("the time constant of a step, from many records", () => {
  it("states an uncertainty that the scatter of repeated records bears out", () => {
    const found = Array.from({ length: 400 }, (_, run) => {
      const y = seconds(60).map(
        (_, i) =>
          100 - 80 * Math.exp(-i / 12) + 3 * (jitter(1 + i * 7 + run * 131) + jitter(i * 11 + run * 977)),
      );
      return given(timeConstant(grid(seconds(60)), y));
    });
    const mean = found.reduce((sum, { timeConstant }) => sum + timeConstant, 0) / found.length;
    const scatter = Math.sqrt(
      found.reduce((sum, f) => sum + (f.timeConstant - mean) ** 2, 0) / (found.length - 1),
    );
    const stated = found.reduce((sum, { uncertainty }) => sum + uncertainty, 0) / found.length;
    expect(Math.abs(mean - 12)).toBeLessThan(0.1);
    expect(stated / scatter).toBeGreaterThan(0.8);
    expect(stated / scatter).toBeLessThan(1.25);
  });

  it("noise in many lengths and seeds is never taken for a step", () => {
    for (let count = 6; count < 40; count++) {
      for (let seed = 1; seed < 40; seed++) {
        const y = Float64Array.from(
          { length: count },
          (_, i) => jitter(i * 7 + seed * 131) + jitter(i * 13 + seed * 977),
        );
        expect(refusal(timeConstant(grid(seconds(count)), y))).toMatch(/^#N\/A/);
      }
    }
  });
});
