/** Where one repair of a time column ends and another begins. */
import { describe, expect, it } from "vitest";
import { timeline } from "../../../src/core/log";
import { column, given, refusal } from "./record";

function repaired(...minutes: (number | undefined)[]) {
  const { added, repairs } = given(timeline(column(...minutes)));
  return { times: minutes.map((time, i) => (time ?? Number.NaN) + (added[i] as number)), repairs };
}
/** The only repair of a column, or all of them in one text. */
const repair = (...minutes: number[]): string =>
  repaired(...minutes)
    .repairs.filter(Boolean)
    .join("; ");

describe("a fall of the clock", () => {
  it("is midnight when it is more than half a day and no more than a whole one", () => {
    expect(repair(700, 710, 720, -1, 9)).toBe("midnight, 1 day added");
    expect(repair(700, 710, 720, 0, 10)).toBe("clock set back, 730 min added");
    const whole = repaired(1420, 1430, 1440, 0, 10);
    // The day that was added brings it to the stamp before: the two scans share ten minutes.
    expect(whole.repairs.slice(3)).toEqual(["midnight, 1 day added; repeated stamp, spread", ""]);
    expect(whole.times).toEqual([1420, 1430, 1440, 1445, 1450]);
    expect(repair(1440, 1500, 1560, 60, 120)).toBe("clock set back, 1560 min added");
  });

  it("is a change by whole hours when it goes on within half an interval of the usual time", () => {
    // Ten minutes apart; an hour back and on at 5, 10 and 15 minutes, then at 4 and 16.
    for (const on of [5, 10, 15]) {
      const { times, repairs } = repaired(600, 610, 620, 560 + on, 570 + on);
      expect(repairs[3]).toBe("clock change, 1 h added");
      expect(times).toEqual([600, 610, 620, 620 + on, 630 + on]);
    }
    expect(repair(600, 610, 620, 564, 574)).toBe("clock set back, 66 min added");
    expect(repair(600, 610, 620, 576, 586)).toBe("clock set back, 54 min added");
    expect(repair(600, 610, 620, 510, 520)).toBe("clock change, 2 h added");
  });

  it("sets the time back by what is needed, named to three digits", () => {
    const { times, repairs } = repaired(600, 602, 604, 601.3334, 603.3334);
    expect(repairs[3]).toBe("clock set back, 4.67 min added");
    expect(times[3]).toBeCloseTo(606, 9);
    expect(times[4]).toBeCloseTo(608, 9);
  });

  it("adds to those before it", () => {
    const { times, repairs } = repaired(1430, 1440, 10, 20, 30, 15, 25);
    expect(times).toEqual([1430, 1440, 1450, 1460, 1470, 1480, 1490]);
    expect(repairs[5]).toBe("clock set back, 25 min added");
  });
});

describe("a stamp out of order", () => {
  it("is told by the next, which goes on from the one before within three intervals", () => {
    const out = "out of order, put between its neighbours";
    expect(repaired(0, 2, 4, 1, 10, 12, 14)).toEqual({
      times: [0, 2, 4, 7, 10, 12, 14],
      repairs: ["", "", "", out, "", "", ""],
    });
    expect(repair(0, 2, 4, 1, 10.1, 12.1, 14.1)).toBe("clock set back, 5 min added");
    // A millionth of a minute is the rounding of the times.
    expect(repair(-4, -2, 0, -3, 6 + 1e-6, 8, 10)).toBe(out);
    expect(repair(-4, -2, 0, -3, 6 + 3e-6, 8, 10)).toBe("clock set back, 5 min added");
  });

  it("may stand between two equal ones, which are then spread with it", () => {
    const { times, repairs } = repaired(0, 2, 4, 1, 4, 6, 8);
    [0, 2, 4, 4 + 2 / 3, 4 + 4 / 3, 6, 8].forEach((time, i) => {
      expect(times[i]).toBeCloseTo(time, 12);
    });
    expect(repairs[3]).toBe("out of order, put between its neighbours; repeated stamp, spread");
    expect(repairs[4]).toBe("repeated stamp, spread");
  });

  it("is put between its neighbours after midnight too", () => {
    const { times } = repaired(1436, 1438, 0, 2, 1, 6, 8);
    expect(times).toEqual([1436, 1438, 1440, 1442, 1444, 1446, 1448]);
  });

  it("cannot be told at the end of the log", () => {
    expect(repair(0, 2, 4, 1)).toBe("clock set back, 5 min added");
  });
});

describe("what a timeline goes by", () => {
  it("is the interval between scans that have times, across those that have none", () => {
    // Intervals 10, 10 and 2 min: the usual one is 10, to which the last stamp is spread.
    const { times } = repaired(0, undefined, 10, undefined, 20, 22, 22, 600, 610);
    expect(times[6]).toBe(32);
  });

  it("is two times at least", () => {
    expect(repaired(0, 2).times).toEqual([0, 2]);
    expect(refusal(timeline(column(undefined, 3)))).toBe("#N/A a timeline needs at least 2 times");
  });

  it("is no log whose newest scan comes first: more than one fall, and more falls than rises", () => {
    const sort = "#N/A the times fall from row to row: sort the log, oldest scan first";
    expect(refusal(timeline(column(9, 8, 7)))).toBe(sort);
    expect(refusal(timeline(column(9, 8, 9, 8, 7)))).toBe(sort);
    expect(refusal(timeline(column(9, 9, 9, 9, 8, 7)))).toBe(sort);
    // Equal stamps are neither.
    expect(repaired(5, 5, 5, 6).times.every((time, i, all) => i === 0 || time > all[i - 1]!)).toBe(true);
    // As many rises as falls: two midnights with one scan each.
    expect(repair(1400, 100, 1000, 50, 700)).toBe("midnight, 1 day added; midnight, 1 day added");
    // One fall may be midnight, but then nothing says how often the log is scanned.
    expect(refusal(timeline(column(9, 8)))).toBe("#N/A the times never rise");
  });
});

describe("repeated stamps", () => {
  it("are spread over the time to the next, each run by itself, and named", () => {
    const { times, repairs } = repaired(0, 0, 0, 3, 6, 6, 9, 12);
    expect(times).toEqual([0, 1, 2, 3, 6, 7.5, 9, 12]);
    const spread = "repeated stamp, spread";
    expect(repairs).toEqual(["", spread, spread, "", "", spread, "", ""]);
  });

  it("at the end are spread at the pace of the log: interval × stamps ÷ scans", () => {
    // Four stamps 3 min apart in five scans: 2.4 min a scan.
    expect(repaired(0, 3, 6, 9, 9).times[4]).toBeCloseTo(9 + 2.4, 12);
  });
});
