/** The evidence as Markdown. */
import type { Evidence } from "./collect";
import { introduction, sections } from "./page";
import type { Section, Table } from "./section";
import { findings } from "./totals";

const cell = (content: string): string => content.replaceAll("|", "\\|").replaceAll("*", "\\*");

const line = (cells: readonly string[]): string => `| ${cells.map(cell).join(" | ")} |`;

const table = ({ columns, rows }: Table): string =>
  [
    line(columns.map(({ name }) => name)),
    `| ${columns.map(({ kind }) => (kind === "figure" ? "---:" : "---")).join(" | ")} |`,
    ...rows.map(line),
  ].join("\n");

const section = (one: Section): string[] => [
  `${"#".repeat(one.level)} ${cell(one.title)}`,
  ...one.text,
  ...(one.plots === undefined ? [] : ["The plots stand in `evidence.html`."]),
  ...(one.table === undefined ? [] : [table(one.table)]),
];

export const markdown = (evidence: Evidence): string =>
  `${[
    "# Evidence",
    ...introduction,
    findings(evidence)
      .map((sentence) => `- ${sentence}`)
      .join("\n"),
    ...sections(evidence).flatMap(section),
  ].join("\n\n")}\n`;
