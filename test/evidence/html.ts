/** The evidence as one page without script: totals, plots, digits, and every value behind its source. */
import { createHash } from "node:crypto";
import { readFileSync } from "node:fs";
import { escaped } from "../../src/build/html";
import type { Evidence } from "./collect";
import { type Group, short } from "./group";
import { residualPlot } from "./plot";
import { findings, totals } from "./totals";

/** Text, and numbers that stand right-aligned. */
type Cell = string | { readonly figure: string | number };

const cell = (content: Cell, tag: "td" | "th"): string =>
  typeof content === "string"
    ? `<${tag}>${escaped(content)}</${tag}>`
    : `<${tag} class="figure">${escaped(String(content.figure))}</${tag}>`;

const line = (cells: readonly Cell[], tag: "td" | "th"): string =>
  `<tr>${cells.map((one) => cell(one, tag)).join("")}</tr>`;

const table = (head: readonly Cell[], rows: readonly (readonly Cell[])[]): string =>
  `<table>\n<thead>${line(head, "th")}</thead>\n<tbody>\n${rows.map((row) => line(row, "td")).join("\n")}\n</tbody>\n</table>`;

const figure = (content: string | number): Cell => ({ figure: content });

const verdict = (holds: boolean): string => (holds ? "✓ agrees" : "✗ FALLS SHORT");

const groupDetails = ({ source, compared, rows }: Group): string => `<details>
<summary>${escaped(source)} (${rows.length})</summary>
<p class="muted">${escaped(compared)}.</p>
${table(
  ["what", figure("published"), figure("ours"), figure("difference"), "verdict"],
  rows.map((one) => [
    one.what,
    figure(one.published),
    figure(one.ours),
    figure(one.difference),
    verdict(one.holds),
  ]),
)}
</details>`;

/** The page stands alone: the look of all pages, and what this one needs. */
function styles(): string {
  return `${readFileSync("src/styles/look.css", "utf8")}${readFileSync("test/evidence/evidence.css", "utf8")}`;
}

export function html(evidence: Evidence): string {
  const { groups, residuals, certified } = evidence;
  const css = styles();
  const hash = createHash("sha256").update(css).digest("base64");
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'sha256-${hash}'">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Beadline: evidence</title>
<style>${css}</style>
</head>
<body>
<main>
<h1>Evidence</h1>
<ul class="findings">
${findings(evidence)
  .map((sentence) => `<li>${escaped(sentence)}</li>`)
  .join("\n")}
</ul>
<p class="muted">“From memory” marks what was not found in print.</p>
<h2>Totals by source</h2>
${table(
  ["source", figure("values"), figure("agree")],
  totals(evidence).map(({ source, values, agreeing }) => [source, figure(values), figure(agreeing)]),
)}
<h2>The inverse over each couple's whole range</h2>
<p class="muted">Residual of the inverse against an evaluation of the published function with 50 digits, on a logarithmic scale from 1E-15 to 1E-7 °C; the band is what we promise. Above it a couple hardly responds, and 5E-11 mV holds.</p>
<div class="plots">
${residuals.map(residualPlot).join("\n")}
</div>
${table(
  [
    "couple",
    figure("from °C"),
    figure("to °C"),
    figure("inverse, °C"),
    figure("inverse, mV"),
    figure("E(t), mV"),
    "verdict",
  ],
  residuals.map((one) => [
    one.name,
    figure(Number(one.low.toFixed(3))),
    figure(one.high),
    figure(short(one.worstDegrees)),
    figure(short(one.worstMillivolts)),
    figure(short(one.worstEmf)),
    verdict(one.holds),
  ]),
)}
<h2>NIST Statistical Reference Datasets</h2>
${table(
  ["set", "values", figure("digits that agree, of 15"), "verdict"],
  certified.map(({ set, values, digits, holds }) => [set, values, figure(digits.toFixed(1)), verdict(holds)]),
)}
<h2>Every value</h2>
${groups.map(groupDetails).join("\n")}
</main>
</body>
</html>
`;
}
