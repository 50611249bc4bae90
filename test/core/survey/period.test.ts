/** Which scans the survey period holds, and when its edges are ragged. */
import { describe, expect, it } from "vitest";
import { type SurveyQuestion, survey, surveySummary } from "../../../src/core/survey";
import { given, refusal } from "../log/record";
import { hold, question, type Rows } from "./logs";

const asked = (rows: Rows, more: Partial<SurveyQuestion>) => given(survey(question(rows, more)));
const verdict = (question: SurveyQuestion) => surveySummary(given(survey(question))).verdict;

/** 20 scans, every 2 minutes from 0 to 38, all in band. */
const rows = hold(20, 900, 901);

describe("the survey period", () => {
  it("holds the scans at both its bounds", () => {
    expect(asked(rows, { start: 4, end: 36 }).period).toEqual({ first: 2, last: 18, ragged: false });
    expect(asked(rows, { start: 4.1, end: 35.9 }).period).toEqual({ first: 3, last: 17, ragged: false });
    expect(asked(rows, { start: 0, end: 38 }).period).toEqual({ first: 0, last: 19, ragged: false });
  });

  it("holds a scan from which a bound is off by its rounding, 1E-6 minute", () => {
    expect(asked(rows, { start: 1e-6, end: 38 }).period.first).toBe(0);
    expect(asked(rows, { start: 3e-6, end: 38 }).period.first).toBe(1);
    const log = question(rows);
    const times = log.times.map((time) => time - 38);
    const last = (end: number) => given(survey({ ...log, times, start: -38, end })).period.last;
    expect(last(-1e-6)).toBe(19);
    expect(last(-3e-6)).toBe(18);
  });

  it("may be a single scan, which is short", () => {
    const found = asked(rows, { start: 10, end: 10 });
    expect(found.period).toEqual({ first: 5, last: 5, ragged: false });
    expect(surveySummary(found)).toMatchObject({ minutes: 0, verdict: "Short" });
  });

  it("begins or ends at a scan in band where one side is left out, if there is one within the other", () => {
    const log = [[880], [900], [901], [880]];
    expect(asked(log, { end: 2 }).period).toMatchObject({ first: 1, last: 1 });
    expect(asked(log, { start: 4 }).period).toMatchObject({ first: 2, last: 2 });
    expect(asked(log, { end: 6 }).period).toMatchObject({ first: 1, last: 3 });
    expect(asked(log, { start: 0 }).period).toMatchObject({ first: 0, last: 2 });
    const never = "#N/A no scan has every sensor in band";
    expect(refusal(survey(question(log, { end: 1 })))).toBe(never);
    expect(refusal(survey(question(log, { start: 5 })))).toBe(never);
  });

  it("holds a reading if its last scan has one", () => {
    const silent: Rows = [[undefined], [undefined], [905], [900]];
    expect(surveySummary(asked(silent, { start: 0, end: 4 }))).toMatchObject({ missing: 2, highest: 905 });
    expect(refusal(survey(question(silent, { start: 0, end: 2 })))).toBe(
      "#N/A no sensor has a reading between start and end",
    );
  });
});

describe("a ragged edge", () => {
  /** 20 minutes without a scan between minute 10 and minute 30. */
  const log = question(hold(20, 900, 901));
  const times = log.times.map((time) => (time > 10 ? time + 18 : time));
  const gapped = { ...log, times, requiredMinutes: 1 };

  it("is where the period begins or ends inside a gap", () => {
    expect(verdict({ ...gapped, start: 20, end: 50 })).toBe("Incomplete");
    expect(verdict({ ...gapped, start: 29, end: 50 })).toBe("Incomplete");
    expect(verdict({ ...gapped, start: 0, end: 11 })).toBe("Incomplete");
    expect(verdict({ ...gapped, start: 0, end: 20 })).toBe("Incomplete");
  });

  it("is not where it begins or ends at the very scan beside the gap", () => {
    expect(verdict({ ...gapped, start: 30, end: 50 })).toBe("Pass");
    expect(verdict({ ...gapped, start: 0, end: 10 })).toBe("Pass");
  });

  it("is not between two scans that are no gap apart", () => {
    expect(verdict({ ...gapped, start: 33, end: 51 })).toBe("Pass");
  });

  it("is past the ends of the log by more than the longest gap that is none: three intervals", () => {
    expect(verdict({ ...log, start: -6, end: 38 })).toBe("Pass");
    expect(verdict({ ...log, start: -6.1, end: 38 })).toBe("Incomplete");
    expect(verdict({ ...log, start: 0, end: 44 })).toBe("Pass");
    expect(verdict({ ...log, start: 0, end: 44.1 })).toBe("Incomplete");
    expect(verdict({ ...log, start: -10, end: 48, maxGap: 10 })).toBe("Pass");
  });

  it("is looked for on the side only that was asked for", () => {
    expect(verdict({ ...gapped, start: 30 })).toBe("Pass");
    expect(verdict({ ...gapped, end: 10 })).toBe("Pass");
    expect(verdict({ ...gapped, start: 25 })).toBe("Incomplete");
    expect(verdict({ ...gapped, end: 15 })).toBe("Incomplete");
  });
});
