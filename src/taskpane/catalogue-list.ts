import type { Catalogue, CatalogueFunction } from "../catalogue/catalogue";

/**
 * The functions by family: sentence, arguments, examples. Made of native disclosure elements, so it works by
 * keyboard as it stands, and of text nodes only, so nothing in the catalogue is read as markup.
 */
export function catalogueList(catalogue: Catalogue): HTMLElement {
  const list = make("div", "catalogue");
  for (const category of catalogue.categories) {
    const functions = catalogue.functions.filter((each) => each.category === category.name);
    if (functions.length === 0) continue;
    const family = make("section", "family");
    family.append(make("h2", "", category.name), make("p", "family-sentence", category.sentence));
    for (const each of functions) family.append(functionEntry(each, catalogue.namespace));
    list.append(family);
  }
  return list;
}

function functionEntry(entry: CatalogueFunction, namespace: string): HTMLElement {
  const details = make("details", "function");
  details.id = `function-${entry.id}`;
  const summary = make("summary");
  summary.append(
    make("code", "function-name", `${namespace}.${entry.id}`),
    make("p", "sentence", entry.description),
  );
  details.append(summary, argumentsOf(entry));
  if (entry.result) details.append(make("h3", "", "Result"), make("p", "", entry.result));
  if (entry.cautions.length > 0) details.append(make("h3", "", "Take care"), texts(entry.cautions));
  if (entry.examples.length > 0) {
    const examples = make("ul", "examples");
    for (const { formula, result } of entry.examples) {
      const item = make("li");
      item.append(make("code", "formula", formula), make("span", "gives", ` gives ${result}`));
      examples.append(item);
    }
    details.append(make("h3", "", "Examples"), examples);
  }
  if (entry.standards.length > 0) details.append(make("h3", "", "After"), texts(entry.standards));
  return details;
}

function argumentsOf(entry: CatalogueFunction): HTMLElement {
  const list = make("dl", "arguments");
  for (const parameter of entry.parameters) {
    const name = make("dt");
    name.append(make("code", "", parameter.name));
    if (parameter.optional) name.append(make("span", "optional", " may be left out"));
    list.append(name, make("dd", "", parameter.description));
  }
  return list;
}

function texts(lines: readonly string[]): HTMLElement {
  const list = make("ul");
  for (const line of lines) list.append(make("li", "", line));
  return list;
}

function make(tag: string, className = "", text = ""): HTMLElement {
  const element = document.createElement(tag);
  if (className) element.className = className;
  if (text) element.textContent = text;
  return element;
}
