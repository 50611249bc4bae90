/** Logged data as a sheet hands it over: bad cells, blanks below the log, units of time, messages for a clerk. */
import { describe, expect, it } from "vitest";
import { DESPIKE, FLAGS, RAMPRATE, TIMECONSTANT, TIMELINE, UNLAG } from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const none = undefined;
const min = one("min");

describe("TIMELINE", () => {
  it("spills a header, and leaves untouched times bit for bit", () => {
    const times = columnOf(45000.123456789, 45000.124851, 45000.12623989);
    const cells = TIMELINE(times);
    expect(cells[0]).toEqual(["time", "repair"]);
    expect(cells.slice(1)).toEqual(times.map(([time]) => [time, ""]));
  });

  it("keeps a blank blank and a bad cell its own, and repairs the others around them", () => {
    const times = columnOf(0.9, "", 0.95, errorCell("#N/A"), "12:00", true, 0.02, "");
    expect(readable(TIMELINE(times))).toEqual([
      ["time", "repair"],
      [0.9, ""],
      ["", ""],
      [0.95, ""],
      ["#N/A", ""],
      ['#VALUE! times: "12:00" is text, not a number', ""],
      ["#VALUE! times: TRUE, not a number", ""],
      [1.02, "midnight, 1 day added"],
      ["", ""],
    ]);
  });

  it("does not take the empty cells of a desktop sheet for scans at midnight", () => {
    const empty = "#VALUE! time: 0 or an empty cell";
    expect(readable(TIMELINE(columnOf(45000.5, 45000.6, 0), one("time")))).toEqual([
      [45000.5],
      [45000.6],
      [empty],
    ]);
    expect(readable(TIMELINE(columnOf(0.5, 0.6, 0, 0), one("time")))).toEqual([
      [0.5],
      [0.6],
      [empty],
      [empty],
    ]);
    // A single 0 in a column of times of day is midnight.
    expect(TIMELINE(columnOf(0.98, 0.99, 0, 0.01), one("time"))).toEqual([[0.98], [0.99], [1], [1.01]]);
  });

  it("has its columns without a header, and refuses what is no column of times", () => {
    expect(TIMELINE(columnOf(0.98, 0.99, 0), one("repair"))).toEqual([[""], [""], ["midnight, 1 day added"]]);
    expect(readable(TIMELINE(rowOf(1, 2)))).toEqual([["#VALUE! times: one column, not 2"]]);
    expect(readable(TIMELINE(one(1)))).toEqual([["#N/A a timeline needs at least 2 times"]]);
    expect(readable(TIMELINE(columnOf("", "")))).toEqual([["#N/A a timeline needs at least 2 times"]]);
    expect(readable(TIMELINE(columnOf(3, 2, 1)))).toEqual([
      ["#N/A the times fall from row to row: sort the log, oldest scan first"],
    ]);
  });
});

describe("FLAGS", () => {
  it("names every kind of reading in a block, column by column", () => {
    const block = [
      [20, 20, ""],
      [20, 90, 20],
      [20, 20, errorCell("#N/A")],
      [150, 20.5, "open"],
      [-5, 60, true],
      [20, 60.5, null],
    ];
    expect(FLAGS(block, one(0), one(100), one(10), one(3), one(1))).toEqual([
      ["stuck", "", "missing"],
      ["stuck", "spike", ""],
      ["stuck", "", "missing"],
      ["over", "", "missing"],
      ["under", "step", "missing"],
      ["", "", "missing"],
    ]);
  });

  it("passes what is at a limit, and has step, stuck and spike off unless asked", () => {
    expect(FLAGS(columnOf(0, 100, 100, 0, 100.1), one(0), one(100))).toEqual(
      columnOf("", "", "", "", "over"),
    );
    expect(FLAGS(one(5), one(0), one(10))).toEqual([[""]]);
    expect(FLAGS(rowOf(5, 11), one(0), one(10))).toEqual([["", "over"]]);
  });

  it.each([
    [[one(10), one(10)], "#N/A low 10 is not below high 10"],
    [[one(0), one(10), one(0)], "#VALUE! max step: 0 or an empty cell"],
    [[one(0), one(10), one(5), one(1)], "#VALUE! stuck count 1 is no whole number from 2 up"],
    [
      [one(0), one(10), one(5), none, one(2000)],
      "#VALUE! spike width 2000 is no whole number from 1 to 1000",
    ],
    [
      [one(0), one(10), none, none, one(2)],
      "#VALUE! a spike width needs a max step, which says how far a spike jumps",
    ],
    [[one(0), one("")], "#VALUE! high: the cell is blank"],
    [[one("0"), one(10)], '#VALUE! low: "0" is text, not a number'],
  ])("refuses limits that make no sense: %#", (limits, message) => {
    const [low, high, maxStep, stuckCount, spikeWidth] = limits as [
      unknown[][],
      unknown[][],
      unknown[][]?,
      unknown[][]?,
      unknown[][]?,
    ];
    expect(readable(FLAGS(columnOf(1, 2), low, high, maxStep, stuckCount, spikeWidth))).toEqual([[message]]);
  });
});

describe("DESPIKE", () => {
  it("takes out a spike, and leaves all others and every bad cell as they are", () => {
    const readings = [20.1, 20.2, 35, 20.1, 20.3, 20.2, "", "open", errorCell("#DIV/0!"), 20.25];
    const cells = readable(DESPIKE(columnOf(...readings))).flat();
    expect(cells).toEqual([
      20.1,
      20.2,
      20.2,
      20.1,
      20.3,
      20.2,
      "",
      '#VALUE! readings: "open" is text, not a number',
      "#DIV/0!",
      20.25,
    ]);
  });

  it("works down each column of a block, and says what is wrong with its settings", () => {
    const block = DESPIKE([1, 1.1, 1.2, 9, 1.1, 1].map((t) => [t, 5]));
    expect(block.map(([, still]) => still)).toEqual([5, 5, 5, 5, 5, 5]);
    expect(block[3]?.[0]).toBeCloseTo(1.1, 12);
    expect(DESPIKE(rowOf(1, 50, 2))).toEqual([[1, 50, 2]]);
    expect(readable(DESPIKE(columnOf(1, 2), one(0)))).toEqual([
      ["#VALUE! half window 0 is no whole number from 1 to 1000"],
    ]);
    expect(readable(DESPIKE(columnOf(1, 2), none, one(0)))).toEqual([
      ["#VALUE! threshold: 0 or an empty cell"],
    ]);
  });
});

describe("RAMPRATE and UNLAG", () => {
  const times = columnOf(0, 1, 2, 3, 4);
  const ramp = [20, 22, 24, 26, 28];

  it("say the same in every unit of time", () => {
    for (const [unit, size] of [
      [one("min"), 1],
      [one("s"), 60],
      [one("h"), 1 / 60],
      [none, 1 / 1440],
    ] as const) {
      const scaled = times.map(([t]) => [45000 * (unit === none ? 1 : 0) + (t as number) * size]);
      for (const [rate] of RAMPRATE(scaled, columnOf(...ramp), none, unit)) expect(rate).toBeCloseTo(2, 4);
      UNLAG(scaled, columnOf(...ramp), one(90), none, unit).forEach(([t], i) => {
        expect(t).toBeCloseTo((ramp[i] as number) + 3, 4);
      });
    }
  });

  it("spoil one cell for one bad cell, and leave rows below the log blank", () => {
    const temperatures = columnOf(20, "open", 24, errorCell("#N/A"), 28, "", 7);
    const longer = [...times, [""], [""]];
    expect(readable(RAMPRATE(longer, temperatures, none, min))).toEqual([
      [2],
      ['#VALUE! temperatures: "open" is text, not a number'],
      [2],
      ["#N/A"],
      [2],
      [""],
      ["#N/A time missing"],
    ]);
    expect(readable(UNLAG(longer, temperatures, one(60), none, min)).map(([cell]) => cell)).toEqual([
      22,
      '#VALUE! temperatures: "open" is text, not a number',
      26,
      "#N/A",
      30,
      "",
      "#N/A time missing",
    ]);
  });

  it("have no answer for a reading that is alone in its window", () => {
    const alone = [["#N/A no second reading within the window"]];
    expect(readable(RAMPRATE(one(0), one(20), none, min))).toEqual(alone);
    expect(readable(UNLAG(one(0), one(20), one(5), none, min))).toEqual(alone);
    expect(readable(RAMPRATE(columnOf(0, 10), columnOf(1, 2), one(1), min))).toEqual([alone[0], alone[0]]);
  });

  it.each([
    [columnOf(0, 1), columnOf(1, 2, 3), "#VALUE! times and temperatures differ in rows, 2 and 3"],
    [
      columnOf(0, 2, 1),
      columnOf(1, 2, 3),
      "#VALUE! time in row 3 falls below the row before: midnight or a clock change? TIMELINE repairs it",
    ],
    [columnOf(0, "", 1), columnOf(1, 2, 3), "#VALUE! time missing in row 2"],
    [columnOf(0, "1 min", 2), columnOf(1, 2, 3), '#VALUE! times, row 2: "1 min" is text, not a number'],
    [columnOf(0, errorCell("#NUM!"), 2), columnOf(1, 2, 3), "#NUM!"],
    [
      columnOf(1, 2, 0),
      columnOf(1, 2, 3),
      '#VALUE! time in row 3: 0 or an empty cell; IF(ISBLANK(range),"",range) tells them apart, TIMELINE repairs midnight',
    ],
    [columnOf("", "", ""), columnOf(1, 2, 3), "#N/A the log has no scan"],
    [rowOf(1, 2), rowOf(1, 2), "#VALUE! times: one column, not 2"],
  ])("name the row in which the times are wrong: %#", (times, temperatures, message) => {
    expect(readable(RAMPRATE(times, temperatures, none, min))).toEqual([[message]]);
    expect(readable(UNLAG(times, temperatures, one(5), none, min))).toEqual([[message]]);
  });

  it("refuse a window and a time constant of 0", () => {
    expect(readable(RAMPRATE(times, columnOf(...ramp), one(0), min))).toEqual([
      ["#VALUE! window: 0 or an empty cell"],
    ]);
    expect(readable(UNLAG(times, columnOf(...ramp), one(0), none, min))).toEqual([
      ["#VALUE! time constant: 0 or an empty cell"],
    ]);
    expect(readable(UNLAG(times, columnOf(...ramp), one(-2), none, min))).toEqual([
      ["#VALUE! time constant -2 s is not above 0"],
    ]);
    expect(readable(RAMPRATE(times, columnOf(...ramp), none, one("d")))).toEqual([
      ['#VALUE! time unit: "d" is none of h, min, s'],
    ]);
  });
});

describe("TIMECONSTANT", () => {
  const seconds = Array.from({ length: 60 }, (_, i) => i);
  const step = (tau: number) => seconds.map((s) => 100 - 80 * Math.exp(-s / tau));
  const quick = step(8);
  const slow = step(12);

  it("spills its metrics, one value column per sensor", () => {
    const cells = TIMECONSTANT(columnOf(...seconds), columnOf(...quick), one("s"));
    expect(cells.map(([metric]) => metric)).toEqual([
      "metric",
      "time_constant",
      "uncertainty",
      "initial",
      "final",
    ]);
    expect(cells[0]?.[1]).toBe("value");
    expect(cells[1]?.[1]).toBeCloseTo(8, 6);
    expect(cells[3]?.[1]).toBeCloseTo(20, 6);
    expect(cells[4]?.[1]).toBeCloseTo(100, 6);
    const both = TIMECONSTANT(
      columnOf(...seconds),
      seconds.map((_, i) => [quick[i], slow[i]]),
      one("s"),
    );
    expect(both[0]).toEqual(["metric", "sensor 1", "sensor 2"]);
    expect(both[1]?.[2]).toBeCloseTo(12, 6);
  });

  it("gives one metric as a row, in seconds whatever the unit of the times", () => {
    const minutes = columnOf(...seconds.map((s) => s / 60));
    const [[tau]] = TIMECONSTANT(minutes, columnOf(...quick), min, one("time_constant")) as [[number]];
    expect(tau).toBeCloseTo(8, 6);
  });

  it("says why a record has none, and spoils only the sensor that has none", () => {
    const level = seconds.map(() => 20);
    const noStep = "#N/A no step stands out of the scatter and the resolution of the record";
    expect(readable(TIMECONSTANT(columnOf(...seconds), columnOf(...level), one("s")))).toEqual([[noStep]]);
    const both = TIMECONSTANT(
      columnOf(...seconds),
      seconds.map((_, i) => [level[i], quick[i]]),
      one("s"),
      one("final"),
    );
    expect(readable(both)[0]?.[0]).toBe(noStep);
    expect(both[0]?.[1]).toBeCloseTo(100, 6);
    expect(readable(TIMECONSTANT(columnOf(0, 1), columnOf(1, 2)))).toEqual([
      ["#N/A 2 readings are too few to fit a step: at least 6"],
    ]);
  });
});
