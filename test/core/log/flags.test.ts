import { describe, expect, it } from "vitest";
import { type FlagLimits, flagger } from "../../../src/core/log";
import { column, given, refusal } from "./record";

const flags = (readings: Float64Array, limits: Partial<FlagLimits> = {}) =>
  given(flagger({ low: 0, high: 1000, ...limits }))(readings);

describe("flags", () => {
  it("name missing readings and those outside the limits", () => {
    expect(flags(column(0, -0.1, undefined, 1000, 1000.1, 99999))).toEqual([
      "",
      "under",
      "missing",
      "",
      "over",
      "over",
    ]);
  });

  it("let what lies at a limit pass, binary rounding included", () => {
    expect(flags(column(0.1 + 0.2, 0.30000001), { high: 0.3 })).toEqual(["", "over"]);
    expect(flags(column(-0.1 - 0.2, -0.30000001), { low: -0.3 })).toEqual(["", "under"]);
  });

  it("do not call a steady furnace on a coarse logger stuck, unless asked", () => {
    const steady = column(900, 900, 900, 900, 901);
    expect(flags(steady).join("")).toBe("");
    expect(flags(steady, { stuckCount: 4 })).toEqual(["stuck", "stuck", "stuck", "stuck", ""]);
    expect(flags(steady, { stuckCount: 5 }).join("")).toBe("");
  });

  it("end a stuck run at a missing reading", () => {
    expect(flags(column(5, 5, undefined, 5, 5), { stuckCount: 3 })).toEqual(["", "", "missing", "", ""]);
  });

  it("call a jump to another level a step, once", () => {
    expect(flags(column(20, 21, 40, 41, 40), { maxStep: 5 })).toEqual(["", "", "step", "", ""]);
  });

  it("call a jump that comes back a spike when its width is given, two steps otherwise", () => {
    const spike = column(20, 21, 60, 61, 21, 20);
    expect(flags(spike, { maxStep: 5 })).toEqual(["", "", "step", "", "step", ""]);
    expect(flags(spike, { maxStep: 5, spikeWidth: 2 })).toEqual(["", "", "spike", "spike", "", ""]);
    expect(flags(spike, { maxStep: 5, spikeWidth: 1 })).toEqual(["", "", "step", "", "step", ""]);
  });

  it("find spikes one after the other", () => {
    expect(flags(column(20, 60, 20, -30, 20), { low: -100, maxStep: 5, spikeWidth: 1 })).toEqual([
      "",
      "spike",
      "",
      "spike",
      "",
    ]);
  });

  it("take no change across a missing reading or one out of limits", () => {
    expect(flags(column(20, undefined, 60, 5000, 20), { maxStep: 5, spikeWidth: 3 })).toEqual([
      "",
      "missing",
      "",
      "over",
      "",
    ]);
  });

  it("allow a change of the largest step", () => {
    expect(flags(column(0.1, 0.3, 0.5), { maxStep: 0.2 }).join("")).toBe("");
  });

  it("are off without their arguments", () => {
    expect(flags(column(1, 1, 1, 1, 900, 1, 1)).join("")).toBe("");
  });

  it("refuse limits that say nothing", () => {
    expect(refusal(flagger({ low: 5, high: 5 }))).toBe("#N/A low 5 is not below high 5");
    expect(refusal(flagger({ low: 0, high: 1, maxStep: 0 }))).toBe("#VALUE! max step: 0 or an empty cell");
    expect(refusal(flagger({ low: 6, high: 5 }))).toBe("#N/A low 6 is not below high 5");
    expect(refusal(flagger({ low: 0, high: 1, maxStep: -2 }))).toBe("#VALUE! max step -2 is not above 0");
    for (const stuckCount of [1, 0, -3, 2.5]) {
      expect(refusal(flagger({ low: 0, high: 1, stuckCount }))).toBe(
        `#VALUE! stuck count ${stuckCount} is no whole number from 2 up`,
      );
    }
    for (const spikeWidth of [0, -1, 1.5, 1001]) {
      expect(refusal(flagger({ low: 0, high: 1, maxStep: 1, spikeWidth }))).toBe(
        `#VALUE! spike width ${spikeWidth} is no whole number from 1 to 1000`,
      );
    }
    expect(refusal(flagger({ low: 0, high: 1, spikeWidth: 1 }))).toBe(
      "#VALUE! a spike width needs a max step, which says how far a spike jumps",
    );
  });

  it("take the shortest stuck run and the widest spike that there can be", () => {
    expect(flags(column(5, 5, 6), { stuckCount: 2 })).toEqual(["stuck", "stuck", ""]);
    const wide = new Float64Array(1002).fill(900);
    wide[0] = wide[1001] = 20;
    const found = flags(wide, { maxStep: 5, spikeWidth: 1000 });
    expect(found.filter((flag) => flag === "spike")).toHaveLength(1000);
    expect([found[0], found[1001]]).toEqual(["", ""]);
  });

  it("find a stuck run at the end of the record, and one of the level after a step", () => {
    expect(flags(column(4, 5, 5, 5), { stuckCount: 3 })).toEqual(["", "stuck", "stuck", "stuck"]);
    expect(flags(column(4, 90, 90, 90), { stuckCount: 3, maxStep: 10 })).toEqual([
      "",
      "stuck",
      "stuck",
      "stuck",
    ]);
  });

  it("call what is over, under or a spike so, though it be stuck", () => {
    expect(flags(column(2000, 2000, 5), { stuckCount: 2 })).toEqual(["over", "over", ""]);
    expect(flags(column(-5, -5, 5), { stuckCount: 2 })).toEqual(["under", "under", ""]);
    expect(flags(column(20, 60, 60, 21), { stuckCount: 2, maxStep: 5, spikeWidth: 2 })).toEqual([
      "",
      "spike",
      "spike",
      "",
    ]);
  });

  it("see a spike through a reading lost in its middle, which stays missing", () => {
    expect(flags(column(20, 60, undefined, 20, 21), { maxStep: 5, spikeWidth: 2 })).toEqual([
      "",
      "spike",
      "missing",
      "",
      "",
    ]);
    expect(flags(column(20, 60, undefined, 60), { maxStep: 5, spikeWidth: 2 })).toEqual([
      "",
      "step",
      "missing",
      "",
    ]);
  });

  it("take the next change from the reading at which a spike came back, and from a step", () => {
    expect(flags(column(20, 60, 21, 50, 50), { maxStep: 5, spikeWidth: 1 })).toEqual([
      "",
      "spike",
      "",
      "step",
      "",
    ]);
    expect(flags(column(20, 60, 90, 91), { maxStep: 5 })).toEqual(["", "step", "step", ""]);
  });

  it("call a jump in the last scan a step: it has not come back", () => {
    expect(flags(column(20, 21, 60), { maxStep: 5, spikeWidth: 3 })).toEqual(["", "", "step"]);
  });
});
