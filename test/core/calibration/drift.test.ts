import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import { calibrationDrift, type PointDrift } from "../../../src/core/calibration";

const points = [200, 600, 1000];
const first = { date: 45_000, values: [-0.2, 0.1, 0.5] };
const second = { date: 45_000 + 365.25, values: [-0.2, 0.3, -0.1] };
const message = (value: unknown): string => (value instanceof Refusal ? value.message() : "no refusal");
const rows = (limits?: number[]): readonly PointDrift[] => {
  const found = calibrationDrift(points, first, second, limits);
  if (found instanceof Refusal) throw new Error(found.message());
  return found;
};

describe("drift of two calibrations", () => {
  it("is second less first at each point, and per year of 365.25 days", () => {
    const two = calibrationDrift(points, first, { ...second, date: 45_000 + 730.5 }) as readonly PointDrift[];
    expect(rows().map(({ point }) => point)).toEqual(points);
    [0, 0.2, -0.6].forEach((drift, i) => {
      expect(rows()[i]?.drift).toBeCloseTo(drift, 14);
      expect(rows()[i]?.perYear).toBeCloseTo(drift, 14);
      expect(two[i]?.perYear).toBeCloseTo(drift / 2, 14);
    });
  });

  it("tells the date at which a value reaches its limit on either side", () => {
    const [, up, down] = rows([1]);
    // 0.3 → +1 at 0.2 a year: 3.5 years; −0.1 → −1 at 0.6 a year: 1.5 years.
    expect(up?.leavesLimitOn).toBeCloseTo(second.date + 3.5 * 365.25, 6);
    expect(down?.leavesLimitOn).toBeCloseTo(second.date + 1.5 * 365.25, 6);
  });

  it("has no date without drift, without a limit, or already outside", () => {
    expect(message(rows([1])[0]?.leavesLimitOn)).toBe("no drift: it never leaves its limit");
    expect(message(rows()[1]?.leavesLimitOn)).toBe("no limit is given");
    expect(message(rows([1, 0.25, 1])[1]?.leavesLimitOn)).toBe(
      "already outside its limit: 0.3 °C against ± 0.25 °C",
    );
  });

  it("counts a value at its limit as inside, leaving it that day", () => {
    expect(rows([1, 0.3, 1])[1]?.leavesLimitOn).toBeCloseTo(second.date, 6);
  });

  it("names no date that a worksheet cannot show", () => {
    const slow = calibrationDrift(
      [100],
      { date: 1, values: [0] },
      { date: 2, values: [1e-9] },
      [5],
    ) as PointDrift[];
    expect(message(slow[0]?.leavesLimitOn)).toContain("before the year 10000");
  });

  it("names the last day that a worksheet knows, 9999-12-31", () => {
    const leaving = (limit: number) =>
      calibrationDrift([100], { date: 0, values: [-1] }, { date: 1, values: [0] }, [limit]) as PointDrift[];
    // One degree a day from day 1 on.
    expect(leaving(2_958_464)[0]?.leavesLimitOn).toBe(2_958_465);
    expect(message(leaving(2_958_465)[0]?.leavesLimitOn)).toBe(
      "at this drift it does not leave its limit before the year 10000",
    );
  });

  it("is refused as a whole where one rate of several is infinite", () => {
    expect(
      message(calibrationDrift([1, 2], { date: 0, values: [0, 0] }, { date: 1, values: [1, 1e308] })),
    ).toBe("the drift per year is too large");
  });

  it("never gives an infinite rate", () => {
    expect(message(calibrationDrift([1], { date: 0, values: [1] }, { date: 5e-324, values: [2] }))).toBe(
      "the drift per year is too large",
    );
  });

  it("is refused for dates in the wrong order, bad points and bad limits", () => {
    expect(message(calibrationDrift(points, second, first))).toBe("the second date is not after the first");
    expect(message(calibrationDrift(points, first, { ...second, date: first.date }))).toBe(
      "the second date is not after the first",
    );
    expect(message(calibrationDrift(points, first, { ...second, values: [1] }))).toBe(
      "points and second values differ in number, 3 and 1",
    );
    expect(message(calibrationDrift([200, 600, 0], first, second))).toContain(
      "point 3 is 0 °C (0 or an empty cell)",
    );
    expect(message(calibrationDrift(points, first, second, [1, 0, 1]))).toBe("limit 2 is 0 or an empty cell");
    expect(message(calibrationDrift(points, first, second, [-1]))).toBe("limit 1 is -1 °C, not above 0");
    expect(message(calibrationDrift(points, first, second, [1, 1]))).toContain(
      "points and limits differ in number",
    );
    expect(message(calibrationDrift([1, 2], first, second))).toContain("first values differ in number");
  });
});
