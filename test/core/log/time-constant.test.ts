import { describe, expect, it } from "vitest";
import { timeConstant } from "../../../src/core/log";
import { column, every, given, grid, jitter, refusal } from "./record";

/** A scan a second; level for `before` scans, then the response. */
const step = (count: number, before: number, tau: number, from = 20, to = 100, noise = 0) =>
  Float64Array.from({ length: count }, (_, i) => {
    const response = i < before ? from : to + (from - to) * Math.exp(-(i - before) / tau);
    return response + noise * jitter(i);
  });

const seconds = (count: number) => every(1 / 60, count);

/** Gauss–Newton in all three parameters at once, by Cramer's rule: a second way to value and uncertainty. */
function plainFit(times: Float64Array, y: Float64Array, start: readonly [number, number, number]) {
  let [a, b, tau] = start;
  const det = (m: number[][]) =>
    m[0]![0]! * (m[1]![1]! * m[2]![2]! - m[1]![2]! * m[2]![1]!) -
    m[0]![1]! * (m[1]![0]! * m[2]![2]! - m[1]![2]! * m[2]![0]!) +
    m[0]![2]! * (m[1]![0]! * m[2]![1]! - m[1]![1]! * m[2]![0]!);
  let uncertainty = Number.NaN;
  for (let round = 0; round < 50; round++) {
    const normal = [0, 1, 2].map(() => [0, 0, 0]);
    const right = [0, 0, 0];
    let squares = 0;
    times.forEach((t, i) => {
      const g = Math.exp(-t / tau);
      const jacobian = [1, g, (b * g * t) / tau ** 2];
      const residual = (y[i] as number) - a - b * g;
      squares += residual ** 2;
      for (let r = 0; r < 3; r++) {
        right[r]! += jacobian[r]! * residual;
        for (let c = 0; c < 3; c++) normal[r]![c]! += jacobian[r]! * jacobian[c]!;
      }
    });
    const d = det(normal);
    const change = [0, 1, 2].map(
      (k) => det(normal.map((row, r) => row.map((x, c) => (c === k ? right[r]! : x)))) / d,
    );
    [a, b, tau] = [a + change[0]!, b + change[1]!, tau + change[2]!];
    const cofactor = normal[0]![0]! * normal[1]![1]! - normal[0]![1]! * normal[1]![0]!;
    uncertainty = Math.sqrt(((squares / (times.length - 3)) * cofactor) / d);
  }
  return { a, b, tau, uncertainty };
}

describe("the time constant of a step", () => {
  it.each([
    ["rising", 20, 100],
    ["falling", 950, 20],
  ])("comes back exactly from a clean %s response", (_, from, to) => {
    const found = given(timeConstant(grid(seconds(60)), step(60, 0, 12, from, to)));
    expect(found.timeConstant).toBeCloseTo(12, 8);
    expect(found.initial).toBeCloseTo(from, 8);
    expect(found.final).toBeCloseTo(to, 8);
    expect(found.uncertainty).toBeLessThan(1e-8);
  });

  it("agrees with a fit of all parameters at once, its standard uncertainty included", () => {
    const times = seconds(80);
    const y = step(80, 0, 15, 20, 100, 2);
    const found = given(timeConstant(grid(times), y));
    const plain = plainFit(times, y, [100, -80, 0.25]);
    expect(found.timeConstant).toBeCloseTo(plain.tau * 60, 7);
    expect(found.uncertainty).toBeCloseTo(plain.uncertainty * 60, 7);
    expect(found.final).toBeCloseTo(plain.a, 7);
    expect(found.initial).toBeCloseTo(plain.a + plain.b, 7);
  });

  it.each([1, 7, 40, 300])("is not biased by %d level readings before the step", (before) => {
    const found = given(
      timeConstant(grid(seconds(before + 80)), step(before + 80, before, 15, 20, 100, 0.4)),
    );
    expect(Math.abs(found.timeConstant - 15)).toBeLessThan(4 * found.uncertainty + 1e-6);
    expect(Math.abs(found.initial - 20)).toBeLessThan(0.3);
  });

  it("finds a fast step late in a long record", () => {
    const found = given(timeConstant(grid(seconds(3000)), step(3000, 2711, 4, 20, 400, 0.2)));
    expect(Math.abs(found.timeConstant - 4)).toBeLessThan(0.02);
    expect(found.final).toBeCloseTo(400, 1);
  });

  it("reads a coarse logger within its uncertainty", () => {
    const y = step(60, 5, 9).map(Math.round);
    const found = given(timeConstant(grid(seconds(60)), y));
    expect(Math.abs(found.timeConstant - 9)).toBeLessThan(4 * found.uncertainty);
  });

  it("leaves missing readings out", () => {
    const y = step(60, 0, 12).map((t, i) => (i % 5 === 2 ? Number.NaN : t));
    expect(given(timeConstant(grid(seconds(60)), y)).timeConstant).toBeCloseTo(12, 8);
  });

  it("does not care where the clock's zero is, nor about uneven scans", () => {
    const times = Float64Array.from({ length: 60 }, (_, i) => 46083 * 1440 + (i + 0.6 * jitter(i)) / 60);
    const y = times.map((t) => 100 - 80 * Math.exp((-(t - times[0]!) * 60) / 12));
    expect(given(timeConstant(grid(times), y)).timeConstant).toBeCloseTo(12, 4);
  });
});

describe("a record without a time constant", () => {
  const reason = (y: Float64Array) => refusal(timeConstant(grid(seconds(y.length)), y));
  const record = (f: (i: number) => number, count = 60) =>
    Float64Array.from({ length: count }, (_, i) => f(i));

  it.each([
    ["steady", record(() => 900)],
    ["steady on a logger that flickers", record((i) => (i === 0 ? 900.1 : 900))],
    ["nothing but noise", record(jitter)],
    ["a hunting furnace", record((i) => 900 + 2 * Math.sin(i / 5), 200)],
  ])("has no step: %s", (_, y) => {
    expect(reason(y)).toBe("#N/A no step stands out of the scatter and the resolution of the record");
  });

  it("is a ramp: it ends before it settles", () => {
    expect(reason(record((i) => 3 * i))).toBe("#N/A the record ends before the step begins to settle");
    expect(reason(record((i) => 3 * i + 0.2 * jitter(i)))).toMatch(/ends before|does not fix/);
  });

  it("is a change from one scan to the next", () => {
    // With two levels only, nobody can tell a step from a logger that knows no values between them.
    expect(reason(record((i) => (i < 30 ? 20 : 100)))).toMatch(/no step stands out/);
    expect(reason(record((i) => (i < 30 ? 20 : 100) + (i % 3) / 10))).toMatch(/over within one interval/);
    expect(reason(record((i) => (i < 30 ? 20 : 100) + 0.3 * jitter(i)))).toMatch(/over within|does not fix/);
  });

  it("is too short", () => {
    expect(reason(column(1, 2, 3))).toBe("#N/A 3 readings are too few to fit a step: at least 6");
    expect(refusal(timeConstant(grid(column(1, 1, 1, 1, 1, 1)), column(1, 2, 3, 4, 5, 6)))).toBe(
      "#N/A the times never rise",
    );
  });
});
