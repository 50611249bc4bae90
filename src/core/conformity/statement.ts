/** The sentences of a certificate that state a verdict, its rule and its risk (ISO/IEC 17025:2017, 7.8.6). */
import { degreesApart, Refusal } from "../errors";
import { finite } from "../numeric/finite";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { refusedUnlessPositive } from "../numeric/positive";
import { celsius, type TemperatureUnit } from "../units";
import { acceptanceLimit } from "./acceptance";
import { largestPassRisk } from "./conformity-probability";
import { type DecisionRule, guardedAcceptance } from "./decision-rule";
import { type Verdict, verdict } from "./verdict";

export interface Statement {
  readonly verdict: Verdict;
  readonly rule: DecisionRule;
  /** °C */
  readonly guardBand: number;
  /** ± °C; undefined where the guard band is wider than the limit and nothing can pass. */
  readonly acceptance: number | undefined;
  /** Largest specific risk of a wrong Pass, 0 to 1 (JCGM 106:2012); undefined where nothing can pass. */
  readonly risk: number | undefined;
  readonly k: number;
  sentence(unit?: TemperatureUnit): string;
}

const clauses: Readonly<Record<DecisionRule["kind"], string>> = {
  simple: "simple acceptance (ILAC-G8:09/2019, 4.2.1)",
  guarded: "acceptance with a guard band (ILAC-G8:09/2019, 4.2.2)",
  conditional: "non-binary with a guard band (ILAC-G8:09/2019, 4.2.3)",
};

/**
 * States the verdict on an error against ±`limit`, with the expanded uncertainty U at coverage
 * factor `k`; all in °C. Refused: a limit, U or k that is not above 0.
 */
export function statement(
  error: number,
  limit: number,
  expandedUncertainty: number,
  rule: DecisionRule = guardedAcceptance,
  k = 2,
): Statement | Refusal {
  const refused =
    refusedUnlessPositive(limit, "limit", degreesApart) ??
    refusedUnlessPositive(expandedUncertainty, "expanded uncertainty", degreesApart) ??
    refusedUnlessPositive(k, "coverage factor");
  if (refused !== undefined) return refused;
  // Neither a verdict nor, where something can pass, its risk has anything left to refuse.
  const reached = verdict(error, limit, expandedUncertainty, rule) as Verdict;
  const guardBand = finite(rule.multiple * expandedUncertainty, "guard band");
  if (guardBand instanceof Refusal) return guardBand;
  const acceptance = acceptanceLimit(limit, expandedUncertainty, rule);
  const left = acceptance instanceof Refusal ? undefined : acceptance;
  const risk =
    left === undefined ? undefined : (largestPassRisk(limit, expandedUncertainty, rule, k) as number);
  return {
    verdict: reached,
    rule,
    guardBand,
    acceptance: left,
    risk,
    k,
    sentence(unit = celsius) {
      const print = (value: number): string => degreesApart(value).print(unit);
      const band =
        rule.kind === "simple"
          ? `no guard band, U = ${print(expandedUncertainty)}, k = ${degreeless(k)}`
          : `guard band ${print(guardBand)} = ${rule.multiple === 1 ? "" : `${degreeless(rule.multiple)} × `}U, k = ${degreeless(k)}`;
      return [
        `${reached}: ${finding(reached, error, limit, guardBand, left, print)}.`,
        `Decision rule: ${clauses[rule.kind]}, ${band}.`,
        risk === undefined
          ? "No error could pass."
          : `Largest specific risk of a wrong Pass by this rule: ${percentAtMost(risk)}.`,
      ].join(" ");
    },
  };
}

const degreeless = (value: number): string => String(Number(value.toPrecision(6)));

/** Why the verdict is what it is. */
function finding(
  reached: Verdict,
  error: number,
  limit: number,
  guardBand: number,
  acceptance: number | undefined,
  print: (value: number) => string,
): string {
  const theError = `the error of ${print(error)}`;
  const theLimit = `the limit of ±${print(limit)}`;
  const notAccepted =
    acceptance === undefined
      ? `the guard band of ${print(guardBand)} exceeds it`
      : `not within the acceptance limit of ±${print(acceptance)}`;
  if (reached === "Pass") {
    // Whatever passes has an acceptance limit.
    return guardBand === 0
      ? `${theError} lies within ${theLimit}`
      : `${theError} lies within the acceptance limit of ±${print(acceptance as number)}, ${theLimit} less the guard band`;
  }
  if (reached === "Conditional fail")
    return `${theError} exceeds ${theLimit}, by no more than the guard band`;
  const withinLimit = toNinthDecimal(Math.abs(error)) <= toNinthDecimal(limit);
  return withinLimit
    ? `${theError} lies within ${theLimit}, but ${notAccepted}`
    : `${theError} exceeds ${theLimit}`;
}

/** A probability rounded up to two digits, so that "at most" stays true; 1E-6 of it is rounding. */
function percentAtMost(probability: number): string {
  if (probability < 1e-6) return "below 0.0001 %";
  const percent = probability * 100;
  const step = 10 ** (Math.floor(Math.log10(percent)) - 1);
  return `at most ${degreeless(Math.ceil((percent / step) * (1 - 1e-6)) * step)} %`;
}
