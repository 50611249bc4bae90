import { describe, expect, it } from "vitest";
import { envelope, systemCheck } from "../../../src/core/survey";
import { column, given, refusal } from "../log/record";

describe("the envelope", () => {
  it("spans the corrected readings of each scan, without the missing ones", () => {
    const found = given(
      envelope(
        [column(900, 901, undefined), column(905, undefined, undefined), column(895, 890, undefined)],
        [1, 0, -1],
      ),
    );
    expect(found.lowest).toEqual(column(894, 889, undefined));
    expect(found.highest).toEqual(column(905, 902, undefined));
    expect(found.mean).toEqual(column(900, 895.5, undefined));
    expect(found.spread).toEqual(column(11, 13, undefined));
  });

  it("spans the readings as they are where there are no corrections", () => {
    const found = given(envelope([column(900, undefined), column(905, 7)]));
    expect(found).toEqual({
      lowest: column(900, 7),
      highest: column(905, 7),
      mean: column(902.5, 7),
      spread: column(5, 0),
    });
  });

  it("refuses columns and corrections that do not match", () => {
    expect(refusal(envelope([]))).toBe("#N/A there is no sensor");
    expect(refusal(envelope([column(1, 2), column(1)]))).toBe(
      "#VALUE! sensor 2 has 1 readings, sensor 1 has 2",
    );
    expect(refusal(envelope([column(1)], [1, 2]))).toBe("#VALUE! 2 corrections for 1 sensors");
  });
});

describe("the system check", () => {
  it("takes the test reading with both its corrections from what the furnace shows", () => {
    expect(systemCheck(871.5, 869, 0.7, 0.3)).toBeCloseTo(1.5, 12);
  });

  it("refuses what is beyond all numbers", () => {
    expect(refusal(systemCheck(1e308, -1e308, 0, 0))).toBe("#N/A the difference is too large for a number");
  });
});
