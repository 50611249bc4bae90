/** Arguments that several functions of this family share. */
import { type DecisionRule, guardedAcceptance } from "../../core";
import { each, ifGiven, once, orElse } from "../arguments";
import { rule as ruleKind } from "../kinds/decision-rule";
import { lowerLimit } from "../kinds/lower-limit";

/** Where an uncertainty is always given. */
export const guardedUnlessSaid = orElse(once(ruleKind), guardedAcceptance as DecisionRule, "guarded");

/** Where an uncertainty may be left out: the rule then depends on it. */
export const ruleIfSaid = ifGiven(once(ruleKind));

/** −upper when left out. */
export const lower = ifGiven(each(lowerLimit));
