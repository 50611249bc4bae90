import { describe, expect, it } from "vitest";
import { type Refusal, temperatureGrid } from "../../../src/core";

const message = (found: unknown): string => (found as Refusal).message();

describe("the temperatures of a table", () => {
  it("go from start to end, either way, and end where the steps do", () => {
    expect(temperatureGrid(0, 10, 2.5)).toEqual([0, 2.5, 5, 7.5, 10]);
    expect(temperatureGrid(10, -10, 5)).toEqual([10, 5, 0, -5, -10]);
    expect(temperatureGrid(0, 9, 2.5)).toEqual([0, 2.5, 5, 7.5]);
    expect(temperatureGrid(3, 3, 1)).toEqual([3]);
    expect(temperatureGrid(3, 3.5, 1)).toEqual([3]);
  });

  it("meet an end that tenths reach in print, though not in binary", () => {
    expect(0.3 / 0.1).toBeLessThan(3);
    expect(temperatureGrid(0, 0.3, 0.1)).toHaveLength(4);
    expect(temperatureGrid(20, 20.7, 0.1)).toHaveLength(8);
  });

  it("fill a worksheet and no more", () => {
    expect(temperatureGrid(0, 1_048_574, 1)).toHaveLength(1_048_575);
    expect(message(temperatureGrid(0, 1_048_575, 1))).toBe(
      "table of 1048576 rows is longer than a worksheet",
    );
    expect(message(temperatureGrid(0, -1e9, 1))).toBe("table of 1000000001 rows is longer than a worksheet");
  });

  it.each([0, -1])("are refused with a step of %d", (step) => {
    expect(message(temperatureGrid(0, 10, step))).toBe(`step ${step} is not above 0`);
    expect((temperatureGrid(0, 10, step) as Refusal).kind).toBe("wrong kind");
  });
});
