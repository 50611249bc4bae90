/** Surveys as a sheet hands them over: every metric and column, units, blanks, messages for a clerk. */
import { describe, expect, it } from "vitest";
import {
  ENVELOPE,
  LETHALITY,
  MEANKINETIC,
  SOAK,
  SURVEY,
  SURVEYCLASS,
  SURVEYSENSORS,
  SYSTEMCHECK,
  TIMEABOVE,
} from "../../src/functions";
import { columnOf, errorCell, one, readable, rowOf } from "./call";

const none = undefined;
const min = one("min");

/** A scan every 10 minutes; two sensors; below the band, overshot by the second, in band for 30 min. */
const times = columnOf(0, 10, 20, 30, 40, 50, 60);
const readings = [
  [700, 690],
  [880, 870],
  [897, 904],
  [898, 903],
  [899, 902],
  [900, 901],
  [880, 870],
];
const setpoint = one(900);
const tolerance = one(5);

interface Options {
  times?: unknown[][];
  readings?: unknown[][];
  setpoint?: unknown[][];
  tolerance?: unknown[][];
  corrections?: unknown[][];
  names?: unknown[][];
  start?: unknown[][];
  end?: unknown[][];
  required?: unknown[][];
  gap?: unknown[][];
  timeUnit?: unknown[][] | undefined;
  metric?: unknown[][];
  unit?: unknown[][];
}

const asked = (options: Options) => ({ times, readings, setpoint, tolerance, timeUnit: min, ...options });

function survey(options: Options = {}): unknown[][] {
  const o = asked(options);
  return readable(
    SURVEY(
      o.times,
      o.readings,
      o.setpoint,
      o.tolerance,
      o.corrections,
      o.names,
      o.start,
      o.end,
      o.required,
      o.gap,
      o.timeUnit,
      o.metric,
      o.unit,
    ),
  );
}

function sensors(options: Options = {}): unknown[][] {
  const o = asked(options);
  return readable(
    SURVEYSENSORS(
      o.times,
      o.readings,
      o.setpoint,
      o.tolerance,
      o.corrections,
      o.names,
      o.start,
      o.end,
      o.timeUnit,
      o.metric,
      o.unit,
    ),
  );
}

function soak(options: Options = {}): unknown[][] {
  const o = asked(options);
  return readable(
    SOAK(o.times, o.readings, o.setpoint, o.tolerance, o.corrections, o.gap, o.timeUnit, o.metric),
  );
}

const metric = (options: Options, name: string): unknown => survey({ ...options, metric: one(name) })[0]?.[0];

describe("SURVEY", () => {
  it("spills every metric, and each can be asked for by itself", () => {
    const cells = survey();
    expect(cells).toEqual([
      ["metric", "value"],
      ["highest", 904],
      ["highest_sensor", 2],
      ["highest_time", 20],
      ["lowest", 897],
      ["lowest_sensor", 1],
      ["lowest_time", 20],
      ["plus_deviation", 4],
      ["minus_deviation", -3],
      ["spread", 7],
      // Σ(t − t̄)(T − T̄)/Σ(t − t̄)² over both sensors: (50 − 50)/1000.
      ["drift", 0],
      ["hottest_sensor", 2],
      ["coldest_sensor", 1],
      ["centring_shift", -0.5],
      ["overshoot", 0],
      ["start", 20],
      ["end", 50],
      ["minutes", 30],
      ["missing", 0],
      ["margin", 1],
      ["class_met", 2],
      ["verdict", "Pass"],
    ]);
    for (const [name, value] of cells.slice(1)) expect(metric({}, name as string)).toBe(value);
  });

  it("names sensors by their cells, by their place where a name is blank", () => {
    const names = rowOf("door", "");
    expect(metric({ names }, "coldest_sensor")).toBe("door");
    expect(metric({ names }, "hottest_sensor")).toBe(2);
    expect(metric({ names: columnOf("door", 17) }, "hottest_sensor")).toBe(17);
    expect(survey({ names: rowOf("a", "b", "c") })).toEqual([["#VALUE! 3 names for 2 sensors"]]);
    expect(survey({ names: rowOf("a", true) })).toEqual([["#VALUE! names, column 2: TRUE, not a name"]]);
  });

  it("gives times back bit for bit, in date-time serials as in minutes", () => {
    const serials = times.map(([t]) => [45123.4 + (t as number) / 1440]);
    const options = { times: serials, timeUnit: none };
    expect(metric(options, "start")).toBe(serials[2]?.[0]);
    expect(metric(options, "end")).toBe(serials[5]?.[0]);
    expect(metric(options, "highest_time")).toBe(serials[2]?.[0]);
    expect(metric(options, "minutes")).toBe(30);
    expect(
      metric({ ...options, start: [serials[3] as unknown[]], end: [serials[5] as unknown[]] }, "minutes"),
    ).toBe(20);
  });

  it("adds corrections, takes uneven tolerances and start and end", () => {
    expect(metric({ corrections: rowOf(1, -1) }, "spread")).toBe(5);
    expect(metric({ corrections: rowOf(0, 2) }, "plus_deviation")).toBe(5);
    expect(metric({ corrections: rowOf(0, 1), tolerance: rowOf(3, 6) }, "margin")).toBe(0);
    expect(metric({ tolerance: columnOf(3, 5) }, "centring_shift")).toBe(0.5);
    expect(metric({ start: one(10), end: one(50) }, "verdict")).toBe("Fail");
    expect(metric({ start: one(30) }, "minutes")).toBe(20);
    expect(metric({ start: one(30) }, "verdict")).toBe("Short");
    expect(metric({ start: one(30), required: one(20) }, "verdict")).toBe("Pass");
  });

  it("fails for an overshoot on the way, and never hides a missing reading", () => {
    const hot = readings.map((row) => [...row]);
    hot[1] = [890, 906];
    expect(metric({ readings: hot }, "overshoot")).toBe(6);
    expect(metric({ readings: hot }, "verdict")).toBe("Fail");
    for (const lost of ["", "open", true, null, errorCell("#N/A")]) {
      const holed: unknown[][] = readings.map((row) => [...row]);
      holed[3] = [898, lost];
      expect(metric({ readings: holed }, "missing")).toBe(1);
      expect(metric({ readings: holed }, "verdict")).toBe("Incomplete");
      expect(metric({ readings: holed }, "minutes")).toBe(10);
    }
  });

  it("reads the rows above the last time, and refuses a reading below it", () => {
    const longer = [...times, [""], [""]];
    expect(metric({ times: longer, readings: [...readings, ["", ""], [0, 0]] }, "verdict")).toBe("Pass");
    expect(survey({ times: longer, readings: [...readings, ["", ""], ["", 20]] })).toEqual([
      ["#VALUE! time missing in row 9, which has a reading"],
    ]);
  });

  it("gives the same verdict in °F, and the class from the standard's own row", () => {
    const inF = (t: number): number => t * 1.8 + 32;
    const fahrenheit: Options = {
      readings: readings.map((row) => row.map(inF)),
      setpoint: one(inF(900)),
      tolerance: one(9),
      unit: one("F"),
    };
    expect(metric(fahrenheit, "verdict")).toBe("Pass");
    expect(metric(fahrenheit, "highest")).toBeCloseTo(inF(904), 9);
    expect(metric(fahrenheit, "plus_deviation")).toBeCloseTo(7.2, 9);
    expect(metric(fahrenheit, "spread")).toBeCloseTo(12.6, 9);
    expect(metric(fahrenheit, "class_met")).toBe(2);
  });

  it.each([
    [{ tolerance: one(0) }, "#VALUE! tolerance: 0 or an empty cell"],
    [{ tolerance: rowOf(5, -5) }, "#VALUE! tolerance -5 °C is not above 0"],
    [{ tolerance: rowOf(1, 2, 3) }, "#VALUE! tolerance: one number, or two cells (below, above), not 3"],
    [{ tolerance: rowOf(5, "") }, "#VALUE! tolerance, column 2: the cell is blank"],
    [{ tolerance: one(-9), unit: one("F") }, "#VALUE! tolerance -9 °F is not above 0"],
    [{ corrections: rowOf(1, 2, 3) }, "#VALUE! 3 corrections for 2 sensors"],
    [{ corrections: rowOf(1, "") }, "#VALUE! corrections, column 2: the cell is blank"],
    [{ setpoint: one("") }, "#VALUE! setpoint: the cell is blank"],
    [{ setpoint: one(500) }, "#N/A no scan has every sensor in band"],
    [
      { readings: readings.map(([t]) => [t, ""]) },
      "#N/A no scan has every sensor in band; sensor 2 has no reading at all",
    ],
    [{ start: one(50), end: one(20) }, "#N/A start lies after end"],
    [{ start: one(52), end: one(58) }, "#N/A the log has no scan between start and end"],
    [{ start: one("") }, "#VALUE! start: the cell is blank"],
    [{ required: one(0) }, "#VALUE! required minutes: 0 or an empty cell"],
    [{ gap: one(0) }, "#VALUE! max gap: 0 or an empty cell"],
    [{ times: columnOf(0, 10, 20) }, "#VALUE! times and readings differ in rows, 3 and 7"],
    [{ timeUnit: one("days") }, '#VALUE! time unit: "days" is none of h, min, s'],
  ] satisfies [Options, string][])("refuses in a sentence: %#", (options, message) => {
    expect(survey(options)).toEqual([[message]]);
  });
});

describe("SURVEYSENSORS", () => {
  it("spills a row per sensor, and each column by itself", () => {
    const table = sensors({ corrections: rowOf(1, 0), names: rowOf("door", "back") });
    expect(table).toEqual([
      [
        "sensor",
        "correction",
        "minimum",
        "mean",
        "maximum",
        "plus_deviation",
        "minus_deviation",
        "stability",
        "in_band",
        "missing",
        "verdict",
      ],
      ["door", 1, 898, 899.5, 901, 1, -2, 3, 1, 0, "Pass"],
      ["back", 0, 901, 902.5, 904, 4, 1, 3, 1, 0, "Pass"],
    ]);
    (table[0] as string[]).forEach((name, at) => {
      expect(sensors({ corrections: rowOf(1, 0), names: rowOf("door", "back"), metric: one(name) })).toEqual(
        table.slice(1).map((row) => [row[at]]),
      );
    });
  });

  it("converts temperatures and differences, and judges each sensor by itself", () => {
    const kelvin = sensors({
      readings: readings.map((row) => row.map((t) => t + 273.15)),
      setpoint: one(1173.15),
      unit: one("K"),
    });
    expect(kelvin[1]?.[2]).toBeCloseTo(897 + 273.15, 9);
    expect(kelvin[1]?.[7]).toBeCloseTo(3, 9);
    const dipped = readings.map((row) => [...row]);
    dipped[3] = [894, 903];
    expect(sensors({ readings: dipped, metric: one("verdict") })).toEqual([["Fail"], ["Pass"]]);
    expect(sensors({ readings: dipped, metric: one("in_band") })).toEqual([[0.75], [1]]);
    expect(sensors({ metric: one("sensor") })).toEqual([[1], [2]]);
  });

  it("has no figures for a sensor without a reading in the period", () => {
    const silent: unknown[][] = readings.map(([t], i) => [t, i < 2 ? 700 : ""]);
    const row = sensors({ readings: silent, start: one(20), end: one(50) })[2] as unknown[];
    expect(row.slice(2, 9)).toEqual(Array(7).fill("#N/A no reading in the survey period"));
    expect(row.slice(9)).toEqual([4, "Incomplete"]);
  });
});

describe("SOAK", () => {
  it("spills every metric, times bit for bit", () => {
    const cells = soak();
    expect(cells).toEqual([
      ["metric", "value"],
      ["start", 20],
      ["end", 50],
      ["minutes", 30],
      ["minutes_to_reach", 20],
      ["overshoot", 0],
      ["interruptions", 0],
    ]);
    for (const [name, value] of cells.slice(1)) expect(soak({ metric: one(name) })).toEqual([[value]]);
    const serials = times.map(([t]) => [45123.4 + (t as number) / 1440]);
    expect(soak({ times: serials, timeUnit: none, metric: one("end") })).toEqual([serials[5]]);
  });

  it("works in whatever degrees the sheet holds, and its messages name none", () => {
    expect(soak({ tolerance: one(-1) })).toEqual([["#VALUE! tolerance -1 degrees is not above 0"]]);
    expect(soak({ readings: columnOf(1, 1, 900, 1, 1, 1, 1) })).toEqual([
      ["#N/A no soak: every sensor is in band for no longer than one scan"],
    ]);
    expect(
      soak({ readings: columnOf(890, 899, 901, 880, 899, 900, 901), metric: one("interruptions") }),
    ).toEqual([[1]]);
  });
});

describe("ENVELOPE", () => {
  it("spills per scan, leaves missing readings out, and is #N/A in a scan that has none", () => {
    const silent = "#N/A no sensor has a reading in this scan";
    expect(
      readable(
        ENVELOPE([
          [900, 902],
          [901, ""],
          ["open", errorCell("#N/A")],
          ["", ""],
        ]),
      ),
    ).toEqual([
      ["lowest", "highest", "mean", "spread"],
      [900, 902, 901, 2],
      [901, 901, 901, 0],
      [silent, silent, silent, silent],
      [silent, silent, silent, silent],
    ]);
    expect(ENVELOPE([[900, 902]], rowOf(1, -3), one("highest"))).toEqual([[901]]);
    expect(ENVELOPE(one(7), none, one("mean"))).toEqual([[7]]);
    expect(readable(ENVELOPE([[900, 902]], one(1)))).toEqual([["#VALUE! 1 corrections for 2 sensors"]]);
  });
});

describe("SURVEYCLASS and SYSTEMCHECK", () => {
  it("work cell by cell", () => {
    expect(readable(SURVEYCLASS(columnOf(3, -3.1, 8.3, "", 29, "wide")))).toEqual([
      [1],
      [2],
      [4],
      [""],
      ["#N/A deviation 29 °C exceeds class 6: ± 28 °C"],
      ['#VALUE! deviation: "wide" is text, not a number'],
    ]);
    expect(SURVEYCLASS(rowOf(5, 15, 50), one("F"))).toEqual([[1, 3, 6]]);
    const checked = readable(
      SYSTEMCHECK(columnOf(900, 901, "", 903), one(900), columnOf(0.5, "", 0.5, 0.5), one(-0.2)),
    );
    expect(checked[0]?.[0]).toBeCloseTo(-0.3, 12);
    expect(checked.slice(1, 3)).toEqual([["#N/A sensor correction missing"], [""]]);
    expect(checked[3]?.[0]).toBeCloseTo(2.7, 12);
  });
});

describe("TIMEABOVE", () => {
  it("gives a row of minutes, per sensor, whatever the unit of the times", () => {
    const two = [
      [110, 130],
      [130, 130],
      [110, ""],
    ];
    expect(TIMEABOVE(columnOf(0, 10, 20), two, one(120), none, min)).toEqual([[10, 10]]);
    expect(TIMEABOVE(columnOf(0, 600, 1200), two, one(120), none, one("s"))).toEqual([[10, 10]]);
    expect(TIMEABOVE(columnOf(1, 1 + 10 / 1440, 1 + 20 / 1440), two, one(120))).toEqual([[10, 10]]);
  });

  it("counts no gap, and spoils only the sensor without two successive readings", () => {
    const record = TIMEABOVE(
      columnOf(0, 10, 20, 60),
      [
        [130, ""],
        [130, 130],
        [130, ""],
        [130, 130],
      ],
      one(120),
      none,
      min,
    );
    expect(readable(record)).toEqual([[20, "#N/A no two successive readings"]]);
    expect(TIMEABOVE(columnOf(0, 60), columnOf(130, 130), one(120), one(60), min)).toEqual([[60]]);
  });
});

describe("LETHALITY", () => {
  const steady = columnOf(0, 5, 10, 15, "");
  const loads = [
    [121, 111],
    [121, 111],
    [121, ""],
    [121, 111],
    ["", ""],
  ];

  it("gives F per sensor, running and missing minutes", () => {
    const of = (name?: string) =>
      LETHALITY(
        steady,
        loads,
        one(121),
        one(10),
        none,
        none,
        none,
        min,
        name === undefined ? none : one(name),
      );
    expect(of()).toEqual(of("f"));
    expect(of()[0]?.[0]).toBeCloseTo(15, 12);
    expect(of()[0]?.[1]).toBeCloseTo(0.5, 12);
    expect(of("missing_minutes")).toEqual([[0, 10]]);
    const running = of("running");
    expect(running.map(([f]) => f)).toEqual([0, 5, 10, 15, ""]);
    expect(running[3]?.[1]).toBeCloseTo(0.5, 12);
  });

  it("takes a threshold, a method and °F", () => {
    const times = columnOf(0, 10, 20);
    const ramp = columnOf(101, 121, 101);
    const trapezoid = LETHALITY(times, ramp, one(121), one(10), one(110), one("trapezoid"), none, min);
    expect(trapezoid[0]?.[0]).toBeCloseTo(10, 12);
    // ∫ 10^((T − 121)/10) dt with T = 121 − 2t, twice, down to 111: 10 · (1 − 0.1)/(2 ln 10), twice.
    const straight = LETHALITY(times, ramp, one(121), one(10), one(111), none, none, min);
    expect(straight[0]?.[0]).toBeCloseTo((2 * 10 * 0.9) / (2 * Math.LN10), 9);
    const inF = columnOf(213.8, 249.8, 213.8);
    const fahrenheit = LETHALITY(
      times,
      inF,
      one(249.8),
      one(18),
      one(231.8),
      none,
      none,
      min,
      none,
      one("F"),
    );
    expect(fahrenheit[0]?.[0]).toBeCloseTo(straight[0]?.[0] as number, 9);
  });

  it("refuses in a sentence", () => {
    const of = (z: unknown, t: unknown[][] = columnOf(121, 121)) =>
      readable(LETHALITY(columnOf(0, 5), t, one(121), one(z), none, none, none, min));
    expect(of(0)).toEqual([["#VALUE! z: 0 or an empty cell"]]);
    expect(of(-10)).toEqual([["#VALUE! z -10 °C is not above 0"]]);
    expect(of(10, columnOf(121, ""))).toEqual([["#N/A no two successive readings"]]);
    expect(of(10, columnOf(121, 99999))).toEqual([
      ["#N/A reading 99999 °C in row 2 is too far above the reference temperature"],
    ]);
  });
});

describe("MEANKINETIC", () => {
  it("is a row per sensor, in the call's unit, weighted by time where times are given", () => {
    const [[a, b]] = MEANKINETIC([[20, 5], ["", 5], [30, 5]]) as [[number, number]]; // biome-ignore format: a block
    expect(a).toBeGreaterThan(25);
    expect(b).toBeCloseTo(5, 9);
    const [[f]] = MEANKINETIC(columnOf(68, 86), none, none, none, one("F")) as [[number]];
    expect(f).toBeCloseTo(a * 1.8 + 32, 9);
    const uneven = MEANKINETIC(columnOf(20, 20, 30), none, columnOf(0, 10, 20), min) as [[number]];
    // Weights 5, 10 and 5 minutes.
    expect(uneven[0][0]).toBeCloseTo((MEANKINETIC(columnOf(20, 20, 20, 30)) as [[number]])[0][0], 9);
    expect(uneven[0][0]).toBeLessThan(a);
  });

  it("refuses in a sentence", () => {
    expect(readable(MEANKINETIC(columnOf(20, 30), one(5)))).toEqual([
      ["#VALUE! activation energy 5 kJ/mol is outside 10 to 500 kJ/mol"],
    ]);
    expect(readable(MEANKINETIC([["", 20]]))).toEqual([["#N/A no reading", expect.closeTo(20, 9)]]);
    expect(readable(MEANKINETIC(columnOf(20, -300)))).toEqual([
      ["#N/A reading -300 °C in row 2 is not above absolute zero"],
    ]);
    expect(readable(MEANKINETIC(columnOf(20, 30), none, columnOf(1)))).toEqual([
      ["#VALUE! times and temperatures differ in rows, 1 and 2"],
    ]);
  });
});
