/** Which records of a step are taken, and why others are not. */
import { describe, expect, it } from "vitest";
import { timeConstant } from "../../../src/core/log";
import { column, every, given, grid, jitter, refusal } from "./record";

const seconds = (count: number) => every(1 / 60, count);
const response = (count: number, tau: number, noise = 0) =>
  Float64Array.from({ length: count }, (_, i) => 100 - 80 * Math.exp(-i / tau) + noise * jitter(i));
const found = (y: Float64Array, times = seconds(y.length)) => given(timeConstant(grid(times), y));
const reason = (y: Float64Array, times = seconds(y.length)) => refusal(timeConstant(grid(times), y));

describe("a recorded step", () => {
  it("has 6 readings at least, those that are missing not counted", () => {
    expect(found(response(6, 2)).timeConstant).toBeCloseTo(2, 6);
    const lost = response(7, 2);
    lost[3] = Number.NaN;
    expect(found(lost).timeConstant).toBeCloseTo(2, 6);
    lost[5] = Number.NaN;
    expect(reason(lost)).toBe("#N/A 5 readings are too few to fit a step: at least 6");
    expect(reason(column(undefined, undefined))).toBe(
      "#N/A 0 readings are too few to fit a step: at least 6",
    );
  });

  it("has 20 000 readings at most", () => {
    expect(reason(new Float64Array(20_001))).toBe(
      "#N/A 20001 readings are too many to fit a step: cut the record to the step, at most 20000",
    );
    // Not too many, but a level is no step.
    expect(reason(new Float64Array(20_000), new Float64Array(20_000))).toBe("#N/A the times never rise");
  });

  it("has a reading for each time", () => {
    expect(refusal(timeConstant(grid(seconds(7)), response(6, 2)))).toBe(
      "#VALUE! the record has 6 readings for 7 times",
    );
  });

  it("fixes its time constant to half of itself at least", () => {
    // Half a time constant with more and more scatter: the curve is less and less told from a straight line.
    const does =
      /^#N\/A the record does not fix the time constant: ([\d.]+) s with a standard uncertainty of ([\d.]+) s$/;
    const shares = [1, 2, 4, 8, 12, 16].map((noise) => {
      const y = response(30, 60, noise);
      const answer = timeConstant(grid(seconds(30)), y);
      if ("uncertainty" in answer) return { fixed: true, share: answer.uncertainty / answer.timeConstant };
      expect(refusal(answer)).toMatch(does);
      const [tau, u] = does.exec(refusal(answer))!.slice(1).map(Number);
      return { fixed: false, share: u! / tau! };
    });
    for (const { fixed, share } of shares) expect(share <= 0.5).toBe(fixed);
    expect(new Set(shares.map(({ fixed }) => fixed)).size).toBe(2);
  });

  it("is refused as over where the whole response lies between two scans", () => {
    const y = Float64Array.from({ length: 60 }, (_, i) => (i < 30 ? 20 : 100) + (i % 3) / 10);
    expect(reason(y)).toBe("#N/A the step is over within one interval of the log");
  });

  it("starts from the mean of the level before it, and from the curve where there is none", () => {
    const level = [20.2, 19.8, 20.1, 19.9, 20, 20.3, 19.7, 20];
    const y = Float64Array.from([...level, ...response(60, 8).slice(1)]);
    const { initial } = found(y);
    // The row at which the curve starts may be one off; the mean of the level is 20.
    expect(Math.abs(initial - 20)).toBeLessThan(0.05);
    expect(found(response(60, 8)).initial).toBeCloseTo(20, 8);
  });

  it("scales with its times and its degrees", () => {
    const y = response(50, 9, 1.5);
    const once = found(y);
    const slow = found(y, every(1 / 6, 50));
    expect(slow.timeConstant / once.timeConstant).toBeCloseTo(10, 6);
    expect(slow.uncertainty / once.uncertainty).toBeCloseTo(10, 6);
    const wide = found(y.map((t) => 5 * t - 40));
    expect(wide.timeConstant).toBeCloseTo(once.timeConstant, 6);
    expect(wide.final).toBeCloseTo(5 * once.final - 40, 6);
    expect(wide.initial).toBeCloseTo(5 * once.initial - 40, 6);
    expect(wide.uncertainty).toBeCloseTo(once.uncertainty, 6);
  });
});
