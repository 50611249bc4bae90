/** The evidence as one page without script. */
import { createHash } from "node:crypto";
import { readFileSync } from "node:fs";
import { escaped } from "../../src/build/html";
import type { Evidence } from "./collect";
import { introduction, sections } from "./page";
import { bandPlot } from "./plots/band";
import { digitsPlot } from "./plots/digits";
import { residualPlot } from "./plots/residual";
import { AGREES, type Column, type Section, type Table } from "./section";
import { findings } from "./totals";

/** A number and its unit stay on one line. */
const withUnit = (text: string): string => text.replace(/(?<=\d) (?=[°ΩµmV%])/g, "\u00a0");

/** Words between backticks are code; a number is not broken at its exponent. */
const prose = (text: string): string =>
  escaped(withUnit(text))
    .replace(/`([^`]+)`/g, "<code>$1</code>")
    .replace(/[\d.]+E-\d+/g, '<span class="number">$&</span>');

const marks = { text: "", figure: ' class="figure"', verdict: "" } as const;

function cell({ kind }: Column, content: string, link?: string): string {
  const plain = escaped(withUnit(content));
  const words = link === undefined ? plain : `<a href="#${link}">${plain}</a>`;
  if (kind !== "verdict") return `<td${marks[kind]}>${words}</td>`;
  return content === AGREES
    ? `<td class="agrees">✓ ${words}</td>`
    : `<td class="falls-short">✗ ${words}</td>`;
}

function table({ columns, rows, links }: Table): string {
  const head = columns.map(({ name, kind }) => `<th scope="col"${marks[kind]}>${escaped(name)}</th>`);
  const body = rows.map((row, i) => {
    const cells = row.map((content, j) =>
      cell(columns[j] as Column, content, j === 0 ? links?.[i] : undefined),
    );
    return `<tr>${cells.join("")}</tr>`;
  });
  return `<div class="table">\n<table>\n<thead><tr>${head.join("")}</tr></thead>\n<tbody>\n${body.join("\n")}\n</tbody>\n</table>\n</div>`;
}

const plots = (evidence: Evidence): Readonly<Record<NonNullable<Section["plots"]>, readonly string[]>> => ({
  residuals: evidence.residuals.map(residualPlot),
  bands: evidence.bands.map(bandPlot),
  digits: digitsPlot(evidence.certified),
});

function section(
  { id, level, title, text, table: rows, plots: kind }: Section,
  drawn: ReturnType<typeof plots>,
): string {
  return [
    `<h${level} id="${id}">${escaped(title)}</h${level}>`,
    ...text.map((paragraph) => `<p class="muted">${prose(paragraph)}</p>`),
    ...(kind === undefined ? [] : [`<div class="plots ${kind}">\n${drawn[kind].join("\n")}\n</div>`]),
    ...(rows === undefined ? [] : [table(rows)]),
  ].join("\n");
}

/** The page stands alone: the look of all pages, and what this one needs. */
function styles(): string {
  return `${readFileSync("src/styles/look.css", "utf8")}${readFileSync("test/evidence/evidence.css", "utf8")}`;
}

export function html(evidence: Evidence): string {
  const css = styles();
  const hash = createHash("sha256").update(css).digest("base64");
  const drawn = plots(evidence);
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
  .map((sentence) => `<li>${prose(sentence)}</li>`)
  .join("\n")}
</ul>
${introduction.map((paragraph) => `<p class="muted">${prose(paragraph)}</p>`).join("\n")}
${sections(evidence)
  .map((one) => section(one, drawn))
  .join("\n")}
</main>
</body>
</html>
`;
}
