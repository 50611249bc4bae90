/** What a simulation takes and refuses, its intervals, and when it bears out the first order. */
import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, thermocouple } from "../../../src/core";
import { type Simulation, type SimulationInput, simulateTemperature } from "../../../src/core/uncertainty";
import { ranks, shortestInterval, symmetricInterval } from "../../../src/core/uncertainty/coverage-interval";
import { validation } from "../../../src/core/uncertainty/validation";

const k = thermocouple("K") as Thermocouple;
const input: SimulationInput = {
  couple: k,
  emf: 20,
  reference: 25,
  uEmfUv: 5,
  uReference: 0.2,
  trials: 1000,
};
const message = (more: Partial<SimulationInput>): string => {
  const found = simulateTemperature({ ...input, ...more });
  if (!(found instanceof Refusal)) throw new Error("not refused");
  return found.message();
};
const simulated = (more: Partial<SimulationInput> = {}): Simulation => {
  const found = simulateTemperature({ ...input, ...more });
  if (found instanceof Refusal) throw new Error(found.message());
  return found;
};

describe("a simulation", () => {
  it("takes 1000 to 10 000 000 trials, in whole numbers", () => {
    const words = (trials: number) => `trials ${trials}: a whole number from 1000 to 10000000`;
    for (const trials of [999, 1000.5, 10_000_001]) expect(message({ trials })).toBe(words(trials));
    expect(simulated({ trials: 1000 }).mean).toBeTypeOf("number");
    // Not the trials are refused, but the EMF: nothing has been simulated yet.
    expect(message({ trials: 10_000_000, emf: 60 })).toContain("above the limit of type K");
  });

  it("takes a seed from 0 up, in whole numbers", () => {
    const words = (seed: string) => `seed ${seed}: a whole number from 0 to 9007199254740991`;
    expect(message({ seed: -1 })).toBe(words("-1"));
    expect(message({ seed: 0.5 })).toBe(words("0.5"));
    expect(message({ seed: 2 ** 53 })).toBe(words("9007199254740992"));
    for (const seed of [0, 2 ** 53 - 1]) expect(simulated({ seed }).mean).toBeTypeOf("number");
  });

  it("has a million trials, seed 1 and no other uncertainty unless the caller says otherwise", () => {
    const { trials: _, ...plain } = input;
    // Over the limit in most trials: the count says how many there were.
    const far = { ...plain, emf: k.emfHigh - k.emf(25) - 1e-4, uEmfUv: 1000 };
    const found = simulateTemperature(far) as Refusal;
    expect(found.message()).toMatch(/^\d+ of 1000000 trials are outside the range of type K$/);
    expect(simulated()).toEqual(simulated({ seed: 1, uOther: 0 }));
    expect(simulated()).not.toEqual(simulated({ uOther: 0.01 }));
  });

  it("is remembered for the same question only", () => {
    const asked: Partial<SimulationInput>[] = [
      {},
      { couple: thermocouple("N") as Thermocouple },
      { emf: 21 },
      { reference: 26 },
      { uEmfUv: 6 },
      { uReference: 0.3 },
      { uOther: 0.1 },
      { trials: 1001 },
      { seed: 2 },
      // Written one after the other their numbers are the same.
      { emf: 2, reference: 25 },
      { emf: 22, reference: 5 },
    ];
    const found = asked.map((more) => simulated(more));
    // Each again, with the others in between: the same numbers, worked out anew.
    asked.forEach((more, i) => {
      expect(simulated(more)).toEqual(found[i]);
    });
    expect(new Set(found.map(({ mean }) => mean)).size).toBe(asked.length);
  });

  it("has the uncertainty of each of its inputs alone", () => {
    const trials = 40_000;
    const of = (more: Partial<SimulationInput>) =>
      simulated({ trials, uEmfUv: 0, uReference: 0, ...more }).standard;
    const t = k.temperature(20 + k.emf(25));
    // The standard deviation of 40 000 trials scatters by 0.35 %.
    expect(of({ uEmfUv: 5 }) / (5 / (1000 * k.seebeck(t)))).toBeCloseTo(1, 1.5);
    expect(of({ uReference: 0.2 }) / ((0.2 * k.seebeck(25)) / k.seebeck(t))).toBeCloseTo(1, 1.5);
    expect(of({ uOther: 0.7 }) / 0.7).toBeCloseTo(1, 1.5);
  });

  it("has 95 % of its trials in either interval, the symmetric one about the mean", () => {
    const { low, high, shortestLow, shortestHigh, mean, standard } = simulated({ trials: 40_000 });
    for (const [end, at] of [
      [low, -1.96],
      [high, 1.96],
      [shortestLow, -1.96],
      [shortestHigh, 1.96],
    ] as const) {
      expect(Math.abs((end - mean) / standard - at)).toBeLessThan(0.15);
    }
    expect(shortestHigh - shortestLow).toBeLessThanOrEqual(high - low);
  });

  it("says what became too large", () => {
    // A thousand trials of 6E+306: the root of the sum of their squares is beyond all numbers, their sum in some seeds.
    const seeds = Array.from({ length: 20 }, (_, seed) => message({ uOther: 6e306, seed }));
    expect([...new Set(seeds)].sort()).toEqual([
      "mean is too large for a number",
      "standard deviation is too large for a number",
    ]);
    expect(message({ uEmfUv: -1 })).toBe("uncertainty of the EMF -1 µV is below 0");
    expect(message({ uEmfUv: 0, uReference: 0 })).toBe("every uncertainty is 0");
  });

  it("counts the trials beyond the range, which may be all of them", () => {
    expect(message({ uEmfUv: 1e15 })).toBe("1000 of 1000 trials are outside the range of type K");
    // At the end itself, half of the trials lie beyond it: 500 ± 16.
    const beyond = (emf: number) =>
      Number(
        /^(\d+) of 1000 trials are outside the range of type K$/.exec(message({ emf, uReference: 0 }))?.[1],
      );
    expect(Math.abs(beyond(k.emfHigh - k.emf(25)) - 500)).toBeLessThan(80);
  });
});

describe("coverage intervals (JCGM 101:2008, 7.7)", () => {
  it("take the first of several that are equally narrow", () => {
    const even = Float64Array.from({ length: 1000 }, (_, i) => i);
    expect(shortestInterval(even)).toEqual({ low: 0, high: 950 });
  });

  it("take the narrowest, at whichever end it lies", () => {
    const bent = Float64Array.from({ length: 1000 }, (_, i) => -(((999 - i) / 999) ** 2));
    expect(shortestInterval(bent)).toEqual({ low: bent[49], high: bent[999] });
    const { span } = ranks(1000);
    const narrow = Float64Array.from({ length: 1000 }, (_, i) =>
      i < 20 ? 2 * i : i <= 20 + span ? 40 + (i - 20) / 2 : 600 + 2 * i,
    );
    expect(shortestInterval(narrow)).toEqual({ low: 40, high: 40 + span / 2 });
  });

  it("leave as many trials below as above", () => {
    const { span, first } = ranks(10_000);
    expect([span, first]).toEqual([9500, 249]);
    const even = Float64Array.from({ length: 10_000 }, (_, i) => i);
    expect(symmetricInterval(even)).toEqual({ low: 249, high: 9749 });
  });
});

describe("validation (JCGM 101:2008, 8)", () => {
  /** 10 000 even trials from 0 to 1: their interval is 0.0249 to 0.9749. */
  const even = Float64Array.from({ length: 10_000 }, (_, i) => i / 10_000);
  /** Rank scatter: 4·√(10 000·0.025·0.975) = 62.45, so 63 trials, 0.0063 of the width. */
  const scatter = 0.0063;
  /** With ends at `low` and `high`; u is some tenths, so δ is 0.05. */
  const of = (low: number, high: number) => {
    const u = (high - low) / 2 / 1.96;
    expect(u.toExponential(0)).toMatch(/e-1$/);
    return validation(even, (low + high) / 2, u);
  };
  const [l, h] = [0.0249, 0.9749];

  it("allows δ less the scatter at either end, on either side", () => {
    const near = 0.05 - scatter - 1e-4;
    expect(of(l - near, h)).toBe("yes");
    expect(of(l + near, h)).toBe("yes");
    expect(of(l, h + near)).toBe("yes");
    expect(of(l, h - near)).toBe("yes");
  });

  it("does not tell within the scatter of δ", () => {
    for (const off of [0.05 - scatter + 1e-4, 0.05 + scatter - 1e-4]) {
      for (const [low, high] of [
        [l - off, h],
        [l + off, h],
        [l, h + off],
        [l, h - off],
      ] as const) {
        expect((of(low, high) as Refusal).message()).toBe(
          "10000 trials are too few to tell whether the first-order result holds",
        );
      }
    }
  });

  it("holds at δ itself, and does not tell where only the scatter passes it", () => {
    // u = 1, so δ is 0.5; y = 1.96: the ends of the first order are 0 and 3.92, exactly.
    const ends = (deepest: number, low: number, high: number, highest: number) =>
      validation(
        Float64Array.from({ length: 10_000 }, (_, i) =>
          i < 249 ? deepest : i < 5000 ? low : i < 9750 ? high : highest,
        ),
        1.96,
        1,
      );
    const [atLow, atHigh] = [-0.5, 2 * 1.96 - 0.5];
    expect(ends(atLow, atLow, atHigh, atHigh)).toBe("yes");
    expect(ends(-0.7, atLow, atHigh, atHigh)).toBeInstanceOf(Refusal);
    expect(ends(atLow, atLow, 3.3, atHigh)).toBeInstanceOf(Refusal);
    expect(ends(-0.7, -0.6, atHigh, atHigh)).toBe("no");
    expect(ends(atLow, atLow, 3.3, 3.4)).toBe("no");
  });

  it("says no beyond δ and the scatter, at one end or at both", () => {
    const far = 0.05 + scatter + 1e-4;
    for (const [low, high] of [
      [l - far, h],
      [l + far, h],
      [l, h + far],
      [l, h - far],
      [l - far, h + far],
    ] as const) {
      expect(of(low, high)).toBe("no");
    }
    // One end is surely out, the other within the scatter.
    expect(of(l - far, h + 0.05)).toBe("no");
  });
});
