import { describe, expect, it } from "vitest";
import {
  acceptanceLimit,
  conformityProbability,
  type DecisionRule,
  decisionRule,
  largestPassRisk,
  verdict,
} from "../../src/core/conformity";
import { jcgmTable1, recomputedRisks } from "./decision-rules";

const rule = (name: string): DecisionRule => decisionRule(name) as DecisionRule;

describe("ILAC-G8:09/2019", () => {
  it.each([
    ["simple", 50, 0],
    ["guarded", 2.5, 1],
    ["guarded 0.83", 5, 0.83],
    ["guarded 1.5", 0.16, 1.5],
    ["guarded 3", 0.0001, 3],
  ])('table 1: "%s" has a specific risk of at most %d %%', (name, percent, multiple) => {
    expect(rule(name).multiple).toBe(multiple);
    // The tolerance is wide against U, as the table assumes. At r = 1 the table rounds up from k = 2.
    const risk = largestPassRisk(1000, 1, rule(name), 2) as number;
    expect(risk * 100).toBeLessThanOrEqual(percent + 1e-9);
  });

  it.each(recomputedRisks)('"%s" with k = %d risks %d at the acceptance limit', (name, k, risk) => {
    const found = largestPassRisk(1000, 1, rule(name), k, "none") as number;
    expect(Math.abs(found / risk - 1)).toBeLessThan(1e-10);
  });

  it.each([
    ["guarded", 0.8],
    ["guarded 1.5", 0.7],
    ["guarded 0.83", 0.834],
    ["guarded 3", 0.4],
  ])('a tolerance of ±1 with U = 0.2 and "%s" accepts ±%d', (name, accepted) => {
    expect(acceptanceLimit(1, 0.2, rule(name))).toBeCloseTo(accepted, 12);
  });

  it("a guard band of 20 % of ±0.5 Ω is 0.1 Ω and accepts ±0.4 Ω", () => {
    expect(acceptanceLimit(0.5, 0.1)).toBeCloseTo(0.4, 12);
  });

  it.each([
    [0.8, "Pass"],
    [0.81, "Conditional pass"],
    [1, "Conditional pass"],
    [1.01, "Conditional fail"],
    [1.2, "Conditional fail"],
    [1.21, "Fail"],
  ])("4.2.3: an error of %d against ±1 with U = 0.2 is a %s", (error, word) => {
    expect(verdict(error, 1, 0.2, rule("conditional"))).toBe(word);
    expect(verdict(-error, 1, 0.2, rule("conditional"))).toBe(word);
  });
});

describe("JCGM 106:2012 (from memory, recomputed)", () => {
  it("7.3: a breakdown voltage of −5.47 V, u 0.05 V, conforms to −5.40 V at most with 92 %", () => {
    const p = conformityProbability(-5.47, -5.4, 0.05, "none") as number;
    expect(p).toBeCloseTo(0.92, 2);
    expect(Math.abs(p / 0.9192433407662289 - 1)).toBeLessThan(1e-10);
  });

  it("7.3: a burst pressure of 509.7 kPa, u 8.6 kPa, conforms to 490 kPa at least with 99 %", () => {
    // A lower limit alone is an upper one of the opposite sign.
    const p = conformityProbability(-509.7, -490, 8.6, "none") as number;
    expect(p).toBeCloseTo(0.99, 2);
    expect(Math.abs(p / 0.9890095473848222 - 1)).toBeLessThan(1e-10);
  });

  it("7.4: a viscosity of 13.6, u 1.8, conforms to 12.5 to 16.3 with 66 %", () => {
    const p = conformityProbability(13.6, 16.3, 1.8, 12.5) as number;
    expect(p).toBeCloseTo(0.66, 2);
    expect(Math.abs(p / 0.6626297864953077 - 1)).toBeLessThan(1e-10);
  });

  it.each(jcgmTable1)("table 1: %d standard uncertainties inside a single limit is %d", (z, p) => {
    expect(Math.abs((conformityProbability(-z, 0, 1, "none") as number) - p)).toBeLessThan(0.0014);
  });
});
