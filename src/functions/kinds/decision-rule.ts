import { type DecisionRule, decisionRule } from "../../core";
import type { Kind } from "./kind";

/** A decision rule of ILAC-G8, with another multiple of U after it where wanted. */
export const rule: Kind<DecisionRule> = {
  name: "option",
  options: ["simple", "guarded", "conditional", "guarded 0.83"],
  read: (cell) => decisionRule(String(cell)),
};
