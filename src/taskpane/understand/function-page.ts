import type { Catalogue, CatalogueFunction, CatalogueParameter } from "../../catalogue/catalogue";
import { button, make } from "../dom";
import { liveExample } from "./live-example";
import { MEANINGS, provokedErrors } from "./provoked-errors";

export interface PageActions {
  readonly build: (found: CatalogueFunction) => void;
  readonly open: (found: CatalogueFunction) => void;
}

/** Said once for all functions, at the foot of the pane. */
const GENERAL_CAUTION = /^For records and analysis/;

/** Everything the catalogue knows of one function, with live results. */
export function functionPage(
  catalogue: Catalogue,
  found: CatalogueFunction,
  actions: PageActions,
): HTMLElement {
  const { namespace } = catalogue;
  const page = make(
    "article",
    { class: "function-page" },
    make("p", { class: "crumb" }, found.category),
    make("h2", { tabindex: "-1" }, make("code", { class: "name" }, `${namespace}.${found.id}`)),
    make("p", { class: "sentence" }, found.description),
    button("Build this formula", () => actions.build(found), "primary"),
    part("Arguments", make("dl", { class: "arguments" }, ...found.parameters.flatMap(argumentOf))),
    part("Result", make("p", {}, found.result)),
    part(
      "Examples",
      make("ul", { class: "examples" }, ...found.examples.map((each) => liveExample(found, each, namespace))),
    ),
  );
  page.append(...texts("Equation", found.equations, "equation"), ...texts("Words", found.definitions));
  page.append(...texts("Assumes", found.assumptions), ...texts("After", found.standards));
  page.append(
    ...texts(
      "Take care",
      found.cautions.filter((each) => !GENERAL_CAUTION.test(each)),
      "caution",
    ),
  );
  page.append(errorsOf(found, namespace));
  const related = found.see.flatMap((id) => catalogue.functions.find((each) => each.id === id) ?? []);
  if (related.length > 0) {
    const links = related.map((each) =>
      make(
        "li",
        {},
        button(each.id, () => actions.open(each), "quiet"),
      ),
    );
    page.append(part("See also", make("ul", { class: "related" }, ...links)));
  }
  return page;
}

function part(title: string, ...content: Node[]): HTMLElement {
  return make("section", { class: "part" }, make("h3", {}, title), ...content);
}

function texts(title: string, lines: readonly string[], look = ""): HTMLElement[] {
  if (lines.length === 0) return [];
  return [
    part(title, make("ul", { class: `lines ${look}`.trim() }, ...lines.map((line) => make("li", {}, line)))),
  ];
}

function argumentOf(parameter: CatalogueParameter): HTMLElement[] {
  const { name, kind, unit, optional, default: usual, options, description, shape } = parameter;
  const facts = [
    unit ? `${kind}, ${unit}` : kind,
    SHAPES[shape],
    optional ? (usual ? `may be left out: ${usual}` : "may be left out") : "",
  ];
  const term = make(
    "dt",
    {},
    make("code", {}, name),
    make("span", { class: "facts" }, ` ${facts.filter(Boolean).join(" · ")}`),
  );
  const words = [make("dd", {}, description)];
  if (options && options.length > 0) {
    words.push(
      make(
        "dd",
        { class: "options" },
        ...options.flatMap((option, index) => [index > 0 ? " " : "", make("code", {}, option)]),
      ),
    );
  }
  return [term, ...words];
}

const SHAPES: Readonly<Record<CatalogueParameter["shape"], string>> = {
  cells: "one cell or a range",
  cell: "one cell",
  column: "a column or a row",
  block: "a block",
};

/** Filled when the functions in the page have given their sentences. */
function errorsOf(found: CatalogueFunction, namespace: string): HTMLElement {
  const list = make("dl", { class: "errors" });
  const section = part("Errors it can give", list);
  provokedErrors(found, namespace).then(
    (errors) => {
      for (const code of Object.keys(MEANINGS)) {
        const own = errors.filter((each) => each.code === code);
        if (own.length === 0) continue;
        list.append(make("dt", {}, make("strong", { class: "fault" }, code), ` ${MEANINGS[code]}`));
        for (const { cause, message } of own)
          list.append(make("dd", {}, make("q", {}, message), make("span", { class: "facts" }, ` ${cause}`)));
      }
      section.hidden = list.childElementCount === 0;
    },
    () => {
      section.hidden = true;
    },
  );
  return section;
}
