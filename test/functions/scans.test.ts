/** The rows of a log as the core takes them: minutes from the first scan, a column per sensor. */
import { describe, expect, it } from "vitest";
import { celsius, Refusal } from "../../src/core";
import { type Readings, readings, type Times, times } from "../../src/functions/arguments";
import { number } from "../../src/functions/kinds/numbers";
import { allScans, scans } from "../../src/functions/scans";
import { columnOf } from "./call";

const timesOf = (...cells: unknown[]) => times.read(columnOf(...cells), "times", celsius) as Times;
const readingsOf = (...cells: unknown[]) =>
  readings(number).read(columnOf(...cells), "readings", celsius) as Readings;
const message = (found: unknown): string => (found as Refusal).message();

describe("scans", () => {
  it("are counted in minutes from the first one, exactly where the days are exact", () => {
    // Differences of 2^-36 day far from 0, as a serial of our days holds them to its last bit.
    const step = 2 ** -36;
    const found = scans(
      timesOf("", 45000, 45000 + step, "", 45000 + 3 * step),
      1440,
      readingsOf(1, 2, 3, 4, 5),
    );
    if (found instanceof Refusal) throw new Error(found.message());
    expect([...found.minutes]).toEqual([Number.NaN, 0, 1440 * step, Number.NaN, 3 * 1440 * step]);
    expect(found.minutesOf(45001)).toBe(1440);
    expect(found.minutesOf(44999)).toBe(-1440);
    expect(found.inSheet(2)).toBe(45000 + step);
  });

  it("end with the last time; what lies below is no part of the log", () => {
    const found = scans(timesOf(1, 2, "", ""), 1, readingsOf(10, 20, "", ""));
    if (found instanceof Refusal) throw new Error(found.message());
    expect([...found.minutes]).toEqual([0, 1]);
    expect(found.columns.map((column) => [...column])).toEqual([[10, 20]]);
  });

  it("without any time are none", () => {
    const found = scans(timesOf("", ""), 1, readingsOf(1, 2));
    if (found instanceof Refusal) throw new Error(found.message());
    expect(found.minutes).toHaveLength(0);
  });

  it("have as many readings as times", () => {
    expect(message(scans(timesOf(1, 2), 1, readingsOf(1, 2, 3)))).toBe(
      "times and readings differ in rows, 2 and 3",
    );
  });

  it("may start at 0 and stay there, and may fall back to 0 at no later row", () => {
    for (const start of [
      [0, 0, 1],
      [0, 1, 2],
      ["", 0, 1],
      [-1, 0, 1],
    ]) {
      // biome-ignore format: rows
      expect(scans(timesOf(...start), 1, readingsOf(1, 2, 3))).not.toBeInstanceOf(Refusal);
    }
    const emptied =
      '0 or an empty cell; IF(ISBLANK(range),"",range) tells them apart, TIMELINE repairs midnight';
    expect(message(scans(timesOf(1, 0, 3), 1, readingsOf(1, 2, 3)))).toBe(`time in row 2: ${emptied}`);
    expect(message(scans(timesOf(0, 1, 0), 1, readingsOf(1, 2, 3)))).toBe(`time in row 3: ${emptied}`);
  });
});

describe("all scans", () => {
  it("leave out no reading in silence", () => {
    expect(message(allScans(timesOf(1, 2, "", ""), 1, readingsOf(10, 20, "", 30)))).toBe(
      "time missing in row 4, which has a reading",
    );
  });

  it("pass over a 0 below the last time, which may be an empty cell, and what is no reading", () => {
    expect(allScans(timesOf(1, 2, "", ""), 1, readingsOf(10, 20, 0, "x"))).not.toBeInstanceOf(Refusal);
  });
});
