/** The evidence as Markdown: totals first, every value after. */
import type { Evidence } from "./collect";
import { type Group, short } from "./group";
import { findings, totals } from "./totals";

const table = (head: readonly string[], rows: readonly (readonly (string | number)[])[]): string =>
  [head, head.map(() => "---"), ...rows].map((cells) => `| ${cells.join(" | ")} |`).join("\n");

const verdict = (holds: boolean): string => (holds ? "agrees" : "FALLS SHORT");

const groupTable = ({ source, compared, rows }: Group): string =>
  `### ${source}\n\n${compared}.\n\n${table(
    ["what", "published", "ours", "difference", "verdict"],
    rows.map((one) => [one.what, one.published, one.ours, one.difference, verdict(one.holds)]),
  )}`;

export function markdown(evidence: Evidence): string {
  const { groups, residuals, certified } = evidence;
  return `${[
    "# Evidence",
    'Made by `npm run evidence`; a test fails when a value falls short and when this page is stale. "From memory" marks what was not found in print.',
    findings(evidence)
      .map((sentence) => `- ${sentence}`)
      .join("\n"),
    "## Totals by source",
    table(
      ["source", "values", "agree"],
      totals(evidence).map(({ source, values, agreeing }) => [source, values, agreeing]),
    ),
    "## The inverse over each couple's whole range",
    "Largest residual at 401 temperatures against an evaluation of the published function with 50 digits. The plots stand in `evidence.html`.",
    table(
      ["couple", "from °C", "to °C", "inverse, °C", "inverse, mV", "E(t), mV", "verdict"],
      residuals.map((one) => [
        one.name,
        Number(one.low.toFixed(3)),
        one.high,
        short(one.worstDegrees),
        short(one.worstMillivolts),
        short(one.worstEmf),
        verdict(one.holds),
      ]),
    ),
    "## NIST Statistical Reference Datasets",
    table(
      ["set", "values", "digits that agree, of 15", "verdict"],
      certified.map(({ set, values, digits, holds }) => [set, values, digits.toFixed(1), verdict(holds)]),
    ),
    "## Every value",
    ...groups.map(groupTable),
  ].join("\n\n")}\n`;
}
