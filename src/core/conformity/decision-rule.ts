/**
 * Decision rules of ILAC-G8:09/2019: how much of a tolerance an error may use before it
 * passes. The guard band w is a multiple of the expanded uncertainty U.
 */
import { type Refusal, wrongKind } from "../errors";

export interface DecisionRule {
  /** `simple` 4.2.1, `guarded` 4.2.2 (both binary), `conditional` 4.2.3 (non-binary). */
  readonly kind: "simple" | "guarded" | "conditional";
  /** Guard band in multiples of U; 0 for the simple rule. */
  readonly multiple: number;
}

export const simpleAcceptance: DecisionRule = { kind: "simple", multiple: 0 };
export const guardedAcceptance: DecisionRule = { kind: "guarded", multiple: 1 };
const conditionalAcceptance: DecisionRule = { kind: "conditional", multiple: 1 };

const byName: ReadonlyMap<string, DecisionRule> = new Map(
  [simpleAcceptance, guardedAcceptance, conditionalAcceptance].map((rule) => [rule.kind, rule]),
);

/** `guarded 0.83`: ISO 14253-1:2017, a one-sided 5 % risk with k = 2. */
const WITH_MULTIPLE = /^(?<kind>guarded|conditional) (?<digits>\d+(?:\.\d+)?)$/;

/**
 * A rule from its name: "simple", "guarded", "conditional", or one of the last two with
 * another multiple of U after it ("guarded 0.83"). Upper or lower case and extra spaces
 * make no difference. Refused: anything else (wrong kind).
 */
export function decisionRule(text: string): DecisionRule | Refusal {
  const name = text.trim().toLowerCase().replace(/\s+/g, " ");
  const plain = byName.get(name);
  if (plain !== undefined) return plain;
  const { kind, digits } = WITH_MULTIPLE.exec(name)?.groups ?? {};
  const multiple = Number(digits);
  if (!Number.isFinite(multiple)) {
    return wrongKind`rule "${text.trim().slice(0, 30)}" is unknown: simple, guarded, conditional, or such as guarded 0.83`;
  }
  if (multiple === 0) return wrongKind`a guard band of 0 × U is the rule "simple"`;
  return { kind: kind as "guarded" | "conditional", multiple };
}
