/** An uncertainty budget: from rows as they are typed to the expanded uncertainty. */
import { noAnswer, Refusal } from "../errors";
import { finite } from "../numeric/finite";
import { refusedUnlessPositive } from "../numeric/positive";
import { rootSumSquare } from "../numeric/root-sum-square";
import { inRow, refusedSensitivity } from "./contributions";
import { coverageFactor, TWO_SIGMA } from "./coverage";
import { type Distribution, distribution, divisorOf, standardUncertainty } from "./distribution";
import { INFINITE_DOF, welchSatterthwaite } from "./effective-dof";

export interface BudgetLine {
  readonly name: string;
  /** Half-width, expanded uncertainty, full step or standard uncertainty, in the quantity's unit. */
  readonly value: number;
  /** A word of `distributions`. */
  readonly distribution: string;
  /** The distribution's own when undefined. */
  readonly divisor?: number | undefined;
  /** 1 when undefined. */
  readonly sensitivity?: number | undefined;
  /** Infinite when undefined. */
  readonly dof?: number | undefined;
  /** The row that a refusal names, from 1; the place among the lines when undefined. */
  readonly row?: number;
}

export interface BudgetRow {
  readonly name: string;
  readonly value: number;
  readonly distribution: Distribution;
  readonly divisor: number;
  readonly standardUncertainty: number;
  readonly sensitivity: number;
  /** `INFINITE_DOF` where none were given. */
  readonly dof: number;
  /** uᵢ(y) = |cᵢ|·u(xᵢ) */
  readonly contribution: number;
  /** Share of the combined variance, 0 to 1. */
  readonly share: number;
}

export interface Budget {
  readonly rows: readonly BudgetRow[];
  readonly combined: number;
  /** Effective degrees of freedom, `INFINITE_DOF` where infinite. */
  readonly dof: number;
  readonly probability: number;
  readonly k: number;
  readonly expanded: number;
}

type UnsharedRow = Omit<BudgetRow, "share">;

/**
 * The budget of independent quantities (JCGM 100:2008, 5.1, G.4; EA-4/02). Refused, naming the
 * row: an unknown distribution (wrong kind), a value below 0, a divisor, sensitivity or degrees
 * of freedom of 0; without a row: no lines, contributions that are all 0, effective degrees of
 * freedom below 1, a probability that is not between 0 and 1.
 */
export function budget(lines: readonly BudgetLine[], probability = TWO_SIGMA): Budget | Refusal {
  if (lines.length === 0) return noAnswer`the budget has no lines`;
  const evaluated: UnsharedRow[] = [];
  for (const [i, line] of lines.entries()) {
    const row = evaluate(line);
    if (row instanceof Refusal) return inRow((line.row ?? i + 1) - 1, row, line.name);
    evaluated.push(row);
  }
  const contributions = evaluated.map(({ contribution }) => contribution);
  const combined = finite(rootSumSquare(contributions), "combined uncertainty");
  if (combined instanceof Refusal) return combined;
  if (combined === 0) return noAnswer`every contribution is 0`;
  const dof = welchSatterthwaite(
    contributions,
    evaluated.map((row) => row.dof),
  );
  const k = coverageFactor(dof, probability);
  if (k instanceof Refusal) return k;
  const expanded = finite(k * combined, "expanded uncertainty");
  if (expanded instanceof Refusal) return expanded;
  const rows = evaluated.map((row) => ({ ...row, share: (row.contribution / combined) ** 2 }));
  return { rows, combined, dof, probability, k, expanded };
}

function evaluate(line: BudgetLine): UnsharedRow | Refusal {
  const { name, value, sensitivity = 1, dof = INFINITE_DOF } = line;
  const kind = distribution(line.distribution);
  if (kind instanceof Refusal) return kind;
  const divisor = divisorOf(kind, line.divisor);
  if (divisor instanceof Refusal) return divisor;
  const u = standardUncertainty(value, kind, line.divisor);
  if (u instanceof Refusal) return u;
  const refused = refusedSensitivity(sensitivity) ?? refusedUnlessPositive(dof, "degrees of freedom");
  if (refused !== undefined) return refused;
  const contribution = finite(Math.abs(sensitivity) * u, "contribution");
  if (contribution instanceof Refusal) return contribution;
  return { name, value, distribution: kind, divisor, standardUncertainty: u, sensitivity, dof, contribution };
}
