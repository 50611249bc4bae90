import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import {
  acceptanceLimit,
  conformityProbability,
  type DecisionRule,
  decisionRule,
  enScore,
  largestPassRisk,
  verdict,
} from "../../../src/core/conformity";

const rule = (name: string): DecisionRule => decisionRule(name) as DecisionRule;
const message = (found: unknown): string => (found as Refusal).message();

describe("decisionRule", () => {
  it.each([
    ["simple", "simple", 0],
    [" Guarded ", "guarded", 1],
    ["CONDITIONAL", "conditional", 1],
    ["guarded 0.83", "guarded", 0.83],
    ["Guarded  1.5", "guarded", 1.5],
    ["conditional 2", "conditional", 2],
  ])('reads "%s"', (text, kind, multiple) => {
    expect(decisionRule(text)).toEqual({ kind, multiple });
  });

  it.each([
    "",
    "strict",
    "guarded 0,83",
    "guarded -1",
    "simple 1",
    "guarded 1e5",
    "guarded 0.83 U",
    `guarded ${"9".repeat(400)}`,
    `  ${"x".repeat(40)} `,
  ])('refuses "%s"', (text) => {
    const refused = decisionRule(text) as Refusal;
    expect(refused.kind).toBe("wrong kind");
    expect(refused.message()).toBe(
      `rule "${text.trim().slice(0, 30)}" is unknown: simple, guarded, conditional, or such as guarded 0.83`,
    );
  });

  it("refuses a guard band of nothing, which has a name of its own", () => {
    expect((decisionRule("guarded 0") as Refusal).kind).toBe("wrong kind");
    expect(message(decisionRule("conditional 0.0"))).toBe('a guard band of 0 × U is the rule "simple"');
  });
});

describe("verdict", () => {
  it("passes at the limit, whatever binary subtraction adds", () => {
    expect(verdict(902.2 - 900, 2.2)).toBe("Pass");
    expect(verdict(900 - 902.2, 2.2)).toBe("Pass");
    expect(verdict(902.2000001 - 900, 2.2)).toBe("Fail");
    expect(verdict(0.3, 0.5, 0.2)).toBe("Pass");
    expect(verdict(0.1 + 0.2, 0.5, 0.2)).toBe("Pass");
  });

  it("is simple without U and guarded with it", () => {
    expect(verdict(2, 2.2)).toBe("Pass");
    expect(verdict(2, 2.2, 0.5)).toBe("Fail");
    expect(verdict(2, 2.2, 0.5, rule("simple"))).toBe("Pass");
    expect(verdict(1.7, 2.2, 0.5)).toBe("Pass");
  });

  it("takes a lower limit of its own", () => {
    expect(verdict(-0.5, 2, undefined, undefined, -1)).toBe("Pass");
    expect(verdict(-1.5, 2, undefined, undefined, -1)).toBe("Fail");
    expect(verdict(5, 10, 1, rule("conditional"), 5)).toBe("Conditional pass");
    expect(verdict(4.5, 10, 1, rule("conditional"), 5)).toBe("Conditional fail");
    expect(verdict(3.5, 10, 1, rule("conditional"), 5)).toBe("Fail");
  });

  it("is one-sided with a lower limit of none", () => {
    expect(verdict(-1e9, 2, undefined, undefined, "none")).toBe("Pass");
    expect(verdict(-1e9, -2, 1, undefined, "none")).toBe("Pass");
    expect(verdict(-2.5, -2, 1, rule("conditional"), "none")).toBe("Conditional pass");
    expect(verdict(0, 0, undefined, undefined, "none")).toBe("Pass");
  });

  it("lets nothing pass where the guard band leaves nothing", () => {
    expect(verdict(0, 1, 1.5)).toBe("Fail");
    expect(verdict(0, 1, 1.5, rule("conditional"))).toBe("Conditional pass");
    expect(verdict(0, 1, 1)).toBe("Pass");
  });

  it("refuses what cannot be judged", () => {
    expect(message(verdict(1, 0))).toContain("limit is 0 or an empty cell");
    expect(message(verdict(1, -2))).toBe('limit -2 is below 0: give the lower limit as well, or "none"');
    expect(message(verdict(1, 2, 0))).toBe("expanded uncertainty is 0 or an empty cell");
    expect(message(verdict(1, 2, -0.1))).toBe("expanded uncertainty -0.1 is below 0");
    expect(message(verdict(1, 2, undefined, rule("guarded")))).toBe(
      "rule guarded needs the expanded uncertainty",
    );
    expect(message(verdict(1, 2, undefined, undefined, 3))).toBe("lower limit 3 is above the upper limit 2");
  });
});

describe("acceptanceLimit", () => {
  it.each([
    ["simple", 2.2],
    ["guarded", 1.7],
    ["conditional", 1.7],
    ["guarded 2", 1.2],
  ])('leaves of ±2.2 with U = 0.5 and "%s" ±%d', (name, left) => {
    expect(acceptanceLimit(2.2, 0.5, rule(name))).toBeCloseTo(left, 12);
  });

  it("may leave nothing but zero", () => {
    expect(acceptanceLimit(0.3, 0.1 + 0.2)).toBe(0);
  });

  it("leaves zero, a verdict and a risk where U exceeds the limit by less than the ninth decimal", () => {
    const u = 1 + 4e-10;
    expect(verdict(0, 1, u)).toBe("Pass");
    expect(acceptanceLimit(1, u)).toBe(0);
    expect(largestPassRisk(1, u, rule("guarded"), 2)).toBeCloseTo(2 * 0.02275013194817921, 9);
    expect(verdict(0, 1, 1 + 6e-10)).toBe("Fail");
    expect(acceptanceLimit(1, 1 + 6e-10)).toBeInstanceOf(Refusal);
    expect(largestPassRisk(1, 1 + 6e-10, rule("guarded"), 2)).toBeInstanceOf(Refusal);
  });

  it("refuses when nothing is left", () => {
    expect(message(acceptanceLimit(2.2, 3))).toBe("U exceeds the limit: 3 is more than 2.2");
    expect(message(acceptanceLimit(2.2, 2, rule("guarded 1.5")))).toBe(
      "guard band 1.5 × 2 exceeds the limit 2.2",
    );
    expect(message(acceptanceLimit(0, 2))).toBe("limit is 0 or an empty cell");
    expect(message(acceptanceLimit(2, 0))).toBe("expanded uncertainty is 0 or an empty cell");
    expect(message(acceptanceLimit(-2, 1))).toBe("limit -2 is below 0");
  });
});

describe("conformityProbability", () => {
  it("is one half at a single limit", () => {
    expect(conformityProbability(2, 2, 0.1, "none")).toBe(0.5);
  });

  it("keeps its digits far outside", () => {
    // Φ(−8) − Φ(−12), the second too small to count.
    expect((conformityProbability(10, 2, 1) as number) / 6.22096057427178e-16).toBeCloseTo(1, 9);
  });

  it("refuses an uncertainty of 0", () => {
    expect(message(conformityProbability(1, 2, 0))).toBe("standard uncertainty is 0 or an empty cell");
  });
});

describe("largestPassRisk", () => {
  it("counts both sides where the tolerance is narrow", () => {
    // ±1 with U = 1, k = 2: only 0 passes, and lies 2 u from either limit.
    expect(largestPassRisk(1, 1, rule("guarded"), 2)).toBeCloseTo(2 * 0.02275013194817921, 15);
  });

  it("converts U with its own k", () => {
    expect(largestPassRisk(100, 3, rule("guarded"), 3)).toBeCloseTo(0.00135, 5);
  });

  it("refuses where nothing can pass", () => {
    expect(message(largestPassRisk(1, 1.5, rule("guarded"), 2))).toBe(
      "the guard band leaves nothing to pass",
    );
    // 0.5 to 2 with a band of 0.75 on either side: 1.25 alone passes, and with 0.76 nothing.
    expect(largestPassRisk(2, 0.75, rule("guarded"), 2, 0.5)).toBeCloseTo(2 * 0.02275013194817921, 12);
    expect(largestPassRisk(2, 0.76, rule("guarded"), 2, 0.5)).toBeInstanceOf(Refusal);
  });

  it("refuses an uncertainty or a coverage factor that is not above 0, and a band that is no number", () => {
    expect(message(largestPassRisk(1, 0, rule("guarded"), 2))).toBe(
      "expanded uncertainty is 0 or an empty cell",
    );
    expect(message(largestPassRisk(1, 1, rule("guarded"), -2))).toBe("coverage factor -2 is below 0");
    expect(message(largestPassRisk(1, 1e308, rule("guarded 3"), 2))).toBe(
      "guard band is too large for a number",
    );
    expect(message(largestPassRisk(1, 1, rule("guarded"), 2, 3))).toBe(
      "lower limit 3 is above the upper limit 1",
    );
  });
});

describe("enScore", () => {
  it("divides by both uncertainties", () => {
    expect(enScore(1000.9, 0.3, 1000.4, 0.4)).toBeCloseTo(1, 9);
    expect(enScore(1000.4, 0.3, 1000.9, 0.4)).toBeCloseTo(-1, 9);
  });

  it("refuses an uncertainty of 0, naming which", () => {
    expect(message(enScore(1, 0, 1, 1))).toBe("expanded uncertainty is 0 or an empty cell");
    expect(message(enScore(1, 1, 1, 0))).toBe("reference uncertainty is 0 or an empty cell");
    expect(message(enScore(1e308, 1, -1e308, 1))).toBe("En number is too large for a number");
  });
});
