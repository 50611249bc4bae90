import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { helpPage } from "../../src/build/help";
import { escaped } from "../../src/build/html";
import type { Catalogue, CatalogueFunction } from "../../src/catalogue/catalogue";

const catalogue = JSON.parse(readFileSync("src/catalogue/catalogue.json", "utf8")) as Catalogue;
const page = helpPage(catalogue);

const bare: CatalogueFunction = {
  id: "BARE",
  category: "Odd",
  description: "Does nothing.",
  parameters: [],
  result: "Nothing",
  resultKinds: [],
  keywords: [],
  equations: [],
  standards: [],
  definitions: [],
  assumptions: [],
  cautions: [],
  examples: [],
  see: [],
};
const wrapped = (...functions: CatalogueFunction[]): Catalogue => ({
  version: "1.2.3",
  namespace: "BEAD",
  categories: [
    { name: "Odd", sentence: "For the test." },
    { name: "Empty", sentence: "Without functions." },
  ],
  functions,
});

test("the committed page is the one that the catalogue gives", () => {
  expect(readFileSync("src/help/help.html", "utf8").replaceAll("\r\n", "\n")).toBe(page);
});

test("every function has one anchor, and the contents lead to it", () => {
  expect(catalogue.functions.length).toBeGreaterThan(0);
  for (const { id } of catalogue.functions) {
    expect(page.split(`id="${id}"`)).toHaveLength(2);
    expect(page).toContain(`<li><a href="#${id}">`);
  }
});

test("every word of every function stands on the page", () => {
  for (const entry of catalogue.functions) {
    const { description, result, equations, standards, definitions, assumptions, cautions } = entry;
    const sentences = [description, result, equations, standards, definitions, assumptions, cautions].flat();
    for (const sentence of sentences) expect(page).toContain(escaped(sentence));
    for (const { name, description, options = [] } of entry.parameters) {
      for (const text of [name, description, ...options]) expect(page).toContain(escaped(text));
    }
    for (const example of entry.examples) {
      expect(page).toContain(escaped(example.formula));
      expect(page).toContain(escaped(example.result));
    }
  }
});

test("every link within the page has a target", () => {
  const ids = new Set([...page.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id));
  for (const [, target] of page.matchAll(/href="#([^"]+)"/g)) expect(ids).toContain(target);
});

test("what could be read as markup is escaped, wherever it comes from", () => {
  const evil = `<b onclick="x">&'`;
  const everywhere: CatalogueFunction = {
    ...bare,
    id: "EVIL",
    description: evil,
    parameters: [
      {
        name: evil,
        description: evil,
        kind: evil,
        unit: evil,
        optional: true,
        default: evil,
        options: [evil],
        shape: "cell",
      },
    ],
    result: evil,
    resultKinds: [
      { name: evil, kind: evil, unit: evil },
      { name: evil, kind: evil },
    ],
    equations: [evil],
    standards: [evil],
    definitions: [evil],
    assumptions: [evil],
    cautions: [evil],
    examples: [{ formula: evil, result: evil }],
    see: [evil],
  };
  const categories = [{ name: "Odd", sentence: evil }];
  const html = helpPage({ ...wrapped(everywhere), version: evil, categories });
  expect(html).not.toContain("<b ");
  expect(html).not.toContain('onclick="');
  expect(html.split(escaped(evil)).length).toBeGreaterThan(15);
});

test("a function without arguments, examples and remarks has no empty tables and headings", () => {
  const html = helpPage(wrapped(bare));
  expect(html).toContain("<code>=BEAD.BARE()</code>");
  expect(html).toContain("It takes no arguments.");
  expect(html).not.toMatch(/<table|<h4>(?!Result)|<ul>\s*<\/ul>/);
});

test("a category without functions is not shown", () => {
  expect(helpPage(wrapped(bare))).not.toContain("Without functions.");
});

test("an argument says whether it may be left out and what holds then", () => {
  const parameter = { name: "step", description: "Step.", kind: "temperature", shape: "cell" as const };
  const html = helpPage(
    wrapped({
      ...bare,
      parameters: [
        { ...parameter, name: "start", optional: false },
        { ...parameter, optional: true, default: "1" },
        { ...parameter, name: "column", optional: true },
      ],
    }),
  );
  expect(html).toContain("=BEAD.BARE(start, [step], [column])");
  expect(html).toMatch(/start.*required/);
  expect(html).toMatch(/step.*<td>1<\/td>/);
  expect(html).toMatch(/column.*<td>not used<\/td>/);
});

test("the page runs no script, styles nothing inline, and fetches only its own files", () => {
  expect(page).toContain("default-src 'none'");
  expect(page).not.toMatch(/<script|style="|<style|(href|src)="\w+:/);
  expect(page).toContain('<link rel="stylesheet" href="help.css">');
});

test("the style sheet follows light, dark and forced colours and fetches nothing", () => {
  const css = readFileSync("src/help/help.css", "utf8");
  expect(css).toContain("prefers-color-scheme: dark");
  expect(css).toContain("forced-colors: active");
  expect(css).not.toMatch(/url\(|@import/);
});
