import { describe, expect, it } from "vitest";
import { Refusal, toIts90 } from "../../../src/core";

const onIts90 = (t68: number): number => {
  const t90 = toIts90(t68);
  if (t90 instanceof Refusal) throw new Error(t90.message());
  return t90;
};

/** The two neighbouring doubles between which the scale begins or ends. */
function edge(refused: number, answered: number): number {
  let [bad, good] = [refused, answered];
  for (let i = 0; i < 100; i++) {
    const middle = (bad + good) / 2;
    if (toIts90(middle) instanceof Refusal) bad = middle;
    else good = middle;
  }
  return good;
}

describe("IPTS-68 to ITS-90", () => {
  it("begins at −200 °C and ends at 4000 °C of ITS-90 themselves", () => {
    expect(onIts90(edge(-201, -200))).toBe(-200);
    expect(onIts90(edge(4010, 4000))).toBe(4000);
  });

  it.each([
    [630, 631.5, 630.6],
    [1063.5, 1065.5, 1064.18],
  ])(
    "goes from one printed piece to the next between %d °C and %d °C at %d °C of ITS-90",
    (from, to, join) => {
      // The pieces are straight here to a millionth of a degree; where they do not meet, the difference steps.
      let largest = { step: 0, at: 0 };
      for (let t68 = from; t68 < to; t68 += 0.005) {
        const second =
          onIts90(t68 + 0.005) - t68 - 0.005 - 2 * (onIts90(t68) - t68) + onIts90(t68 - 0.005) - t68 + 0.005;
        if (Math.abs(second) > largest.step) largest = { step: Math.abs(second), at: onIts90(t68) };
      }
      expect(largest.step).toBeGreaterThan(1e-6);
      expect(largest.step).toBeLessThan(1e-3);
      expect(Math.abs(largest.at - join)).toBeLessThan(0.012);
    },
  );
});
