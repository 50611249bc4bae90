import { describe, expect, it } from "vitest";
import { Refusal, toIts90 } from "../../src/core";
import { eachAgrees } from "./agrees";
import { scaleSets } from "./scale-differences";

const onIts90 = (t68: number): number => {
  const t90 = toIts90(t68);
  if (t90 instanceof Refusal) throw new Error(t90.message());
  return t90;
};

eachAgrees(scaleSets);

describe("IPTS-68 to ITS-90", () => {
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
