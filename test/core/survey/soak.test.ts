import { describe, expect, it } from "vitest";
import { soak } from "../../../src/core/survey";
import { given, refusal } from "../log/record";
import { furnace, hold, question, type Rows, ramp, withReading } from "./logs";

const found = (rows: Rows, more = {}) => given(soak(question(rows, more)));

describe("the soak", () => {
  it("is the stretch with every sensor in band", () => {
    expect(found(furnace())).toMatchObject({
      first: 30,
      last: 60,
      minutes: 60,
      minutesToReach: 60,
      interruptions: 0,
    });
  });

  it("is cut by a reading out of band, which is an interruption", () => {
    const dipped = withReading(furnace(), 40, 2, 893.9);
    expect(found(dipped)).toMatchObject({
      first: 41,
      last: 60,
      minutes: 38,
      minutesToReach: 82,
      interruptions: 1,
    });
  });

  it("is cut by a missing reading, which is no interruption", () => {
    const lost = withReading(furnace(), 40, 2, undefined);
    expect(found(lost)).toMatchObject({ first: 41, last: 60, interruptions: 0 });
  });

  it("is cut by a gap between scans", () => {
    const log = question(furnace());
    const times = log.times.map((time, scan) => time + (scan >= 50 ? 10 : 0));
    expect(given(soak({ ...log, times }))).toMatchObject({
      first: 30,
      last: 49,
      minutes: 38,
      interruptions: 0,
    });
    expect(given(soak({ ...log, times, maxGap: 12 }))).toMatchObject({ first: 30, last: 60, minutes: 70 });
  });

  it("counts an excursion with a lost reading in its middle once", () => {
    const rows = [...hold(3, 900, 900), [910, 900], [undefined, 900], [910, 900], ...hold(2, 900, 900)];
    expect(found(rows).interruptions).toBe(1);
  });

  it("counts an excursion that ends in a single scan, the last of the log", () => {
    expect(found([...hold(3, 900, 900), [910, 900], [900, 900]])).toMatchObject({
      last: 2,
      interruptions: 1,
    });
  });

  it("ends with the last of several scans that share a stamp", () => {
    const times = Float64Array.of(0, 2, 4, 4);
    expect(given(soak(question(hold(4, 900), { times })))).toMatchObject({ first: 0, last: 3, minutes: 4 });
  });

  it("is the longer of two, wherever it stands", () => {
    const rows = [...hold(3, 900), [950], ...hold(4, 900), [950], ...hold(3, 900)];
    expect(found(rows)).toMatchObject({ first: 4, last: 7, minutes: 6, minutesToReach: 8, interruptions: 2 });
  });

  it("takes a reading at the limit as in band, whatever its bits", () => {
    const rows = hold(3, 902.2, 897.8);
    expect(found(rows, { tolerance: { below: 2.2, above: 2.2 } }).minutes).toBe(4);
    expect(refusal(soak(question(rows, { tolerance: { below: 2.2, above: 2.19 } })))).toMatch(/no scan/);
  });

  it("takes an uneven tolerance side by side", () => {
    const rows = [[891, 900], ...hold(4, 890, 905), [890, 905.1]];
    expect(found(rows, { tolerance: { below: 10, above: 5 } })).toMatchObject({ first: 0, last: 4 });
  });

  it("adds each sensor's correction to its readings", () => {
    const rows = hold(3, 907, 893);
    expect(found(rows, { corrections: [-2, 2] }).minutes).toBe(4);
    expect(refusal(soak(question(rows, { corrections: [2, -2] })))).toMatch(/no scan/);
  });

  it("is the first of two that are equally long", () => {
    const rows = [...hold(4, 900), [950], ...hold(4, 900)];
    expect(found(rows)).toMatchObject({ first: 0, last: 3 });
  });

  it("lasts an exact hour in date-time serials too", () => {
    const log = question(furnace());
    const times = log.times.map((minutes) => (46083.2916666667 + minutes / 1440) * 1440);
    expect(given(soak({ ...log, times }))).toMatchObject({ minutes: 60, minutesToReach: 60 });
  });

  it("reports the overshoot on the way in", () => {
    const rows = [...ramp(20, 890, 30, 0, 0), [905, 890], [909.5, 893], [907, 893.9], ...hold(20, 901, 899)];
    expect(found(rows)).toMatchObject({ first: 33, overshoot: 9.5 });
  });
});

describe("a log without a soak", () => {
  const reason = (rows: Rows, more = {}) => refusal(soak(question(rows, more)));

  it("never has every sensor in band", () => {
    expect(
      reason([
        [880, 900],
        [900, 880],
      ]),
    ).toBe("#N/A no scan has every sensor in band");
  });

  it("has a sensor without any reading, which is named", () => {
    expect(
      reason([
        [900, undefined],
        [900, undefined],
      ]),
    ).toBe("#N/A no scan has every sensor in band; sensor 2 has no reading at all");
    expect(reason([[undefined, 900]])).toBe(
      "#N/A no scan has every sensor in band; sensor 1 has no reading at all",
    );
    expect(
      reason([
        [undefined, 900],
        [880, undefined],
      ]),
    ).toBe("#N/A no scan has every sensor in band");
  });

  it("has every sensor in band for one scan: that is no soak", () => {
    expect(reason([[880], [900], [950]])).toBe(
      "#N/A no soak: every sensor is in band for no longer than one scan",
    );
    const two = question([[900], [900]], { times: Float64Array.of(5, 5) });
    expect(refusal(soak(two))).toMatch(/no longer than one scan/);
  });

  it("has arguments that cannot be meant", () => {
    const rows = hold(2, 900, 900);
    expect(reason(rows, { tolerance: { below: 0, above: 5 } })).toBe("#VALUE! tolerance: 0 or an empty cell");
    expect(reason(rows, { tolerance: { below: 5, above: -5 } })).toBe(
      "#VALUE! tolerance -5 °C is not above 0",
    );
    expect(reason(rows, { corrections: [1] })).toBe("#VALUE! 1 corrections for 2 sensors");
    expect(reason(rows, { corrections: [1, Number.NaN] })).toBe("#VALUE! correction of sensor 2 is missing");
    expect(reason(rows, { corrections: [Number.NaN, 1] })).toBe("#VALUE! correction of sensor 1 is missing");
    expect(reason(rows, { times: Float64Array.of(0, 1, 2) })).toBe(
      "#VALUE! sensor 1 has 2 readings for 3 times",
    );
    expect(reason(rows, { readings: [] })).toBe("#N/A the survey has no sensor");
  });
});
