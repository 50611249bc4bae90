import { type Budget, budget as budgetOf, INFINITE_DOF, Refusal } from "../../core";
import { ifGiven, once } from "../arguments";
import { choice } from "../kinds/kind";
import { numberResult, shareResult, wordResult } from "../results";
import { type Entry, whole } from "../whole";
import { budgetLines, lines as linesOption, type TypedLine } from "./lines";
import { probability as probabilityOption } from "./options";

/**
 * An uncertainty budget from its lines: standard uncertainties, contributions and shares, then combined uncertainty,
 * effective degrees of freedom, coverage factor and expanded uncertainty.
 * @customfunction BUDGET
 * @category Weigh
 * @param lines Rows of name, value (±, without sign), distribution, divisor, sensitivity, degrees of freedom; the last three columns may be blank or left out. No header row.
 * @param [probability] Coverage probability between 0 and 1; 0.9545 when left out, which makes k = 2 for infinite degrees of freedom.
 * @param [metric] One part: combined, dof, k, expanded, contributions or shares (columns that stand beside the lines).
 * @returns A header, a row per line, and five rows that sum up, or the part asked for.
 * @equation u(xi) = value / divisor; ui(y) = |ci|·u(xi); u = √Σui(y)²; share = ui(y)²/u²
 * @equation ν = u⁴/Σ(ui(y)⁴/νi); U = k·u, k from Student's t at ν
 * @definition distribution: normal (an expanded uncertainty, divisor k), rectangular, triangular, u-shaped, trapezoidal (divisor: top / bottom), resolution (full step), standard.
 * @definition Blank: the distribution's own divisor, sensitivity 1, infinite degrees of freedom. Wholly blank rows are passed over. A 0 there is refused, it may be an empty cell: IF(ISBLANK(A2:F9),"",A2:F9).
 * @definition ∞ in the table is 1E+99 by the metric dof.
 * @assumes Quantities that are independent of each other; COMBINEDU takes correlations.
 * @standard JCGM 100:2008, 5.1 and G.4; EA-4/02 M:2013
 * @keywords uncertainty budget, expanded uncertainty, GUM, contributions, CMC, certificate
 * @related COMBINEDU, STANDARDU, TYPEA, COVERAGE, REPORTVALUE
 * @example =BEAD.BUDGET({"certificate",0.6,"normal";"repeatability",0.4,"standard"},,"expanded") → 1.0
 * @example =BEAD.BUDGET({"certificate",0.6,"normal";"repeatability",0.4,"standard"},,"shares") → {0.36;0.64}
 */
export function BUDGET(lines: unknown[][], probability?: unknown[][], metric?: unknown[][]): unknown[][] {
  return budget({ lines, probability, metric });
}

const columns = {
  quantity: wordResult,
  value: numberResult,
  distribution: wordResult,
  divisor: numberResult,
  "standard uncertainty": numberResult,
  sensitivity: numberResult,
  contribution: numberResult,
  "degrees of freedom": numberResult,
  share: shareResult,
};

const printedDof = (dof: number): Entry => (dof === INFINITE_DOF ? "∞" : dof);

/** As in EA-4/02: the lines from left to right as they are worked out, the sums under the contributions. */
function everything({ rows, combined, dof, probability, k, expanded }: Budget): Entry[][] {
  const sum = (label: string, value: Entry): Entry[] => [label, "", "", "", "", "", value, "", ""];
  return [
    Object.keys(columns),
    ...rows.map((row): Entry[] => [
      row.name,
      row.value,
      row.distribution,
      row.divisor,
      row.standardUncertainty,
      row.sensitivity,
      row.contribution,
      printedDof(row.dof),
      row.share,
    ]),
    sum("combined standard uncertainty", combined),
    sum("effective degrees of freedom", printedDof(dof)),
    sum("coverage probability", probability),
    sum("coverage factor k", k),
    sum("expanded uncertainty U", expanded),
  ];
}

/** A column beside the lines as they were typed, blank where they are. */
function beside(typed: readonly (TypedLine | undefined)[], values: readonly number[]): Entry[][] {
  let next = 0;
  return typed.map((line) => [line === undefined ? "" : (values[next++] as number)]);
}

const budget = whole(BUDGET, {
  arguments: {
    lines: linesOption,
    probability: probabilityOption,
    metric: ifGiven(once(choice(["combined", "dof", "k", "expanded", "contributions", "shares"]))),
  },
  result: columns,
  cells({ lines, probability, metric }) {
    const found = budgetOf(budgetLines(lines), probability);
    if (found instanceof Refusal) return found;
    if (metric === undefined) return everything(found);
    if (metric === "contributions")
      return beside(
        lines,
        found.rows.map(({ contribution }) => contribution),
      );
    if (metric === "shares")
      return beside(
        lines,
        found.rows.map(({ share }) => share),
      );
    return [[found[metric]]];
  },
});
