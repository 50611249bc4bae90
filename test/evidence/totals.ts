/** The head of the page: how many values agree, source by source, and what the README may say of them. */
import type { Evidence } from "./collect";
import { short } from "./group";
import { PROMISED_DEGREES, PROMISED_MILLIVOLTS } from "./residuals";

export interface Total {
  readonly source: string;
  readonly compared: string;
  readonly values: number;
  readonly agreeing: number;
}

export const totals = ({ groups }: Evidence): Total[] =>
  groups.map(({ source, compared, rows }) => ({
    source,
    compared,
    values: rows.length,
    agreeing: rows.filter(({ holds }) => holds).length,
  }));

const sum = (numbers: readonly number[]): number => numbers.reduce((all, one) => all + one, 0);

/** One sentence for each kind of evidence. */
export function findings(evidence: Evidence): string[] {
  const each = totals(evidence);
  const emf = each.filter(({ compared }) => compared.startsWith("EMF in mV over temperature"));
  const { residuals, certified } = evidence;
  const kept = residuals.filter(({ holds }) => holds).length;
  const byDegrees = residuals.filter(({ worstDegrees }) => worstDegrees <= PROMISED_DEGREES).length;
  const least = Math.min(...certified.map(({ digits }) => digits));
  return [
    `${sum(each.map(({ agreeing }) => agreeing))} of ${sum(each.map(({ values }) => values))} values from print, or recomputed independently where their source says so, agree within their printed rounding or stated band, ${sum(emf.map(({ agreeing }) => agreeing))} of ${sum(emf.map(({ values }) => values))} rows of EMF tables among them.`,
    `Over its whole range the inverse of ${kept} of ${residuals.length} couples keeps its promise, ${short(PROMISED_DEGREES)} °C or, where a couple hardly responds, ${short(PROMISED_MILLIVOLTS)} mV: ${byDegrees} keep the first everywhere.`,
    `NIST's certified statistics come out to ${least} digits or more of 15.`,
  ];
}
