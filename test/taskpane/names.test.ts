/** Names that the pane shares with files that no compiler checks against it. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import type { Catalogue } from "../../src/catalogue/catalogue";
import catalogueFile from "../../src/catalogue/catalogue.json";
import { searcher } from "../../src/taskpane/find/search";
import { DRAWN, SURVEY_ARGUMENTS } from "../../src/taskpane/look/drawn-functions";
import { luminance } from "../../src/taskpane/office-theme";
import shortcuts from "../../src/taskpane/shortcuts.json";
import { ACTIONS } from "../../src/taskpane/ways-in";

const catalogue = catalogueFile as unknown as Catalogue;
const parametersOf = (id: string) =>
  catalogue.functions.find((each) => each.id === id)?.parameters.map(({ name }) => name);

describe("the functions that pictures are drawn with", () => {
  it.each(Object.entries(DRAWN))("%s takes its arguments in this order", (id, names) => {
    expect(parametersOf(id)?.slice(0, names.length)).toEqual(names);
  });

  it("are asked by the names that a survey's readings have", () => {
    for (const id of ["SURVEY", "SURVEYSENSORS", "SOAK"]) {
      expect(parametersOf(id)).toEqual(expect.arrayContaining([...SURVEY_ARGUMENTS]));
    }
  });
});

describe("the ways in", () => {
  it("lead to actions that the pane answers to", () => {
    const manifest = readFileSync("manifest.xml", "utf8");
    const called = [...manifest.matchAll(/<FunctionName>(.*)<\/FunctionName>/g)].map(([, name]) => name);
    expect(Object.keys(ACTIONS)).toEqual(expect.arrayContaining(called));
    expect(called.length).toBeGreaterThan(0);
    expect(shortcuts.actions.map(({ id }) => id)).toEqual(Object.keys(ACTIONS));
    expect(shortcuts.shortcuts.map(({ action }) => action)).toEqual(Object.keys(ACTIONS));
  });
});

describe("the dark colours", () => {
  it("are the same by the system and by the theme of Office", () => {
    const css = readFileSync("src/styles/look.css", "utf8");
    const colours = (block: RegExp) =>
      [...(block.exec(css)?.[1] ?? "").matchAll(/--[\w-]+: #\w+/g)].map(([each]) => each);
    const bySystem = colours(/:not\(\[data-theme="light"\]\) \{([^}]*)\}/);
    expect(bySystem.length).toBeGreaterThan(10);
    expect(colours(/\[data-theme="dark"\] \{([^}]*)\}/)).toEqual(bySystem);
  });

  it("are chosen by how dark the theme is", () => {
    expect(luminance("#ffffff")).toBeCloseTo(1);
    expect(luminance("#262626")).toBeLessThan(0.1);
    expect(luminance("rgb(1,2,3)")).toBeUndefined();
  });
});

describe("search", () => {
  const search = searcher(catalogue);

  it("finds every function by its own name first", () => {
    for (const { id } of catalogue.functions) expect(search(id)[0]?.id).toBe(id);
  });

  it("finds every function by its first keyword among the first five", () => {
    const missed = catalogue.functions.filter(
      ({ id, keywords }) =>
        keywords[0] &&
        !search(keywords[0])
          .slice(0, 5)
          .some((found) => found.id === id),
    );
    expect(missed.map(({ id, keywords }) => `${id}: ${keywords[0]}`)).toEqual([]);
  });
});
