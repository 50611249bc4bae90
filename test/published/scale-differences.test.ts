import { describe, expect, it } from "vitest";
import { Refusal, toIts90 } from "../../src/core";
import { printedDifferences, printedRadiationDifferences } from "./scale-differences";

const onIts90 = (t68: number): number => {
  const t90 = toIts90(t68);
  if (t90 instanceof Refusal) throw new Error(t90.message());
  return t90;
};

describe("IPTS-68 to ITS-90", () => {
  it.each(printedDifferences)("at %d °C the scales differ by the printed %d °C", (t90, difference) => {
    // 1.5 mK (below 0 °C) and 1 mK are the stated fit, 0.5 mK the rounding of the table.
    const tolerance = (t90 < 0 ? 0.0015 : 0.001) + 0.0005;
    expect(Math.abs(onIts90(t90 - difference) - t90)).toBeLessThanOrEqual(tolerance);
  });

  it.each(printedRadiationDifferences)("at %d °C they differ by the printed %d °C", (t90, difference) => {
    expect(Math.abs(onIts90(t90 - difference) - t90)).toBeLessThanOrEqual(0.005 + 0.001);
  });

  it("puts the gold point of IPTS-68, 1064.43 °C, at 1064.18 °C (definitions of the two scales)", () => {
    expect(onIts90(1064.43)).toBeCloseTo(1064.18, 3);
  });

  it("leaves 0 °C where it was", () => {
    expect(onIts90(0)).toBe(0);
  });

  it.each([-260, 4100, Number.NaN])("refuses %d °C", (t68) => {
    expect(toIts90(t68)).toBeInstanceOf(Refusal);
  });

  it("rises throughout, across both joins", () => {
    let before = onIts90(-199);
    for (let t68 = -198.9; t68 < 3000; t68 += 0.1) {
      const t90 = onIts90(t68);
      expect(t90).toBeGreaterThanOrEqual(before);
      before = t90;
    }
  });
});
