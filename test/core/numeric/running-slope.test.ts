import { describe, expect, it } from "vitest";
import { runningSlope } from "../../../src/core/numeric/running-slope";

/** The textbook slope Σ(x − x̄)(y − ȳ)/Σ(x − x̄)² over the points of each window, point by point. */
function textbookSlopes(x: Float64Array, y: Float64Array, halfWidth: number): number[] {
  return Array.from(x, (x0, i) => {
    if (Number.isNaN(y[i])) return Number.NaN;
    const near = [...x.keys()].filter(
      (k) => Math.abs((x[k] as number) - x0) <= halfWidth && !Number.isNaN(y[k]),
    );
    const mean = (of: Float64Array): number =>
      near.reduce((sum, k) => sum + (of[k] as number), 0) / near.length;
    const [meanX, meanY] = [mean(x), mean(y)];
    let [xx, xy] = [0, 0];
    for (const k of near) {
      xx += ((x[k] as number) - meanX) ** 2;
      xy += ((x[k] as number) - meanX) * ((y[k] as number) - meanY);
    }
    return xx === 0 ? Number.NaN : xy / xx;
  });
}

function expectTextbook(x: Float64Array, y: Float64Array, halfWidth: number): void {
  const expected = textbookSlopes(x, y, halfWidth);
  runningSlope(x, y, halfWidth).forEach((slope, i) => {
    if (Number.isNaN(expected[i])) expect(slope).toBeNaN();
    else expect(Math.abs(slope - (expected[i] as number))).toBeLessThan(1e-9);
  });
}

/** Uneven steps, every eleventh of them zero; every seventh point missing, and the first two. */
const COUNT = 1000;
const x = new Float64Array(COUNT);
for (let i = 1; i < COUNT; i++) x[i] = (x[i - 1] as number) + (i % 11 === 0 ? 0 : 0.5 + (i % 4) / 4);
const y = Float64Array.from(x, (at, i) =>
  i < 2 || i % 7 === 3 ? Number.NaN : 20 + 3 * Math.sin(at / 40) + 0.01 * (i % 5),
);

describe("the running slope", () => {
  it.each([0, 0.5, 2, 40])("is the least-squares slope of the points within ±%d", (halfWidth) => {
    expectTextbook(x, y, halfWidth);
  });

  it.each([150, 333, 1e6])(
    "is so in windows of hundreds of points, ±%d, put together from parts",
    (halfWidth) => {
      expectTextbook(x, y, halfWidth);
    },
  );

  it("counts points at the very edge of the window on both sides", () => {
    // Alone with one neighbour: 0 and 3; all three: Σ(x − 1)(y − 1)/2 = (1 + 2)/2.
    expect([...runningSlope(Float64Array.of(0, 1, 2), Float64Array.of(0, 0, 3), 1)]).toEqual([0, 1.5, 3]);
  });

  it("is missing where the point is, or where no second abscissa lies near it", () => {
    expect([...runningSlope(Float64Array.of(0, 0, 5), Float64Array.of(1, 2, 3), 1)]).toEqual([
      Number.NaN,
      Number.NaN,
      Number.NaN,
    ]);
    const late = runningSlope(Float64Array.of(0, 1, 2), Float64Array.of(Number.NaN, 1, 3), 5);
    expect([...late]).toEqual([Number.NaN, 2, 2]);
  });

  it("loses none of a slow drift of a hot record among date serials, in windows of any width", () => {
    const days = Float64Array.from({ length: 700 }, (_, i) => 45_000 + i / 60);
    const slow = Float64Array.from(days, (day) => 1000 + (day - 45_000) * 3.7e-7);
    for (const halfWidth of [0.5, 4]) {
      const expected = textbookSlopes(days, slow, halfWidth);
      runningSlope(days, slow, halfWidth).forEach((slope, i) => {
        expect(Math.abs(slope / (expected[i] as number) - 1)).toBeLessThan(2e-8);
      });
    }
  });

  it("has no second abscissa among hundreds of points at one time", () => {
    const at = new Float64Array(400).fill(3.7);
    const held = Float64Array.from(at, (_, i) => 20 + (i % 3) / 7);
    expect(runningSlope(at, held, 1).every(Number.isNaN)).toBe(true);
  });

  it("keeps its digits far from zero: half a millionth of a degree a day among date serials", () => {
    const days = Float64Array.from({ length: 700 }, (_, i) => 45_000 + i / 64);
    const steady = Float64Array.from(days, (day) => 1000 + (day - 45_000) * 2 ** -21);
    for (const halfWidth of [0.5, 8]) {
      for (const slope of runningSlope(days, steady, halfWidth)) {
        expect(Math.abs(slope * 2 ** 21 - 1)).toBeLessThan(1e-9);
      }
    }
  });

  it("goes on past a stretch of missing points that fills whole parts", () => {
    const at = Float64Array.from({ length: 800 }, (_, i) => i);
    const holed = Float64Array.from(at, (_, i) => (i >= 96 && i < 192 ? Number.NaN : i * i));
    expectTextbook(at, holed, 200);
  });
});
