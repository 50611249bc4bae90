/** Which of several equal readings, sensors or scans is named. */
import { describe, expect, it } from "vitest";
import { temperatureUnits } from "../../../src/core";
import { type SurveyQuestion, survey, surveySummary } from "../../../src/core/survey";
import { given, refusal } from "../log/record";
import { hold, question, type Rows } from "./logs";

const summary = (rows: Rows, more: Partial<SurveyQuestion> = {}) =>
  surveySummary(given(survey(question(rows, more))));
const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F")!;

describe("of equal extremes", () => {
  it("the first scan of one sensor is named", () => {
    expect(summary([[900], [904], [896], [904], [896]])).toMatchObject({ highestScan: 1, lowestScan: 2 });
  });

  it("in one scan the first sensor is named", () => {
    const rows = [
      [900, 900, 900],
      [900, 904, 904],
      [896, 900, 896],
    ];
    expect(summary(rows)).toMatchObject({ highestSensor: 1, lowestSensor: 0 });
  });

  it("those count as equal that differ by less than 1E-9 of the unit's degree", () => {
    // In °F half a step of the ninth decimal is 2.8E-10 °C, in °C 5E-10 °C.
    const rows = [
      [900, 899],
      [899, 900 + 4e-10],
    ];
    expect(summary(rows).highestSensor).toBe(0);
    expect(summary(rows, { unit: fahrenheit }).highestSensor).toBe(1);
    expect(summary(rows.map((row) => row.map((x) => 1800 - x))).lowestSensor).toBe(0);
    expect(
      summary(
        rows.map((row) => row.map((x) => 1800 - x)),
        { unit: fahrenheit },
      ).lowestSensor,
    ).toBe(1);
  });

  it("none is of a sensor without readings, the first sensor though it is", () => {
    const rows = hold(3, 900, 902).map((row) => [undefined, ...row]);
    expect(summary(rows, { start: 0, end: 4 })).toMatchObject({ highestSensor: 2, lowestSensor: 1 });
  });
});

describe("of equal means", () => {
  it("the first sensor is named", () => {
    expect(summary(hold(3, 900, 902, 902, 899, 899))).toMatchObject({ hottestSensor: 1, coldestSensor: 3 });
  });

  it("those count as equal that differ by less than 1E-9 of the unit's degree", () => {
    const rows = hold(3, 900, 900 + 4e-10, 899);
    expect(summary(rows).hottestSensor).toBe(0);
    expect(summary(rows, { unit: fahrenheit }).hottestSensor).toBe(1);
  });
});

describe("the drift", () => {
  it("is known from two scans on", () => {
    // 1 °C in 2 minutes is 30 °C per hour; the third sensor has one reading, which says nothing.
    const rows: Rows = [
      [900, 895, undefined],
      [901, 896, 899.7],
    ];
    expect(summary(rows, { start: 0, end: 2 }).drift).toBeCloseTo(30, 9);
  });

  it("keeps its digits where times are minutes since 1900, as date-time cells give them", () => {
    const rows = Array.from({ length: 31 }, (_, i) => [900 + i / 30, 895 + i / 30]);
    const log = question(rows);
    const times = log.times.map((time) => 46083 * 1440 + time);
    expect(surveySummary(given(survey({ ...log, times }))).drift).toBeCloseTo(1, 10);
  });

  it("passes over a sensor without readings", () => {
    const rows = Array.from({ length: 31 }, (_, i) => [undefined, 900 + i / 30]);
    expect(summary(rows, { start: 0, end: 60 }).drift).toBeCloseTo(1, 9);
  });

  it("is refused where no sensor has readings at two times", () => {
    expect(refusal(summary([[880], [900], [920]]).drift)).toBe(
      "#N/A no sensor has readings at two times, so there is no drift",
    );
    const apart: Rows = [
      [900, undefined],
      [undefined, 901],
    ];
    expect(refusal(summary(apart, { start: 0, end: 2 }).drift)).toMatch(/readings at two times/);
  });
});
