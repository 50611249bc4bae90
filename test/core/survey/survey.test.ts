import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import {
  type SurveyQuestion,
  type SurveySummary,
  survey,
  surveySummary,
  surveyTable,
} from "../../../src/core/survey";
import { given, jitter, refusal } from "../log/record";
import { furnace, hold, question, type Rows, ramp, withReading } from "./logs";
import { plainSurvey } from "./plain";

const summary = (rows: Rows, more: Partial<SurveyQuestion> = {}): SurveySummary =>
  surveySummary(given(survey(question(rows, more))));
const table = (rows: Rows, more: Partial<SurveyQuestion> = {}) =>
  surveyTable(given(survey(question(rows, more))));

describe("every figure of the summary and of the table", () => {
  const lossy = furnace().map((row, i) => row.map((x, s) => (s === 3 && i > 40 && i < 44 ? undefined : x)));
  const cases: [string, SurveyQuestion][] = [
    ["a plain survey", question(furnace())],
    ["corrections", question(furnace(), { corrections: [0.5, -1.2, 1.3, 0, 0.4] })],
    ["a sensor lost for three scans", question(lossy)],
    ["a dip in the soak", question(withReading(furnace(), 45, 0, 890))],
    ["an uneven tolerance", question(furnace(), { tolerance: { below: 8, above: 5 } })],
    ["a tolerance too tight for some", question(furnace(), { tolerance: { below: 3.6, above: 3.6 } })],
    ["a period from the caller", question(furnace(), { start: 50, end: 112 })],
    [
      "a gap",
      { ...question(furnace()), times: question(furnace()).times.map((t, i) => t + (i > 44 ? 9 : 0)) },
    ],
    [
      "a gap that is allowed",
      {
        ...question(furnace()),
        times: question(furnace()).times.map((t, i) => t + (i > 44 ? 9 : 0)),
        maxGap: 11,
      },
    ],
    [
      "uneven and repeated times",
      { ...question(furnace()), times: question(furnace()).times.map((t, i) => Math.floor(t + jitter(i))) },
    ],
    ["a longer requirement", question(furnace(), { requiredMinutes: 61 })],
  ];

  it.each(cases)("agrees with plain loops: %s", (_, asked) => {
    const plain = plainSurvey(asked);
    const found = given(survey(asked));
    for (const [name, value] of Object.entries(plain.summary)) {
      const figure = surveySummary(found)[name as keyof SurveySummary];
      if (typeof value === "number") expect(figure, name).toBeCloseTo(value, 8);
      else expect(figure, name).toBe(value);
    }
    surveyTable(found).forEach((row, s) => {
      for (const [name, value] of Object.entries(plain.table[s]!)) {
        expect(row[name as keyof typeof row], `sensor ${s + 1} ${name}`).toBeCloseTo(value, 8);
      }
    });
  });
});

describe("the verdict", () => {
  it("is Pass for a soak of an hour in band", () => {
    expect(summary(furnace())).toMatchObject({
      first: 30,
      last: 60,
      minutes: 60,
      missing: 0,
      verdict: "Pass",
    });
  });

  it("is Fail for a dip inside the soak, however short", () => {
    const found = summary(withReading(furnace(), 45, 2, 893.9));
    expect(found).toMatchObject({ first: 30, last: 60, verdict: "Fail" });
    expect(found.margin).toBeCloseTo(-0.1, 9);
  });

  it("is Incomplete for one missing reading", () => {
    expect(summary(withReading(furnace(), 45, 2, undefined))).toMatchObject({
      first: 30,
      last: 60,
      missing: 1,
      minutes: 56,
      verdict: "Incomplete",
    });
  });

  it("is Incomplete for a gap between scans", () => {
    const log = question(furnace());
    const times = log.times.map((time, scan) => time + (scan >= 50 ? 4.1 : 0));
    expect(surveySummary(given(survey({ ...log, times })))).toMatchObject({
      missing: 0,
      minutes: 58,
      verdict: "Incomplete",
    });
  });

  it("is Fail before Incomplete, and Incomplete before Short", () => {
    const both = withReading(withReading(furnace(), 45, 2, undefined), 50, 2, 880);
    expect(summary(both).verdict).toBe("Fail");
    expect(summary(withReading(furnace(), 45, 2, undefined), { requiredMinutes: 200 }).verdict).toBe(
      "Incomplete",
    );
  });

  it("is Short under 30 minutes, and Pass at 30", () => {
    expect(summary(hold(15, 900, 901)).verdict).toBe("Short");
    expect(summary(hold(16, 900, 901))).toMatchObject({ minutes: 30, verdict: "Pass" });
  });

  it("passes at 30 minutes in date-time serials, whose bits are a little short", () => {
    const log = question(hold(16, 900, 901));
    const times = log.times.map((minutes) => (46083.2916666667 + minutes / 1440) * 1440);
    expect(surveySummary(given(survey({ ...log, times })))).toMatchObject({ minutes: 30, verdict: "Pass" });
  });

  it("is Short for a single scan in band, whatever is required", () => {
    const rows = [
      [880, 880],
      [900, 900],
      [920, 920],
    ];
    const found = summary(rows, { requiredMinutes: 1e-9 });
    expect(found).toMatchObject({ first: 1, last: 1, minutes: 0, verdict: "Short" });
    expect(found.drift).toBeInstanceOf(Refusal);
  });

  it("is Fail when a period from the caller holds a reading out of band at its edge", () => {
    expect(summary(furnace(), { start: 58, end: 120 }).verdict).toBe("Fail");
    expect(summary(furnace(), { start: 60, end: 120 }).verdict).toBe("Pass");
  });

  it("is Incomplete when the period from the caller reaches past the log or into a gap", () => {
    const rows = hold(20, 900, 901);
    expect(summary(rows, { start: -10, end: 38 }).verdict).toBe("Incomplete");
    expect(summary(rows, { start: 0, end: 60 }).verdict).toBe("Incomplete");
    expect(summary(rows, { start: -3, end: 41 }).verdict).toBe("Pass");
    const log = question(rows, { start: 12, end: 58 });
    const times = log.times.map((time, scan) => time + (scan > 1 ? 20 : 0));
    expect(surveySummary(given(survey({ ...log, times }))).verdict).toBe("Incomplete");
  });

  it("of the survey is the worst of its sensors'", () => {
    const rank = ["Fail", "Incomplete", "Short", "Pass"];
    for (const rows of [
      furnace(),
      withReading(furnace(), 45, 2, undefined),
      withReading(withReading(furnace(), 45, 2, undefined), 44, 0, 920),
      hold(5, 900, 900, 900),
    ]) {
      const worst = Math.min(...table(rows).map(({ verdict }) => rank.indexOf(verdict)));
      expect(summary(rows).verdict).toBe(rank[worst]);
    }
  });
});

describe("a sensor that is open for long", () => {
  const rows = [...ramp(20, 890, 30, 0, 0, 0), ...hold(40, 900, 902, 897)].map((row, i) =>
    row.map((x, s) => (s === 2 && i >= 35 && i < 55 ? undefined : x)),
  );

  it("cannot be the coldest", () => {
    expect(summary(rows)).toMatchObject({ coldestSensor: 0, hottestSensor: 1, lowestSensor: 2, missing: 20 });
  });

  it("is Incomplete in the table, with its missing readings counted and its share of the others", () => {
    expect(table(rows)[2]).toMatchObject({ missing: 20, inBand: 1, mean: 897, verdict: "Incomplete" });
    expect(table(rows)[0]).toMatchObject({ missing: 0, verdict: "Pass" });
  });

  it("may be the coldest with 90 % of the scans", () => {
    const lost = (count: number) =>
      hold(40, 900, 902, 897).map((row, i) =>
        row.map((x, s) => (s === 2 && i >= 5 && i < 5 + count ? undefined : x)),
      );
    expect(summary(lost(4)).coldestSensor).toBe(2);
    expect(summary(lost(5)).coldestSensor).toBe(0);
  });

  it("has figures refused, and never invented, when it has no reading at all", () => {
    const silent = hold(20, 900, 902).map((row) => [...row, undefined]);
    const asked = { start: 0, end: 38 };
    const row = table(silent, asked)[2]!;
    expect(row).toMatchObject({ missing: 20, verdict: "Incomplete" });
    for (const name of [
      "minimum",
      "mean",
      "maximum",
      "plusDeviation",
      "minusDeviation",
      "stability",
      "inBand",
    ] as const) {
      expect(refusal(row[name])).toBe("#N/A no reading in the survey period");
    }
    expect(summary(silent, asked)).toMatchObject({
      highest: 902,
      lowest: 900,
      missing: 20,
      verdict: "Incomplete",
    });
  });

  it("leaves no hottest sensor when all were", () => {
    const holes = hold(20, 900, 902).map((row, i) => row.map((x, s) => (i % 4 === s ? undefined : x)));
    expect(refusal(summary(holes).hottestSensor)).toBe("#N/A no sensor has 90 % of the scans");
  });
});

describe("figures of a survey", () => {
  it("name the earliest of several equal extremes", () => {
    const rows = [
      [900, 900],
      [900, 904],
      [904, 900],
      [896, 900],
      [900, 896],
    ];
    expect(summary(rows)).toMatchObject({ highestSensor: 1, highestScan: 1, lowestSensor: 0, lowestScan: 3 });
  });

  it("pool the drift within sensors, so that one lost at the end adds none of its offset", () => {
    const rows = Array.from({ length: 31 }, (_, i) => [900 + i / 30, i > 15 ? undefined : 895 + i / 30]);
    expect(summary(rows).drift).toBeCloseTo(1, 9);
  });

  it("say by what to move the set point so that the extremes lie evenly", () => {
    expect(summary(hold(3, 904, 898)).centringShift).toBe(-1);
    expect(summary(hold(3, 904, 898), { tolerance: { below: 4, above: 8 } }).centringShift).toBe(1);
  });

  it("state the class by the larger of the deviations and the overshoot", () => {
    expect(summary(hold(3, 903, 899)).classMet).toBe(1);
    expect(summary(hold(3, 903.1, 899)).classMet).toBe(2);
    expect(summary(hold(3, 900, 870), { tolerance: { below: 40, above: 40 } }).classMet).toBe("none");
  });
});

describe("a survey that cannot be made", () => {
  const reason = (rows: Rows, more: Partial<SurveyQuestion> = {}) => refusal(survey(question(rows, more)));
  const rows = hold(20, 900, 901);

  it("never has every sensor in band, and no period was given", () => {
    expect(reason(hold(20, 900, 920))).toBe("#N/A no scan has every sensor in band");
    expect(summary(hold(20, 900, 920), { start: 0, end: 38 }).verdict).toBe("Fail");
  });

  it("has a period with nothing in it", () => {
    expect(reason(rows, { start: 30, end: 20 })).toBe("#N/A start lies after end");
    expect(reason(rows, { start: 31, end: 31.5 })).toBe("#N/A the log has no scan between start and end");
    expect(reason(rows, { start: 100, end: 200 })).toBe("#N/A the log has no scan between start and end");
    const empty = [...rows, [undefined, undefined], [undefined, undefined]];
    expect(reason(empty, { start: 40, end: 42 })).toBe("#N/A no sensor has a reading between start and end");
  });

  it("requires no time: an empty cell would let any survey pass", () => {
    expect(reason(rows, { requiredMinutes: 0 })).toBe("#VALUE! required minutes: 0 or an empty cell");
    expect(reason(rows, { requiredMinutes: -5 })).toBe("#VALUE! required minutes: -5 min is not above 0");
  });
});

describe("the readings of a survey", () => {
  it("are not copied where there is nothing to add", () => {
    const log = question(furnace(), { corrections: [0, 1, 0, 0, 0] });
    const { sensors } = given(survey(log)).block;
    expect(sensors.map((column, s) => column === log.readings[s])).toEqual([true, false, true, true, true]);
  });

  it("leave the lowest and highest of each scan of the period, and of no other", () => {
    const { extremes, period } = given(survey(question(furnace())));
    expect(extremes.lowest).toHaveLength(period.last - period.first + 1);
    expect(extremes.highest).toHaveLength(31);
  });
});

describe("a period with one side from the caller", () => {
  it("finds the other in the band", () => {
    expect(summary(furnace(), { start: 80 })).toMatchObject({ first: 40, last: 60 });
    expect(summary(furnace(), { end: 80 })).toMatchObject({ first: 30, last: 40 });
  });
});
