import { describe, expect, it } from "vitest";
import { timeline } from "../../../src/core/log";
import { column, every, given, refusal } from "./record";

const clock = (text: string): number => {
  const [hours = 0, minutes = 0, seconds = 0] = text.split(":").map(Number);
  return hours * 60 + minutes + seconds / 60;
};
const stamps = (text: string): Float64Array => Float64Array.from(text.split(" "), clock);

function repaired(times: Float64Array) {
  const { added, repairs } = given(timeline(times));
  return { times: Array.from(times, (time, i) => time + (added[i] as number)), repairs };
}

describe("a timeline", () => {
  it("leaves a good column exactly as it is", () => {
    const { added, repairs } = given(timeline(every(0.1, 50)));
    expect([...added]).toEqual(new Array(50).fill(0));
    expect(repairs.join("")).toBe("");
  });

  it("adds a day at each midnight", () => {
    const { times, repairs } = repaired(stamps("23:56 23:58 0:00 0:02 12:00 23:59 0:01"));
    expect(times).toEqual([1436, 1438, 1440, 1442, 2160, 2879, 2881]);
    expect(repairs).toEqual(["", "", "midnight, 1 day added", "", "", "", "midnight, 1 day added"]);
  });

  it("adds the hour of a clock that went back in autumn, and keeps the scans' own jitter", () => {
    const { times, repairs } = repaired(stamps("2:50 2:55 2:00:01 2:05 2:10"));
    expect(times.map((time) => Math.round(time * 60))).toEqual([10200, 10500, 10801, 11100, 11400]);
    expect(repairs[2]).toBe("clock change, 1 h added");
  });

  it("lets a clock that was set back by less go on at the usual interval", () => {
    const { times, repairs } = repaired(stamps("10:00 10:02 10:04 10:01 10:03 10:05"));
    expect(times).toEqual([600, 602, 604, 606, 608, 610]);
    expect(repairs).toEqual(["", "", "", "clock set back, 5 min added", "", ""]);
  });

  it("moves one stamp out of order between its neighbours, and no other", () => {
    const { times, repairs } = repaired(stamps("10:00 10:02 9:00 10:06 10:08"));
    expect(times).toEqual([600, 602, 604, 606, 608]);
    expect(repairs).toEqual(["", "", "out of order, put between its neighbours", "", ""]);
  });

  it("spreads repeated stamps up to the next", () => {
    const seconds = column(0, 0, 1, 1, 2, 2, 3).map((s) => s / 60);
    const { times, repairs } = repaired(seconds);
    expect(times.map((time) => Math.round(time * 6000))).toEqual([0, 50, 100, 150, 200, 250, 300]);
    expect(repairs[1]).toBe("repeated stamp, spread");
    expect(repairs[2]).toBe("");
  });

  it("spreads them no further than the usual interval when a gap follows", () => {
    expect(repaired(stamps("8:00 8:02 8:04 8:04 16:00 16:02")).times[3]).toBe(clock("8:06"));
  });

  it("spreads the last ones at the pace of the log", () => {
    const times = repaired(column(0, 0, 1, 1, 2, 2)).times;
    expect(times).toEqual([0, 0.5, 1, 1.5, 2, 2.5]);
  });

  it("leaves a jump forward alone: a clock put forward cannot be told from a gap", () => {
    const { added } = given(timeline(stamps("1:50 1:55 3:00 3:05")));
    expect([...added]).toEqual([0, 0, 0, 0]);
  });

  it("passes over missing times", () => {
    const { added, repairs } = given(timeline(column(0, 2, undefined, 4, 4, 6)));
    expect([...added]).toEqual([0, 0, 0, 0, 1, 0]);
    expect(repairs[2]).toBe("");
  });

  it("refuses a column with nothing to go by", () => {
    expect(refusal(timeline(column(5)))).toBe("#N/A a timeline needs at least 2 times");
    expect(refusal(timeline(column(5, 5, 5)))).toBe("#N/A the times never rise");
    expect(refusal(timeline(column(9, 8, 7, 8, 6, 5)))).toMatch(/sort the log, oldest scan first/);
  });
});
