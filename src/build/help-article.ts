// The help page's article about one function.

import type { Catalogue, CatalogueFunction, CatalogueParameter } from "../catalogue/catalogue";
import { escaped } from "./html";

const SHAPES: Record<CatalogueParameter["shape"], string> = {
  cell: "one cell",
  cells: "a cell or a range",
  column: "a column",
  block: "a block of cells",
};

/** One function: its anchor, sentence, arguments, result, examples and remarks. */
export function article(entry: CatalogueFunction, { namespace }: Catalogue): string {
  const parts = [
    `<article id="${escaped(entry.id)}">`,
    `<h3>${escaped(entry.id)}</h3>`,
    `<p>${escaped(entry.description)}</p>`,
    `<p class="formula"><code>=${escaped(`${namespace}.${signature(entry)}`)}</code></p>`,
    argumentsTable(entry),
    `<h4>Result</h4>\n<p class="result">${escaped(entry.result)}</p>`,
    resultParts(entry),
    list("Definitions", entry.definitions),
    list("Equation", entry.equations),
    list("Assumes", entry.assumptions),
    examples(entry),
    list("Caution", entry.cautions, "caution"),
    list("Standards and publications", entry.standards),
    seeAlso(entry),
    "</article>",
  ];
  return parts.filter((part) => part !== "").join("\n");
}

function signature({ id, parameters }: CatalogueFunction): string {
  return `${id}(${parameters.map(({ name, optional }) => (optional ? `[${name}]` : name)).join(", ")})`;
}

function argumentsTable({ id, parameters }: CatalogueFunction): string {
  if (parameters.length === 0) return "<p>It takes no arguments.</p>";
  return `<h4>Arguments</h4>
<section class="wide" tabindex="0" aria-label="Arguments of ${escaped(id)}">
<table>
<thead><tr><th scope="col">Argument</th><th scope="col">What it is</th><th scope="col">Takes</th><th scope="col">When left out</th></tr></thead>
<tbody>
${parameters.map(argumentRow).join("\n")}
</tbody>
</table>
</section>`;
}

function argumentRow(parameter: CatalogueParameter): string {
  const kind = parameter.unit ? `${parameter.kind}, ${parameter.unit}` : parameter.kind;
  const options = parameter.options?.map((option) => `<code>${escaped(option)}</code>`).join(", ");
  return [
    `<tr><th scope="row"><code>${escaped(parameter.name)}</code></th>`,
    `<td>${escaped(parameter.description)}${options ? `<br><span class="muted">One of</span> ${options}` : ""}</td>`,
    `<td>${escaped(kind)}<br><span class="muted">${SHAPES[parameter.shape]}</span></td>`,
    `<td>${parameter.optional ? escaped(parameter.default ?? "not used") : "required"}</td></tr>`,
  ].join("");
}

/** The named parts of a table that spills; a plain result needs no such line. */
function resultParts({ resultKinds }: CatalogueFunction): string {
  if (resultKinds.length < 2) return "";
  const parts = resultKinds.map(
    ({ name, unit }) => `<code>${escaped(name)}</code>${unit ? ` in ${escaped(unit)}` : ""}`,
  );
  return `<p>Parts: ${parts.join(", ")}</p>`;
}

function examples({ id, examples }: CatalogueFunction): string {
  if (examples.length === 0) return "";
  const rows = examples.map(
    ({ formula, result }) =>
      `<tr><td><code>${escaped(formula)}</code></td><td class="result">${escaped(result)}</td></tr>`,
  );
  return `<h4>Examples</h4>
<section class="wide" tabindex="0" aria-label="Examples of ${escaped(id)}">
<table>
<thead><tr><th scope="col">Formula</th><th scope="col">Result</th></tr></thead>
<tbody>
${rows.join("\n")}
</tbody>
</table>
</section>`;
}

function list(title: string, items: readonly string[], style = ""): string {
  if (items.length === 0) return "";
  const name = style ? ` class="${style}"` : "";
  return `<h4>${title}</h4>\n<ul${name}>\n${items.map((item) => `<li>${escaped(item)}</li>`).join("\n")}\n</ul>`;
}

function seeAlso({ see }: CatalogueFunction): string {
  if (see.length === 0) return "";
  return `<p>See also ${see.map((id) => `<a href="#${escaped(id)}">${escaped(id)}</a>`).join(", ")}.</p>`;
}
