import { describe, expect, it } from "vitest";
import { survey, surveySummary, surveyTable } from "../../../src/core/survey";
import { given } from "../log/record";
import { hold, question, type Rows, ramp } from "./logs";

const summary = (rows: Rows, more = {}) => surveySummary(given(survey(question(rows, more))));
const soaked = hold(20, 901, 899);

describe("overshoot", () => {
  it("above the band fails a survey whose soak is in order", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [905, 890], [907, 893], [903, 893.9], ...soaked];
    const found = summary(rows);
    expect(found).toMatchObject({ first: 33, overshoot: 7, plusDeviation: 1, verdict: "Fail", classMet: 3 });
  });

  it("fails the sensor that did it and no other", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [905, 890], [907, 893], [903, 893.9], ...soaked];
    expect(surveyTable(given(survey(question(rows)))).map(({ verdict }) => verdict)).toEqual([
      "Fail",
      "Pass",
    ]);
  });

  it("up to the band's limit passes", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [906, 890], ...soaked];
    expect(summary(rows)).toMatchObject({ overshoot: 6, verdict: "Pass" });
  });

  it("is not below 0, even when all sensors crept in from below", () => {
    expect(summary([...ramp(20, 890, 30, 0, 0), [897, 890], ...soaked]).overshoot).toBe(0);
    expect(summary([...ramp(20, 890, 30, 0, 0), ...soaked]).overshoot).toBe(0);
  });

  it("of every sensor at once, past the band and back, is seen", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [925, 924], [931, 930], [925, 924], [912, 911], ...soaked];
    expect(summary(rows)).toMatchObject({ first: 34, overshoot: 31, verdict: "Fail" });
  });

  it("is none when the band was reached from above", () => {
    expect(summary([...ramp(1000, 910, 30, 0, 0), ...soaked])).toMatchObject({
      overshoot: 0,
      verdict: "Pass",
    });
  });

  it("is not an earlier, lower set point", () => {
    const rows = [...ramp(20, 850, 30, 0, 0), ...hold(20, 850, 852), ...ramp(850, 890, 5, 0, 0), ...soaked];
    expect(summary(rows)).toMatchObject({ first: 55, overshoot: 0, verdict: "Pass" });
  });

  it("is not an earlier, higher set point that was held", () => {
    const rows = [...ramp(20, 950, 31, 0, 0), ...hold(20, 950, 948), ...ramp(945, 910, 5, 0, 0), ...soaked];
    // The ramp upward passes through the band: a log with several set points needs start and end.
    const found = summary(rows, { start: 2 * 56, end: 2 * 75 });
    expect(found).toMatchObject({ first: 56, last: 75, overshoot: 0, verdict: "Pass" });
  });

  it("is not an earlier, higher set point with the load cooled down between", () => {
    const rows = [
      ...ramp(20, 950, 31, 0, 0),
      ...hold(5, 950, 948),
      ...ramp(945, 500, 5, 0, 0),
      ...ramp(500, 890, 8, 0, 0),
      [903, 892],
      ...soaked,
    ];
    expect(summary(rows, { start: 100, end: 138 })).toMatchObject({ first: 50, overshoot: 3 });
  });

  it("that lingers just above the band is no set point", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), ...hold(30, 910, 909), ...soaked];
    expect(summary(rows)).toMatchObject({ first: 60, overshoot: 10, verdict: "Fail" });
  });

  it("is not hidden by a reading lost on the way", () => {
    // Sensor 1 shoots over and is open while sensor 2 is still below: not every sensor is known to be below.
    const rows = [...ramp(20, 890, 30, 0, 0), [909, 890], [undefined, 891], [905, 893], ...soaked];
    expect(summary(rows)).toMatchObject({ overshoot: 9, verdict: "Fail" });
  });

  it("is seen although one sensor is open throughout", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [909, 890], [903, 893], ...soaked].map((row) => [
      ...row,
      undefined,
    ]);
    const found = summary(rows, { start: 64, end: 102 });
    expect(found).toMatchObject({ overshoot: 9, verdict: "Fail" });
  });

  it("counts from the log's first scan, when that alone was below", () => {
    expect(summary([[880, 880], [907, 890], ...soaked])).toMatchObject({ first: 2, overshoot: 7 });
  });

  it("is each sensor's own, above the set point", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [904, 890], [902, 893], ...soaked];
    expect([...given(survey(question(rows))).overshoots]).toEqual([4, 0]);
  });

  it("is seen although a sensor joins late, or begins in the band", () => {
    const late = [[880, undefined], [907, undefined], [905, 890], ...soaked];
    expect(summary(late)).toMatchObject({ first: 3, overshoot: 7 });
    const hot = [[907, undefined], [905, 890], ...soaked];
    expect(summary(hot)).toMatchObject({ first: 2, overshoot: 0 });
  });

  it("is none when the first known scan was above: a scan without readings says nothing", () => {
    expect(summary([[undefined, undefined], [907, 910], ...soaked]).overshoot).toBe(0);
  });

  it("asks a sensor that reads in the period only once, and none that never does", () => {
    const way = [...ramp(20, 890, 30, 0, 0), [890, 907], [890, 908]];
    const last = [...hold(19, 901, 899).map(([a]) => [a, undefined]), [901, 899]];
    // The second sensor is above while the first is still below: not all were below in these scans.
    const period = { start: 64, end: 102 };
    expect(summary([...way, ...last], period).overshoot).toBe(8);
    const never = hold(20, 901, 899).map(([a]) => [a, undefined]);
    expect(summary([...way, ...never], period).overshoot).toBe(0);
    const after = [...never, [901, 899]];
    expect(summary([...way, ...after], period).overshoot).toBe(0);
  });
});
