/** Coverage factors and a published budget. */
import {
  type Budget,
  type BudgetLine,
  budget,
  coverageFactor,
  INFINITE_DOF,
} from "../../src/core/uncertainty";
import { emf, furnace } from "../published/ea-4-02";
import { fractions, tableG2 } from "../published/table-g2";
import { type Group, type Row, row, significant } from "./group";

type Printed = readonly (readonly [line: BudgetLine, u: number, contribution: number])[];

/** The print rounds to two digits, and now and then in between. */
function lines(name: string, printed: Printed, unit: string): Row[] {
  const made = budget(printed.map(([line]) => line)) as Budget;
  return printed.flatMap(([line, u, contribution], i) => [
    significant(`${name}: ${line.name}, u`, u, made.rows[i]?.standardUncertainty, 0.01),
    significant(
      `${name}: ${line.name}, contribution in ${unit}`,
      contribution,
      made.rows[i]?.contribution,
      0.025,
    ),
  ]);
}

export const uncertaintyGroups: readonly Group[] = [
  {
    source: "JCGM 100:2008, table G.2 (to three decimals from an independent library; printed to two)",
    compared: "coverage factor",
    rows: tableG2.flatMap(([dof, ...values]) =>
      values.map((printed, i) => {
        const fraction = fractions[i] as number;
        const k = coverageFactor(Math.min(dof, INFINITE_DOF), fraction / 100);
        return row(`ν = ${Number.isFinite(dof) ? dof : "∞"}, ${fraction} %`, printed, k, 3);
      }),
    ),
  },
  {
    source: "EA-4/02 M:2013, supplement 1, example S5",
    compared: "standard uncertainties within 1 %, contributions within 2.5 % of their rounded print",
    rows: [
      ...lines("furnace", furnace, "°C"),
      ...lines("EMF", emf, "µV"),
      row("furnace: combined, °C", 0.641, (budget(furnace.map(([line]) => line)) as Budget).combined, 3),
      row("EMF: combined, µV", 25, (budget(emf.map(([line]) => line)) as Budget).combined, 1),
    ],
  },
];
