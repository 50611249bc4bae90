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
    expect(refusal(flagger({ low: 0, high: 1, stuckCount: 1 }))).toMatch(/whole number from 2 up/);
    expect(refusal(flagger({ low: 0, high: 1, maxStep: 1, spikeWidth: 1.5 }))).toMatch(/whole number/);
    expect(refusal(flagger({ low: 0, high: 1, spikeWidth: 1 }))).toMatch(/needs a max step/);
  });
});
