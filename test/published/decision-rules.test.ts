import { describe, expect, it } from "vitest";
import { type DecisionRule, decisionRule, verdict } from "../../src/core/conformity";
import { eachAgrees } from "./agrees";
import { decisionSets } from "./decision-rules";
import { conformitySets } from "./jcgm-106";

const rule = (name: string): DecisionRule => decisionRule(name) as DecisionRule;

eachAgrees([...decisionSets, ...conformitySets]);

describe("ILAC-G8:09/2019", () => {
  it.each([
    ["simple", 0],
    ["guarded", 1],
    ["guarded 0.83", 0.83],
    ["guarded 1.5", 1.5],
    ["guarded 3", 3],
  ])('table 1: "%s" has a guard band of %d U', (name, multiple) => {
    expect(rule(name).multiple).toBe(multiple);
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
