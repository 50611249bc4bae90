/** When a stay above the band was another set point, and when it was an overshoot. */
import { describe, expect, it } from "vitest";
import { survey, surveySummary } from "../../../src/core/survey";
import { given } from "../log/record";
import { hold, question, type Rows, ramp } from "./logs";

/**
 * Heated from below, then `above`, then the soak, which is the period asked for. The band is 900 ± 6 °C, so 12 °C wide:
 * "well above" starts over 918 °C, "steady" is within 3 °C. Scans are 2 minutes apart.
 */
function overshootOf(above: Rows, stretch: (time: number) => number = (time) => time): number {
  const sensors = above[0]?.length ?? 0;
  const rows = [...ramp(20, 890, 5, ...hold(1, 0, 0)[0]!.slice(0, sensors)), ...above];
  const soak = hold(20, ...new Array<number>(sensors).fill(900));
  const log = question([...rows, ...soak]);
  const times = log.times.map(stretch);
  const [start, end] = [times[rows.length]!, times[times.length - 1]!];
  return surveySummary(given(survey({ ...log, times, start, end, maxGap: 15 }))).overshoot;
}

/** Hold and way down: 950 °C is 50 °C of overshoot unless it was a set point. */
const held = (...rows: Rows[]): Rows => [...rows.flat(), [930, 930], [912, 911]];

describe("a stay above the band", () => {
  it("is a set point from 20 minutes on: 11 scans of 2 minutes, not 10", () => {
    expect(overshootOf(held(hold(11, 950, 948)))).toBe(0);
    expect(overshootOf(held(hold(10, 950, 948)))).toBe(50);
  });

  it("is counted in minutes and not in scans", () => {
    expect(overshootOf(held(hold(6, 950, 948)), (time) => 2 * time)).toBe(0);
    expect(overshootOf(held(hold(11, 950, 948)), (time) => time / 2)).toBe(50);
  });

  it("must be well above, in every sensor: at 18 °C over the set point it is not", () => {
    expect(overshootOf([...hold(11, 918.1, 918.1), [912, 911]])).toBe(0);
    expect(overshootOf([...hold(11, 918, 918.1), [912, 911]])).toBeCloseTo(18.1, 9);
    expect(overshootOf([...hold(11, 950, 918), [912, 911]])).toBe(50);
  });

  it("must be steady: up to 3 °C from where it began, either way", () => {
    const then = (level: number) => held(hold(6, 950, 948), hold(5, level, 948));
    expect(overshootOf(then(953))).toBe(0);
    expect(overshootOf(then(947))).toBe(0);
    expect(overshootOf(then(953.1))).toBeCloseTo(53.1, 9);
    expect(overshootOf(then(946.9))).toBe(50);
  });

  it("is held to where it began, so that a slow drift is not steady", () => {
    expect(overshootOf([...ramp(950, 972, 11, 0, 0), [912, 911]])).toBe(70);
  });

  it("begins anew where it became steady", () => {
    expect(overshootOf(held(ramp(930, 960, 5, 0, 0), hold(11, 960, 960)))).toBe(0);
  });

  it("begins anew after a scan that was not well above", () => {
    expect(overshootOf(held(hold(6, 950, 948), [[905, 948]], hold(6, 950, 948)))).toBe(50);
    expect(overshootOf(held(hold(3, 950, 948), [[905, 948]], hold(11, 950, 948)))).toBe(0);
  });

  it("is not held through a gap, in which nothing is known", () => {
    const late = (from: number) => (time: number) => (time >= from ? time + 30 : time);
    // The hold begins at minute 10.
    expect(overshootOf(held(hold(6, 950, 948)), late(14))).toBe(50);
    expect(overshootOf(held(hold(14, 950, 948)), late(14))).toBe(0);
  });

  it("goes on past a missing reading of one sensor, and not past a scan without any", () => {
    expect(overshootOf(held(hold(5, 950, 948), [[undefined, 948]], hold(5, 950, 948)))).toBe(0);
    expect(overshootOf(held(hold(5, 950, 948), [[undefined, undefined]], hold(5, 950, 948)))).toBe(50);
  });

  it("holds a sensor that was missing at its beginning to its first reading", () => {
    const beginning: Rows = [[undefined, 948]];
    expect(overshootOf(held(beginning, hold(10, 950, 948)))).toBe(0);
    expect(overshootOf(held(beginning, hold(5, 950, 948), hold(5, 960, 948)))).toBe(60);
  });

  it("ends where the period begins", () => {
    // The eleventh scan at 950 °C is the first of the period.
    const rows = [...ramp(20, 890, 5, 0, 0), ...hold(11, 950, 948), ...hold(20, 900, 900)];
    const found = survey(question(rows, { start: 2 * 15, end: 2 * 35 }));
    expect(surveySummary(given(found)).overshoot).toBe(50);
  });

  it("does not count before the load was last below the band", () => {
    const rows = held(hold(11, 950, 948));
    expect(overshootOf([...rows, ...ramp(880, 890, 2, 0, 0), [908, 907]])).toBe(8);
  });
});
