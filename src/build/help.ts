// The help page: one static page made from the catalogue, with an anchor for every function. Without script.

import type { Catalogue, CatalogueFunction } from "../catalogue/catalogue";
import { article } from "./help-article";
import { escaped } from "./html";

const POLICY =
  "default-src 'none'; style-src 'self'; img-src 'self' data:; base-uri 'none'; form-action 'none'";

/** The whole page as text. Everything from the catalogue is escaped. */
export function helpPage(catalogue: Catalogue): string {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${POLICY}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<title>Beadline functions</title>
<link rel="icon" href="assets/mark.svg">
<link rel="stylesheet" href="help.css">
</head>
<body>
<header>
<img src="assets/mark.svg" alt="" width="32" height="32">
<div>
<h1>Beadline functions</h1>
<p class="muted">Worksheet functions for thermocouples, version ${escaped(catalogue.version)}</p>
</div>
</header>
${contents(catalogue)}
<main>
${BEFORE_YOU_START}
${categoriesInUse(catalogue)
  .map(
    ({ name, sentence, functions }) => `<section>
<h2>${escaped(name)}</h2>
<p>${escaped(sentence)}</p>
${functions.map((entry) => article(entry, catalogue)).join("\n")}
</section>`,
  )
  .join("\n")}
</main>
</body>
</html>
`;
}

const BEFORE_YOU_START = `<section id="before-you-start">
<h2>Before you start</h2>
<dl>
<dt>Empty cells</dt>
<dd>A spreadsheet may hand an empty cell of a range to a function as 0, and 0 mV is a real reading. Where a
range can have gaps, write <code>IF(ISBLANK(B2:B2001),"",B2:B2001)</code> in place of <code>B2:B2001</code>:
gaps then stay empty in the result.</dd>
<dt>Errors</dt>
<dd><code>#VALUE!</code> means that an argument is of the wrong kind, <code>#N/A</code> that no valid answer
exists. Point at the cell to read the reason. One bad cell spoils one cell of the result and no other.</dd>
<dt>Units</dt>
<dd>EMF is in mV, temperature in °C unless the argument <code>unit</code> says "F", "K" or "R".</dd>
</dl>
</section>`;

interface CategoryInUse {
  name: string;
  sentence: string;
  functions: readonly CatalogueFunction[];
}

function categoriesInUse(catalogue: Catalogue): CategoryInUse[] {
  return catalogue.categories
    .map((category) => ({
      ...category,
      functions: catalogue.functions.filter((entry) => entry.category === category.name),
    }))
    .filter(({ functions }) => functions.length > 0);
}

function contents(catalogue: Catalogue): string {
  const groups = categoriesInUse(catalogue).map(
    ({ name, functions }) => `<h2>${escaped(name)}</h2>
<ul>
${functions.map(({ id }) => `<li><a href="#${escaped(id)}">${escaped(id)}</a></li>`).join("\n")}
</ul>`,
  );
  return `<nav aria-label="Functions">\n${groups.join("\n")}\n</nav>`;
}
